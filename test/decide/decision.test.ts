import { describe, expect, it } from 'vitest';
import { afterEdit, changedOption, draftDecision, issuedOn, sinceIssued } from '../../lib/decide/index.ts';
import { sayMoney } from '../../lib/decide/words.ts';
import { confirmed, parseStudy, writeStudy, type Decision, type Study } from '../../lib/index.ts';
import { answerTo } from '../appraise/answerTo.ts';
import { workedStudy } from '../option-study/study.ts';

const example = workedStudy();
const study: Study = {
  ...example,
  options: { ...example.options, forms: ['composite-i', 'concrete-box'], workOutAnyway: [] },
};
const appraisal = answerTo(study);
const { standing, options, currency } = appraisal;
const leader = options.find(({ number }) => number === standing.leader)!;
const last = options.at(-1)!;

const decided = (number: number): Decision => ({
  ...draftDecision(appraisal, number),
  dissent: '',
  author: 'A. Mason',
  date: '2026-03-02',
  issued: null,
});

describe('draftDecision(appraisal, number)', () => {
  it('gives the standing as reasons for the leader, and one reason for dropping each other option, in order', () => {
    const draft = draftDecision(appraisal, leader.number);
    expect(draft.reasons.slice(0, standing.because.length)).toEqual(standing.because);
    expect(draft.dropped.map(({ option }) => option)).toEqual(
      options.map(({ number }) => number).filter((number) => number !== leader.number),
    );
    for (const { option, reason } of draft.dropped) {
      const other = options.find(({ number }) => number === option)!;
      expect(reason).toContain(sayMoney(other.cost.p50, currency));
      const isLevel = standing.groups.some(
        (group) => group.includes(option) && group.includes(leader.number),
      );
      expect(reason.startsWith('Cannot be separated on cost')).toBe(isLevel);
      expect(reason.startsWith('Dearer')).toBe(!isLevel);
    }
  });

  it('asks what the rules leave to be confirmed of the option taken, each once', () => {
    const { questions } = draftDecision(appraisal, leader.number);
    expect(questions.length).toBeGreaterThan(0);
    expect(new Set(questions).size).toBe(questions.length);
    const toConfirm = leader.rulings.filter(({ effect }) => effect === 'to confirm');
    expect(questions.length).toBe(new Set(toConfirm.flatMap(({ because }) => because)).size);
  });

  it('says of an option that does not lead how it stands to the leader, and of a cheaper one that cost is no reason', () => {
    const draft = draftDecision(appraisal, last.number);
    expect(draft.reasons[0]).toContain(`behind option ${leader.number}, which leads`);
    const reason = draft.dropped.find(({ option }) => option === leader.number)!.reason;
    const isLevel = standing.groups.some(
      (group) => group.includes(last.number) && group.includes(leader.number),
    );
    expect(isLevel).toBe(false);
    expect(reason).toMatch(/^The cheaper one, .*cost does not say why it is dropped\.$/u);
  });

  it('names the rule that puts another option out before anything of cost', () => {
    const because = ['a pier stands in the navigation channel'];
    const out = { rule: 'channel', effect: 'out' as const, because, source: 'invented for the test' };
    const forbidden = { ...last, status: 'out' as const, rulings: [...last.rulings, out] };
    const draft = draftDecision(
      { ...appraisal, options: options.map((one) => (one === last ? forbidden : one)) },
      leader.number,
    );
    expect(draft.dropped.at(-1)!.reason).toBe('Out by rule: a pier stands in the navigation channel.');
  });

  it('asks of every start value that nobody has confirmed, behind what the rules leave open', () => {
    const rules = draftDecision(appraisal, leader.number).questions;
    expect(draftDecision(appraisal, leader.number, ['load standard', 'ground line']).questions).toEqual([
      ...rules,
      'Start value not confirmed: load standard.',
      'Start value not confirmed: ground line.',
    ]);
  });

  it('refuses an option that the appraisal does not have', () => {
    expect(() => draftDecision(appraisal, 999)).toThrow('received 999');
  });
});

describe('afterEdit(before, edited)', () => {
  const assumed = ['brief.loading', 'brief.road.endLevelM', 'brief.road.startLevelM'];
  const open: Study = {
    ...study,
    assumed,
    decision: {
      ...draftDecision(appraisal, leader.number, ['load standard', 'level of the road']),
      dissent: '',
      author: '',
      date: '',
      issued: null,
    },
  };
  const questions = ({ decision }: Study): readonly string[] => decision!.questions;
  const level = 'Start value not confirmed: level of the road.';
  const raised = (from: Study, key: 'startLevelM' | 'endLevelM'): Study => ({
    ...from,
    brief: { ...from.brief, road: { ...from.brief.road, [key]: from.brief.road[key] + 0.5 } },
  });

  it('takes a question out of the draft once none of its figures is a start value any more', () => {
    const half = afterEdit(open, raised(open, 'startLevelM'));
    expect(half.assumed).toEqual(['brief.loading', 'brief.road.endLevelM']);
    expect(questions(half)).toEqual(questions(open));
    const whole = afterEdit(half, raised(half, 'endLevelM'));
    expect(whole.assumed).toEqual(['brief.loading']);
    expect(questions(whole)).toEqual(questions(open).filter((words) => words !== level));
    const agreed = afterEdit(open, confirmed(open, ['brief.road']));
    expect(questions(agreed)).toEqual(questions(whole));
  });

  it('goes on asking of a start value whose obstacle has another name', () => {
    const named: Study = {
      ...open,
      assumed: ['brief.obstacles.0.fromM'],
      decision: {
        ...open.decision!,
        questions: [`Start value not confirmed: width of ${study.brief.obstacles[0]!.name}.`],
      },
    };
    const [first, ...others] = named.brief.obstacles;
    const turned = { ...named.brief, obstacles: [{ ...first!, name: 'the Mill Beck' }, ...others] };
    expect(questions(afterEdit(named, { ...named, brief: turned }))).toEqual([
      'Start value not confirmed: width of the Mill Beck.',
    ]);
  });

  it('leaves a question that people have written over, and an issued decision, as they are', () => {
    const own = questions(open).map((words) => (words === level ? 'Ask the county for levels.' : words));
    const written: Study = { ...open, decision: { ...open.decision!, questions: own } };
    expect(questions(afterEdit(written, confirmed(written, assumed)))).toContain(
      'Ask the county for levels.',
    );
    const issued: Study = {
      ...open,
      decision: { ...open.decision!, issued: issuedOn('2026-03-05', appraisal) },
    };
    const later = afterEdit(issued, confirmed(issued, assumed));
    expect(later.assumed).toEqual([]);
    expect(later.decision).toEqual(issued.decision);
  });
});

describe('changedOption(decision, drafted, next)', () => {
  it('drafts anew what stood as drafted, and keeps what people have written', () => {
    const before = draftDecision(appraisal, leader.number);
    const edited: Decision = {
      ...decided(leader.number),
      reasons: ['The county prefers steel.', ...before.reasons.slice(1)],
      dropped: before.dropped.map((one) =>
        one.option === options[1]!.number ? { ...one, reason: 'Mine' } : one,
      ),
    };
    const next = draftDecision(appraisal, last.number);
    const turned = changedOption(edited, before, next);
    expect(turned.option).toBe(last.number);
    expect(turned.reasons).toEqual([...next.reasons, 'The county prefers steel.']);
    expect(turned.dropped.find(({ option }) => option === options[1]!.number)!.reason).toBe('Mine');
    expect(turned.dropped.map(({ option }) => option)).not.toContain(last.number);
    expect(turned.dropped.map(({ option }) => option)).toContain(leader.number);
    expect(turned.author).toBe('A. Mason');
  });
});

describe('an issued decision', () => {
  const issued = issuedOn('2026-03-05', appraisal);
  const decision: Decision = { ...decided(leader.number), issued };

  it('is read back as it was written, with the results of every option', () => {
    const whole: Study = { ...study, decision };
    expect(parseStudy(JSON.parse(writeStudy(whole)))).toEqual({ ok: true, value: whole });
    expect(issued.options.map(({ number, p50 }) => [number, p50])).toEqual(
      options.map(({ number, cost }) => [number, cost.p50]),
    );
    expect(issued.fingerprint).toBe(appraisal.study.fingerprint);
  });

  it('says nothing while nothing has changed, and a draft never does', () => {
    expect(sinceIssued(decision, appraisal)).toEqual([]);
    expect(sinceIssued({ ...decision, issued: null }, appraisal)).toEqual([]);
  });

  it('says both fingerprints and what its option came to then and comes to now, once the study has changed', () => {
    const dearer = { ...leader, cost: { p10: 2e7, p50: 3e7, p90: 4e7 } };
    const now = {
      ...appraisal,
      study: { ...appraisal.study, fingerprint: 'f'.repeat(64) },
      standing: { ...standing, leader: last.number },
      options: options.map((one) => (one === leader ? dearer : one)),
    };
    const said = sinceIssued(decision, now);
    expect(said[0]).toContain(`${issued.fingerprint.slice(0, 12)} then and is ffffffffffff now`);
    expect(said[1]).toBe(
      `P50 of option ${leader.number} was ${sayMoney(leader.cost.p50, currency)} then and is 30 million EUR now.`,
    );
    expect(said[2]).toBe(`Option ${leader.number} led on cost then; now option ${last.number} does.`);
  });

  it('says that its option is not worked out any more, and that another version of the tool finds otherwise', () => {
    const gone = { ...appraisal, options: options.filter((one) => one !== leader) };
    expect(sinceIssued(decision, gone).join(' ')).toMatch(
      /worked out otherwise by this version of the tool\. .* is not worked out any more\./u,
    );
  });

  it('is refused where it drops the option it takes, or one twice, or has no result of it', () => {
    const places = (wrong: Decision): string[] => {
      const read = parseStudy({ ...study, decision: wrong });
      return read.ok ? [] : read.problems.map(({ path }) => path.join('.'));
    };
    const [first] = decision.dropped;
    expect(places({ ...decision, dropped: [{ option: leader.number, reason: '' }] })).toEqual([
      'decision.dropped.0.option',
    ]);
    expect(places({ ...decision, dropped: [first!, first!] })).toEqual(['decision.dropped.1.option']);
    expect(places({ ...decision, option: 999 })).toEqual(['decision.option']);
  });

  it('of an earlier file, without what has been added since, is read as a draft', () => {
    const read = parseStudy({ ...study, decision: { option: 1, reasons: ['Cheapest'] } });
    expect(read.ok && read.value.decision).toEqual({
      option: 1,
      reasons: ['Cheapest'],
      dropped: [],
      questions: [],
      dissent: '',
      author: '',
      date: '',
      issued: null,
    });
  });
});
