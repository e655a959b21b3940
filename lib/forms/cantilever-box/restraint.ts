import { solveDense } from '../../mechanics/index.ts';
import type { ShaftUnder } from '../../model/index.ts';
import { boxData } from '../concrete-box/boxData.ts';
import type { CantileverModel } from './cantileverModel.ts';
import type { HaunchedSections } from './sectionsAlong.ts';

/** What shafts in one with a deck do to it where it moves over them, at the stations: moments, sagging positive, and pull. */
export interface Restraint {
  readonly leftKNm: Float64Array;
  readonly rightKNm: Float64Array;
  /** Tension of the deck, kN. */
  readonly pulledKN: Float64Array;
}

/**
 * The deck moved over its shafts by so many metres each (positive towards its end): slope deflection of the shafts, rigid at
 * their feet, with the joined deck, whose axis lies above their tops.
 */
export function restraintOf(
  model: Pick<CantileverModel, 'beam' | 'heldPiers'> & { readonly concrete: { readonly ecmMPa: number } },
  sections: Pick<HaunchedSections, 'lowM'> & { readonly midspan: { readonly inertiaM4: number } },
  shafts: readonly ShaftUnder[],
  movedM: (shaft: ShaftUnder) => number,
): Restraint {
  const { beam, heldPiers } = model;
  const eiKNm2 = model.concrete.ecmMPa * 1e3 * sections.midspan.inertiaM4;
  const n = beam.xM.length;
  const ends = shafts.map((shaft) => {
    const { heightM: h, eiKNm2: ei, support } = shaft;
    const station = beam.supportAt[support]!;
    const { couple } = heldPiers.find((pier) => pier.support === support)!;
    const aboveM = sections.lowM[station]!;
    const moved = movedM(shaft);
    const forceKN = (12 * ei * moved) / h ** 3;
    const forceKNPerRad = (6 * ei) / h ** 2;
    return {
      station,
      couple,
      forceKN,
      forceKNPerRad,
      // About the axis of the deck: the moment at the top of the shaft, and its force on the way up to the axis.
      fixedKNm: (6 * ei * moved) / h ** 2 + aboveM * forceKN,
      stiffKNm: (4 * ei) / h + aboveM * forceKNPerRad,
    };
  });
  const flexible = (i: number, j: number): number => ends[j]!.couple.turnRad[ends[i]!.station]! / eiKNm2;
  const turns = solveDense(
    ends.map((_, i) => ends.map(({ stiffKNm }, j) => (i === j ? 1 : 0) + flexible(i, j) * stiffKNm)),
    ends.map((_, i) => ends.reduce((sum, { fixedKNm }, j) => sum + flexible(i, j) * fixedKNm, 0)),
  );
  const out = {
    leftKNm: new Float64Array(n),
    rightKNm: new Float64Array(n),
    pulledKN: new Float64Array(n),
  };
  ends.forEach(({ couple, fixedKNm, stiffKNm, forceKN, forceKNPerRad, station }, j) => {
    const coupleKNm = fixedKNm - stiffKNm * turns[j]!;
    const pullKN = forceKN - forceKNPerRad * turns[j]!;
    for (let i = 0; i < n; i++) {
      out.leftKNm[i]! += coupleKNm * couple.leftKNm[i]!;
      out.rightKNm[i]! += coupleKNm * couple.rightKNm[i]!;
      if (i > station) out.pulledKN[i]! += pullKN;
    }
  });
  return out;
}

/** What restraint adds to the deck in use, before its shortening and after it; of temperature the share that goes with traffic. */
export interface RestraintInUse {
  readonly openMax: Float64Array;
  readonly openMin: Float64Array;
  readonly lastingMax: Float64Array;
  readonly lastingMin: Float64Array;
  /** With a factor of 1 on imposed movement (EN 1992-1-1 2.4.2.1), temperature in full. */
  readonly ultimateMax: Float64Array;
  readonly ultimateMin: Float64Array;
  readonly openPulledKN: Float64Array;
  readonly lastingPulledKN: Float64Array;
}

/** The worse of both sides of every station; null where nothing is known of the shafts or the deck stands on bearings. */
export function restraintInUse(model: CantileverModel, sections: HaunchedSections): RestraintInUse | null {
  const { shafts = [] } = model.task;
  if (shafts.length === 0) return null;
  const short = restraintOf(model, sections, shafts, ({ shortenedM }) => shortenedM);
  const cool = restraintOf(model, sections, shafts, ({ cooledM }) => cooledM);
  const share = boxData.gradient.withTraffic;
  const worse = (pick: typeof Math.max, of: (shortKNm: number, coolKNm: number) => number): Float64Array =>
    short.leftKNm.map((left, i) =>
      pick(of(left, Math.abs(cool.leftKNm[i]!)), of(short.rightKNm[i]!, Math.abs(cool.rightKNm[i]!))),
    );
  return {
    openMax: worse(Math.max, (_, coolKNm) => share * coolKNm),
    openMin: worse(Math.min, (_, coolKNm) => -share * coolKNm),
    lastingMax: worse(Math.max, (shortKNm, coolKNm) => shortKNm + share * coolKNm),
    lastingMin: worse(Math.min, (shortKNm, coolKNm) => shortKNm - share * coolKNm),
    ultimateMax: worse(Math.max, (shortKNm, coolKNm) => Math.max(0, shortKNm) + coolKNm),
    ultimateMin: worse(Math.min, (shortKNm, coolKNm) => Math.min(0, shortKNm) - coolKNm),
    openPulledKN: cool.pulledKN.map((kN) => share * Math.max(0, kN)),
    lastingPulledKN: short.pulledKN.map((kN, i) => Math.max(0, kN + share * cool.pulledKN[i]!)),
  };
}
