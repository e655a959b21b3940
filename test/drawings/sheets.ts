import { checkBars } from '../../notebooks/charts/checkBars.ts';
import { costByPart } from '../../notebooks/charts/costByPart.ts';
import { costIntervals } from '../../notebooks/charts/costIntervals.ts';
import { depthBands } from '../../notebooks/charts/depthBands.ts';
import { depthCurve } from '../../notebooks/charts/depthCurve.ts';
import { oddsMatrix } from '../../notebooks/charts/oddsMatrix.ts';
import { quantityMarks } from '../../notebooks/charts/quantityMarks.ts';
import { rangePanels } from '../../notebooks/charts/rangePanels.ts';
import { byCost } from '../../notebooks/charts/rowHead.ts';
import { shareColumns } from '../../notebooks/charts/shareColumns.ts';
import { sourceAxis, sourceSpans } from '../../notebooks/charts/sourceSpans.ts';
import { spanChart } from '../../notebooks/charts/spanChart.ts';
import { tradeOffs } from '../../notebooks/charts/tradeOffs.ts';
import { crossing } from '../../notebooks/drawing/crossing.ts';
import { chainagesShown, elevation } from '../../notebooks/drawing/elevation.ts';
import { colours, pens } from '../../notebooks/drawing/ink.ts';
import { keyLine } from '../../notebooks/drawing/keyLine.ts';
import { label } from '../../notebooks/drawing/label.ts';
import { ladder } from '../../notebooks/drawing/ladder.ts';
import type { Piece } from '../../notebooks/drawing/piece.ts';
import { el, g } from '../../notebooks/drawing/piece.ts';
import { plan } from '../../notebooks/drawing/plan.ts';
import { roadProfile } from '../../notebooks/drawing/roadProfile.ts';
import { section } from '../../notebooks/drawing/section.ts';
import { sectionRow } from '../../notebooks/drawing/sectionRow.ts';
import { sheet } from '../../notebooks/drawing/sheet.ts';
import { stack } from '../../notebooks/drawing/stack.ts';
import { stationLine } from '../../notebooks/drawing/stationLine.ts';
import { formLooks } from '../../notebooks/forms/formLook.ts';
import { glyph } from '../../notebooks/forms/glyph.ts';
import { hatchId, hatches } from '../../notebooks/forms/hatch.ts';
import { optionNumber } from '../../notebooks/forms/optionNumber.ts';
import { smallCrossing } from '../../notebooks/shelf/smallCrossing.ts';
import { formIds } from '../../lib/model/index.ts';
import {
  checks,
  depthForms,
  depthPoints,
  measures,
  published,
  shares,
  sourceForms,
  spanRows,
} from './figures.ts';
import { budget, crested, lowSite, obstacles, options, site, standing } from './fixture.ts';

const second = options[1]!;
const third = options[2]!;
const sorted = byCost(options);
const shared = { options: sorted, reference: 2, widthPx: 980 } as const;
const currency = 'EUR';

/** All seventeen forms: glyph, colour, hatch. */
function forms(): Piece {
  return sheet(560, formIds.length * 30 + 12, 'Forms with glyph, colour and hatch', [
    el('defs', {}, hatches(formIds, 'forms')),
    formIds.map((form, index) => {
      const y = 22 + index * 30;
      const { colour, name } = formLooks[form];
      return g(
        {},
        glyph(form, 8, y - 8, colour),
        glyph(form, 56, y - 12.8, colour, 1.6),
        label(122, y + 4, name),
        optionNumber(index + 1, 300, y, { colour }),
        optionNumber(index + 1, 328, y, { colour, filled: true }),
        el('path', { d: `M350,${String(y)}h40`, stroke: colour, 'stroke-width': pens.thick }),
        el('rect', {
          x: 400,
          y: y - 9,
          width: 150,
          height: 18,
          fill: `url(#${hatchId('forms', form)})`,
          stroke: colours.ink,
          'stroke-width': pens.fine,
        }),
      );
    }),
  ]);
}

const joined = { at: '3+010', uses: ['1+010', '2+010'], usedBy: ['4+010', '5+010'] } as const;

/** Every drawing and chart once, by the name of its golden file. */
export const sheets: Readonly<Record<string, () => Piece>> = {
  forms,
  crossing: () => crossing({ site, option: second, obstacles, widthPx: 980 }),
  'crossing-crest': () => crossing({ site: lowSite, option: crested(second), obstacles, widthPx: 980 }),
  'crossing-handles': () =>
    crossing({
      site,
      option: second,
      obstacles,
      widthPx: 980,
      handles: { hold: null, locked: [] },
      band: false,
    }),
  'crossing-shelf': () => smallCrossing(site, 2500, 'shelf'),
  'crossing-bare': () => crossing({ site, option: null, obstacles, widthPx: 980 }),
  'crossing-small': () => crossing({ site, option: second, obstacles, widthPx: 358 }),
  'crossing-window': () =>
    crossing({
      site,
      option: second,
      obstacles,
      widthPx: 980,
      scale: 500,
      window: { fromM: 1300, toM: 1420 },
    }),
  plan: () => plan({ site, option: second, widthPx: 980, bar: true }),
  'plan-bare': () => plan({ site, option: null, widthPx: 980 }),
  'plan-black': () => plan({ site, option: third, widthPx: 980, paper: 'black', scale: 500 }),
  ...Object.fromEntries(
    options.map((option) => [`elevation-${option.form}`, () => elevation({ site, option, widthPx: 980 })]),
  ),
  stack: () => stack({ site, options, standing, budget, currency, reference: 2, widthPx: 1224 }),
  'stack-black': () =>
    stack({ site, options, standing, budget, currency, reference: 2, widthPx: 1224, paper: 'black' }),
  'stack-narrow': () => stack({ site, options, standing, budget, currency, reference: 2, widthPx: 358 }),
  'section-halves': () => section({ design: second.designs[0]!, widthPx: 700 }),
  'section-concrete': () => section({ design: third.designs[0]!, widthPx: 700, paper: 'black' }),
  sections: () => sectionRow({ options: sorted, reference: 2, widthPx: 1224 }),
  'road-profile': () =>
    roadProfile({
      site: lowSite,
      option: crested(second),
      widthPx: 980,
      scale: 1000,
      shown: chainagesShown(lowSite, 980, 1000),
    }),
  'road-profile-straight': () =>
    roadProfile({
      site,
      option: second,
      widthPx: 980,
      scale: 1000,
      shown: chainagesShown(site, 980, 1000),
      paper: 'black',
    }),
  'road-profile-narrow': () =>
    roadProfile({
      site,
      option: second,
      widthPx: 358,
      scale: 2500,
      shown: chainagesShown(site, 358, 2500),
    }),
  ladder: () => ladder({ site, option: second, obstacle: obstacles[0]! }),
  'span-chart': () =>
    spanChart({ rows: spanRows, askedM: 63, askedWords: '63 m asked: 60 clear, plus a pier', widthPx: 980 }),
  'span-chart-narrow': () => spanChart({ rows: spanRows, askedM: 63, widthPx: 358 }),
  'span-chart-by-fit': () =>
    spanChart({
      rows: spanRows.slice(4, 9),
      askedM: 63,
      groups: 'status',
      axisM: [4, 2000],
      widthPx: 1224,
      paper: 'black',
    }),
  'depth-bands': () => depthBands({ forms: depthForms, spanM: 63, widthPx: 1224 }),
  'depth-bands-narrow': () => depthBands({ forms: depthForms, spanM: 63, widthPx: 358 }),
  'source-spans': () =>
    sourceSpans({ forms: sourceForms, askedM: 63, axisM: sourceAxis(sourceForms, 63), widthPx: 1224 }),
  'source-spans-narrow': () =>
    sourceSpans({ forms: sourceForms, askedM: 63, axisM: sourceAxis(sourceForms, 63), widthPx: 358 }),
  'share-columns': () => shareColumns({ ...shares, widthPx: 1224 }),
  'share-columns-narrow': () => shareColumns({ ...shares, widthPx: 358, paper: 'black' }),
  'depth-curve': () =>
    depthCurve({
      form: 'composite-i',
      points: depthPoints,
      depthM: 2.3,
      limits: [{ depthM: 1.75, words: 'flange at the pier is full' }],
      currency,
      widthPx: 560,
    }),
  checks: () => checkBars({ form: 'composite-i', checks, widthPx: 300 }),
  quantities: () => quantityMarks({ ...shared, published }),
  'cost-by-part': () => costByPart({ ...shared, currency, widthPx: 1224 }),
  'cost-intervals': () => costIntervals({ ...shared, standing, budget, currency, priceDate: '2026 Q1' }),
  'cost-intervals-black': () => costIntervals({ ...shared, standing, budget, currency, paper: 'black' }),
  odds: () => oddsMatrix({ ...shared, standing, unseparated: [0.2, 0.8] }),
  ranges: () => rangePanels({ ...shared, measures }),
  'trade-offs': () => tradeOffs({ ...shared, measures, budget, currency, widthPx: 1224 }),
  'key-line': () =>
    keyLine({
      sections: ['Brief', 'What can span it', 'Arrangements', 'Section', 'Cost'].map((name, index) => ({
        number: index + 1,
        name,
        href: `#s${String(index + 1)}`,
        stations: [`${String(index + 1)}+010`],
      })),
      widthPx: 1224,
      joined,
    }),
  'station-line': () =>
    stationLine({
      heightPx: 620,
      view: { top: 0, bottom: 520 },
      joined,
      marks: [
        { name: 's1', y: 20, post: true },
        { name: '1+010', y: 60 },
        { name: '2+010', y: 130 },
        { name: '3+010', y: 220 },
        { name: '4+010', y: 330, state: 'pending' },
        { name: '4+020', y: 420, state: 'failed' },
        { name: '5+010', y: 560, state: 'held' },
      ],
    }),
};
