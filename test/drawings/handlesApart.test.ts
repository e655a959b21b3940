import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { handles, keyedIn } from '../../notebooks/drawing/handles.ts';
import { handlesApart, type WantedPlace } from '../../notebooks/drawing/handlesApart.ts';

const sheet = { left: 0, top: 0, right: 400, bottom: 160 };

const wantedAt = (key: string, x: number, y: number, gives: 'across' | 'down' = 'down'): WantedPlace => ({
  key,
  x,
  y,
  width: 26,
  height: 26,
  gives,
  reach: [48, 48],
});

/** Those that have a place, with its middle. */
const placesOf = (wanted: readonly WantedPlace[]) => {
  const shifts = handlesApart(wanted, sheet);
  return wanted.flatMap((one) => {
    const shift = shifts.get(one.key);
    return shift ? { ...one, atX: one.x + shift[0], atY: one.y + shift[1] } : [];
  });
};

const many = fc
  .array(
    fc.record({
      x: fc.integer({ min: 0, max: 400 }),
      y: fc.integer({ min: 0, max: 160 }),
      gives: fc.constantFrom('across' as const, 'down' as const),
      isTyped: fc.boolean(),
    }),
    { maxLength: 40 },
  )
  .map((all) =>
    all.map(({ x, y, gives, isTyped }, i): WantedPlace => ({
      ...wantedAt(String(i), x, y, isTyped ? 'down' : gives),
      ...(isTyped && { width: 34, height: 24, reach: [3, 6] }),
    })),
  );

describe('handlesApart', () => {
  it('leaves a lone handle where it is', () => {
    expect(handlesApart([wantedAt('pier/1', 120.3, 70)], sheet).get('pier/1')).toEqual([0, 0]);
  });

  it('puts no target over another, off the sheet or beyond its reach', () => {
    fc.assert(
      fc.property(many, (wanted) => {
        const placed = placesOf(wanted);
        placed.forEach((a, i) => {
          expect(a.atX - a.width / 2).toBeGreaterThan(sheet.left - 0.02);
          expect(a.atX + a.width / 2).toBeLessThan(sheet.right + 0.02);
          expect(a.atY - a.height / 2).toBeGreaterThan(sheet.top - 0.02);
          expect(a.atY + a.height / 2).toBeLessThan(sheet.bottom + 0.02);
          // What is wanted over the edge of the sheet is first brought on it.
          expect(Math.abs(a.atX - a.x)).toBeLessThan(a.reach[0] + a.width / 2 + 0.02);
          expect(Math.abs(a.atY - a.y)).toBeLessThan(a.reach[1] + a.height / 2 + 0.02);
          for (const b of placed.slice(i + 1)) {
            const across = (a.width + b.width) / 2 - Math.abs(a.atX - b.atX);
            const down = (a.height + b.height) / 2 - Math.abs(a.atY - b.atY);
            expect(Math.min(across, down)).toBeLessThan(0.02);
          }
        });
      }),
      { seed: 20261203, numRuns: 300 },
    );
  });

  it('keeps those that give the same way in order beside one another', () => {
    fc.assert(
      fc.property(many, (wanted) => {
        const placed = placesOf(wanted).filter(({ gives }) => gives === 'across');
        placed.forEach((a, i) => {
          for (const b of placed.slice(i + 1)) {
            const isBeside = Math.abs(a.atY - b.atY) < (a.height + b.height) / 2 - 0.02;
            if (isBeside && a.x !== b.x) expect(Math.sign(a.atX - b.atX)).toBe(Math.sign(a.x - b.x));
          }
        });
      }),
      { seed: 20261204, numRuns: 300 },
    );
  });

  it('moves the later of two as little as it can, the way it gives', () => {
    const shifts = handlesApart([wantedAt('pier/1', 100, 70), wantedAt('obstacle/0/to', 110, 94)], sheet);
    expect(shifts.get('pier/1')).toEqual([0, 0]);
    expect(shifts.get('obstacle/0/to')).toEqual([0, 2]);
    const level = handlesApart(
      [wantedAt('depth', 100, 70, 'across'), wantedAt('clearance/0', 104, 91, 'across')],
      sheet,
    );
    expect(level.get('clearance/0')).toEqual([22, 0]);
  });

  it('says which has no free place', () => {
    const crowd = Array.from({ length: 60 }, (_, i) => wantedAt(String(i), 200, 80));
    const shifts = [...handlesApart(crowd, sheet).values()];
    // In reach are three columns; those wanted in one place stand in order downwards, so of two rows.
    expect(shifts.filter((shift) => shift !== null).length).toBe(6);
  });
});

describe('handles', () => {
  const spec = (key: string, x: number, y: number) => ({
    ...{ key, name: key, valueM: 1, leastM: 0, mostM: 2, places: 1, words: '1', x, y },
    perPx: [1, 0] as const,
  });
  const gripsOf = (piece: ReturnType<typeof handles>): (string | undefined)[] =>
    piece.children.map((child) =>
      typeof child === 'string'
        ? undefined
        : child.children.flatMap((part) =>
            typeof part !== 'string' && part.attrs['class'] === 'grip' ? [part.attrs['y']!] : [],
          )[0],
    );

  it('while one is in hand the others stay as far from what they move as before', () => {
    const specs = [spec('pier/1', 100, 70), spec('pier/2', 110, 80)];
    const rest = gripsOf(handles(specs, sheet, null, 'one'));
    expect(rest).toEqual(['57', '83']);
    const hold = { key: 'pier/1', valueM: 1, supportsM: [] };
    const away = [spec('pier/1', 300, 70), spec('pier/2', 110, 80)];
    expect(gripsOf(handles(away, sheet, hold, 'one'))).toEqual(rest);
    expect(gripsOf(handles(away, sheet, null, 'one'))).toEqual(['57', '67']);
  });

  it('names those that keys alone come to', () => {
    const crowd = Array.from({ length: 60 }, (_, i) => spec(`pier/${String(i)}`, 200, 80));
    const piece = handles(crowd, sheet, null, 'crowd');
    expect(keyedIn(piece)).toContain('pier/59');
    expect(keyedIn(handles(crowd.slice(0, 2), sheet, null, 'few'))).toEqual([]);
  });
});
