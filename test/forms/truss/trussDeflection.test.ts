import { describe, expect, it } from 'vitest';
import { loadStandard, trafficOnInfluence } from '../../../lib/actions/index.ts';
import { trussDeflection } from '../../../lib/forms/truss/trussDeflection.ts';
import { trussSpan } from '../../../lib/forms/truss/trussSpan.ts';
import { trussForces } from '../../../lib/mechanics/index.ts';
import { wholeTruss } from './wholeTruss.ts';
import { floorDeck } from '../floor/cases.ts';

describe('trussDeflection(truss, standard, traffic)', () => {
  it('agrees with the displacement method on the sized members', () => {
    const span = trussSpan(90, {
      form: 'truss',
      spansM: [90],
      deck: floorDeck,
      standard: 'lm1',
      planRadiusM: Infinity,
      method: 'crane',
      depthM: 1.4,
    });
    const { geometry, members } = span.truss;
    const { truss, floorNodes } = wholeTruss(geometry, (i) => members[i]!.section.areaM2);
    const middle = floorNodes[geometry.panels / 2]!;
    const line = floorNodes.map((node) => trussForces(truss, [{ node, zKN: 1 }]).deflectionM[middle]!);
    const expected = trafficOnInfluence(span.traffic, geometry.nodesM, line).max;
    expect(geometry.panels % 2).toBe(0);
    expect(trussDeflection(span.truss, loadStandard('lm1'), span.traffic)).toBeCloseTo(expected, 8);
  });
});
