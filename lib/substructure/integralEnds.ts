import { familyOf, type Design, type Site, type Unit } from '../model/index.ts';
import { substructureData } from './data.ts';
import { deckMaterial } from './deckMaterial.ts';
import { jointMovement } from './loads.ts';
import { upliftKN } from './supportLines.ts';

/** Families of forms whose deck can be cast into its abutments. */
const castIn: ReadonlySet<string> = new Set(['slab', 'girder', 'box']);

/** Movement at either end of a deck cast into both abutments, mm, both ways together: it grows from its middle. */
function integralMovement(units: readonly Unit[], designs: readonly Design[]): number {
  const x = units[0]!.supportsM;
  return jointMovement(deckMaterial(designs[0]!), (x.at(-1)! - x[0]!) / 2);
}

/**
 * Whether the deck is cast into both abutments, without bearings and joints there: one unit of a slab, girder or box form
 * that stays pressed at its ends, with movement and skew within what integral abutments take (BA 42/96, see the data file).
 * A skew that is not known is not within them.
 */
export function integralEnds(site: Site, units: readonly Unit[], designs: readonly Design[]): boolean {
  const { mostMovementMm, mostSkewDeg } = substructureData.integral;
  const design = designs[0]!;
  if (units.length !== 1 || site.skewDeg === null || design.task.pylons !== undefined) return false;
  // The point that stays is then among its piers, not in its middle.
  if (design.castIn) return false;
  // A frame brings walls of its own.
  if (design.walls !== undefined && design.walls.length > 0) return false;
  if (!castIn.has(familyOf[design.task.form])) return false;
  const ends = [design.reactions[0]!, design.reactions.at(-1)!];
  return (
    Math.abs(site.skewDeg) <= mostSkewDeg &&
    integralMovement(units, designs) <= mostMovementMm &&
    ends.every(
      ({ permanentKN, trafficMinKN }) => upliftKN({ permanentKN, trafficLeastKN: trafficMinKN }) === 0,
    )
  );
}
