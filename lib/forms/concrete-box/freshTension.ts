import { concrete, type Concrete } from '../../actions/index.ts';
import type { StandardId } from '../../model/index.ts';
import { boxData } from './boxData.ts';
import type { OwnWeight } from './boxLoads.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import type { TendonLine } from './tendonLine.ts';

/** What a deck is cast of: its concrete, and the lightweight concrete of a part of it. */
export interface CastOf {
  readonly standardId: StandardId;
  readonly concrete: Concrete;
  readonly light?: Concrete | null;
}

/** Tensile strength of the weaker concrete of a deck as a share of that of its concrete. */
export const weakerShare = ({ concrete: usual, light }: Pick<CastOf, 'concrete' | 'light'>): number =>
  light ? Math.min(1, light.fctmMPa / usual.fctmMPa) : 1;

/** Mean tensile strength of a deck on the day its tendons are stressed, MPa. */
export function youngTensionMPa(made: CastOf): number {
  const { strengthAtTransfer } = boxData.compression;
  return weakerShare(made) * concrete(made.standardId, strengthAtTransfer * made.concrete.fckMPa).fctmMPa;
}

/** Greatest tension of either face under own weight and tendons stressed to a force, kN, along a line, before any lasting loss, MPa; 0 where all is pressed. */
export type FreshTension = (line: Omit<TendonLine, 'depthM'>, initialKN: number) => number;

/**
 * What the day of stressing does to the faces of a deck.
 * @param straightKN force of centred tendons stressed with them, kN
 */
export function freshTension(
  sections: Pick<SectionsAlong, 'areaM2' | 'inertiaM4' | 'topM' | 'lowM' | 'topLag' | 'lowLag'>,
  own: Pick<OwnWeight, 'effects'>,
  straightKN: number,
): FreshTension {
  const low = sections.inertiaM4.map((inertia, i) => (sections.lowM[i]! * sections.lowLag[i]!) / inertia);
  const top = sections.inertiaM4.map((inertia, i) => (sections.topM[i]! * sections.topLag[i]!) / inertia);
  return ({ share, eccentricityM, parasiticM }, initialKN) => {
    let mostKPa = 0;
    for (let i = 0; i < low.length; i++) {
      const pressed = (share[i]! * initialKN + straightKN) / sections.areaM2[i]!;
      const moment = own.effects.momentKNm[i]! + initialKN * (parasiticM[i]! - share[i]! * eccentricityM[i]!);
      mostKPa = Math.max(mostKPa, moment * low[i]! - pressed, -moment * top[i]! - pressed);
    }
    return mostKPa / 1e3;
  };
}
