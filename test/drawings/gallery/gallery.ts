import '../../../notebooks/style/index.css';
import { checkBars } from '../../../notebooks/charts/checkBars.ts';
import { costByPart, partTable } from '../../../notebooks/charts/costByPart.ts';
import { costIntervals, costTable } from '../../../notebooks/charts/costIntervals.ts';
import { depthCurve } from '../../../notebooks/charts/depthCurve.ts';
import { oddsMatrix } from '../../../notebooks/charts/oddsMatrix.ts';
import { quantityMarks } from '../../../notebooks/charts/quantityMarks.ts';
import { rangePanels } from '../../../notebooks/charts/rangePanels.ts';
import { ranking } from '../../../notebooks/charts/ranking.ts';
import { byCost } from '../../../notebooks/charts/rowHead.ts';
import { spanChart } from '../../../notebooks/charts/spanChart.ts';
import { tableBehind } from '../../../notebooks/charts/table.ts';
import { tradeOffs } from '../../../notebooks/charts/tradeOffs.ts';
import { crossing } from '../../../notebooks/drawing/crossing.ts';
import { keyLine } from '../../../notebooks/drawing/keyLine.ts';
import { ladder } from '../../../notebooks/drawing/ladder.ts';
import { listenToStack } from '../../../notebooks/drawing/listenToStack.ts';
import { section } from '../../../notebooks/drawing/section.ts';
import { sectionRow } from '../../../notebooks/drawing/sectionRow.ts';
import { stack, stackOnPaper } from '../../../notebooks/drawing/stack.ts';
import { stationLine } from '../../../notebooks/drawing/stationLine.ts';
import type { HtmlChild } from '../../../notebooks/html.ts';
import { h } from '../../../notebooks/html.ts';
import type { Paper } from '../../../notebooks/drawing/ink.ts';
import lowFerry from '../../../data/examples/low-ferry.json?raw';
import { readStudy } from '../../../lib/index.ts';
import * as invented from '../fixture.ts';
import { checks, depthPoints, measures, published, spanRows } from '../figures.ts';
import { answerTo } from '../../appraise/answerTo.ts';

const asked = new URLSearchParams(location.search);
/** `?study` shows the worked example as it is worked out; otherwise the figures drawn up by hand. */
function worked(): Omit<typeof invented, 'options' | 'crested' | 'lowSite'> & {
  options: typeof invented.options;
} {
  const read = readStudy(lowFerry);
  if (!read.ok) throw new RangeError(JSON.stringify(read.problems));
  const study = read.value;
  const appraisal = answerTo(study);
  const money = study.brief.budget === 'unknown' ? invented.budget : study.brief.budget.amount;
  return {
    site: appraisal.site,
    options: appraisal.options,
    standing: appraisal.standing,
    obstacles: study.brief.obstacles,
    budget: money,
  };
}
const { budget, obstacles, options, site, standing } = asked.has('study') ? worked() : invented;
const paper = (asked.get('paper') ?? 'colour') as Paper;
const viewport = document.documentElement.clientWidth;
const band = viewport < 700 ? 28 : viewport < 1180 ? 118 : 168;
const outer = viewport < 700 ? 14 : viewport < 1180 ? 24 : viewport < 1408 ? 32 : 48;
const body = Math.min(980, viewport - band - outer);
const wide = viewport < 1408 ? body : 1224;
const option = options.find((one) => one.number === (asked.has('study') ? standing.leader : 2))!;
const measured = asked.has('study')
  ? [
      {
        name: 'Programme, months',
        places: 0,
        values: Object.fromEntries(options.map((one) => [one.number, one.months])),
      },
    ]
  : measures;
const sorted = byCost(options);
const shared = { options: sorted, reference: option.number, paper };
let reference = option.number;

const cell = (name: string, content: HtmlChild, notes: HtmlChild = null, isWide = false): HTMLElement =>
  h(
    'div',
    { class: isWide ? (name === '3+020' ? 'cell wide long' : 'cell wide') : 'cell', id: name },
    h('a', { class: 'station', href: `#${name}` }, name),
    h('div', { class: 'body' }, content),
    notes === null ? null : h('aside', { class: 'notes' }, h('div', { class: 'given' }, notes)),
  );
const part = (number: number, name: string, finding: string, ...cells: HTMLElement[]): HTMLElement =>
  h(
    'section',
    { class: 'section', id: `s${number}` },
    h(
      'h2',
      {},
      h('span', { class: 'post' }, String(number)),
      h('span', { class: 'name' }, name, h('span', { class: 'finding' }, finding)),
    ),
    ...cells,
  );
const typed = (text: string, kind = 'typed'): HTMLElement => h('span', { class: `fig ${kind}` }, text);

const stackHolder = h('div');
function drawStack(): void {
  stackHolder.replaceChildren(
    h(
      'div',
      { class: 'on-screen' },
      stack({ site, options, standing, budget, currency: 'EUR', reference, widthPx: wide, paper }),
    ),
    h(
      'div',
      { class: 'on-paper' },
      ...stackOnPaper(
        { site, options, standing, budget, currency: 'EUR', reference, widthPx: 1224, paper },
        960,
      ),
    ),
  );
  listenToStack(stackHolder.querySelector('svg')!);
}
stackHolder.addEventListener('choose-reference', (event) => {
  reference = (event as CustomEvent<{ number: number }>).detail.number;
  drawStack();
});
drawStack();

const names = [
  'Brief',
  'What can span it',
  'Arrangements',
  'Depth and level',
  'Section',
  'Quantities',
  'Cost',
  'Time, carbon, upkeep',
  'Trade-offs',
  'Ranking',
  'What would change it',
  'Decision',
];
const sheetElement = h(
  'main',
  { class: paper === 'black' ? 'sheet black' : 'sheet' },
  h(
    'nav',
    { 'aria-label': 'Pages' },
    h(
      'div',
      { class: 'bar' },
      h('a', { href: '#', 'aria-current': 'page' }, 'Spanledger'),
      ...['Shelf', 'Span chart', 'Section bench', 'Rates', 'Evidence'].map((name) =>
        h('a', { href: '#' }, name),
      ),
      h('span', { class: 'apart' }),
      h('span', { class: 'state' }, 'saved 14:02 on this laptop'),
      ...['Undo', 'Compare issues', 'Client page', 'Print'].map((name) =>
        h('button', { class: 'action' }, name),
      ),
    ),
  ),
  h(
    'header',
    {},
    h('h1', {}, 'River Wend crossing at Low Ferry'),
    h(
      'p',
      { class: 'answer' },
      'Composite I-girders at 70 + 90 + 70 m come out at 9.7 M€, between 8.0 and 12. Spliced precast I-girders cannot be separated from them on cost. Two piers fewer in the flood plain decide it.',
    ),
    h(
      'p',
      { class: 'next' },
      h('b', {}, 'Next:'),
      ' ask for one borehole at each river pier, the unknown most worth settling. See ',
      h('a', { href: '#' }, '11+020'),
      '.',
    ),
    h(
      'table',
      { class: 'block' },
      h(
        'tbody',
        {},
        ...[
          ['Study', 'WEN 07'],
          ['Issue', 'B, draft'],
          ['Prices', '2026 Q1, M€'],
          ['Loading', 'EN 1991-2, LM1'],
          ['Levels', 'm above local datum'],
          ['Stage', 'option study; not for construction'],
        ].map(([a, b]) => h('tr', {}, h('th', { scope: 'row' }, a), h('td', {}, b))),
      ),
    ),
  ),
  h(
    'div',
    { class: 'key' },
    h(
      'span',
      { class: 'hint' },
      'Point at a cell: solid spans come from what it uses, dashed ones go to what uses it.',
    ),
    keyLine({
      sections: names.map((name, index) => ({
        number: index + 1,
        name,
        href: `#s${index + 1}`,
        stations: [`${index + 1}+010`, `${index + 1}+020`, `${index + 1}+030`],
      })),
      widthPx: wide,
      joined: {
        at: '3+020',
        uses: ['1+010', '1+020', '2+010'],
        usedBy: ['4+010', '5+010', '6+010', '7+010', '8+020'],
      },
    }),
  ),
  part(
    1,
    'Brief',
    'A river, a railway and a flood plain in 230 m.',
    cell(
      '1+010',
      [
        h(
          'p',
          {},
          'A road of ',
          typed('2'),
          ' lanes with a footway has to cross the River Wend and the Low Ferry branch from chainage ',
          typed('1\u2009240'),
          ' to ',
          typed('1\u2009470'),
          ', on a ',
          typed('straight'),
          ' line, ',
          typed('8°'),
          ' off square to the river. Over the single track, ',
          typed('5.90', 'preset'),
          ' m must stay clear above rail. The ground is ',
          typed('unknown', 'unknown'),
          ': no borehole. The budget is ',
          h('input', { class: 'fig typed', value: '11.5', 'aria-label': 'Budget' }),
          ' M€ at ',
          typed('2026 Q1'),
          ' prices.',
        ),
      ],
      [
        h(
          'p',
          {},
          'Plain underline: typed here. Dotted: preset, to be confirmed. Dashed: unknown, and the result is wider for it.',
        ),
        h(
          'p',
          { class: 'caution' },
          h('b', {}, 'Caution.'),
          ' 5.90 m is a preset; the railway has not confirmed it.',
        ),
        h('p', { class: 'source' }, 'Flood: hydraulic note WEN-H-02, table 3, read.'),
      ],
    ),
    cell(
      '1+020',
      viewport < 700
        ? [
            crossing({ site, option, obstacles, widthPx: body, paper, prefix: 'over', bar: false }),
            h(
              'div',
              { class: 'pushed' },
              crossing({
                site,
                option,
                obstacles,
                widthPx: body,
                scale: 1000,
                window: { fromM: 1226, toM: 1484 },
                paper,
                prefix: 'win',
                band: false,
              }),
            ),
          ]
        : crossing({ site, option, obstacles, widthPx: body, paper }),
      h(
        'p',
        {},
        'Drawn with option 2, the reference. Drag a level, a bank or the road line, or type in the table.',
      ),
    ),
  ),
  part(
    2,
    'What can span it',
    '60 m clear between pier faces asks for 63 m.',
    cell(
      '2+010',
      spanChart({
        rows: spanRows,
        askedM: 63,
        askedWords: '63 m asked: 60 clear, plus a pier',
        widthPx: body,
        paper,
      }),
      h('p', {}, 'Every form is in, possible or out, with the number that decides.'),
    ),
  ),
  part(
    3,
    'Arrangements',
    'Of 512 arrangements, 6 are kept and 506 dropped, each with its reason.',
    cell('3+020', stackHolder, null, true),
  ),
  part(
    4,
    'Depth and level',
    'The railway fixes 2.72 m.',
    cell(
      '4+010',
      h(
        'div',
        { class: 'beside' },
        h('div', {}, ladder({ site, option, obstacle: obstacles[0]!, paper })),
        h(
          'div',
          {},
          depthCurve({
            form: 'composite-i',
            points: depthPoints,
            depthM: 2.3,
            limits: [
              { depthM: 1.75, words: 'flange at the pier is full' },
              { depthM: 2.72, words: 'deeper lifts the road' },
            ],
            currency: 'EUR',
            widthPx: Math.min(560, body),
            paper,
          }),
        ),
      ),
    ),
  ),
  part(
    5,
    'Section',
    'Option 2 is governed by bending at the piers, 0.97.',
    cell(
      '5+010',
      h(
        'div',
        { class: 'beside' },
        h(
          'div',
          {},
          section({
            design: option.designs[0]!,
            widthPx: Math.min(640, body),
            scale: viewport < 700 ? 200 : 100,
            paper,
          }),
        ),
        h(
          'div',
          {},
          checkBars({
            form: option.form,
            checks: asked.has('study') ? option.designs[0]!.checks : checks,
            widthPx: Math.min(300, body),
            paper,
          }),
        ),
      ),
    ),
    cell(
      '5+020',
      sectionRow({ options: sorted, reference: option.number, widthPx: wide, paper }),
      null,
      true,
    ),
  ),
  part(
    6,
    'Quantities',
    'Per m² of deck. Hatched behind each mark: what has been published for that form at that span.',
    cell(
      '6+010',
      quantityMarks({ ...shared, widthPx: body, published: asked.has('study') ? {} : published }),
      h('p', {}, 'Bands from memory are drawn wider.'),
    ),
  ),
  part(
    7,
    'Cost',
    'Two options are level inside the budget, three are level at its edge, one is far outside.',
    cell(
      '7+010',
      [
        costByPart({ ...shared, currency: 'EUR', widthPx: Math.max(wide, 700) }),
        tableBehind(partTable({ ...shared, currency: 'EUR', widthPx: wide })),
      ],
      null,
      true,
    ),
    cell(
      '7+020',
      [
        costIntervals({ ...shared, standing, budget, currency: 'EUR', priceDate: '2026 Q1', widthPx: body }),
        tableBehind(costTable({ ...shared, standing, budget, currency: 'EUR', widthPx: body })),
      ],
      h('p', {}, 'Thin: 10 to 90 %. Thick: the middle half. Tick: the median.'),
    ),
    cell(
      '7+030',
      oddsMatrix({ ...shared, standing, unseparated: [0.2, 0.8], widthPx: body }),
      h('p', {}, 'Odds in steps of 5 %.'),
    ),
  ),
  part(
    8,
    'Programme, carbon, upkeep',
    'Option 2 is first on time.',
    cell('8+010', rangePanels({ ...shared, measures: measured, widthPx: body })),
  ),
  part(
    9,
    'Trade-offs',
    'Nothing beats option 2 on cost.',
    cell(
      '9+010',
      tradeOffs({ ...shared, measures: measured, budget, currency: 'EUR', widthPx: wide }),
      null,
      true,
    ),
  ),
  part(
    10,
    'Ranking under the budget',
    'Option 2 leads.',
    cell(
      '10+010',
      h(
        'div',
        { class: 'across' },
        ranking({ options: sorted, standing, budget, currency: 'EUR', reference: option.number, paper }),
      ),
      null,
      true,
    ),
  ),
);
document.body.append(sheetElement);
void document.fonts.ready.then(() => {
  const top = sheetElement.getBoundingClientRect().top;
  const marks = [...sheetElement.querySelectorAll('.section > h2, .cell > .station')].map((element) => {
    const box = element.getBoundingClientRect();
    const post = element.tagName === 'H2';
    return {
      name: post ? `s${element.parentElement!.id}` : element.textContent,
      y: post ? box.top - top + 0.5 : box.top - top + 12,
      post,
    };
  });
  sheetElement.prepend(
    h(
      'div',
      { class: 'stations-over', 'aria-hidden': 'true' },
      stationLine({
        heightPx: sheetElement.clientHeight,
        marks,
        joined: {
          at: '3+020',
          uses: ['1+010', '1+020', '2+010'],
          usedBy: ['4+010', '5+010', '6+010', '7+010'],
        },
        lineX: band === 28 ? 13 : band === 118 ? 60 : 112,
        bandPx: band,
      }),
    ),
  );
});
