/** Units at the end of field names, longest first. */
const units: readonly (readonly [ending: string, unit: string])[] = [
  ['KNm3', 'kN/m3'],
  ['KNm2', 'kN/m2'],
  ['KNM2', 'kN/m2'],
  ['KgM3', 'kg/m3'],
  ['KgM2', 'kg/m2'],
  ['kgM3', 'kg/m3'],
  ['1PerK', '1/K'],
  ['PerK', '1/K'],
  ['MPa', 'MPa'],
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

/** A field name in words and the unit at its end: 'leastStemM' -> 'least stem', 'm'. */
export function fieldWords(field: string): { readonly words: string; readonly unit: string } {
  const found = units.find(([ending]) => field.length > ending.length && field.endsWith(ending));
  const stem = found === undefined ? field : field.slice(0, -found[0].length);
  return {
    words: stem
      .replace(/(?<=[a-z0-9])[A-Z]/gu, (capital) => ` ${capital.toLowerCase()}`)
      .replaceAll('-', ' '),
    unit: found?.[1] ?? '',
  };
}
