import { spawnSync } from 'node:child_process';
import { expect, it } from 'vitest';

it('depcruise(lib, notebooks) finds no import against the layer rules and no circle', () => {
  const outcome = spawnSync('npx', ['depcruise', '--config', '.config/layers.cjs', 'lib', 'notebooks'], {
    encoding: 'utf8',
  });
  expect(outcome.stdout).toContain('no dependency violations found');
  expect(outcome.status).toBe(0);
}, 60_000);
