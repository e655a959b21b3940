import { beforeAll, describe, expect, it } from 'vitest';
import { rebuilt, trialContext, trialFigure } from '../../lib/explain/index.ts';
import { depthTrials, memory, workOutSteps, type AppraisedOption, type Figure } from '../../lib/index.ts';
import { depthTable } from '../../notebooks/charts/depthCurve.ts';
import { ofOption, ofTrial, trialIn } from '../../notebooks/drawing/asked.ts';
import { otherwise } from './contexts.ts';

describe('trialFigure(context, trial, under, path)', () => {
  let own: AppraisedOption;
  let trial: AppraisedOption;
  const ask = (path: string): Figure => trialFigure(otherwise(), trial, 'depths/1', path);
  beforeAll(() => {
    const { study, appraisal } = otherwise();
    own = appraisal.options.find(({ number }) => number !== 40)!;
    const trials = depthTrials(study, own).filter(({ depthM }) => depthM !== own.depthM.midspan);
    const steps = workOutSteps(study, trials.slice(0, 1), memory());
    let step = steps.next();
    while (step.done !== true) step = steps.next();
    const [outcome] = step.value;
    if (outcome === undefined || !('totals' in outcome)) throw new Error('the trial was not worked out');
    trial = outcome.option;
  }, 60_000);

  it('gives what the trial comes to, not the option of its number', () => {
    const cost = ask(ofOption(own, 'cost/p50'));
    expect(cost.value).toBe(trial.cost.p50);
    expect(cost.value).not.toBe(own.cost.p50);
    expect(cost.path).toBe(ofTrial(1, ofOption(own, 'cost/p50')));
    expect(ask(ofOption(own, 'depthM/midspan')).value).toBe(trial.depthM.midspan);
  });

  it('walks down to the depth that was tried and to the study, and never through the option it stands beside', () => {
    const seen = new Set<string>();
    const tried: Figure[] = [];
    let closed = 0;
    const visit = (path: string): void => {
      if (seen.has(path)) return;
      seen.add(path);
      const place = trialIn(path);
      expect(path.startsWith(ofOption(own, '')), path).toBe(false);
      const found = ask(place?.path ?? path);
      if (found.because.method === 'tried') tried.push(found);
      const again = rebuilt(trialContext(otherwise(), trial), place?.path ?? path);
      if (typeof found.value === 'number' && again !== undefined && found.because.method !== 'tried') {
        closed += 1;
        expect(Math.abs(again - found.value), path).toBeLessThanOrEqual(
          1e-9 * Math.max(1, Math.abs(found.value)),
        );
      }
      for (const input of found.because.inputs) visit(input.path);
    };
    visit(ofTrial(1, ofOption(own, 'cost/p50')));
    expect(closed).toBeGreaterThan(100);
    expect(tried.map(({ value }) => value)).toEqual([trial.depthM.midspan]);
  });

  it('says only of the trial what hangs on it: the standing is that of the study', () => {
    const users = ask(ofOption(own, 'cost/p50')).usedBy;
    expect(users.length).toBeGreaterThan(0);
    expect(users.every((path) => path.startsWith(ofTrial(1, ofOption(own, ''))))).toBe(true);
  });

  it('depthTable prints a trial under its path', () => {
    const figures = {
      depthM: ofTrial(0, 'options/1/depthM/midspan'),
      cost: ofTrial(0, 'options/1/cost/p50'),
    };
    const { rows } = depthTable({
      form: 'composite-i',
      points: [{ depthM: 2.4, cost: 6.2e6, figures }],
      depthM: 2.4,
      limits: [],
      currency: 'EUR',
      widthPx: 600,
    });
    expect(rows[0]).toEqual([
      { text: '2.40', figure: figures.depthM },
      { text: '6.2', figure: figures.cost },
      '0.0',
    ]);
  });
});
