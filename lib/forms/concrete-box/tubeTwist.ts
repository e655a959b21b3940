import { bredt, type LineBeam } from '../../mechanics/index.ts';
import type { TwistedDeck } from '../common/skewTorque.ts';
import type { BoxLayout } from './boxLayout.ts';
import { tube } from './boxShear.ts';

/** Poisson's ratio of uncracked concrete (EN 1992-1-1 3.1.3, from memory). */
const poisson = 0.2;

/** A concrete box along its length, at the stations of its beam: depth and thicknesses, m, inertia, m4. */
export interface TubeAlong {
  readonly depthM: ArrayLike<number>;
  readonly webM: ArrayLike<number>;
  readonly bottomM: ArrayLike<number>;
  readonly bottomWidthM: ArrayLike<number>;
  readonly inertiaM4: ArrayLike<number>;
}

/** Stiffnesses of uncracked sections, the box closed by its outer webs (Bredt), for a modulus of 1: their ratio is all that counts. */
export function tubeTwist(
  layout: BoxLayout,
  { xM, supportAt }: Pick<LineBeam, 'xM' | 'supportAt'>,
  along: TubeAlong,
): TwistedDeck {
  const elements = xM.length - 1;
  const mean = (values: ArrayLike<number>, e: number): number => (values[e]! + values[e + 1]!) / 2;
  const elementM = new Float64Array(elements);
  const eiKNm2 = new Float64Array(elements);
  const gjKNm2 = new Float64Array(elements);
  for (let e = 0; e < elements; e++) {
    elementM[e] = xM[e + 1]! - xM[e]!;
    eiKNm2[e] = mean(along.inertiaM4, e);
    const bottomM = mean(along.bottomM, e);
    const { enclosedM2, wallM } = tube(layout, mean(along.depthM, e), bottomM);
    gjKNm2[e] =
      bredt(enclosedM2, [
        { lengthM: layout.cells * layout.spacingM, thicknessM: layout.slab.midM },
        { lengthM: 2 * wallM, thicknessM: mean(along.webM, e) },
        { lengthM: mean(along.bottomWidthM, e), thicknessM: bottomM },
      ]) /
      (2 * (1 + poisson));
  }
  return { elementM, eiKNm2, gjKNm2, supportAt };
}
