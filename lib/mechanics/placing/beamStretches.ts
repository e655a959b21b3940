import { addLine, sources } from '../beam/influence.ts';
import type { LineBeam } from '../beam/lineBeam.ts';
import { reactionLines } from '../beam/reactionLines.ts';
import { stretchOf, type Stretch } from './stretch.ts';

/** The stretch that the section just left and just right of every station of a beam lies in. */
export interface BeamStretches {
  readonly left: readonly Stretch[];
  readonly right: readonly Stretch[];
}

const known = new WeakMap<LineBeam, BeamStretches>();

/** Stretches of a beam between its reactions, made once: whatever travels along the beam shares them. */
export function beamStretches(beam: LineBeam): BeamStretches {
  const before = known.get(beam);
  if (before) return before;
  const { xM, startMomentLine } = beam;
  const lines = reactionLines(beam);
  // Sum of the reactions to the left of the section (its shear) and of their moments about the start of the beam.
  const Q = new Float64Array(4 * (xM.length - 1));
  const T = new Float64Array(4 * (xM.length - 1));
  if (startMomentLine) addLine(T, -1, startMomentLine);
  const at = sources(beam);
  const left: Stretch[] = [];
  const right: Stretch[] = [];
  let stretch = stretchOf(xM, Q, T);
  for (let s = 0; s < xM.length; s++) {
    left.push(stretch);
    if (at.includes(s)) {
      at.forEach((station, j) => {
        if (station !== s) return;
        addLine(Q, 1, lines[j]!);
        addLine(T, xM[s]!, lines[j]!);
      });
      stretch = stretchOf(xM, Q, T);
    }
    right.push(stretch);
  }
  const made = { left, right };
  known.set(beam, made);
  return made;
}
