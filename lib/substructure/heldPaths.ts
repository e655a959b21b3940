import type { At } from '../model/index.ts';
import { heldIn, unitsAt, type UnitAt } from './meetings.ts';

/** The units that this support holds along the road, alone or with others. */
export const holding = (at: At): UnitAt[] =>
  unitsAt(at).filter(({ unit, s }) => heldIn(at, unit).stiffnessKNm[s]! > 0);

/** Whether more than one support of a unit holds it. */
export const isShared = (at: At, unit: number): boolean =>
  heldIn(at, unit).stiffnessKNm.filter((k) => k > 0).length > 1;

/** Path of the chainage that stays where it is when a unit grows or shrinks. */
export const stillPath = (at: At, unit: number): string => {
  const alone = heldIn(at, unit).stiffnessKNm.findIndex((k) => k > 0);
  return isShared(at, unit)
    ? `${at.root}/held/${unit}/stillM`
    : `${at.root}/units/${unit}/supportsM/${alone}`;
};

/** Paths of the stiffnesses of all supports that hold a unit. */
export const stiffnesses = (at: At, unit: number): string[] =>
  heldIn(at, unit).stiffnessKNm.flatMap((k, s) => (k > 0 ? [`${at.root}/held/${unit}/stiffness/${s}`] : []));

/** Paths of the permanent loads of those supports of a unit that are to be kept. */
export const permanents = (at: At, { unit, path }: UnitAt, keep: (s: number) => boolean): string[] =>
  at.option.units[unit]!.supportsM.flatMap((_, s) => (keep(s) ? [`${path}/reactions/${s}/permanentKN`] : []));
