import { described, type At, type Descriptor } from '../model/index.ts';
import { depthAt } from '../site/depthAlong.ts';
import { levelOnRoad, onRoad, onRoadFormula } from '../site/onRoad.ts';
import { constructionDepth, roadLevelAt } from '../site/index.ts';
import { depthAlong, spareOf } from './workOption.ts';

const place = (at: At): number => Number(at.name('x'));

/** Where a chainage at which headroom is measured comes from: an end of a limit, of the crossing, or a bend of the depth. */
function endAt(at: At): string | null {
  const { site } = at;
  const x = place(at);
  const limit = site.soffitLimits.findIndex(({ fromM, toM }) => fromM === x || toM === x);
  if (limit >= 0)
    return `site/soffitLimits/${limit}/${site.soffitLimits[limit]!.fromM === x ? 'fromM' : 'toM'}`;
  return x === site.startM ? at.ends.start : x === site.endM ? at.ends.end : null;
}

/** The unit of constant depth over a chainage, or -1 where the depth there is on a haunch. */
function levelUnitAt(at: At): number {
  const { units, designs } = at.option;
  const x = place(at);
  const over = units.flatMap(({ supportsM }, i) => (x >= supportsM[0]! && x <= supportsM.at(-1)! ? [i] : []));
  const level = over.filter((i) => designs[i]!.depthM.support === designs[i]!.depthM.midspan);
  return over.length === 1 && level.length === 1 ? level[0]! : -1;
}

/** Whether the depth along the deck bends at a chainage, or a support stands there. */
const bendsAt = (at: At): boolean =>
  depthAlong(at.site, at.option.units, at.option.designs).xM.includes(place(at));

const overPlace = (what: string): string => `options/:option/over/:x/${what}`;

/** What stands over a chainage, the headroom that is left there, and the area of the deck. */
export const headroomFigures: readonly Descriptor[] = [
  described({
    path: overPlace('chainageM'),
    when: (at) => endAt(at) !== null,
    label: 'chainage',
    unit: 'm',
    method: 'as given',
    formula: 'end of the stretch to be kept clear',
    inputs: (at) => ({ end: endAt(at)! }),
    compute: ({ end }) => end,
  }),
  described({
    path: overPlace('chainageM'),
    when: bendsAt,
    label: 'chainage',
    unit: 'm',
    method: 'bend of the soffit',
    formula: 'place at which the depth along the deck bends under the limit, or a support',
    value: place,
    inputs: (at) => ({
      supports: at.option.units.flatMap(({ supportsM }, u) =>
        supportsM.map((_, s) => `${at.root}/units/${u}/supportsM/${s}`),
      ),
    }),
  }),
  described({
    path: overPlace('structureM'),
    when: (at) => levelUnitAt(at) >= 0,
    label: 'structural depth',
    unit: 'm',
    method: 'same along the unit',
    formula: 'structural depth of the unit',
    inputs: (at) => ({ depth: `${at.root}/designs/${levelUnitAt(at)}/depthM/midspan` }),
    compute: ({ depth }) => depth,
  }),
  described({
    path: overPlace('structureM'),
    label: 'structural depth',
    unit: 'm',
    method: 'along the haunch',
    formula: 'read off the depth along the unit at this chainage',
    value: (at) => {
      const { site } = at;
      return (
        depthAt(depthAlong(site, at.option.units, at.option.designs), place(at)) -
        constructionDepth(site.deck, 0)
      );
    },
    inputs: (at) => ({
      depths: at.option.designs.flatMap((_, u) => [
        `${at.root}/designs/${u}/depthM/support`,
        `${at.root}/designs/${u}/depthM/midspan`,
      ]),
    }),
  }),
  described({
    path: overPlace('depthM'),
    label: (at) => `construction depth at ${place(at)}`,
    unit: 'm',
    method: 'sum',
    formula: 'structural depth + surfacing + crossfall x width between kerbs / 2',
    inputs: (at) => ({
      structure: `${at.root}/over/${at.name('x')}/structureM`,
      surfacing: 'site/deck/surfacingM',
      crossfall: 'practice/site/crossfall',
      road: 'site/deck/carriagewayM',
    }),
    compute: ({ structure, surfacing, crossfall, road }) => structure + surfacing + (crossfall * road) / 2,
  }),
  described({
    path: overPlace('roadM'),
    label: (at) => `road level at ${place(at)}`,
    unit: 'm',
    method: 'vertical alignment',
    formula: onRoadFormula,
    value: (at) => roadLevelAt(at.option.profile, place(at)),
    inputs: (at) => onRoad(at, place(at), `${at.root}/over/${at.name('x')}/chainageM`),
    compute: (v) => levelOnRoad(v),
  }),
  described({
    path: 'options/:option/headroom',
    label: 'spare headroom',
    unit: 'm',
    method: 'no limit',
    formula: 'nothing has to be kept clear under the deck',
  }),
  described({
    path: 'options/:option/headroom/spareM',
    label: (at) => `spare headroom, ${at.option.headroom?.reason ?? ''}`,
    unit: 'm',
    method: 'difference, least of all limits',
    formula: 'road level - construction depth - lowest soffit allowed',
    inputs: (at) => {
      const over = `${at.root}/over/${at.option.headroom?.chainageM ?? NaN}`;
      const limit = spareOf(at.site, at.option)?.limit;
      return {
        road: `${over}/roadM`,
        depth: `${over}/depthM`,
        limit: `site/soffitLimits/${at.site.soffitLimits.findIndex((one) => one === limit)}/levelM`,
      };
    },
    compute: ({ road, depth, limit }) => road - depth - limit,
  }),
  described({
    path: 'options/:option/headroom/chainageM',
    label: 'place of the least headroom',
    unit: 'm',
    method: 'least of all limits',
    formula: 'where the soffit is nearest to a limit',
    inputs: (at) => ({ place: `${at.root}/over/${at.option.headroom?.chainageM ?? NaN}/chainageM` }),
    compute: ({ place }) => place,
  }),
  described({
    path: 'options/:option/deckAreaM2',
    label: 'deck area',
    unit: 'm2',
    method: 'product',
    formula: 'length x deck width',
    inputs: (at) => ({ length: at.ends.length, width: 'site/deck/widthM' }),
    compute: ({ length, width }) => length * width,
  }),
];
