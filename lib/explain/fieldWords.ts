import { forms } from '../forms/index.ts';
import { inText } from '../messages/index.ts';
import { standardIds, standardNames } from '../model/index.ts';

/** Units at the end of field names, longest first. */
const units: readonly (readonly [ending: string, unit: string])[] = [
  ['KNm3', 'kN/m3'],
  ['KNm2', 'kN/m2'],
  ['KNM2', 'kN/m2'],
  ['KgPerM3', 'kg/m3'],
  ['KgM3', 'kg/m3'],
  ['KgM2', 'kg/m2'],
  ['kgM3', 'kg/m3'],
  ['1PerK', '1/K'],
  ['PerK', '1/K'],
  ['RadPerM', '1/m'],
  ['PerRad', ''],
  ['PerM2', '1/m2'],
  ['PerM', 'm/m'],
  ['MPa', 'MPa'],
  ['Mm2', 'mm2'],
  ['Kmh', 'km/h'],
  ['MN', 'MN'],
  ['Ms', 'm/s'],
  ['KPa', 'kPa'],
  ['Deg', 'deg'],
  ['Cm3', 'cm3'],
  ['KNm', 'kN/m'],
  ['KN', 'kN'],
  ['Mm', 'mm'],
  ['Kg', 'kg'],
  ['M3', 'm3'],
  ['M2', 'm2'],
  ['M', 'm'],
  ['T', 't'],
  ['K', 'K'],
];

/** Names that are no words of their own, and those whose end only looks like a unit. */
const named: Readonly<Record<string, string>> = {
  ...Object.fromEntries(standardIds.map((id) => [id, `to ${standardNames[id]}`])),
  ...Object.fromEntries(Object.values(forms).map(({ id, name }) => [id, inText(name)])),
  crd: 'coefficient of shear without links',
  eMPa: 'modulus of elasticity',
  gammaM: 'partial factor of resistance',
  sigma: 'standard deviation of the logarithm',
  speeds: 'design speed in km/h',
  uls: 'ultimate limit state',
};

/** A field name in words and the unit at its end: 'leastStemM' -> 'least stem', 'm'. */
export function fieldWords(field: string): { readonly words: string; readonly unit: string } {
  const own = named[field];
  if (own !== undefined) return { words: own, unit: field === 'eMPa' ? 'MPa' : '' };
  const found = units.find(([ending]) => field.length > ending.length && field.endsWith(ending));
  const stem = found === undefined ? field : field.slice(0, -found[0].length);
  return {
    words: stem
      .replace(/(?<=[a-z0-9])[A-Z]/gu, (capital) => ` ${capital.toLowerCase()}`)
      .replaceAll('-', ' '),
    unit: found?.[1] ?? '',
  };
}
