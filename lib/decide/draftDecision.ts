import type { Appraisal, AppraisedOption, Decision, Effect } from '../model/index.ts';
import { levelWith } from './levelWith.ts';
import { sayMoney, sayOdds } from './words.ts';

/** The part of a decision that follows from the appraisal. */
type Draft = Pick<Decision, 'option' | 'reasons' | 'dropped' | 'questions'>;

const said = ({ rulings }: AppraisedOption, effect: Effect): string[] => [
  ...new Set(rulings.filter((ruling) => ruling.effect === effect).flatMap(({ because }) => because)),
];

const sentence = (words: string): string => `${words.charAt(0).toUpperCase()}${words.slice(1)}.`;

/** What speaks for an option: its place on cost where it leads, else how it stands to the leader; then the rules in favour. */
function reasonsFor(appraisal: Appraisal, taken: AppraisedOption): string[] {
  const { standing, currency, options } = appraisal;
  const leader = options.find(({ number }) => number === standing.leader);
  const inFavour = said(taken, 'in favour').map(sentence);
  if (leader === taken) return [...standing.because, ...inFavour];
  const out = said(taken, 'out').map((words) => `A rule puts it out: ${words}.`);
  if (leader === undefined) return [...out, ...inFavour];
  const cheaper = sayOdds(standing.odds[taken.number]![leader.number]!);
  const cost = `On cost it stands behind option ${leader.number}, which leads: median cost ${sayMoney(taken.cost.p50, currency)} against ${sayMoney(leader.cost.p50, currency)}, cheaper in ${cheaper} of the draws.`;
  return [...out, cost, ...inFavour];
}

/** Why another option was not taken, as far as rules and cost tell. */
function whyDropped(
  { standing, currency }: Appraisal,
  taken: AppraisedOption,
  other: AppraisedOption,
): string {
  const out = said(other, 'out');
  if (out.length > 0) return sentence(`out by rule: ${out.join('; ')}`);
  const [its, ours] = [sayMoney(other.cost.p50, currency), sayMoney(taken.cost.p50, currency)];
  const chance = sayOdds(standing.odds[other.number]![taken.number]!);
  const isLevel = levelWith(standing, taken.number).includes(other.number);
  const cost = `median cost ${its} against ${ours}, cheaper in ${chance} of the draws`;
  const others = said(taken, 'caution');
  const cautions = said(other, 'caution').filter((words) => !others.includes(words));
  const also = cautions.map((words) => `; caution: ${words}`).join('');
  if (isLevel) return sentence(`cannot be separated on cost: ${cost}${also}`);
  if (other.cost.p50 < taken.cost.p50)
    return sentence(`the cheaper one, ${cost}${also}; cost does not say why it is dropped`);
  return sentence(`dearer: ${cost}${also}`);
}

/** The drafted question on a start value that nobody has confirmed. */
export const openStartValue = (name: string): string => `Start value not confirmed: ${name}.`;

/**
 * What the appraisal says for taking an option forward, for dropping each other one in the order of the ranking, and what
 * is still to be confirmed of it. A draft: what decides besides rules and cost only people can write.
 * @param number of the option that is taken forward
 * @param unconfirmed names of the start values of the study that nobody has confirmed
 * @throws RangeError where the appraisal has no option of that number
 */
export function draftDecision(
  appraisal: Appraisal,
  number: number,
  unconfirmed: readonly string[] = [],
): Draft {
  const taken = appraisal.options.find((option) => option.number === number);
  if (taken === undefined)
    throw new RangeError(`option: expected a number of the appraisal, received ${number}`);
  return {
    option: number,
    reasons: reasonsFor(appraisal, taken),
    dropped: appraisal.options
      .filter((option) => option !== taken)
      .map((option) => ({ option: option.number, reason: whyDropped(appraisal, taken, option) })),
    questions: [...said(taken, 'to confirm').map(sentence), ...unconfirmed.map(openStartValue)],
  };
}

/**
 * A decision for another option, or for the same one after the study has changed: what stands as it was drafted is drafted
 * anew, what people have written stays.
 * @param drafted the draft that the decision began with, as far as it can still be told; null where it cannot
 */
export function changedOption(decision: Decision, drafted: Draft | null, next: Draft): Decision {
  const own = (texts: readonly string[], before: readonly string[] = []): string[] =>
    texts.filter((one) => !before.includes(one));
  const kept = new Map(
    decision.dropped
      .filter(({ option, reason }) => {
        const before = drafted?.dropped.find((one) => one.option === option);
        return before?.reason !== reason;
      })
      .map(({ option, reason }) => [option, reason]),
  );
  const merged = (fresh: readonly string[], written: readonly string[]): string[] => [
    ...fresh,
    ...written.filter((one) => !fresh.includes(one)),
  ];
  return {
    ...decision,
    option: next.option,
    reasons: merged(next.reasons, own(decision.reasons, drafted?.reasons)),
    dropped: next.dropped.map(({ option, reason }) => ({ option, reason: kept.get(option) ?? reason })),
    questions: merged(next.questions, own(decision.questions, drafted?.questions)),
  };
}
