import { familyOf, formIds, spanSources, spanWindow, type Family } from '../../lib/index.ts';
import {
  askedLine,
  sourceAxis,
  sourceSpans,
  sourceSpansTable,
  type SourceSpansInput,
} from '../charts/sourceSpans.ts';
import { tableBehind } from '../charts/table.ts';
import { el } from '../drawing/piece.ts';
import { toDom } from '../drawing/toDom.ts';
import { h } from '../html.ts';
import type { LineSection, Sheet } from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';
import type { AnswerCells } from './answerCells.ts';
import { referenceTo } from './references.ts';

const forms: SourceSpansInput['forms'] = formIds.map((form) => ({
  form,
  usual: spanWindow(form).usual,
  spans: spanSources(form).map(({ source, fromM, toM, of }) => ({
    fromM,
    toM,
    source: referenceTo(source),
    ...(of === undefined ? {} : { of }),
  })),
}));

/** Families that stand in one chart; more would be higher than a printed sheet. */
const together: readonly (readonly Family[])[] = [
  ['slab', 'girder'],
  ['box', 'truss'],
  ['arch', 'cable-supported'],
];
const parts = together.map((names) => forms.filter(({ form }) => names.includes(familyOf[form])));

/** The asked span as an element for a chart that stands. */
const lineOf = (input: SourceSpansInput): Element =>
  toDom(el('svg', {}, askedLine(input)), document).firstElementChild!;

/** Section 3: each source's span of each form, beside the others. The charts stand; only the asked span moves in them. */
export function disagreementSection(page: Sheet, graph: Graph, cells: AnswerCells): LineSection {
  const axis = graph.cell('sourceAxis', { answer: cells.answer }, (v) => sourceAxis(forms, v.answer.span), {
    equal: (a, b) => a[0] === b[0] && a[1] === b[1],
  });
  let askedM = Number.NaN;
  let drawn: readonly { readonly input: SourceSpansInput; readonly element: Element }[] = [];
  graph.watch(cells.answer, (state) => {
    if (state.state !== 'ready') return;
    askedM = state.value.span;
    for (const { input, element } of drawn)
      element.querySelector('.limit')?.replaceWith(lineOf({ ...input, askedM }));
  });
  return page.section(
    3,
    'Where sources disagree',
    'One line each; the tint is what the rules take as usual.',
    [
      page.cell({
        station: '3+010',
        title: 'What single sources say',
        shows: { axis },
        wide: true,
        long: true,
        body: (v, room) => {
          drawn = parts.map((part, index) => {
            const input = {
              forms: part,
              askedM,
              axisM: v.axis,
              widthPx: room.widthPx,
              prefix: `sources-${String(index)}`,
            };
            return { input, element: toDom(sourceSpans(input), document) };
          });
          return [
            drawn.map(({ element }) => element),
            tableBehind(sourceSpansTable({ forms, askedM, axisM: v.axis, widthPx: room.widthPx })),
          ];
        },
        notes: [
          h(
            'p',
            {},
            'Sources differ because they speak of different things: a method, a material, what is built and what is economical. Those read weigh more than those from memory; no line sets a figure by itself.',
          ),
        ],
      }),
    ],
  );
}
