import type { Appraisal, FormId, Study } from '../../../lib/index.ts';
import { exampleNames, type ExampleName } from '../../../notebooks/exampleNames.ts';
import { exampleStudy, workedOut } from '../../appraise/workedOut.ts';
import { answerTo } from '../../appraise/answerTo.ts';

/** A crossing that has been worked out, with the study it is of. */
export interface Crossed {
  readonly name: string;
  readonly study: Study;
  readonly appraisal: Appraisal;
}

export const example = (name: ExampleName): Crossed => ({
  name,
  study: exampleStudy(name),
  appraisal: workedOut(name),
});

/** One carriageway of Stonebeck Lane alone: a crossing short enough for forms that span one road and no more. */
function oneCarriageway(form: FormId): Crossed {
  const whole = exampleStudy('stonebeck-lane');
  const { crossing, obstacles } = whole.brief;
  const study: Study = {
    ...whole,
    brief: {
      ...whole.brief,
      crossing: { ...crossing, startM: 427.5, endM: 450 },
      obstacles: obstacles.filter(({ toM }) => toM <= 450),
    },
    options: { ...whole.options, forms: [form], workOutAnyway: [form] },
  };
  return { name: `one carriageway of Stonebeck Lane, ${form}`, study, appraisal: answerTo(study) };
}

/** An example in which a form is worked out, or else a short crossing made for it. */
export function crossedBy(form: FormId): Crossed {
  const has = ({ options }: Appraisal): boolean =>
    options.some(({ units }) => units.some((unit) => unit.form === form));
  const name = exampleNames.find((one) => has(workedOut(one)));
  return name === undefined ? oneCarriageway(form) : example(name);
}
