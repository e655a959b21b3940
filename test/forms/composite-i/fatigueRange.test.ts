import { describe, expect, it } from 'vitest';
import { fatigueLimitMPa, fatigueRange, fatigueShare } from '../../../lib/forms/composite-i/fatigueRange.ts';
import { girderEffects } from '../../../lib/forms/composite-i/girderEffects.ts';
import { girderModel } from '../../../lib/forms/composite-i/girderModel.ts';
import { sizeGirder } from '../../../lib/forms/composite-i/sizeGirder.ts';
import { girderTask } from './cases.ts';

/** Range of one girder at midspan of a simple span, kNm, and the share of a lorry it carries. */
function midspan(spanM: number, standard: 'lm1' | 'hl93'): { rangeKNm: number; share: number } {
  const model = girderModel(girderTask([spanM], spanM / 20, { standard }));
  const { run } = sizeGirder(model);
  const beam = girderEffects(model, run, 0).shortBeam;
  return {
    rangeKNm: fatigueRange(model, beam)[10]!,
    share: fatigueShare(model.task.deck, model.layout.offsetsM),
  };
}

describe('fatigueRange(model, beam)', () => {
  it('is fatigue load model 3 on the lane beside the girder times lambda, by hand at 40 m (EN 1991-2, EN 1993-2 9.5.2, from memory)', () => {
    const { rangeKNm, share } = midspan(40, 'lm1');
    // Three marked lanes of 3.5 m on 11 m: the outer one 3.5 m from the middle, over a girder 3.5 m from it.
    expect(share).toBeCloseTo(0.5 + 3.5 / 7.0, 2);
    // Axles of 120 kN at 0, 1.2, 7.2 and 8.4 m, the second at midspan: arms 9.4, 10, 7 and 6.4 m.
    const lorry = 120 * (9.4 + 10 + 7 + 6.4);
    // lambda1 2.55 - 0.7 x 30/70 = 2.25, lambda2 445/480: 2.09, but no more than lambda max 2.0.
    expect(rangeKNm).toBeCloseTo(2.0 * share * lorry, -1);
  });

  it('falls to lambda1 x lambda2 = 2.05 x 0.93 at 60 m', () => {
    const { rangeKNm, share } = midspan(60, 'lm1');
    const lorry = 120 * (14.4 + 15 + 12 + 11.4);
    expect(rangeKNm / (share * lorry)).toBeCloseTo(2.05 * 0.93, 2);
  });

  it('is 1.75 x 1.15 of the truck with axles 30 ft apart under AASHTO LRFD (3.6.1.4, from memory)', () => {
    const { rangeKNm, share } = midspan(40, 'hl93');
    // Middle axle 142.3 kN at midspan: arms 10 - 2.135, 10 and 10 - 4.57 m.
    const truck = 35.6 * (10 - 4.27 / 2) + 142.3 * 10 + 142.3 * (10 - 9.14 / 2);
    expect(rangeKNm).toBeCloseTo(1.75 * 1.15 * share * truck, -1);
  });

  it('may cause 80 / 1.35 MPa, stiffener welded to the flange (EN 1993-1-9 tables 8.4 and 3.1, from memory)', () => {
    expect(fatigueLimitMPa('lm1')).toBeCloseTo(59.3, 1);
  });
});
