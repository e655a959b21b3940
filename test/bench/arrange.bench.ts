import { bench, describe } from 'vitest';
import { arrange } from '../../lib/arrange/index.ts';
import { survey } from '../../lib/site/index.ts';
import { demoRequests } from '../arrange/demoRequests.ts';
import { demoSite, type DemoZone } from '../arrange/demoSite.ts';
import { demoTable } from '../arrange/demoTable.ts';
import { lowFerry } from '../site/demoBrief.ts';

const table = demoTable((x) => 250_000 + 100_000 * Math.sin(x / 200));

/** Nineteen stretches of 15 to 50 m at uneven distances, every fourth of them soft, and a navigation opening of 60 m. */
const stretches = Array.from({ length: 19 }, (_, i): DemoZone => {
  const from = 60 + i * 150 + ((i * 37) % 60);
  return [from, from + 15 + ((i * 23) % 35)];
});
const estuary = demoSite(
  3000,
  [...stretches.filter((_, i) => i % 4 !== 3 && i !== 9), [1480, 1540]],
  stretches.filter((_, i) => i % 4 === 3),
);

describe('arrange, all forms', () => {
  const ferry = survey(lowFerry().brief);
  bench('230 m, aim 50 ms', () => {
    for (const request of demoRequests) arrange(request, ferry, table);
  });
  bench('3 km with 20 zones, aim 300 ms', () => {
    for (const request of demoRequests) arrange(request, estuary, table);
  });
});
