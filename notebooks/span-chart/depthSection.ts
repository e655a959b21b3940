import { depthGuidance, type FormId, type GuideForm } from '../../lib/index.ts';
import { depthBands, depthTable, type DepthBandRow, type DepthBandsInput } from '../charts/depthBands.ts';
import { tableBehind } from '../charts/table.ts';
import { countWords, length } from '../format.ts';
import { formLooks } from '../forms/formLook.ts';
import { h } from '../html.ts';
import type { LineSection, Sheet } from '../page/index.ts';
import { orderOf, type AnswerCells } from './answerCells.ts';
import { taskOf, type Question } from './question.ts';
import { referenceTo } from './references.ts';
import { ratioWords } from './words.ts';

/** Bands that measure what stands under the road at midspan. */
const underRoad: ReadonlySet<string> = new Set(['depth', 'midspan depth', 'floor depth']);

function bandsOf(form: FormId, question: Question, { depthM }: GuideForm): readonly DepthBandRow[] {
  return depthGuidance(form, taskOf(question)).map((band) => {
    const isUnderRoad = underRoad.has(band.what);
    const taken =
      band.method !== undefined
        ? undefined
        : isUnderRoad
          ? depthM.midspan
          : band.what === 'depth at the support'
            ? depthM.support
            : undefined;
    return {
      what: band.what,
      depthM: band.depthM,
      ratio: ratioWords(band),
      isUnderRoad,
      sources: band.sources.map(referenceTo),
      ...(taken === undefined ? {} : { takenM: taken }),
    };
  });
}

/** Section 2: how deep each form that reaches is at the asked span. */
export function depthSection(page: Sheet, cells: AnswerCells): LineSection {
  const { asked, answer, order, remarks } = cells;
  const finding = page.live({ asked, answer }, (v) => {
    const reaching = v.answer.forms.filter(({ status }) => status !== 'out');
    const depths = reaching.map(({ depthM }) => depthM.midspan);
    if (depths.length === 0) return 'No form reaches, so no depth is given.';
    return `${length(Math.min(...depths))} to ${length(Math.max(...depths))} m under the road at midspan for ${length(v.answer.span)} m.`;
  });
  const reachingIn = (v: { answer: { forms: readonly GuideForm[] } }): readonly GuideForm[] =>
    v.answer.forms.filter(({ status }) => status !== 'out');
  return page.section(2, 'How deep', finding, [
    page.cell({
      station: '2+010',
      title: 'How deep forms are',
      shows: { asked, answer, order },
      wide: true,
      body: (v, room) => {
        const reaching = reachingIn(v);
        if (reaching.length === 0) return h('p', { class: 'prose' }, 'No form reaches the span asked for.');
        const input: DepthBandsInput = {
          forms: orderOf(v.answer, v.order).flatMap((form) => {
            const one = reaching.find((entry) => entry.form === form);
            return one === undefined ? [] : [{ form, bands: bandsOf(form, v.asked, one) }];
          }),
          spanM: v.answer.span,
          widthPx: room.widthPx,
          prefix: 'depths',
        };
        return [depthBands(input), tableBehind(depthTable(input))];
      },
      notes: (v) => {
        const out = v.answer.forms.length - reachingIn(v).length;
        return [
          h(
            'p',
            {},
            v.asked.lengthM === 'unknown'
              ? 'As single spans, because the length between abutments is not known; continuous spans are shallower. '
              : 'Continuous where the length leaves room for side spans and a rule says how long they are, else as single spans. ',
            'Structural depth without surfacing and crossfall. ',
            out > 0 && `The ${countWords(out)} that are out are left out here.`,
          ),
          h('p', { class: 'source' }, 'Numbers: sources under 5, in italics where from memory.'),
        ];
      },
    }),
    page.cell({
      station: '2+020',
      title: 'Where depths disagree',
      shows: { remarks },
      body: (v) =>
        v.remarks.length === 0
          ? h('p', { class: 'prose' }, 'Nothing is noted beside these bands.')
          : h(
              'dl',
              { class: 'remarks' },
              v.remarks.map(({ form, note }) => [h('dt', {}, formLooks[form].short), h('dd', {}, note)]),
            ),
    }),
  ]);
}
