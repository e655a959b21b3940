import { describe, expect, it } from 'vitest';
import { formIds, methodIds } from '../../lib/model/index.ts';
import {
  evaluate,
  factDictionary,
  rules,
  rulesFor,
  withRatios,
  wholeCondition,
  type Condition,
} from '../../lib/rules/index.ts';
import { checkBook } from '../../lib/rules/checkBook.ts';
import { factsIn } from '../../lib/rules/limitsOn.ts';
import type { Rule } from '../../lib/rules/index.ts';

const words = { true: 'applies', false: 'does not apply', unknown: 'unknown' } as const;

describe('rules of data/rules', () => {
  it.each(rules.map((rule) => [rule.id, rule] as const))('%s agrees with its own examples', (_id, rule) => {
    for (const { given, expect: expected } of rule.examples) {
      const { truth } = evaluate(wholeCondition(rule), withRatios(given));
      expect(words[`${truth}`], JSON.stringify(given)).toBe(expected);
    }
  });

  it('[R18] every rule has an example to which it applies and one to which it does not', () => {
    for (const rule of rules) {
      const expected = rule.examples.map((example) => example.expect);
      expect(expected, rule.id).toContain('applies');
      expect(expected, rule.id).toContain('does not apply');
    }
  });

  it('[R8] no reason types a figure: every figure comes from a fact or a limit', () => {
    for (const rule of rules)
      for (const text of [rule.reason, rule.otherwise?.reason ?? ''])
        expect(text.replace(/\{[^}]*\}/gu, ''), rule.id).not.toMatch(/\d/u);
  });

  it('a reason names the limit of a fact only where all conditions together hold it against one', () => {
    const heldTogether = (condition: Condition, fact: string): number => {
      if ('all' in condition) return condition.all.reduce((sum, one) => sum + heldTogether(one, fact), 0);
      if ('any' in condition) return Math.max(...condition.any.map((one) => heldTogether(one, fact)));
      if ('not' in condition) return heldTogether(condition.not, fact);
      return condition.fact === fact ? 1 : 0;
    };
    for (const rule of rules)
      for (const text of [rule.reason, rule.otherwise?.reason ?? ''])
        for (const [, fact] of text.matchAll(/\{limit:(\w+)\}/gu))
          expect(heldTogether(rule.condition, fact!), `${rule.id}: ${fact}`).toBe(1);
  });

  it('reasons avoid words that promise', () => {
    for (const rule of rules)
      expect(`${rule.title} ${rule.reason}`, rule.id).not.toMatch(
        /\b(score|optimal|smart|AI|guaranteed|dashboard)\b/iu,
      );
  });

  it('optional minimum depths never put anything out', () => {
    const guidance = rules.filter(({ sources }) => sources.includes('aashto-lrfd-2.5.2.6.3'));
    expect(guidance.length).toBeGreaterThan(10);
    for (const rule of guidance) expect(['to confirm', 'in favour'], rule.id).toContain(rule.effect);
  });

  it('every form has a longest and a usual span, and a published depth', () => {
    for (const form of formIds) {
      const own = rulesFor(form);
      expect(
        own.some(({ id }) => id === `${form}-span-most`),
        form,
      ).toBe(true);
      expect(
        own.some(({ id }) => id === `${form}-span-usual`),
        form,
      ).toBe(true);
      expect(
        own.some(({ subject, effect }) => subject === 'depth' && effect === 'in favour'),
        form,
      ).toBe(true);
    }
  });

  it('facts are asked at the points at which they are known', () => {
    for (const rule of rules)
      for (const id of factsIn(wholeCondition(rule))) {
        const asked = factDictionary.find((fact) => fact.id === id)?.askedOf ?? [];
        const latest = (['option', 'arrangement', 'form'] as const).find((point) =>
          rule.askedOf.includes(point),
        )!;
        expect(asked, `${rule.id}: ${id}`).toContain(latest);
      }
  });

  it('methods named in conditions exist', () => {
    const named = (node: Condition): string[] => {
      if ('all' in node) return node.all.flatMap(named);
      if ('any' in node) return node.any.flatMap(named);
      if ('not' in node) return named(node.not);
      return node.fact === 'method' && 'value' in node ? [String(node.value)] : [];
    };
    for (const method of rules.flatMap((rule) => named(wholeCondition(rule))))
      expect(methodIds).toContain(method);
  });
});

describe('checkBook(rules, facts, sources)', () => {
  const facts = new Map(factDictionary.map((fact) => [fact.id, fact]));
  const sources = new Map([['a', { id: 'a', text: 'a', read: true }]]);
  const good: Rule = {
    id: 'good',
    title: 'good',
    subject: 'span',
    askedOf: ['form'],
    forms: 'all',
    condition: { fact: 'mainSpanM', is: '>', value: 50 },
    effect: 'out',
    reason: 'needs {mainSpanM}',
    sources: ['a'],
    examples: [],
  };
  it.each<[string, Partial<Rule>, RegExp]>([
    ['an unknown fact', { condition: { fact: 'spam', is: '>', value: 1 } }, /unknown fact spam/],
    ['an unknown fact in when', { when: { fact: 'spam', is: '>', value: 1 } }, /unknown fact spam/],
    ['an unknown fact in the reason', { reason: '{spam}' }, /unknown fact spam/],
    ['an unknown fact counted in the reason', { reason: '{spam?span|spans}' }, /unknown fact spam/],
    ['a text counted in the reason', { reason: '{method?way|ways}' }, /method is counted in the reason/],
    [
      'an unknown fact in an example',
      { examples: [{ given: { spam: 1 }, expect: 'applies' }] },
      /unknown fact spam/,
    ],
    ['an unknown source', { sources: ['b'] }, /unknown source b/],
    [
      'a number held against a text',
      { condition: { fact: 'mainSpanM', is: '=', value: 'long' } },
      /held against a string/,
    ],
    ['a text in order', { condition: { fact: 'method', is: '>', value: 'launch' } }, /cannot be ordered/],
    ['a text never seen', { condition: { fact: 'continuity', is: '=', value: 'curved' } }, /never is curved/],
    ['a band of text', { condition: { fact: 'method', between: [1, 2] } }, /not a number/],
    ['a reversed band', { condition: { fact: 'mainSpanM', between: [2, 1] } }, /reversed/],
    [
      'facts of different units',
      { condition: { fact: 'pieceLengthM', is: '>', than: 'haulMassT' } },
      /differ in unit/,
    ],
    ['a limit off the step', { condition: { fact: 'mainSpanM', is: '>', value: 50.05 } }, /not a multiple/],
  ])('[R17] refuses %s', (_what, change, message) => {
    expect(() => checkBook([{ ...good, ...change }], facts, sources)).toThrow(message);
  });
  it('[R17] refuses an id used twice and passes a good book', () => {
    expect(() => checkBook([good], facts, sources)).not.toThrow();
    expect(() => checkBook([good, good], facts, sources)).toThrow(/good: id used twice/);
  });
});
