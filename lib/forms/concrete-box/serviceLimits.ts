import { boxData } from './boxData.ts';
import { weakerShare, type CastOf } from './freshTension.ts';

/** A limit of the concrete in service: how far beyond the axis of the tendons it is judged, m, and the tension allowed there, kPa. */
export interface ServiceLimit {
  readonly aroundM: number;
  readonly tensionKPa: number;
}

/**
 * Limits of prestressed concrete under the combination of actions that service is judged by. Eurocode: no tension round the
 * ducts (EN 1992-2 7.3.1(105)), and none at the faces that would crack them (EN 1992-1-1 7.1(2)), for bars are not sized for
 * cracks; tendons near mid-depth would otherwise leave the faces to themselves. AASHTO: its tension at the faces.
 * @param ductM height of the ducts, m
 */
export function serviceLimits(made: CastOf, ductM: number): readonly ServiceLimit[] {
  const tensionKPa = boxData.serviceTensionMPa[made.standardId] * 1e3;
  return made.standardId === 'lm1'
    ? [
        { aroundM: ductM / 2 + boxData.decompressedAroundDuctM.value, tensionKPa },
        { aroundM: Infinity, tensionKPa: weakerShare(made) * made.concrete.fctmMPa * 1e3 },
      ]
    : [{ aroundM: Infinity, tensionKPa }];
}
