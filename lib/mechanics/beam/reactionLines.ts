import { solveBand } from './bandFactor.ts';
import { elementLine, prescribe, type LineBeam } from './lineBeam.ts';

const known = new WeakMap<LineBeam, readonly Float64Array[]>();

/**
 * Influence line of every reaction of a beam, rigid supports first, then springs: four numbers an element (value and slope
 * at its left end, value and slope at its right end). Most beams are only loaded: worked out when first asked for, and once.
 */
export function reactionLines(beam: LineBeam): readonly Float64Array[] {
  const before = known.get(beam);
  if (before) return before;
  const { freedoms, factors, fixed, supportAt, springAt, springKNPerM } = beam;
  const u = new Float64Array(freedoms.count);
  const rigid = supportAt.map((_, j) => {
    u.fill(0);
    prescribe(beam, fixed[j]!, 1, u);
    solveBand(factors, freedoms.count, u);
    return elementLine(beam, u);
  });
  const springs = springAt.map((station, i) => {
    u.fill(0);
    u[freedoms.w[station]!] = springKNPerM[i]!;
    for (const freedom of fixed) u[freedom] = 0;
    solveBand(factors, freedoms.count, u);
    return elementLine(beam, u);
  });
  const made = [...rigid, ...springs];
  known.set(beam, made);
  return made;
}
