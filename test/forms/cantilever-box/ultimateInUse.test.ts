import { describe, expect, it } from 'vitest';
import { cantileverBase, cantileverModel } from '../../../lib/forms/cantilever-box/cantileverModel.ts';
import { sizeHaunched } from '../../../lib/forms/cantilever-box/sizeHaunched.ts';
import { strandStates, ultimateInUse } from '../../../lib/forms/cantilever-box/tendonNeeds.ts';
import { creepShare } from '../../../lib/forms/cantilever-box/stages.ts';
import { middleStation } from '../../../lib/forms/common/middleStation.ts';
import { cantileverSpans, cantileverTask } from './cases.ts';

describe('ultimateInUse(model, weight, use, states, parasitic moments, station)', () => {
  const model = cantileverModel(cantileverBase(cantileverTask(cantileverSpans(150), 4)), 9, 3);
  const { weight, found } = sizeHaunched(model, null);
  const { open, lasting } = strandStates(model, found.stresses);
  const at = middleStation(model.beam, 1);
  const { max, min } = ultimateInUse(model, weight, found.use, [open, lasting], found, at);
  const [along, over] = [found.parasiticBottomKNm[at]!, found.parasiticTopKNm[at]!];

  it('takes weight and tendons before creep or after it, never one of each, by hand', () => {
    const joined = 1.0 * weight.openKNm[at]! + open.bottomParasitic * along;
    const crept = 1.35 * weight.lastingKNm[at]! + along + creepShare * over;
    expect(weight.openKNm[at]!).toBeLessThan(0);
    expect(max).toBeCloseTo(Math.max(joined, crept) + found.use.ultimateMax[at]!, 3);
    expect(max).toBeLessThan(1.35 * weight.lastingKNm[at]! + along + found.use.ultimateMax[at]!);
    expect(min).toBeLessThan(max);
  });

  it('knows that creep brings sagging of the weight and hogging of the tendons over the piers together', () => {
    expect(weight.lastingKNm[at]!).toBeGreaterThan(weight.openKNm[at]!);
    expect(over).toBeLessThan(0);
  });
});
