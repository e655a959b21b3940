import { familyOf, formIds, spanSources, spanWindow, type Family } from '../../lib/index.ts';
import { sourceAxis, sourceSpans, sourceSpansTable, type SourceSpansInput } from '../charts/sourceSpans.ts';
import { tableBehind } from '../charts/table.ts';
import { h } from '../html.ts';
import type { LineSection, Sheet } from '../page/index.ts';
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

/** Section 3: each source's span of each form, beside the others. */
export function disagreementSection(page: Sheet, cells: AnswerCells): LineSection {
  const { answer } = cells;
  return page.section(
    3,
    'Where sources disagree',
    'One line each; the tint is what the rules take as usual.',
    [
      page.cell({
        station: '3+010',
        title: 'What single sources say',
        shows: { answer },
        wide: true,
        long: true,
        body: (v, room) => {
          const input: SourceSpansInput = {
            forms,
            askedM: v.answer.span,
            axisM: sourceAxis(forms, v.answer.span),
            widthPx: room.widthPx,
          };
          return [
            parts.map((part, index) =>
              sourceSpans({ ...input, forms: part, prefix: `sources-${String(index)}` }),
            ),
            tableBehind(sourceSpansTable(input)),
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
