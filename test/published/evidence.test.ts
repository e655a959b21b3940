import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import sources from '../../data/sources.json' with { type: 'json' };
import {
  evidence,
  evidenceFileNames,
  evidenceRows,
  isUnexplained,
  summary,
} from '../../lib/evidence/index.ts';

/**
 * Every row of data/evidence names its source; ours is worked out here and compared within the row's tolerance. What lies
 * outside must have its cause beside it.
 */
const lines = evidence();

describe('evidence()', () => {
  for (const line of lines.filter((each) => each.within !== null)) {
    const source = `${line.source} (${line.read ? 'read' : 'not read'})`;
    it(`${line.id} ${line.figure} agrees with ${source} or has its cause`, () => {
      expect(isUnexplained(line), `published ${line.published} ${line.unit}, ours ${line.ours}`).toBe(false);
    });
  }

  it('lets only quantities lie outside their tolerance', () => {
    const outside = lines.filter((line) => line.within === false);
    expect(outside.filter((line) => line.kind === 'mechanics').map((line) => line.id)).toEqual([]);
  });

  it('has the cause of the worst case of every subject', () => {
    const silent = summary(lines).filter(({ worst }) => worst === null || worst.cause === null);
    expect(silent.map(({ subject, worst }) => `${subject}: ${worst?.id}`)).toEqual([]);
  });

  it('gives every designed example and built bridge a tolerance no wider than its kind may have', () => {
    const widest = { designed: 0.25, built: 0.3 };
    const wide = evidenceRows().filter(
      ({ kind, tolerance }) =>
        (kind === 'designed' || kind === 'built') && (tolerance === null || tolerance > widest[kind]),
    );
    expect(wide.map((row) => row.id)).toEqual([]);
  });

  it('reads every file of data/evidence', () => {
    const files = readdirSync(new URL('../../data/evidence', import.meta.url)).filter((name) =>
      name.endsWith('.json'),
    );
    expect(files.sort()).toEqual(evidenceFileNames().sort());
  });

  it('cites only sources of the bibliography', () => {
    const known = new Set(sources.sources.map((source) => source.id));
    expect(
      evidenceRows()
        .filter((row) => !known.has(row.source))
        .map((row) => `${row.id}: ${row.source}`),
    ).toEqual([]);
  });

  it('gives every row its own id', () => {
    const ids = evidenceRows().map((row) => row.id);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('says why wherever a row is only shown', () => {
    const silent = evidenceRows().filter((row) => row.tolerance === null && row.note === undefined);
    expect(silent.map((row) => row.id)).toEqual([]);
  });
});
