import type { FormId, Site } from '../model/index.ts';
import { rulingsFor } from '../rules/index.ts';
import { formFacts } from './facts.ts';

/** Why the rules put a form out on a site, in sentences; empty where they do not. */
export function ruledOut(site: Site, form: FormId): readonly string[] {
  const rulings = rulingsFor('form', form, formFacts(site));
  return rulings.filter(({ effect }) => effect === 'out').flatMap(({ because }) => because);
}
