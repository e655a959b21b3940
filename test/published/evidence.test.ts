import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import sources from '../../data/sources.json' with { type: 'json' };
import { evidence, evidenceFileNames, evidenceRows } from '../../lib/evidence/index.ts';

/** Every row of data/evidence names its source; ours is worked out here and compared within the row's tolerance. */
const lines = evidence();

describe('evidence()', () => {
  for (const line of lines.filter((each) => each.within !== null)) {
    it(`${line.id} ${line.figure} agrees with ${line.source} (${line.read ? 'read' : 'not read'})`, () => {
      expect(line.within, `published ${line.published} ${line.unit}, ours ${line.ours}`).toBe(true);
    });
  }

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
