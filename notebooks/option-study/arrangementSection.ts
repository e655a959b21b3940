import type { Appraisal, Site } from '../../lib/index.ts';
import { tableBehind } from '../charts/table.ts';
import { crossing } from '../drawing/crossing.ts';
import { chooseReference, listenToStack, type ChooseReference } from '../drawing/listenToStack.ts';
import { largestScale, pxPerMetre } from '../drawing/scale.ts';
import { roadProfile } from '../drawing/roadProfile.ts';
import { needTable, roadTable } from '../drawing/roadTable.ts';
import { inRoom } from '../drawing/sheet.ts';
import { stack, stackChainage, stackOnPaper } from '../drawing/stack.ts';
import { stackOutset } from '../drawing/stackSheet.ts';
import { fixed } from '../format.ts';
import { h } from '../html.ts';
import { type LineSection, type Sheet, type StudyStore } from '../page/index.ts';
import { riverTable } from './riverTable.ts';
import type { Graph } from '../reactive/index.ts';
import { asItStandsNote } from './asItStandsNote.ts';
import { byHand } from './byHand.ts';
import { choiceTable } from './choiceTable.ts';
import { anywayWords, droppedTable, droppedTotal } from './droppedTable.ts';
import { handsOn } from './handsOn.ts';
import { outTable } from './outTable.ts';
import { studyDesk } from './studyDesk.ts';
import { withKeyed } from './withKeyed.ts';
import type { StudyCells } from './studyCells.ts';
import { budgetOf, findingOf, toComeWords } from './words.ts';

/** Section 3: every option drawn on one chainage and one scale, with its cost beside it. */
export function arrangementSection(
  page: Sheet,
  graph: Graph,
  store: StudyStore,
  cells: StudyCells,
): LineSection {
  const { appraisal, asItStands, books, brief, hands, options, reference, site, stacked } = cells;
  const finding = page.live({ appraisal }, (v) => {
    const kept = v.appraisal.options.length;
    const dropped = droppedTotal(v.appraisal);
    return findingOf(
      v.appraisal,
      `Of ${fixed(kept + dropped, 0)} arrangements, ${kept} are worked out and ${fixed(dropped, 0)} dropped, each with its reason.`,
    );
  });
  const chosen = (event: Event): void => {
    const { number } = (event as ChooseReference).detail;
    store.edit((study) => ({ ...study, options: { ...study.options, reference: number } }), {
      what: 'reference',
    });
  };
  /** Table of what was dropped: the same while something is dragged, and open as it was left. */
  let dropped: { readonly of: Appraisal; readonly element: HTMLElement } | null = null;
  const droppedBy = (of: Appraisal): HTMLElement => {
    if (dropped?.of === of) return dropped.element;
    const element = h('div', {}, riverTable(of), anywayWords(store, of), droppedTable(of, store));
    if (dropped?.element.querySelector('details')?.open === true)
      element.querySelector('details')!.open = true;
    dropped = { of, element };
    return element;
  };
  /** Options that are out, the reference aside: the same while something is dragged, and open as it was left. */
  let out: { readonly of: Appraisal; readonly but: number | null; readonly element: HTMLElement } | null =
    null;
  const outOf = (of: Appraisal, but: number | null): HTMLElement | null => {
    if (out?.of === of && out.but === but) return out.element;
    const options = of.options.filter(({ status, number }) => status === 'out' && number !== but);
    if (options.length === 0) return null;
    const element = outTable(options, of.currency);
    if (out?.element.hasAttribute('open') === true) element.setAttribute('open', '');
    out = { of, but, element };
    return element;
  };
  const stackCell = page.cell({
    station: '3+020',
    title: 'Arrangements',
    shows: { stacked, brief, hands },
    awaits: [appraisal],
    owns: [appraisal, stacked],
    wide: true,
    long: true,
    body: (v, room) => {
      if (v.stacked === null) return null;
      const { options: all, movedNumber } = v.stacked;
      const reference = v.stacked.reference?.number ?? null;
      const inside = all.filter(({ status, number }) => status !== 'out' || number === reference);
      const drawn = inside.length > 0 ? inside : all;
      const { site, standing, currency } = v.stacked.appraisal;
      const within = Object.fromEntries(
        Object.entries(standing.within).filter(([number]) => Number(number) !== movedNumber),
      );
      const input = {
        site,
        options: drawn,
        standing: { ...standing, within },
        budget: budgetOf(v.brief),
        currency,
        reference,
        widthPx: room.widthPx,
        prefix: 'stack',
      };
      const { appraisal: of } = v.stacked;
      const toCome = toComeWords(of);
      const missing = toCome !== '' && h('p', { class: 'small' }, toCome);
      if (room.paperPx !== null) {
        const parts = stackOnPaper(input, room.paperPx, room.paperPx - OVER_STACK_PX);
        return [parts.map((part) => h('div', { class: 'part' }, part)), missing];
      }
      return [
        withKeyed(
          inRoom(stack({ ...input, hands: v.hands }), room.widthPx + stackOutset, 'Elevations', 'with-bar'),
        ),
        missing,
        drawn.length < all.length && outOf(of, reference),
        droppedBy(of),
      ];
    },
  });
  listenToStack(stackCell.element);
  stackCell.element.addEventListener(chooseReference, chosen);
  handsOn(stackCell, studyDesk(graph, store, cells));
  return page.section(3, 'Arrangements', finding, [
    page.cell({
      station: '3+010',
      title: 'The reference by hand',
      shows: { reference, options },
      typed: [options],
      body: [
        page.live({ reference, options }, (v) =>
          byHand(
            v.reference,
            v.options.kept.find(({ number }) => number === (v.reference?.number ?? v.options.reference)),
            store,
          ),
        ),
        choiceTable(graph, store, cells),
      ],
      notes: [
        h(
          'p',
          {},
          h('span', { class: 'on-screen' }, 'Click an elevation to make it the reference everywhere. '),
          'Grey bands are barred to supports. All stand on one chainage and one scale.',
        ),
      ],
    }),
    page.cell({
      station: '3+015',
      title: 'What it comes to',
      shows: { asItStands, books },
      body: (v) => h('div', { class: 'prose' }, asItStandsNote(v.asItStands, v.books.currency)),
    }),
    stackCell,
    page.cell({
      station: '3+025',
      title: 'Road over the reference',
      shows: { reference, site },
      wide: true,
      body: (v, room) => {
        if (!v.reference) return h('p', { class: 'prose' }, 'No option has been worked out yet.');
        const {
          drawnPx: widthPx,
          scale,
          shown,
        } = stackChainage(v.site, room.widthPx, undefined, room.paperPx === null);
        return [
          inRoom(
            roadProfile({ site: v.site, option: v.reference, widthPx, scale, shown, prefix: 'road' }),
            room.widthPx,
            'Road over the reference',
          ),
          tableBehind(roadTable(v.reference), 'Table of the road'),
          v.site.soffitLimits.length > 0 &&
            tableBehind(needTable(v.site, v.reference), 'Table of the levels needed'),
        ];
      },
      notes: [
        h(
          'p',
          {},
          'On the chainage of the elevations above, with heights exaggerated as it says. Heavy lines: the road level that each headroom or flood needs for the depth of the reference. Dashed: the road as proposed. Circles: where a curve begins or ends.',
        ),
      ],
    }),
    page.cell({
      station: '3+030',
      title: 'Main opening at a larger scale',
      shows: { reference, brief, site },
      wide: true,
      body: (v, room) => {
        const { site, reference: option } = v;
        if (!option || !site.mainOpening) {
          return h(
            'p',
            { class: 'prose' },
            'Nothing is barred to supports: there is no opening to look at closely.',
          );
        }
        const { scale, window } = closeUp(site, room.widthPx);
        return crossing({
          site,
          option,
          obstacles: v.brief.obstacles,
          widthPx: room.widthPx,
          scale,
          window,
          band: room.widthPx >= 700,
          prefix: 'close-up',
        });
      },
    }),
  ]);
}

/** On the printed sheet that begins the section its heading and first two cells stand over the stack, px. */
const OVER_STACK_PX = 240;

/** Ground shown on either side of the main opening, m. */
const BESIDE_OPENING_M = 25;

/** Scale and stretch of a drawing that shows the widest opening with the supports beside it. */
function closeUp({ mainOpening, startM, endM }: Site, widthPx: number) {
  const { fromM, toM } = mainOpening!;
  const scale = largestScale(Math.min(endM - startM, toM - fromM + 2 * BESIDE_OPENING_M), widthPx - 20, 500);
  const half = widthPx / pxPerMetre(scale) / 2;
  const middle = (fromM + toM) / 2;
  return {
    scale,
    window: { fromM: Math.max(startM - 15, middle - half), toM: Math.min(endM + 15, middle + half) },
  };
}
