import { z } from '../zod.ts';
import type { AskedOf, FormId } from '../model/index.ts';
import { familyOf, formIds } from '../model/index.ts';
import methodFactsJson from '../../data/rules/facts-methods.json';
import riverFactsJson from '../../data/rules/facts-river.json';
import supportFactsJson from '../../data/rules/facts-supports.json';
import factsJson from '../../data/rules/facts.json';
import generalJson from '../../data/rules/general.json';
import methodsJson from '../../data/rules/methods.json';
import riverJson from '../../data/rules/river.json';
import supportsJson from '../../data/rules/supports.json';
import sourcesJson from '../../data/sources.json';
import { checkBook } from './checkBook.ts';
import { formRuleFiles } from './formRuleFiles.ts';
import { factSchema, ruleSchema, sourceSchema, type Fact, type Rule, type Source } from './rule.ts';

const ruleFile = z.strictObject({ rules: z.array(ruleSchema) });

const factFile = z.strictObject({ facts: z.array(factSchema) });

const facts: ReadonlyMap<string, Fact> = new Map(
  [factsJson, supportFactsJson, riverFactsJson, methodFactsJson].flatMap((file) =>
    factFile.parse(file).facts.map((entry) => [entry.id, entry] as const),
  ),
);

const sources: ReadonlyMap<string, Source> = new Map(
  z
    .strictObject({ sources: z.array(sourceSchema) })
    .parse(sourcesJson)
    .sources.map((entry) => [entry.id, entry]),
);

/** Every rule of the project, form by form and then the general ones. */
export const rules: readonly Rule[] = [
  ...formRuleFiles,
  generalJson,
  supportsJson,
  riverJson,
  methodsJson,
].flatMap((file) => ruleFile.parse(file).rules);

checkBook(rules, facts, sources);

/** Every fact a rule may ask for. */
export const factDictionary: readonly Fact[] = [...facts.values()];

/** The bibliography. */
export const bibliography: readonly Source[] = [...sources.values()];

function found<T>(map: ReadonlyMap<string, T>, id: string, what: string): T {
  const value = map.get(id);
  if (value === undefined) throw new RangeError(`unknown ${what}: ${id}`);
  return value;
}

/** A fact of the dictionary. @throws RangeError for an id that is not in it. */
export const fact = (id: string): Fact => found(facts, id, 'fact');

/** A work of the bibliography. @throws RangeError for an id that is not in it. */
export const source = (id: string): Source => found(sources, id, 'source');

const byId: ReadonlyMap<string, Rule> = new Map(rules.map((entry) => [entry.id, entry]));

/** A rule by its id. @throws RangeError for an id no rule has. */
export const rule = (id: string): Rule => found(byId, id, 'rule');

/** Whether a rule speaks of a form. */
function concerns(entry: Rule, form: FormId): boolean {
  return (
    entry.forms === 'all' ||
    entry.forms.some((one) => (typeof one === 'string' ? one === form : one.family === familyOf[form]))
  );
}

const byForm: ReadonlyMap<FormId, readonly Rule[]> = new Map(
  formIds.map((form) => [form, rules.filter((entry) => concerns(entry, form))]),
);

/**
 * The rules that are asked of a form at any of the named points of the pipeline, in the order of the book.
 *
 * @param points left out = all three
 */
export function rulesFor(form: FormId, points?: readonly AskedOf[]): readonly Rule[] {
  const all = byForm.get(form) ?? [];
  return points === undefined
    ? all
    : all.filter((entry) => entry.askedOf.some((point) => points.includes(point)));
}
