import { described, type At, type Descriptor } from '../model/index.ts';
import { groundAt } from '../site/index.ts';

const place = (at: At): number => Number(at.name('x'));
const over = (at: At, what: string): string => `${at.root}/over/${at.name('x')}/${what}`;

/** Soffit limits that reach over a chainage. */
const limitsAt = (at: At): string[] =>
  at.site.soffitLimits.flatMap(({ fromM, toM }, i) =>
    place(at) >= fromM && place(at) <= toM ? [`site/soffitLimits/${i}/levelM`] : [],
  );

/** The ground points on either side of a chainage; the first or last alone beyond them. */
function pointsBeside(at: At): readonly number[] {
  const { groundX } = at.site;
  const right = groundX.findIndex((x) => x >= place(at));
  if (right < 0) return [groundX.length - 1];
  return right === 0 || groundX[right] === place(at) ? [right] : [right - 1, right];
}

/** Levels at any chainage of an option, as drawings state them, and of the ground under it. */
export const placeFigures: readonly Descriptor[] = [
  described({
    path: 'options/:option/over/:x/chainageM',
    label: 'chainage',
    unit: 'm',
    method: 'as asked',
    formula: 'place at which the drawing states its levels',
    value: place,
  }),
  described({
    path: 'options/:option/over/:x/soffitM',
    label: (at) => `lowest soffit at ${place(at)}`,
    unit: 'm',
    method: 'difference',
    formula: 'road level - construction depth',
    inputs: (at) => ({ road: over(at, 'roadM'), depth: over(at, 'depthM') }),
    compute: ({ road, depth }) => road - depth,
  }),
  described({
    path: 'options/:option/over/:x/leastM',
    when: (at) => limitsAt(at).length > 0,
    label: (at) => `lowest soffit allowed at ${place(at)}`,
    unit: 'm',
    method: 'highest limit',
    formula: 'highest of the limits that reach over this place',
    inputs: (at) => ({ limits: limitsAt(at) }),
    compute: ({ limits }) => Math.max(...limits),
  }),
  described({
    path: 'options/:option/over/:x/spareM',
    when: (at) => limitsAt(at).length > 0,
    label: (at) => `spare under the soffit at ${place(at)}`,
    unit: 'm',
    method: 'difference',
    formula: 'lowest soffit - lowest soffit allowed',
    inputs: (at) => ({ soffit: over(at, 'soffitM'), least: over(at, 'leastM') }),
    compute: ({ soffit, least }) => soffit - least,
  }),
  described({
    path: 'options/:option/over/:x/fallM',
    label: (at) => `fall of the soffit to its edge at ${place(at)}`,
    unit: 'm',
    method: 'product',
    formula: 'crossfall x width between kerbs / 2',
    inputs: () => ({ crossfall: 'practice/site/crossfall', road: 'site/deck/carriagewayM' }),
    compute: ({ crossfall, road }) => (crossfall * road) / 2,
  }),
  described({
    path: 'site/groundAt/:x',
    label: (at) => `ground level at ${place(at)}`,
    unit: 'm',
    method: (at) => (pointsBeside(at).length > 1 ? 'straight line' : 'as given'),
    formula: (at) =>
      pointsBeside(at).length > 1
        ? 'straight between the ground points on either side'
        : 'level of the ground point here',
    value: (at) => groundAt(at.site, place(at)),
    inputs: (at) => ({
      levels: pointsBeside(at).map((i) => `site/groundZ/${i}`),
      chainages: pointsBeside(at).map((i) => `site/groundX/${i}`),
    }),
    compute: ({ levels, chainages }, at) => {
      const [x0, x1] = chainages;
      const [z0, z1] = levels;
      return x1 === undefined ? z0! : z0! + ((z1! - z0!) * (place(at) - x0!)) / (x1 - x0!);
    },
  }),
];
