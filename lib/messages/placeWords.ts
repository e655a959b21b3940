/** Groups of the study whose name adds nothing to what stands in them. */
const silent = new Set(['brief', 'books', 'options']);

/** What one entry of a list is called; of other lists it is an entry. */
const entries: Readonly<Record<string, string>> = {
  classes: 'class',
  deck: 'strip',
  ground: 'ground point',
  groundStretches: 'ground stretch',
  kept: 'kept option',
  notes: 'note',
  obstacles: 'obstacle',
  pylons: 'pylon',
  rates: 'rate',
  register: 'numbered option',
  supportsM: 'support',
  units: 'unit',
  waters: 'water',
};

/** Entries whose name in the file is not what they are called on the page. */
const fields: Readonly<Record<string, string>> = {
  ballastKNm: 'ballast',
  craneMomentTm: 'load moment of the largest crane',
  datumLevelM: 'level',
  depthM: 'depth',
  endEarliestM: 'innermost place of the end abutment',
  fillSideSlope: 'side slope of fill',
  fixedEnd: 'ends that may rise',
  floodFromM: 'start of the flood plain',
  floodReturnYears: 'return period',
  floodToM: 'end of the flood plain',
  flowM3s: 'flow of the flood',
  fromM: 'start',
  grainMm: 'median grain of the bed',
  haulLengthM: 'longest piece',
  haulMassT: 'heaviest piece',
  lanesKept: 'lanes kept in use',
  launchYardM: 'level ground behind an abutment',
  maxGradient: 'steepest gradient',
  mayRiseM: 'rise allowed',
  p10: 'low figure',
  p50: 'likely figure',
  p90: 'high figure',
  pierPremium: 'sum for a support in it',
  startLatestM: 'innermost place of the start abutment',
  toM: 'end',
  vesselDwtT: 'largest vessel',
  vesselSpeedMs: 'speed of the largest vessel',
  velocityMs: 'velocity of the flood',
};

const unitSuffix = /(?<=[a-z])(M|T|Deg|KNm|KN|KNM2|Kg|KgM3|M2|M3|MPa|Kmh)$/u;

/** The name of an entry in words: 'headroomM' -> 'headroom', '--depth' -> 'depth'. */
function fieldWords(key: string): string {
  if (Object.hasOwn(fields, key)) return fields[key]!;
  return key
    .replace(unitSuffix, '')
    .replace(/^--/u, '')
    .replace(/(?<=[a-z0-9])[A-Z]/gu, (capital) => ` ${capital.toLowerCase()}`);
}

/** A place in a study in the words of the page: 'obstacle 2, clearance, headroom'; 'study' for the study itself. */
export function placeWords(path: readonly (string | number)[]): string {
  const words = path.flatMap((key, i) => {
    const list = path[i - 1];
    if (typeof key === 'string') {
      const isList = typeof path[i + 1] === 'number';
      return isList || (silent.has(key) && i < path.length - 1) ? [] : [fieldWords(key)];
    }
    const noun = typeof list === 'string' ? entries[list] : undefined;
    return [
      noun === undefined ? `${fieldWords(String(list ?? ''))}, entry ${key + 1}` : `${noun} ${key + 1}`,
    ];
  });
  return words.length === 0 ? 'study' : words.join(', ');
}
