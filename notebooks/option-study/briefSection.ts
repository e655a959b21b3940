import type { Obstacle, Study } from '../../lib/index.ts';
import { crossing } from '../drawing/crossing.ts';
import { h, type HtmlChild } from '../html.ts';
import {
  fieldsOf,
  type Fields,
  type LineSection,
  type Path,
  type Sheet,
  type StudyStore,
} from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';
import { sentence } from '../../lib/index.ts';
import { madeFigure } from './madeFigure.ts';
import type { StudyCells } from './studyCells.ts';
import { crossingWords } from './words.ts';

const obstacleAt = (study: Study, index: number): Obstacle => study.brief.obstacles[index]!;

/** The stretch whose width decides the main opening: the widest that bars supports. */
function mainBarred(study: Study): number {
  const widths = study.brief.obstacles.map((o) => (o.supports === 'hard' ? o.toM - o.fromM : -1));
  return widths.indexOf(Math.max(...widths));
}

/** Every obstacle in a sentence with its fields inside it. */
function obstacleSentence(
  graph: Graph,
  store: StudyStore,
  fields: Fields,
  index: number,
  main: boolean,
): HtmlChild {
  const obstacle = obstacleAt(store.valid(), index);
  const at = (...rest: Path): Path => ['brief', 'obstacles', index, ...rest];
  const metres = (label: string, path: Path, places: number): HTMLElement =>
    fields.figure(path, { label, places, unit: 'm', step: places > 0 ? 0.1 : 1 });
  const barred = obstacle.supports === 'hard' && [
    obstacle.kind === 'river' ? 'No pier may stand in ' : 'No support may stand on ',
    h('i', {}, obstacle.name),
    main && [
      ', over ',
      madeFigure(graph, store, {
        label: 'no-pier width',
        places: 1,
        unit: 'm',
        min: { value: 5 },
        max: { value: 150 },
        get: (study) => obstacleAt(study, index).toM - obstacleAt(study, index).fromM,
        put: (study, widthM) => withWidth(study, index, widthM),
      }),
      ' m',
    ],
    ', from chainage ',
    metres(`${obstacle.name}, from`, at('fromM'), 1),
    ' to ',
    metres(`${obstacle.name}, to`, at('toM'), 1),
    '. ',
  ];
  const clear = obstacle.clearance && [
    obstacle.supports === 'hard' ? 'Above it ' : [h('i', {}, obstacle.name), ': '],
    fields.figure(at('clearance', 'headroomM'), {
      label: `headroom over ${obstacle.name}`,
      places: 2,
      unit: 'm',
      step: 0.1,
      min: { value: 0 },
      max: { value: 80 },
      isPreset: (draft) => obstacleAt(draft as Study, index).clearance?.confirmed === false,
    }),
    ' m must stay clear above level ',
    metres(`${obstacle.name}, level`, at('clearance', 'datumLevelM'), 2),
    '. ',
  ];
  return [barred, clear];
}

/** The stretch made wider or narrower about its middle, to half metres. */
function withWidth(study: Study, index: number, widthM: number): Study {
  const obstacle = obstacleAt(study, index);
  const middle = (obstacle.fromM + obstacle.toM) / 2;
  const changed = { ...obstacle, fromM: middle - widthM / 2, toM: middle + widthM / 2 };
  const obstacles = study.brief.obstacles.map((o, i) => (i === index ? changed : o));
  return { ...study, brief: { ...study.brief, obstacles } };
}

function sentences(graph: Graph, store: StudyStore): HTMLElement {
  const fields = fieldsOf(graph, store, sentence);
  const study = store.valid();
  const { brief } = study;
  const main = mainBarred(study);
  const figure = fields.figure;
  return h(
    'div',
    { class: 'prose' },
    h(
      'p',
      {},
      `A road of ${brief.deck.filter((strip) => strip.kind === 'lane').length} lanes has to cross from chainage `,
      figure(['brief', 'crossing', 'startM'], { label: 'start', places: 0, unit: 'm' }),
      ' to ',
      figure(['brief', 'crossing', 'endM'], { label: 'end', places: 0, unit: 'm' }),
      ', ',
      figure(['brief', 'crossing', 'skewDeg'], {
        label: 'skew',
        places: 0,
        unit: 'deg',
        unknown: 'unknown',
        min: { value: 0 },
        max: { value: 70 },
      }),
      '° off square. ',
      brief.obstacles.map((_, index) => obstacleSentence(graph, store, fields, index, index === main)),
    ),
    h(
      'p',
      {},
      brief.waters.map((water, index) => [
        h('i', {}, water.name),
        ' stands at ',
        figure(['brief', 'waters', index, 'levelM'], {
          label: 'water level',
          places: 2,
          unit: 'm',
          step: 0.1,
        }),
        ' and floods to ',
        figure(['brief', 'waters', index, 'floodLevelM'], {
          label: 'flood level',
          places: 2,
          unit: 'm',
          step: 0.1,
          unknown: 'unknown',
          from: water.levelM,
        }),
        '; the soffit keeps ',
        figure(['brief', 'waters', index, 'freeboardM'], {
          label: 'freeboard',
          places: 2,
          unit: 'm',
          step: 0.1,
          min: { value: 0 },
        }),
        ' m above the flood. ',
      ]),
      'The road stands at ',
      figure(['brief', 'road', 'startLevelM'], {
        label: 'road level at the start',
        places: 2,
        unit: 'm',
        step: 0.1,
      }),
      ' at the start and ',
      figure(['brief', 'road', 'endLevelM'], {
        label: 'road level at the end',
        places: 2,
        unit: 'm',
        step: 0.1,
      }),
      ' at the end; a free end may rise by ',
      figure(['brief', 'road', 'mayRiseM'], {
        label: 'rise allowed',
        places: 2,
        unit: 'm',
        step: 0.1,
        min: { value: 0 },
      }),
      ' m, at ',
      figure(['brief', 'road', 'maxGradient'], {
        label: 'steepest gradient',
        places: 1,
        unit: '%',
        per: 100,
        step: 0.5,
        min: { value: 0.1 },
        max: { value: 15 },
      }),
      ' % at most. ',
      'The ground is ',
      h(
        'span',
        { class: 'fig unknown' },
        brief.groundStretches.every((s) => s.known) ? 'known' : 'not proved',
      ),
      ': each stretch carries its odds. ',
      brief.budget === 'unknown'
        ? ['The budget is ', h('span', { class: 'fig unknown' }, 'not given'), '.']
        : [
            'The budget is ',
            figure(['brief', 'budget', 'amount'], {
              label: 'budget',
              places: 2,
              unit: `M${study.books.currency}`,
              per: 1e-6,
              step: 0.1,
              min: { value: 0.1 },
            }),
            ` million ${study.books.currency} at ${brief.budget.priceDate} prices. ${brief.budget.includes}.`,
          ],
    ),
  );
}

/** Section 1: the brief as typed, and the crossing drawn with the reference option. */
export function briefSection(page: Sheet, graph: Graph, store: StudyStore, cells: StudyCells): LineSection {
  const { brief, site, reference } = cells;
  return page.section(
    1,
    'Brief',
    page.live({ site }, (v) => crossingWords(v.site)),
    [
      page.cell({
        station: '1+010',
        title: 'Brief',
        shows: { brief },
        body: sentences(graph, store),
        notes: (v) => [
          h(
            'p',
            {},
            'Plain underline: typed here. Dotted: preset, to be confirmed. Dashed: unknown, and the result is wider for it.',
          ),
          v.brief.obstacles
            .filter((obstacle) => obstacle.clearance?.confirmed === false)
            .map((obstacle) =>
              h(
                'p',
                { class: 'caution' },
                h('b', {}, 'Caution.'),
                ` The headroom over ${obstacle.name} is a preset; its authority has not confirmed it.`,
              ),
            ),
          h('p', {}, 'Drag a figure sideways, use the arrow keys, or type.'),
        ],
      }),
      page.cell({
        station: '1+020',
        title: 'Crossing',
        shows: { site, brief, reference },
        owns: [site],
        body: (v, room) =>
          crossing({
            site: v.site,
            option: v.reference,
            obstacles: v.brief.obstacles,
            widthPx: room.widthPx,
            prefix: 'crossing',
          }),
        notes: (v) => [
          v.reference && h('p', {}, `Drawn with option ${v.reference.number}, the reference.`),
          h(
            'p',
            {},
            'Last rows of the band: the lowest soffit that headroom, flood and freeboard allow, and what is spare.',
          ),
          h('p', { class: 'source' }, 'Founding shown for the likeliest ground of each stretch.'),
        ],
      }),
    ],
  );
}
