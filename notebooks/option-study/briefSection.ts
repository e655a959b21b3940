import type { Brief, Site } from '../../lib/index.ts';
import { crossing, crossingHas } from '../drawing/crossing.ts';
import { sheetIn, wantsWidth } from '../drawing/elevation.ts';
import { plan } from '../drawing/plan.ts';
import { inRoom } from '../drawing/sheet.ts';
import { h, type HtmlChild } from '../html.ts';
import type { LineSection, Sheet, StudyStore } from '../page/index.ts';
import { handsOn } from './handsOn.ts';
import type { Graph } from '../reactive/index.ts';
import { asItStandsNote } from './asItStandsNote.ts';
import { briefSentences } from './brief/briefSentences.ts';
import { deckField } from './brief/deckField.ts';
import { groundTable } from './brief/groundTable.ts';
import { obstacleTable } from './brief/obstacleTable.ts';
import { groundNames, oddsTable } from './brief/oddsTable.ts';
import { waterTable } from './brief/waterTable.ts';
import { studyDesk } from './studyDesk.ts';
import { withKeyed } from './withKeyed.ts';
import type { StudyCells } from './studyCells.ts';
import { crossingWords } from './words.ts';

/** Of what is said beside a cell: how its figures are changed, which paper need not say. */
const onScreen = { class: 'on-screen' };

const presetNotes = ({ obstacles }: Brief): HtmlChild =>
  obstacles
    .filter(({ clearance }) => clearance?.confirmed === false)
    .map(({ name }) =>
      h(
        'p',
        { class: 'caution' },
        h('b', {}, 'Caution.'),
        ` The headroom over ${name} is a preset; its authority has not confirmed it.`,
        h('span', onScreen, ' Enter on the figure confirms it.'),
      ),
    );

/** What of the crossing can be taken hold of, and how. */
const handWords = ({ windows }: Site): string =>
  `Point at the drawing: piers, ${windows === undefined ? '' : 'abutments in their windows, '}soffit, edges of obstacles, headroom and road ends can be dragged, stepped with the arrow keys, or typed after Enter. Escape takes back; L locks a pier, Delete removes it, + in a span adds one.`;

/** Section 1: the brief in prose, drawing and tables, each figure changed where it stands. */
export function briefSection(page: Sheet, graph: Graph, store: StudyStore, cells: StudyCells): LineSection {
  const { brief, books, site, reference, asItStands, hands } = cells;
  const { head } = store.slices;
  const crossingCell = page.cell({
    station: '1+020',
    title: 'Crossing',
    shows: { site, brief, books, reference, asItStands, hands },
    owns: [site],
    wide: (v) => wantsWidth(v.site),
    body: (v, room) =>
      withKeyed(
        inRoom(
          crossing({
            site: v.site,
            option: v.reference,
            obstacles: v.brief.obstacles,
            ...sheetIn(v.site, room.widthPx, room.paperPx === null),
            prefix: 'crossing',
            ...(room.paperPx === null && { handles: v.hands }),
          }),
          room.widthPx,
          'Crossing',
        ),
      ),
    notes: (v, room) => {
      const { scale, widthPx } = sheetIn(v.site, room.widthPx, room.paperPx === null);
      const has = crossingHas(scale, widthPx);
      return [
        asItStandsNote(v.asItStands, v.books.currency),
        room.paperPx === null && h('p', {}, handWords(v.site)),
        has.band &&
          h(
            'p',
            {},
            'Last rows of the band: the lowest soffit that headroom, flood and freeboard allow, and what is spare.',
          ),
        has.lettering &&
          h('p', { class: 'source' }, 'Founding shown for the likeliest ground of each stretch.'),
      ];
    },
  });
  handsOn(crossingCell, studyDesk(graph, store, cells));
  return page.section(
    1,
    'Brief',
    page.live({ site }, (v) => crossingWords(v.site)),
    [
      page.cell({
        station: '1+010',
        title: 'Brief',
        shows: { brief, head },
        typed: [brief, head],
        body: briefSentences(graph, store),
        notes: (v) => [
          v.head.notice !== '' && h('p', {}, v.head.notice),
          h(
            'p',
            {},
            'Plain underline: typed here. Dotted: preset or start value, to be confirmed. Dashed: unknown, and the result is wider for it.',
          ),
          presetNotes(v.brief),
          h('p', onScreen, 'Drag a figure sideways, use the arrow keys, or type; ? for not known.'),
        ],
      }),
      crossingCell,
      page.cell({
        station: '1+025',
        title: 'Plan',
        shows: { site, reference },
        wide: (v) => wantsWidth(v.site),
        body: (v, room) =>
          inRoom(
            plan({
              site: v.site,
              option: v.reference,
              ...sheetIn(v.site, room.widthPx, room.paperPx === null),
              prefix: 'plan',
              bar: true,
            }),
            room.widthPx,
            'Plan',
          ),
        notes: [
          h(
            'p',
            {},
            'Supports and what is crossed stand at the skew of the crossing. Hidden lines: shafts, footings, piles.',
          ),
        ],
      }),
      page.cell({
        station: '1+030',
        title: 'Obstacles, water and ground line',
        shows: { brief },
        typed: [brief],
        body: [obstacleTable(graph, store), waterTable(graph, store), groundTable(graph, store)],
        notes: [
          h(
            'p',
            {},
            'Supports barred: none may stand there, ever. At a price: one may, with a caution. Free: the stretch only keeps its envelope clear.',
          ),
          h('p', {}, 'An envelope is a preset until its authority has confirmed it.'),
          h(
            'p',
            onScreen,
            'Ground line: paste chainage and level from a spreadsheet into any of its figures; they take its place.',
          ),
        ],
      }),
      page.cell({
        station: '1+040',
        title: 'Deck and ground',
        shows: { brief },
        typed: [brief],
        body: h('div', { class: 'beside' }, deckField(graph, store), oddsTable(graph, store)),
        notes: [
          h(
            'p',
            {},
            'Looking up-chainage. ',
            h(
              'span',
              onScreen,
              'Click a width to change it, a name to change what the strip is, a gap to add one.',
            ),
          ),
          h('p', {}, 'Each class of ground gets its own foundation and its own price; the odds mix them.'),
          h('p', { class: 'source' }, `${groundNames()}.`),
        ],
      }),
    ],
  );
}
