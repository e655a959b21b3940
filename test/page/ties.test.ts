import { describe, expect, it } from 'vitest';
import { homeOf, tiesOf } from '../../notebooks/page/ties.ts';
import type { Station } from '../../notebooks/page/ties.ts';
import { graph } from '../../notebooks/reactive/index.ts';

/** brief -> site -> (spans, ladder) -> price; site and price's helper have no station. */
function notebook() {
  const g = graph();
  const brief = g.input('brief', 1);
  const options = g.input('options', 1);
  const site = g.cell('site', { brief }, () => 1);
  const survey = g.cell('survey', { site }, () => 1);
  const spans = g.cell('spans', { survey, options }, () => 1);
  const ladder = g.cell('ladder', { site }, () => 1);
  const draws = g.cell('draws', { spans, ladder }, () => 1);
  const price = g.cell('price', { draws }, () => 1);
  const stations: Station[] = [
    { name: '1+010', shows: [brief] },
    { name: '1+020', shows: [brief, options] },
    { name: '3+010', shows: [spans], owns: [options] },
    { name: '4+010', shows: [ladder] },
    { name: '7+010', shows: [price, spans] },
  ];
  return { g, stations, usesOf: (cell: Parameters<typeof g.uses>[0]) => g.uses(cell) };
}

describe('tiesOf', () => {
  it('tiesOf(stations) looks through cells that have no station', () => {
    const { stations, usesOf } = notebook();
    const ties = tiesOf(stations, usesOf);
    expect(ties.get('4+010')).toEqual({ uses: ['1+010'], usedBy: ['7+010'] });
    expect(ties.get('7+010')).toEqual({ uses: ['3+010', '4+010'], usedBy: [] });
  });

  it('tiesOf(stations) ties a station that shows the cell of another to it', () => {
    const { stations, usesOf } = notebook();
    const ties = tiesOf(stations, usesOf);
    expect(ties.get('1+010')).toEqual({ uses: [], usedBy: ['1+020', '3+010', '4+010'] });
  });

  it('tiesOf(stations) gives a cell to the station that claims it, though another shows it first', () => {
    const { stations, usesOf } = notebook();
    expect(tiesOf(stations, usesOf).get('1+020')).toEqual({ uses: ['1+010', '3+010'], usedBy: [] });
  });

  it('tiesOf(stations) never ties a station to itself, and uses and usedBy mirror each other', () => {
    const { stations, usesOf } = notebook();
    const ties = tiesOf(stations, usesOf);
    for (const [name, { uses, usedBy }] of ties) {
      expect(uses).not.toContain(name);
      for (const other of uses) expect(ties.get(other)?.usedBy).toContain(name);
      for (const other of usedBy) expect(ties.get(other)?.uses).toContain(name);
    }
  });
});

describe('homeOf', () => {
  it('homeOf(cell) is its owner, or the first station that depends on it through cells without one', () => {
    const { stations, usesOf } = notebook();
    expect(homeOf('price', stations, usesOf)).toBe('7+010');
    expect(homeOf('options', stations, usesOf)).toBe('3+010');
    expect(homeOf('draws', stations, usesOf)).toBe('7+010');
    expect(homeOf('survey', stations, usesOf)).toBe('3+010');
    expect(homeOf('site', stations, usesOf)).toBe('3+010');
    expect(homeOf('nothing', stations, usesOf)).toBeUndefined();
  });
});
