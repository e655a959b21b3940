import { describe, expect, it } from 'vitest';
import type { CastInPier, Design, RoadProfile, Site, Support } from '../../lib/model/index.ts';
import { resultantAt } from '../../lib/substructure/combos.ts';
import { substructureData } from '../../lib/substructure/data.ts';
import type { FrameAsk } from '../../lib/substructure/framedShaft.ts';
import { heldAlong } from '../../lib/substructure/heldAlong.ts';
import { expectedLines, standSupports } from '../../lib/substructure/index.ts';
import { pierCombos } from '../../lib/substructure/pierCombos.ts';
import { settingAt } from '../../lib/substructure/setting.ts';
import { quantitiesOf } from '../../lib/takeoff/index.ts';
import { proposedProfile } from '../../lib/site/index.ts';
import { crossing, plainDesign, unitOn } from './crossing.ts';

/** Level and dry, on rock that carries anything, its road so far above the ground, m. */
const at = (roadM: number, lengthM = 200, bearingLevelM = -1): Site => ({
  ...crossing,
  waters: [],
  endM: lengthM,
  lengthM,
  groundX: [0, lengthM],
  groundZ: [0, 0],
  groundStretches: [
    { fromM: 0, toM: lengthM, known: true, classes: [{ ground: 'rock', bearingLevelM, odds: 1 }] },
  ],
  road: { ...crossing.road, startLevelM: roadM, endLevelM: roadM },
});

const deck = { deckTurnKNm: 8e7, laidKNm: 15_000, trafficKNm: 60_000 };
const castInAt = (...supports: number[]): readonly CastInPier[] =>
  supports.map((support) => ({ support, ...deck }));

const design = (spansM: readonly number[], supports: readonly number[] = []): Design => ({
  ...plainDesign(spansM, {
    form: 'cantilever-box',
    permanentKNm: 280,
    depthM: 4,
    lines: [{ part: 'deck', item: 'prestress', quantity: 1e5, what: 'strand', how: 'given' }],
  }),
  ...(supports.length > 0 ? { castIn: castInAt(...supports) } : {}),
});

function stood(
  roadM: number,
  spansM: readonly number[],
  supports: readonly number[] = [],
  bearingLevelM = -1,
): Support[] {
  const places = spansM.reduce<number[]>((x, span) => [...x, x.at(-1)! + span], [0]);
  const site = at(roadM, places.at(-1), bearingLevelM);
  const profile: RoadProfile = proposedProfile(site);
  return standSupports(site, [unitOn(places, 'cantilever-box')], [design(spansM, supports)], profile);
}

const frameOf = ({ articulation }: Support) => articulation.frame!;

describe('piers that the deck is cast in with', () => {
  const spans = [50, 100, 50];
  const [start, left, right, end] = stood(40, spans, [1, 2]) as [Support, Support, Support, Support];
  const loose = stood(40, spans);

  it('have no bearings: none counted, none measured, and their shafts reach up to the soffit', () => {
    for (const [i, pier] of [left, right].entries()) {
      expect(pier.articulation.bearings).toBe(0);
      expect(pier.articulation.bearingKind).toBeUndefined();
      expect(pier.lines.filter(({ item }) => item === 'bearing')).toEqual([]);
      expect(pier.topLevelM - loose[i + 1]!.topLevelM).toBeCloseTo(substructureData.bearings.heightM, 9);
    }
    for (const abutment of [start, end]) expect(abutment.articulation.bearings).toBe(2);
    for (const { articulation } of loose)
      expect([articulation.bearings, articulation.frame]).toEqual([2, undefined]);
  });

  it('hold the deck together: it stays in the middle between them and moves the joints alike', () => {
    expect([left, right].map(({ articulation }) => articulation.fixed)).toEqual([true, true]);
    // (1e-5 x 71.5 + 0.0004) x 100 m.
    expect(start.articulation.jointMovementMm).toBeCloseTo(111.5, 6);
    expect(end.articulation.jointMovementMm).toBeCloseTo(111.5, 6);
    // Braking, 360 + 2.7 x 200, and nothing out of balance between the abutments: a half each; one more of friction by a = 1.
    const friction = 0.03 * 280 * 25;
    expect(left.articulation.alongKN).toBeCloseTo((900 + friction) / 2, 6);
  });

  it('are pushed by half the range of temperature and all the shortening, 6 E I push / h^2 by hand', () => {
    const { pushMm, pushedKNm, eiKNm2 } = frameOf(left);
    expect(pushMm).toBeCloseTo(1000 * (1e-5 * (71.5 / 2) + 0.0004) * 50, 6);
    const h = left.topLevelM - (left.groundLevelM - substructureData.piles.capCoverM);
    const turn = (4 * eiKNm2) / h;
    const share = (deck.deckTurnKNm + turn / 2) / (deck.deckTurnKNm + turn);
    expect(pushedKNm).toBeCloseTo(((6 * eiKNm2 * pushMm) / 1000 / h ** 2) * share, 3);
    // Hollow above 30 m: 6 x t^3 less 5.3 (t - 0.7)^3, half of 34 GPa.
    const t = left.shaft.lengthM;
    expect(eiKNm2).toBeCloseTo((17e6 * (6 * t ** 3 - 5.3 * (t - 0.7) ** 3)) / 12, 0);
  });

  it('carry what bends them and say with what', () => {
    const { designKNm, carriesKNm, pushedKNm } = frameOf(left);
    expect(designKNm).toBeGreaterThan(pushedKNm);
    expect(designKNm).toBeLessThanOrEqual(carriesKNm);
  });

  it('mirrored are the mirrored piers with the same quantities', () => {
    const there = stood(40, [40, 100, 60], [1, 2]);
    const back = stood(40, [60, 100, 40], [1, 2]).reverse();
    there.forEach((support, i) => {
      const [a, b] = [support, back[i]!].map((one) => quantitiesOf(expectedLines(one)));
      expect(b!.concreteM3).toBeCloseTo(a!.concreteM3, 6);
      expect(b!.reinforcementKg).toBeCloseTo(a!.reinforcementKg, 4);
      expect(back[i]!.articulation.jointMovementMm).toBeCloseTo(support.articulation.jointMovementMm, 6);
      expect(back[i]!.articulation.frame?.pushMm ?? 0).toBeCloseTo(
        support.articulation.frame?.pushMm ?? 0,
        6,
      );
    });
  });

  it('one alone stands where the deck stays: it is not pushed at all and takes all of the braking', () => {
    const [, only, other] = stood(40, spans, [1]) as [Support, Support, Support];
    expect(frameOf(only).pushMm).toBe(0);
    expect(frameOf(only).pushedKNm).toBe(0);
    expect(only.articulation.alongKN).toBeGreaterThan(900);
    expect([other.articulation.frame, other.articulation.bearings]).toEqual([undefined, 2]);
  });
});

describe('movement between piers that hold the deck together', () => {
  const moments = (roadM: number, apartM: number): number =>
    frameOf(stood(roadM, [60, apartM, 60], [1, 2])[1]!).pushedKNm;

  it('bends shafts of one stiffness the less the taller they are', () => {
    // Up to 30 m leaves are as thick as they must be for height: what a metre of it brings is told apart by E I.
    const perEI = [16, 20, 24, 28].map((roadM) => {
      const { pushedKNm, eiKNm2 } = frameOf(stood(roadM, [60, 100, 60], [1, 2])[1]!);
      return pushedKNm / eiKNm2;
    });
    perEI.slice(1).forEach((one, i) => expect(one).toBeLessThan(perEI[i]!));
  });

  it('bends them the more the farther apart they stand', () => {
    const farther = [80, 100, 120].map((apartM) => moments(40, apartM));
    farther.slice(1).forEach((one, i) => expect(one).toBeGreaterThan(farther[i]!));
  });

  it('is too much for a stocky shaft, and none that is thicker or thinner would do: its best is returned', () => {
    const { designKNm, carriesKNm } = frameOf(stood(9, [60, 130, 60], [1, 2])[1]!);
    expect(designKNm).toBeGreaterThan(carriesKNm);
    const tall = frameOf(stood(40, [60, 130, 60], [1, 2])[1]!);
    expect(tall.designKNm).toBeLessThanOrEqual(tall.carriesKNm);
  });

  it('leaves the point that stays nearer to the stiffer, lower of two piers', () => {
    const site = at(40);
    const on = {
      site,
      unit: unitOn([0, 50, 150, 200], 'cantilever-box'),
      design: design([50, 100, 50], [1, 2]),
      waterDepthM: [0, 0, 0, 0],
    };
    const held = heldAlong({ ...on, heightM: [40, 40, 25, 40] });
    expect(held.stillM).toBeGreaterThan(100);
    expect(held.stiffnessKNm.map((k) => k > 0)).toEqual([false, true, true, false]);
    expect(heldAlong({ ...on, heightM: [40, 30, 30, 40] }).stillM).toBeCloseTo(100, 9);
  });
});

describe('combinations at a pier in one with the deck', () => {
  const site = at(40);
  const still = { pushM: 0, cooledM: 0, stillM: 50 };
  const shaft = { heightM: 30, eiKNm2: 2e8, deckTurnKNm: deck.deckTurnKNm };
  const ask = {
    name: 'pier 1',
    kind: 'pier',
    chainageM: 50,
    roadLevelM: 40,
    soffitLevelM: 30,
    permanentKN: 25_000,
    trafficKN: 4000,
    trafficLeastKN: 0,
    alongKN: 500,
    acrossKN: 300,
    fixed: true,
    heldAlongKN: 20_000,
    bearingMovementMm: 0,
    bearings: 0,
    jointMovementMm: 0,
    frame: { ...deck, ...still },
    building: { momentKNm: 60_000, verticalKN: 22_000 },
  } as const;
  const own = { weightKN: 0, windKN: 0, windLevelM: 15 };
  const feet = (frame: FrameAsk, seismic: Site['seismic'] = null) =>
    pierCombos({ ...ask, frame }, settingAt({ ...site, seismic }, 50), 30, own, shaft).map(
      (combo) => resultantAt(combo, 0).momentAlongKNm,
    );

  it('pierCombos(ask) hold the shaft at its top: half of the braking moment reaches the foot under a rigid deck', () => {
    const rigid = { ...shaft, deckTurnKNm: 1e15 };
    const [traffic] = pierCombos(
      { ...ask, frame: { deckTurnKNm: 1e15, laidKNm: 0, trafficKNm: 0, ...still } },
      settingAt(site, 50),
      30,
      own,
      rigid,
    );
    expect(resultantAt(traffic!, 0).momentAlongKNm).toBeCloseTo((500 * 30) / 2, 3);
    expect(-traffic!.momentAlongKNm!).toBeCloseTo((500 * 30) / 2, 3);
  });

  it('pierCombos(ask) have no friction of bearings, and the moment of one arm ahead goes down the shaft as it is', () => {
    const [traffic, wind, building] = feet({ ...deck, ...still, laidKNm: 0 });
    expect(wind).toBe(0);
    expect(building).toBe(60_000);
    // 500 x 30 x (K + s/2) / (2 K + s/2), s = 4 x 2e8 / 30; + 60 000 s / (s + K) / 2.
    const s = (4 * 2e8) / 30;
    const K = deck.deckTurnKNm;
    expect(traffic).toBeCloseTo((15_000 * (K + s / 2)) / (2 * K + s / 2) + (60_000 * s) / (s + K) / 2, 3);
  });

  it('pierCombos(ask) bend it further by its movement in use, not in an earthquake', () => {
    const quake = { groundAccelerationG: 0.1, siteClass: 'A' } as const;
    const unmoved = feet({ ...deck, ...still }, quake);
    const moved = feet({ ...deck, ...still, pushM: 0.03 }, quake);
    expect(moved.map((one, i) => one > unmoved[i]!)).toEqual([true, true, false, false, false]);
  });
});

it.each([
  ['hollow and cast in', 40, true, 220],
  ['hollow on bearings', 40, false, 155],
  ['a leaf cast in', 12, true, 350],
  ['two columns on bearings', 12, false, 200],
] as const)('a shaft that is %s has below ground the bars that it has above', (_, roadM, isCastIn, kgM3) => {
  const [, pier] = stood(roadM, [50, 100, 50], isCastIn ? [1, 2] : [], -4);
  const below = pier!.foundations[0]!.lines.filter(({ what }) => what.endsWith('shaft below ground'));
  const [concrete, bars] = below.map(({ quantity }) => quantity);
  expect(below.map(({ item }) => item)).toEqual([expect.stringMatching(/concrete$/u), 'reinforcement']);
  expect(bars! / concrete!).toBeCloseTo(kgM3, 9);
});
