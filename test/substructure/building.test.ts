import { describe, expect, it } from 'vitest';
import { resultantAt } from '../../lib/substructure/combos.ts';
import { substructureData } from '../../lib/substructure/data.ts';
import { pierCombos } from '../../lib/substructure/pierCombos.ts';
import { settingAt } from '../../lib/substructure/setting.ts';
import { standOneSupport } from '../../lib/substructure/standOneSupport.ts';
import type { SupportAsk } from '../../lib/substructure/supportAsk.ts';
import { expectedLines } from '../../lib/substructure/index.ts';
import { survey } from '../../lib/index.ts';
import { workbench } from '../../lib/appraise/workbench.ts';
import { workOptionAt } from '../../lib/appraise/workOption.ts';
import { lowFerry } from '../appraise/studies.ts';

const site = survey(lowFerry().brief);
const pier: SupportAsk = {
  name: 'pier 1',
  kind: 'pier',
  chainageM: 1300,
  roadLevelM: 22,
  soffitLevelM: 18,
  permanentKN: 20_000,
  trafficKN: 3000,
  trafficLeastKN: 0,
  alongKN: 600,
  acrossKN: 300,
  fixed: false,
  heldAlongKN: 0,
  bearingMovementMm: 0,
  bearings: 2,
  jointMovementMm: 0,
};
const concrete = (ask: SupportAsk): number =>
  expectedLines(standOneSupport(site, ask))
    .filter(({ item }) => item.endsWith('concrete') || item === 'bored-pile')
    .reduce((sum, { quantity }) => sum + quantity, 0);

describe('a pier from which a deck is cantilevered', () => {
  it('pierCombos(ask) carry the moment of one arm ahead down to the foot as it is, on the bare deck and the shaft', () => {
    const ask = { ...pier, building: { momentKNm: 60_000, verticalKN: 17_000 } };
    const own = { weightKN: 2000, windKN: 0, windLevelM: 10 };
    const more = pierCombos(ask, settingAt(site, 1300), 17, own).filter(
      ({ momentAlongKNm }) => momentAlongKNm !== undefined,
    );
    expect(more.map((combo) => resultantAt(combo, 5))).toEqual([
      { verticalKN: 19_000, alongKN: 0, acrossKN: 0, momentAlongKNm: 60_000, momentAcrossKNm: 0 },
    ]);
    expect(more[0]!.ultimate).toBe(substructureData.factors.permanent);
  });

  it('standOneSupport(ask) takes more concrete where that moment governs, and none where it does not', () => {
    const small = { ...pier, building: { momentKNm: 100, verticalKN: 17_000 } };
    const great = { ...pier, building: { momentKNm: 90_000, verticalKN: 17_000 } };
    expect(concrete(small)).toBe(concrete(pier));
    expect(concrete(great)).toBeGreaterThan(1.1 * concrete(pier));
  });

  it('standSupports(box cantilever) asks its inner piers for the moment of the design, abutments for none', () => {
    const bench = workbench(lowFerry());
    const units = [{ form: 'cantilever-box', role: 'main', supportsM: [1240, 1300, 1410, 1470] }] as const;
    const option = { number: 1, form: 'cantilever-box', method: 'balanced-cantilever', units } as const;
    const { designs, supports } = workOptionAt(bench, { ...option, depthM: 3, origin: 'proposed' }, [3]);
    const moment = designs[0]!.figures['unbalancedMomentKNm'];
    expect(moment).toBeGreaterThan(0);
    expect(supports.map(({ articulation }) => articulation.buildingKNm)).toEqual([
      undefined,
      moment,
      moment,
      undefined,
    ]);
  });
});
