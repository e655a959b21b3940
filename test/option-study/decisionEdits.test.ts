import { expect, it } from 'vitest';
import { fingerprint, type Study } from '../../lib/index.ts';
import {
  firstTaken,
  notIssuable,
  unsaid,
  withDraft,
  withEntryText,
  withIssue,
  withoutIssue,
  withTaken,
  withUnsaid,
} from '../../notebooks/option-study/decision/decisionEdits.ts';
import { answerTo } from '../appraise/answerTo.ts';
import { placesOf, workedStudy } from './study.ts';

const example = workedStudy();
const study: Study = {
  ...example,
  options: { ...example.options, forms: ['composite-i', 'concrete-box'], workOutAnyway: [] },
};
const appraisal = answerTo(study);
const DAY = '2026-03-02';
const numbers = appraisal.options.map(({ number }) => number);
const [first, second] = numbers as [number, number];
const drafted = withDraft(study, appraisal, first, DAY);

it('firstTaken: the reference, else the leader, else the cheapest, else none', () => {
  expect(firstTaken(appraisal, second)).toBe(second);
  expect(firstTaken(appraisal, 999)).toBe(appraisal.standing.leader);
  const out = { ...appraisal, standing: { ...appraisal.standing, leader: null } };
  expect(firstTaken(out, null)).toBe(first);
  expect(firstTaken({ ...out, options: [] }, null)).toBeNull();
});

it('withDraft: a valid study with its decision of the day; drafted anew it keeps who decided', () => {
  expect(placesOf(drafted)).toEqual([]);
  expect(drafted.decision).toMatchObject({ option: first, date: DAY, author: '', issued: null });
  const named: Study = {
    ...drafted,
    decision: { ...drafted.decision!, author: 'A. Mason', reasons: ['Mine'] },
  };
  const anew = withDraft(named, appraisal, first, '2026-04-01').decision!;
  expect([anew.author, anew.date]).toEqual(['A. Mason', DAY]);
  expect(anew.reasons).toEqual(drafted.decision!.reasons);
});

it('withTaken: the option given up gets a reason, the one taken has none', () => {
  const turned = withTaken(drafted, appraisal, second);
  expect(turned.decision!.option).toBe(second);
  expect(unsaid(turned.decision!, appraisal)).toEqual([]);
  expect(placesOf(turned)).toEqual([]);
});

it('withEntryText: changed, added behind the last, taken out when emptied', () => {
  const { reasons } = drafted.decision!;
  const of = (index: number, text: string) =>
    withEntryText(drafted, 'reasons', index, text).decision!.reasons;
  expect(of(0, 'Other')).toEqual(['Other', ...reasons.slice(1)]);
  expect(of(reasons.length, 'More')).toEqual([...reasons, 'More']);
  expect(of(0, '')).toEqual(reasons.slice(1));
  expect(of(reasons.length, '')).toEqual(reasons);
});

it('withUnsaid: drafts why for the options that nothing is said of, and leaves the others', () => {
  const short: Study = {
    ...drafted,
    decision: { ...drafted.decision!, dropped: [{ option: second, reason: 'Mine' }] },
  };
  expect(unsaid(short.decision!, appraisal)).toEqual(
    numbers.filter((one) => one !== first && one !== second),
  );
  const whole = withUnsaid(short, appraisal).decision!;
  expect(whole.dropped[0]).toEqual({ option: second, reason: 'Mine' });
  expect(unsaid(whole, appraisal)).toEqual([]);
});

it('notIssuable: what is missing is named, and an answer of another study does not do', () => {
  const decision = drafted.decision!;
  const asked = fingerprint(drafted);
  expect(notIssuable(decision, appraisal, asked)).toEqual(['nobody is named who decided']);
  const named = { ...decision, author: 'A. Mason' };
  expect(notIssuable(named, appraisal, asked)).toEqual([]);
  expect(notIssuable(named, null, asked)).toEqual(['the options are still being worked out']);
  expect(notIssuable(named, appraisal, 'f'.repeat(64))).toEqual(['the options are still being worked out']);
  expect(notIssuable({ ...named, reasons: [], dropped: named.dropped.slice(1) }, appraisal, asked)).toEqual([
    'no reason is given',
    `nothing is said of option ${decision.dropped[0]!.option}`,
  ]);
});

it('withIssue and withoutIssue: frozen on the day with what was asked, and a draft again', () => {
  const issued = withIssue(drafted, appraisal, '2026-03-05');
  expect(issued.decision!.issued).toMatchObject({ date: '2026-03-05', fingerprint: fingerprint(drafted) });
  expect(fingerprint(issued)).toBe(fingerprint(study));
  expect(placesOf(issued)).toEqual([]);
  expect(withoutIssue(issued)).toEqual(drafted);
});

it('withDraft and withTaken: ask of the start values of the study, each once, whichever option is taken', () => {
  const begun: Study = { ...study, assumed: ['brief.road.endLevelM', 'brief.road.startLevelM'] };
  const asked = (one: Study): readonly string[] =>
    one.decision!.questions.filter((words) => words.startsWith('Start value not confirmed'));
  const draft = withDraft(begun, appraisal, first, DAY);
  expect(asked(draft)).toEqual(['Start value not confirmed: level of the road.']);
  expect(asked(withTaken(draft, appraisal, second))).toEqual(asked(draft));
});
