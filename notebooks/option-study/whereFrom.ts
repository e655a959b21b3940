import {
  figure,
  trialFigure,
  type Appraisal,
  type AppraisedOption,
  type FigureContext,
  type Study,
} from '../../lib/index.ts';
import { ofTrial, trialIn } from '../drawing/asked.ts';
import { whereFrom, type Ask, type Head, type WhereFrom } from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';
import type { StudyCells } from './studyCells.ts';

/** Where figures are shown, by the beginning of their path; the first that fits. */
const stations: readonly (readonly [path: RegExp, station: string])[] = [
  [/^brief\/(?:obstacles|waters|crossing\/ground)\b/u, '1+030'],
  [/^depths\//u, '4+020'],
  [/^(?:windows\/[^/]+\/(?:span|usual)|built|site\/mainSpanM)\b/u, '2+010'],
  [/^site\/deck\/(?:w|ultimateW)idthM$/u, '1+040'],
  [/^brief\/(?:deck|groundStretches|surfacingM)\b/u, '1+040'],
  [/^brief\//u, '1+010'],
  [/^site\//u, '1+020'],
  [/^droppedCounts\//u, '3+020'],
  [/^(?:rates|books)\//u, '7+005'],
  [/^standing\/within\//u, '7+020'],
  [/^standing\/(?:odds|groups)\//u, '7+030'],
  [/^standing\/leader$/u, '10+010'],
  [/^kept\/|^options\/\d+\/variant\//u, '3+010'],
  [/^options\/\d+\/(?:units|supports)\//u, '3+020'],
  [/^options\/\d+\/(?:profile|headroom|depthM|over)\//u, '4+010'],
  [/^options\/\d+\/designs\/\d+\/(?:checks|depthM|limitingCheck|task)\//u, '5+010'],
  [/^options\/\d+\/perM2\//u, '6+010'],
  [/^options\/\d+\/parts\//u, '7+010'],
  [/^options\/\d+\/(?:cost|quartiles|pricePerM2)\//u, '7+020'],
  [/^options\/\d+\/(?:months|programme)\//u, '8+010'],
  [/^options\/\d+\/rulings\//u, '10+020'],
  [/^options\/\d+\/(?:status|limitingCheck)\b/u, '10+010'],
];

/** The station where a figure, or the table it belongs to, is shown; undefined for figures on the way that none shows. */
export const stationOf = (path: string): string | undefined =>
  stations.find(([pattern]) => pattern.test(path))?.[1];

/** Lets every figure of the page be asked where it comes from; a study and its appraisal always answer for one age. */
export function studyWhereFrom(graph: Graph, cells: StudyCells, sheet: HTMLElement): WhereFrom {
  const where = whereFrom(sheet, stationOf);
  let age: { readonly head: Head; readonly asked: Study; readonly appraisal: Appraisal } | undefined;
  let ask: Ask | null = null;
  /** The reference at other depths, worked out beside the appraisal. */
  let trials: readonly AppraisedOption[] = [];
  const ofTrials = (context: FigureContext, asked: string) => {
    const place = trialIn(asked);
    if (place === null) return figure(context, asked);
    const trial = trials[place.index];
    if (trial === undefined)
      throw new RangeError(`path: expected one of ${trials.length} trials, received '${asked}'`);
    return trialFigure(context, trial, ofTrial(place.index, '').slice(0, -1), place.path);
  };
  const stopTrials = graph.watch(cells.byDepth, (state) => {
    if (state.state === 'ready') trials = state.value;
  });
  const { head, asked, appraisal } = cells;
  const stop = graph.view({ head, asked, appraisal }, (state) => {
    if ('value' in state && state.value !== age) {
      age = state.value;
      // What is asked knows nothing of start values, for results do not hang on them.
      const study = { ...age.asked, assumed: age.head.assumed };
      const context: FigureContext = { study, appraisal: age.appraisal };
      ask = (path) => ofTrials(context, path);
    }
    where.set(ask, state.state === 'pending');
  });
  return {
    set: where.set,
    end() {
      stop();
      stopTrials();
      where.end();
    },
  };
}
