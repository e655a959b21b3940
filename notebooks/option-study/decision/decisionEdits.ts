import {
  changedOption,
  draftDecision,
  issuedOn,
  startValues,
  type Appraisal,
  type Decision,
  type Study,
} from '../../../lib/index.ts';

/** Lists of a decision in which every entry is a sentence. */
export type DecisionList = 'reasons' | 'questions';

const has = ({ options }: Appraisal, number: number): boolean =>
  options.some((option) => option.number === number);

/** The option that a decision begins with: the reference, else the leader, else the cheapest; null where there is none. */
export function firstTaken({ options, standing }: Appraisal, reference: number | null): number | null {
  const wanted = [reference, standing.leader].find(
    (number) => number !== null && options.some((option) => option.number === number),
  );
  return wanted ?? options[0]?.number ?? null;
}

/** The study with a decision drafted from its appraisal, for an option that the appraisal has. */
export const withDraft = (study: Study, appraisal: Appraisal, number: number, today: string): Study => ({
  ...study,
  decision: {
    dissent: '',
    author: '',
    date: today,
    issued: null,
    ...study.decision,
    ...draftDecision(appraisal, number, startValues(study)),
  },
});

/** The study without its decision. */
export const withoutDecision = (study: Study): Study => ({ ...study, decision: null });

const changed = (study: Study, change: (decision: Decision) => Decision): Study =>
  study.decision === null ? study : { ...study, decision: change(study.decision) };

/** The study with another option taken forward: what was drafted follows it, what people have written stays. */
export const withTaken = (study: Study, appraisal: Appraisal, number: number): Study =>
  changed(study, (decision) => {
    const draft = (option: number) => draftDecision(appraisal, option, startValues(study));
    const before = has(appraisal, decision.option) ? draft(decision.option) : null;
    return changedOption(decision, before, draft(number));
  });

/** Numbers of options that the decision says nothing of, in the order of the ranking. */
export const unsaid = ({ option: taken, dropped }: Decision, { options }: Appraisal): number[] =>
  options
    .map(({ number }) => number)
    .filter((number) => number !== taken && dropped.every(({ option }) => option !== number));

/** The study with a drafted reason for every option that the decision says nothing of. */
export const withUnsaid = (study: Study, appraisal: Appraisal): Study =>
  changed(study, (decision) => {
    const missing = unsaid(decision, appraisal);
    if (missing.length === 0 || !has(appraisal, decision.option)) return decision;
    const more = draftDecision(appraisal, decision.option).dropped.filter(({ option }) =>
      missing.includes(option),
    );
    return { ...decision, dropped: [...decision.dropped, ...more] };
  });

/** The study with the words of an entry of a list; without words it is taken out, one behind the last is added. */
export const withEntryText = (study: Study, list: DecisionList, index: number, text: string): Study =>
  changed(study, (decision) => {
    const texts = decision[list];
    if (index >= texts.length) return text === '' ? decision : { ...decision, [list]: [...texts, text] };
    return {
      ...decision,
      [list]: text === '' ? texts.filter((_, i) => i !== index) : texts.with(index, text),
    };
  });

/** What keeps a decision from being issued, in words; nothing where it may be. */
export function notIssuable(decision: Decision, appraisal: Appraisal | null, fingerprint: string): string[] {
  if (appraisal?.study.fingerprint !== fingerprint) return ['the options are still being worked out'];
  const left = unsaid(decision, appraisal);
  const empty = decision.dropped.filter(({ reason }) => reason === '').map(({ option }) => option);
  const without = [...left, ...empty];
  return [
    ...(has(appraisal, decision.option) ? [] : [`option ${decision.option} is not worked out`]),
    ...(decision.reasons.length > 0 ? [] : ['no reason is given']),
    ...(without.length === 0 ? [] : [`nothing is said of option ${without.join(', ')}`]),
    ...(decision.author === '' ? ['nobody is named who decided'] : []),
    ...(decision.date === '' ? ['its date is not given'] : []),
  ];
}

/** The study with its decision issued on what an appraisal came to. */
export const withIssue = (study: Study, appraisal: Appraisal, today: string): Study =>
  changed(study, (decision) => ({ ...decision, issued: issuedOn(today, appraisal) }));

/** The study with its decision a draft again. */
export const withoutIssue = (study: Study): Study =>
  changed(study, (decision) => ({ ...decision, issued: null }));
