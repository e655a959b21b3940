import { mainUnit } from '../appraise/workOption.ts';
import type { AppraisedOption, Figure } from '../model/index.ts';
import type { Context } from './at.ts';
import { figure } from './figure.ts';

const made = new WeakMap<AppraisedOption, Context>();

/** An appraisal as it would stand with an option tried in the place of that of its number. */
export function trialContext(context: Context, trial: AppraisedOption): Context {
  const known = made.get(trial);
  if (known?.study === context.study) return known;
  const options = context.appraisal.options.map((one) => (one.number === trial.number ? trial : one));
  const fresh: Context = { ...context, appraisal: { ...context.appraisal, options } };
  made.set(trial, fresh);
  return fresh;
}

/** The path at which a trial gives the depth of its main unit. */
const depthOf = ({ number, units }: AppraisedOption): string =>
  `options/${number}/designs/${units.indexOf(mainUnit(units))}/task/depthM`;

/**
 * Where a figure of an option comes from that was tried at another depth beside the appraisal, e.g. for a curve of cost
 * against depth. Its own figures go by the paths of an option under `under`; what is not of the option keeps its path.
 * @param under where trials of this kind stand, e.g. 'depths/2'
 * @param path within it: 'options/3/cost/p50'
 * @throws RangeError where there is no such figure
 */
export function trialFigure(context: Context, trial: AppraisedOption, under: string, path: string): Figure {
  const own = `options/${trial.number}/`;
  const placed = (one: string): string => (one.startsWith(own) ? `${under}/${one}` : one);
  const found = figure(trialContext(context, trial), path);
  const { inputs } = found.because;
  const because =
    path === depthOf(trial)
      ? {
          method: 'tried',
          formula: 'one of the depths about that of the option, inside the published band of its form',
          inputs: [],
          sources: found.because.sources,
        }
      : { ...found.because, inputs: inputs.map((input) => ({ ...input, path: placed(input.path) })) };
  return {
    path: placed(found.path),
    label: found.label,
    value: found.value,
    unit: found.unit,
    ...(found.range === undefined ? {} : { range: found.range }),
    kind: found.kind,
    because,
    get usedBy() {
      // What stands on all options at once stands on those of the study.
      return found.usedBy.filter((one) => one.startsWith(own)).map(placed);
    },
  };
}
