import { pretensioned } from './pretensioned.ts';
import type { PrecastModel } from './precastModel.ts';

/**
 * Safety of a beam of `lengthM` hanging from loops near its ends against cracking when it tilts (roll stability; Mast, PCI
 * Journal 1989 and 1993, from memory): 1 / (z0 / yr tmax + ti / tmax). z0 is the sideways sag of the beam under its weight
 * turned on its side, yr the height of the loops over the centroid, ti the tilt from sweep and loops off the middle, tmax
 * the tilt at which the top flange cracks under its weight, held in pure bending about its weak axis.
 */
export function liftingSafety(model: PrecastModel, lengthM: number): number {
  const { lifting } = pretensioned;
  const { shape, releaseConcrete, standardId, ownKNm } = model;
  const a = lifting.overhangShare * lengthM;
  const l = lengthM - 2 * a;
  const stiff = releaseConcrete.ecmMPa * 1e3 * shape.inertiaYM4;
  const z0 =
    (ownKNm / (12 * stiff * lengthM)) * (l ** 5 / 10 - a ** 2 * l ** 3 + 3 * a ** 4 * l + (6 / 5) * a ** 5);
  const sweep = lifting.sweepOverLength * lengthM;
  // Mean sideways distance of a bowed beam from the line of its loops.
  const bowed = (l / lengthM) ** 2 - 1 / 3;
  const ti = sweep * bowed + lifting.loopErrorM;
  const yr = shape.depthM - shape.centroidM - lifting.camberOverLength * lengthM * bowed;
  if (!(yr > 0)) return 0;
  const moment = ((ownKNm * l * l) / 8 - (ownKNm * a * a) / 2) * lifting.impact;
  const tension = pretensioned.release.tensionRootMPa[standardId] * Math.sqrt(releaseConcrete.fckMPa);
  const sideways = (tension * 1e3 * 2 * shape.inertiaYM4) / shape.acrossM;
  const tmax = sideways / moment;
  return 1 / (z0 / yr + ti / yr / tmax);
}
