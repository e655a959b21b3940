import { lineBeam } from '../beam/lineBeam.ts';
import { stepped } from '../beam/loadings.ts';

/** A deck pushed out over its piers from one abutment. */
export interface Launch {
  readonly spansM: readonly number[];
  /** Weight of the deck as launched, kN/m. */
  readonly weightKNm: number;
  /** Length and weight of the nose; 0 for a bare deck. */
  readonly noseM: number;
  readonly noseKNm: number;
  /** Bending stiffness of the nose over that of the deck. */
  readonly noseStiffness: number;
  /** Length of deck that rests on the yard behind the abutment, as spans of temporary supports, m. */
  readonly yardSpansM: readonly number[];
  /** Steps a span. */
  readonly steps?: number;
}

export interface LaunchMoments {
  /** Greatest sagging and hogging moment met by any section of the deck on the way, kNm. */
  readonly sagKNm: number;
  readonly hogKNm: number;
  /** Greatest reaction of a pier or the abutment, kN. */
  readonly reactionKN: number;
  /** Deflection of the tip before it lands, m per (kNm2 of deck stiffness): divide by EI. */
  readonly tipDeflectionTimesEI: number;
}

/**
 * Moves the tip from the first pier to the last support in equal steps and solves the beam each time: supports behind
 * the tip hold, the rest sticks out. Just before touchdown is the governing case and is always among the steps.
 * @throws RangeError for a nose as long as the yard, no yard, or spans that are not positive
 */
export function launchStages(launch: Launch): LaunchMoments {
  const { spansM, weightKNm, noseM, noseKNm, noseStiffness, yardSpansM } = launch;
  if (!(noseM >= 0)) throw new RangeError(`noseM: expected 0 or more, received ${noseM}`);
  const steps = launch.steps ?? 10;
  const behind = [...yardSpansM];
  if (!(noseM < yardSpansM.reduce((sum, length) => sum + length, 0))) {
    throw new RangeError(`noseM: expected less than the yard, received ${noseM}`);
  }
  if (behind.length === 0) throw new RangeError('yardSpansM: expected at least one span behind the abutment');
  let sagKNm = 0;
  let hogKNm = 0;
  let reactionKN = 0;
  let tipDeflectionTimesEI = 0;
  for (const span of spansM) {
    for (let step = 1; step <= steps; step++) {
      const overhang = (span * step) / steps;
      const rearM = behind.reduce((sum, length) => sum + length, 0);
      const tip = rearM + overhang;
      const deckEnd = tip - noseM;
      const beam = lineBeam({
        spansM: behind,
        overhangsM: { end: overhang },
        eiKNm2: (x) => (x > deckEnd ? noseStiffness : 1),
        extraStationsM: [deckEnd],
      });
      const load = Float64Array.from({ length: beam.xM.length - 1 }, (_, e) =>
        (beam.xM[e]! + beam.xM[e + 1]!) / 2 > deckEnd ? noseKNm : weightKNm,
      );
      const effects = stepped(beam, load);
      const yard = behind.length - yardSpansM.length;
      for (let i = 0; i < beam.xM.length; i++) {
        if (beam.xM[i]! > deckEnd + 1e-9) break;
        sagKNm = Math.max(sagKNm, effects.momentKNm[i]!);
        hogKNm = Math.min(hogKNm, effects.momentKNm[i]!);
      }
      for (let j = effects.reactionKN.length - 1 - yard; j < effects.reactionKN.length; j++) {
        reactionKN = Math.max(reactionKN, effects.reactionKN[j]!);
      }
      const tipNow = effects.deflectionM[beam.xM.length - 1]!;
      if (step === steps) tipDeflectionTimesEI = Math.max(tipDeflectionTimesEI, tipNow);
    }
    behind.push(span);
  }
  return { sagKNm, hogKNm, reactionKN, tipDeflectionTimesEI };
}
