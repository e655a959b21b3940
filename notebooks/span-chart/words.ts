import {
  builtShares,
  methodNames,
  type BuiltBucket,
  type DepthGuidance,
  type FormId,
  type Guide,
  type Status,
} from '../../lib/index.ts';
import { flipWords } from '../charts/spanRows.ts';
import { capitalised, countWords, fixed, listed, plain } from '../format.ts';
import { formLooks } from '../forms/formLook.ts';

/** A form's name inside a sentence: 'composite I'. */
const inText = (form: FormId): string => {
  const { short } = formLooks[form];
  return `${short.charAt(0).toLowerCase()}${short.slice(1)}`;
};

const namesOf = (guide: Guide, status: Status): readonly string[] =>
  guide.forms.filter((one) => one.status === status).map(({ form }) => inText(form));

/** The answer in a sentence: which forms are in, and how many are possible and out. */
export function answerWords(guide: Guide): string {
  const inside = namesOf(guide, 'in');
  const possible = namesOf(guide, 'possible').length;
  const out = namesOf(guide, 'out').length;
  const rest = `${countWords(possible)} more ${possible === 1 ? 'is' : 'are'} possible, ${countWords(out)} ${out === 1 ? 'is' : 'are'} out.`;
  if (inside.length === 0) return capitalised(`no form is in; ${rest}`);
  return `${capitalised(listed(inside))} ${inside.length === 1 ? 'is' : 'are'} in; ${rest}`;
}

/** What changes first when the span does. */
export function firstTurnWords(guide: Guide): string {
  const turns = guide.forms.flatMap((one) =>
    one.flip?.fact === 'mainSpanM' ? [{ one, byM: Math.abs(one.flip.to - one.flip.from) }] : [],
  );
  const first = turns.sort((a, b) => a.byM - b.byM)[0];
  return first === undefined
    ? 'No change of the span alone changes a standing.'
    : `First to change: ${inText(first.one.form)}, ${flipWords(first.one) ?? ''}.`;
}

/** One over a ratio: 0.04 -> '1/25', 0.0667 -> '1/15', 0.1429 -> '1/7'. */
const oneOver = (ratio: number): string => `1/${plain(Number((1 / ratio).toFixed(1 / ratio < 20 ? 1 : 0)))}`;

/** A band of depth as a ratio in words: '1/25 to 1/20 of the span', with what else is to be said of it. */
export function ratioWords({ ratio, of, method, leastM }: DepthGuidance): string {
  const least = leastM === undefined ? '' : `; at least ${fixed(leastM, 2)} m for access`;
  const only =
    method === undefined ? '' : method === 'launch' ? ', launched' : `, for ${methodNames[method]}`;
  return `${oneOver(ratio[0])} to ${oneOver(ratio[1])} of the ${of}${only}${least}`;
}

/** What was built at a span, the two forms most often, in a sentence. */
export function builtWords(bucket: BuiltBucket | null): string {
  if (bucket === null) return 'Beyond 500 m too few were built to count.';
  const first = builtShares.classes
    .map(({ id, words }) => ({
      words,
      percent: bucket.percent[id] ?? 0,
      isDoubted: bucket.doubted.includes(id),
    }))
    .filter(({ isDoubted }) => !isDoubted)
    .sort((a, b) => b.percent - a.percent)
    .slice(0, 2)
    .map(({ words, percent }) => `${fixed(percent, 0)} % ${words}`);
  return `Of ${fixed(bucket.count, 0)} bridges with a longest span of ${bucket.fromM} to ${bucket.toM} m: ${listed(first)}.`;
}
