import type { Appraisal, Site } from '../../lib/index.ts';
import { crossing } from '../drawing/crossing.ts';
import { chooseReference, listenToStack, type ChooseReference } from '../drawing/listenToStack.ts';
import { largestScale, pxPerMetre } from '../drawing/scale.ts';
import { stack, stackOnPaper } from '../drawing/stack.ts';
import { toDom } from '../drawing/toDom.ts';
import { formLooks } from '../forms/formLook.ts';
import { fixed } from '../format.ts';
import { h } from '../html.ts';
import type { LineSection, Sheet, StudyStore } from '../page/index.ts';
import { riverTable } from './riverTable.ts';
import type { StudyCells } from './studyCells.ts';
import { budgetOf } from './words.ts';

const droppedTotal = ({ droppedCounts }: Appraisal): number =>
  droppedCounts.reduce((sum, dropped) => sum + dropped.count, 0);

/** What was not worked out, by form and reason. */
function droppedTable(appraisal: Appraisal): HTMLElement {
  const rows = [
    ...appraisal.dropped.map(({ form, because }) => ({
      form,
      reason: because.join('; '),
      count: null,
      figure: undefined,
    })),
    ...appraisal.droppedCounts.map((one, i) => ({ ...one, figure: `droppedCounts/${i}/count` })),
  ];
  return h(
    'details',
    { class: 'behind' },
    h('summary', {}, `The ${fixed(droppedTotal(appraisal), 0)} arrangements dropped, by reason`),
    h(
      'table',
      {},
      h(
        'thead',
        {},
        h(
          'tr',
          {},
          ['form', 'reason', 'arrangements'].map((word) => h('th', { scope: 'col' }, word)),
        ),
      ),
      h(
        'tbody',
        {},
        rows.map(({ form, reason, count, figure }) =>
          h(
            'tr',
            {},
            h('th', { scope: 'row' }, formLooks[form].short),
            h('td', { class: 'text' }, reason),
            h('td', { 'data-figure': figure }, count === null ? 'form dropped' : fixed(count, 0)),
          ),
        ),
      ),
    ),
  );
}

/** Section 3: every option drawn on one chainage and one scale, with its cost beside it. */
export function arrangementSection(page: Sheet, store: StudyStore, cells: StudyCells): LineSection {
  const { appraisal, reference, brief, site } = cells;
  const finding = page.live({ appraisal }, (v) => {
    const kept = v.appraisal.options.length;
    const dropped = droppedTotal(v.appraisal);
    return `Of ${fixed(kept + dropped, 0)} arrangements, ${kept} are worked out and ${fixed(dropped, 0)} dropped, each with its reason.`;
  });
  const chosen = (event: Event): void => {
    const { number } = (event as ChooseReference).detail;
    store.edit((study) => ({ ...study, options: { ...study.options, reference: number } }), {
      what: 'reference',
    });
  };
  return page.section(3, 'Arrangements', finding, [
    page.cell({
      station: '3+010',
      title: 'How to read the stack',
      shows: { brief },
      body: h(
        'p',
        { class: 'prose' },
        'Click an elevation to make it the reference everywhere. Grey bands are barred to supports. All stand on one chainage and one scale.',
      ),
    }),
    page.cell({
      station: '3+020',
      title: 'Arrangements',
      shows: { appraisal, reference, brief },
      owns: [appraisal, reference],
      wide: true,
      long: true,
      body: (v, room) => {
        const { site, options, standing, currency } = v.appraisal;
        const input = {
          site,
          options,
          standing,
          budget: budgetOf(v.brief),
          currency,
          reference: v.reference?.number ?? null,
          widthPx: room.widthPx,
          prefix: 'stack',
        };
        if (room.isPaper) return stackOnPaper(input).map((part) => h('div', { class: 'part' }, part));
        const drawing = toDom(stack(input), document);
        listenToStack(drawing);
        drawing.addEventListener(chooseReference, chosen);
        return [drawing, riverTable(v.appraisal), droppedTable(v.appraisal)];
      },
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
