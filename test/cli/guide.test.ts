import { describe, expect, it } from 'vitest';
import { guideCommand } from '../../lib/cli/guide.ts';
import { answer } from './run.ts';

const run = (line: string) => answer(guideCommand, line);

describe('guide on the command line', () => {
  it('takes the narrowest deck that carries a lane: 2.5 m between two barriers of half a metre', () => {
    expect(run('--span 30 --width 3.5').code).toBe(0);
    expect(run('--span 30 --width 3.49').code).toBe(2);
  });

  it('prints seventeen forms as JSON and leaves with 0', () => {
    const { code, out, err } = run('--span 120 --width 12 --length 400 --radius 1500');
    expect(err).toBe('');
    expect(code).toBe(0);
    const answer = JSON.parse(out) as { span: number; forms: { form: string; depthM: object }[] };
    expect(answer.span).toBe(120);
    expect(answer.forms).toHaveLength(17);
    expect(Object.keys(answer.forms[0]!.depthM)).toEqual(['support', 'midspan']);
  });
  it('gives every form its status, depths, reasons and sources, best first, and what turns it', () => {
    const { forms } = JSON.parse(run('--span 120 --width 12').out) as {
      forms: Record<string, unknown>[];
    };
    const ranks = forms.map(({ status }) => ['in', 'possible', 'out'].indexOf(String(status)));
    expect(ranks).toEqual([...ranks].sort((a, b) => a - b));
    expect(ranks[0]).toBe(0);
    for (const { flip, ...form } of forms) {
      expect(Object.keys(form)).toEqual(['form', 'status', 'depthM', 'because', 'sources']);
      expect(form['because']).toEqual(expect.arrayContaining([expect.any(String)]));
      expect(form['sources']).toEqual(expect.arrayContaining([expect.any(String)]));
      if (flip === undefined) continue;
      expect(Object.keys(flip as object)).toEqual(['fact', 'from', 'to', 'unit', 'becomes']);
      expect((flip as { becomes: string }).becomes).not.toBe(form['status']);
    }
  });
  it.each([
    ['--span -3', /span: expected a number above 0 m, received -3 m \(--span\)/],
    [
      '--span 100 --width 1',
      /width: expected a number of at least 3\.5, at most 60 m, received 1 m \(--width\)/,
    ],
    ['--span 100 --width 61', /width: expected .*at most 60 m, received 61 m/],
    ['--span 100 --length 50', /length: expected at least the span of 100 m, received 50 m \(--length\)/],
  ])('%s leaves with 2 and says why on stderr', (line, message) => {
    const { code, out, err } = run(line);
    expect(code).toBe(2);
    expect(out).toBe('');
    expect(err).toMatch(message);
  });
});
