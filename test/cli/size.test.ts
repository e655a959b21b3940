import { describe, expect, it } from 'vitest';
import { sizeCommand } from '../../lib/cli/size.ts';
import { answer } from './run.ts';

interface Sized {
  readonly spans: number[];
  readonly deckAreaM2: number;
  readonly perM2: Record<string, number>;
  readonly quantities: Record<string, number>;
  readonly supports: Record<string, number>;
  readonly lines: { item: string; what: string; quantity: number; unit: string; how: string }[];
  readonly checks: { id: string; utilisation: number }[];
  readonly limitingCheck: string;
  readonly depthM: { support: number; midspan: number };
  readonly warnings: string[];
}
const size = (line: string): Sized => JSON.parse(answer(sizeCommand, line).out) as Sized;

describe('size', () => {
  it('size(composite-i 60,80,60) has 190 to 255 kg/m2 of structural steel, the plates of a twin-girder deck of that span', () => {
    // Twin-girder decks of the JRC/SETRA worked-example geometry (60-80-60 m, 12 m wide, girder 2.8 m): band from
    // practice, 0.105 L^1.6 + 100 = 216 kg/m2 at 80 m (from memory) and its usual scatter.
    const sized = size('--form composite-i --spans 60,80,60 --width 12 --lanes 3 --depth 3.1');
    expect(sized.deckAreaM2).toBe(2400);
    expect(sized.perM2['structuralSteelKg']).toBeGreaterThan(190);
    expect(sized.perM2['structuralSteelKg']).toBeLessThan(255);
    expect(sized.quantities['structuralSteelKg']! / 2400).toBeCloseTo(sized.perM2['structuralSteelKg']!, 2);
    const governing = sized.checks.find((check) => check.id === sized.limitingCheck)!;
    expect(governing.utilisation).toBe(Math.max(...sized.checks.map((check) => check.utilisation)));
  });

  it('size(...) prints the take-off by part, which adds up to the quantities', () => {
    const { lines, quantities } = size(
      '--form composite-i --spans 60,80,60 --width 12 --lanes 3 --depth 3.1',
    );
    const sum = (item: string): number =>
      lines.filter((line) => line.item === item).reduce((kg, { quantity }) => kg + quantity, 0);
    expect(sum('plate-girder-steel')).toBeCloseTo(quantities['structuralSteelKg']!, -1);
    expect(sum('reinforcement')).toBeCloseTo(quantities['reinforcementKg']!, -1);
    expect(lines.map(({ what }) => what)).toContain('bottom flanges');
    for (const { unit, how } of lines) expect(unit.length * how.length).toBeGreaterThan(0);
  });

  it('size(...) without a depth finds one inside the published band', () => {
    const sized = size('--form composite-i --spans 60,80,60 --width 12 --lanes 3');
    expect(sized.depthM.midspan / 80).toBeGreaterThanOrEqual(0.032);
    expect(sized.depthM.midspan / 80).toBeLessThanOrEqual(0.05);
  });

  it('size(composite-i --haunch) is deeper over its piers than at midspan', () => {
    const sized = size('--form composite-i --spans 60,80,60 --width 12 --lanes 3 --depth 2.6 --haunch 1.5');
    expect(sized.depthM).toEqual({ support: 3.9, midspan: 2.6 });
  });

  it('size(bad input) is refused with subject, expected, received, place and remedy, exit code 2', () => {
    const printed = answer(sizeCommand, '--form composite-i --spans -60,80 --width wide --lanes 2');
    expect(printed.code).toBe(2);
    expect(printed.out).toBe('');
    expect(printed.err).toMatch(/spans: expected .* received -60,80 m \(--spans\)\. give --spans like/);
    expect(printed.err).toMatch(/width: expected .* received wide/);
  });

  it('size(--depth) has the depth asked for, or says how deep the beams make it, or is refused with what they can make', () => {
    const boxes = '--form adjacent-box --spans 25 --width 12 --lanes 2';
    const near = size(`${boxes} --depth 1.2`);
    expect(near.depthM.midspan).toBeLessThan(1.2);
    expect(near.warnings[0]).toContain(
      `1.20 m was asked for; with the beams there are it is ${near.depthM.midspan}`,
    );
    const made = size(`${boxes} --depth ${near.depthM.midspan}`).warnings;
    expect(made.filter((text) => !text.includes('outside the published band'))).toEqual([]);
    const refused = answer(sizeCommand, `${boxes} --depth 2.5`);
    expect(refused.code).toBe(2);
    const most = Number(/ to ([0-9.]+) m, received 2.5 m/.exec(refused.err)![1]);
    expect(size(`${boxes} --depth ${most}`).depthM.midspan).toBe(most);
  });

  it('size(what cannot be built) is refused with its worst check, the share of own weight and how deep it was tried', () => {
    const printed = answer(sizeCommand, '--form cantilever-box --spans 240,400,240 --width 12 --lanes 3');
    expect(printed.code).toBe(2);
    expect(printed.out).toBe('');
    expect(printed.err).toMatch(
      /^spans: expected .* received 240,400,240 m.* at \d{3} % of its limit \([0-9.e+]+ of [0-9.e+]+ \S+\)/,
    );
    expect(Number(/own weight is (\d+) %/.exec(printed.err)![1])).toBeGreaterThan(80);
    const [, most, triedTo] =
      /published band, [0-9.]+ to ([0-9.]+) m, and deeper ones beyond it to ([0-9.]+) m/.exec(printed.err)!;
    expect(Number(triedTo)).toBeGreaterThan(Number(most));
  });

  it('size(--limit) prints the span at which a limit is hit with its name, says each span it tries, and takes no depth', () => {
    const line = '--form precast-i --spans 30 --width 12 --lanes 3 --limit';
    const said: string[] = [];
    const found = JSON.parse(sizeCommand(line.split(' '), (text) => said.push(text)).out) as {
      limitingSpanM: number;
      limit: string;
      carries: { spanM: number; limitingCheck: { utilisation: number } };
      ownWeightHalfM: number | null;
    };
    expect(found.limitingSpanM).toBeGreaterThan(found.carries.spanM);
    expect(found.carries.limitingCheck.utilisation).toBeLessThanOrEqual(1.0001);
    expect(found.limit.length).toBeGreaterThan(5);
    expect(said.length).toBeGreaterThan(5);
    expect(new Set(said).size).toBe(said.length);
    expect(answer(sizeCommand, `${line} --depth 2`).err).toMatch(/^depth: expected nothing with --limit/);
  });

  it('size(--depth) that cannot carry is refused with the numbers, and one beyond the published band is said to be', () => {
    const line = '--form composite-i --spans 60,80,60 --width 12 --lanes 3';
    const refused = answer(sizeCommand, `${line} --depth 0.9`);
    expect(refused.code).toBe(2);
    expect(refused.err).toMatch(/^depth: expected .* received 0.9 m, .* at \d+ % of its limit/);
    const deep = size(`${line} --depth 9`).warnings.filter((text) =>
      text.includes('outside the published band'),
    );
    expect(deep).toHaveLength(1);
    expect(deep[0]).toMatch(/Depth 1\/8.9 of the span.* 1\/31 to 1\/20.*Source: AASHTO/);
    const within = size(`${line} --depth 3.1`).warnings.filter((text) => text.includes('published band'));
    expect(within).toEqual([]);
  });

  it.each([
    [
      'cantilever-box --spans 75,120,75 --haunch 1.2',
      /haunch: expected .*composite-i, steel-box.* cantilever-box/,
    ],
    ['half-through --spans 40 --girders 5', /girders: expected .*precast-i.* received half-through/],
    ['composite-i --spans 40 --lanes 8', /lanes: expected on 11 m between kerbs at most 4 lanes, received 8/],
    ['composite-i --spans 300 --radius 40', /radius: expected .* no full circle, 47\.7.* received 40 m/],
    [
      'composite-i --spans 3 --radius 5',
      /radius: expected more than half the deck width .*6 m, received 5 m/,
    ],
  ])('size(--form %s) is refused: it would be read by nothing or stand for no bridge', (line, said) => {
    const lanes = line.includes('--lanes') ? '' : ' --lanes 2';
    const printed = answer(sizeCommand, `--form ${line} --width 12${lanes}`);
    expect(printed.code).toBe(2);
    expect(printed.err).toMatch(said);
  });

  it('size(end spans a quarter of the main one) says that the ends lift; of end spans of three quarters it does not', () => {
    // Ends of continuous beams lift under traffic at the ultimate limit below about half of the next span (statics).
    const lifted = (spans: string): string[] =>
      size(`--form concrete-box --spans ${spans} --width 12 --lanes 2 --depth 3`).warnings.filter((text) =>
        text.includes('pulled up'),
      );
    expect(lifted('15,60,15')).toHaveLength(2);
    expect(lifted('45,60,45')).toEqual([]);
  });

  it('size(cantilever-box --light) takes lightweight concrete, strength and ballast by span', () => {
    const line = '--form cantilever-box --spans 65,110,65 --width 12 --lanes 3 --depth 3';
    const lighter = size(`${line} --strength 60 --light 1900 --light-middles 0,60,0 --ballast 30,0,30`);
    expect(lighter.quantities['prestressKg']).toBeLessThan(size(line).quantities['prestressKg']!);
  });

  it('size(cantilever-box --cast-in) takes no less strand than on bearings', () => {
    const line = '--form cantilever-box --spans 65,110,65 --width 12 --lanes 3 --depth 3';
    const castIn = size(`${line} --cast-in 1`);
    expect(castIn.quantities['prestressKg']).toBeGreaterThan(size(line).quantities['prestressKg']!);
  });

  it.each([
    ['concrete-box --spans 35,45,35 --depth 2.1', 'reinforcementKg'],
    ['truss --spans 80 --depth 1.5', 'structuralSteelKg'],
    ['half-through --spans 30 --depth 1.2', 'structuralSteelKg'],
    ['cantilever-box --spans 90,150,90 --depth 3.5', 'reinforcementKg'],
    ['steel-box --spans 60,90,60 --depth 3.5', 'structuralSteelKg'],
    ['cable-stayed --spans 80,200,80 --depth 1.9', 'structuralSteelKg'],
  ])(
    'size(%s --skew) is the same either way, and heavier than square; 0 is square to the last digit',
    (unit, of) => {
      const line = `--form ${unit} --width 12 --lanes 3`;
      expect(size(`${line} --skew 0`)).toEqual(size(line));
      expect(size(`${line} --skew -10`)).toEqual(size(`${line} --skew 10`));
      expect(size(`${line} --skew 10`).quantities[of]).toBeGreaterThan(size(line).quantities[of]!);
    },
  );

  it('size(portal-frame --skew) has longer walls, and says what it leaves out of its deck', () => {
    const line = '--form portal-frame --spans 18 --width 12 --lanes 3 --depth 0.9';
    const concrete = (flags: string): number => size(line + flags).supports['concreteM3']!;
    expect(concrete(' --skew 20')).toBeGreaterThan(concrete(''));
    expect(size(`${line} --skew 20`).warnings.join(' ')).toContain('obtuse corners');
  });

  it.each([['--form slab --skew 61', /skew: expected .* at most 60 degrees, received 61/]])(
    'size(%s) is refused',
    (line, told) => {
      expect(answer(sizeCommand, `${line} --spans 20 --width 12 --lanes 3`).err).toMatch(told);
    },
  );

  it.each([
    ['--light-middles 0,20,0', /light: expected .*--light/],
    ['--light 900 --light-middles 0,20,0', /light: expected 1400 to 2200 kg\/m3/],
    ['--light 1900 --light-middles 0,120,0', /light-middles, entry 2: expected 0 to 110 m, received 120 m/],
    ['--ballast 30,30', /ballast: expected a number for each of 3 spans/],
    ['--ballast 30,x,30', /ballast: expected a number for each span/],
    ['--strength 900', /strength: expected 20 to 90 MPa, received 900 MPa/],
    ['--cast-in 3', /cast-in: expected 1 to 2, whole piers .*received 3/],
    ['--cast-in 1.5', /cast-in: expected a whole number above 0/],
    ['--box-width 11.5', /box-width: expected 2.5 to 11.1 m, received 11.5 m/],
  ])('size(cantilever-box %s) is refused', (flags, said) => {
    const line = `--form cantilever-box --spans 65,110,65 --width 12 --lanes 3 --depth 3 ${flags}`;
    const printed = answer(sizeCommand, line);
    expect(printed.code).toBe(2);
    expect(printed.err).toMatch(said);
  });

  it('size(composite-i --ballast) names the forms that read it', () => {
    const line = '--form composite-i --spans 60,80,60 --width 12 --lanes 3 --depth 3 --ballast 1,1,1';
    expect(answer(sizeCommand, line).err).toMatch(/concrete-box, cantilever-box/);
  });

  it('size(form nobody knows) names the forms there are', () => {
    const printed = answer(sizeCommand, '--form rope --spans 60 --width 12 --lanes 2');
    expect(printed.code).toBe(2);
    expect(printed.err).toContain('composite-i');
  });
});
