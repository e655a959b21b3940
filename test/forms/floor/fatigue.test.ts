import { describe, expect, it } from 'vitest';
import { fatigueLimitMPa, fatigueRange } from '../../../lib/forms/floor/fatigue.ts';
import { loadTrack } from '../../../lib/mechanics/index.ts';

describe('fatigueRange(standard, track, ordinates, length)', () => {
  it('fatigue load model 3 on a 20 m simple span, midspan moment, by hand', () => {
    // Axles 120 kN at 0, 1.2, 7.2 and 8.4 m (EN 1991-2 4.6.4, from memory). With the second axle at midspan: ordinates
    // 5, 5 - 0.6, 5 - 3.0, 5 - 3.6 m, sum 12.8: 120 x 12.8 = 1 536 kNm. Damage: lambda1 = 2.55 - 0.7 x 10 / 70 = 2.45,
    // lambda max at 20 m = 2.5 - 0.5 x 10 / 15 = 2.1667 governs.
    const track = loadTrack([0, 10, 20]);
    expect(fatigueRange('lm1', track, [0, 5, 0], 20)).toBeCloseTo(1536 * (2.5 - 0.5 * (10 / 15)), 6);
  });

  it('AASHTO fatigue truck on the same span, by hand', () => {
    // 32 kip at midspan, the other 32 kip 30 ft = 9.144 m behind, 8 kip 4.267 m ahead: 142.34 x 5 + 142.34 x 0.428
    // + 35.586 x 2.8664 = 874.6 kNm; 15 % allowance and 1.75 for Fatigue I (from memory).
    const track = loadTrack([0, 10, 20]);
    const static_ = 142.3430915 * (5 + (10 - 9.144) / 2) + 35.5857729 * ((10 - 4.2672) / 2);
    expect(fatigueRange('hl93', track, [0, 5, 0], 20)).toBeCloseTo(static_ * 1.15 * 1.75, 3);
  });

  it('details stand in order: plain flange over stiffener over gusset', () => {
    for (const id of ['lm1', 'hl93'] as const) {
      expect(fatigueLimitMPa(id, 'plain')).toBeGreaterThan(fatigueLimitMPa(id, 'stiffener'));
      expect(fatigueLimitMPa(id, 'stiffener')).toBeGreaterThan(fatigueLimitMPa(id, 'gusset'));
    }
  });
});
