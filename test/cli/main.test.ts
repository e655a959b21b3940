import { describe, expect, it } from 'vitest';
import { command } from './run.ts';

describe('npm run, as a user runs it', () => {
  it('guide prints JSON on standard output alone and leaves with 0', () => {
    const { out, err, code } = command('guide', '--span 120 --width 12');
    expect({ err, code }).toEqual({ err: '', code: 0 });
    expect(JSON.parse(out)).toMatchObject({ span: 120 });
  }, 30_000);

  it('size of bad input prints its reasons on standard error alone and leaves with 2', () => {
    const { out, err, code } = command('size', '--form rope --spans 60 --width 12 --lanes 2');
    expect({ out, code }).toEqual({ out: '', code: 2 });
    expect(err).toContain('composite-i');
  }, 30_000);
});
