import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  lineBeam,
  momentInfluence,
  pointLoads,
  reactionInfluence,
  settle,
  stepped,
} from '../../lib/mechanics/index.ts';
import { denseBeam } from './denseBeam.ts';

/** Random beams with a stiffness for every span, springs and settlements, solved again with the dense matrices of ml-matrix. */
const beams = fc.record({
  spansM: fc.array(fc.double({ min: 5, max: 90, noNaN: true }), { minLength: 1, maxLength: 6 }),
  ei: fc.array(fc.double({ min: 1e5, max: 1e7, noNaN: true }), { minLength: 6, maxLength: 6 }),
  w: fc.array(fc.double({ min: 0, max: 200, noNaN: true }), { minLength: 6, maxLength: 6 }),
  settlementM: fc.array(fc.double({ min: -0.02, max: 0.02, noNaN: true }), { minLength: 7, maxLength: 7 }),
  springAt: fc.double({ min: 0.1, max: 0.9, noNaN: true }),
  springKNPerM: fc.double({ min: 0, max: 5e4, noNaN: true }),
  loadAt: fc.double({ min: 0.01, max: 0.99, noNaN: true }),
});

type Case = typeof beams extends fc.Arbitrary<infer T> ? T : never;

function both(random: Case) {
  const ends: number[] = [];
  random.spansM.reduce((sum, span) => {
    ends.push(sum + span);
    return sum + span;
  }, 0);
  const lengthM = ends[ends.length - 1]!;
  const spanAt = (x: number): number =>
    Math.max(
      0,
      ends.findIndex((end) => x < end),
    );
  const springX = random.springAt * lengthM;
  const beam = lineBeam({
    spansM: random.spansM,
    eiKNm2: (x) => random.ei[x >= lengthM ? random.spansM.length - 1 : spanAt(x)]!,
    springs: [{ xM: springX, kNPerM: random.springKNPerM }],
    stationsPerSpan: 8,
  });
  const xM = [...beam.xM];
  const middles = xM.slice(1).map((x, e) => (x + xM[e]!) / 2);
  const oracle = {
    xM,
    ei: middles.map((x) => random.ei[spanAt(x)]!),
    supports: [...beam.supportAt],
    springs: [{ node: beam.springAt[0]!, kNPerM: random.springKNPerM }],
    nodeKN: xM.map(() => 0),
    elementKNm: middles.map(() => 0),
    settlementM: [] as number[],
  };
  return { beam, oracle, middles, spanAt, lengthM };
}

/** Equal to a millionth of the largest value in the list; values below a tenth are measured against a tenth. */
function close(ours: ArrayLike<number>, theirs: readonly number[]): void {
  const scale = Math.max(0.1, ...theirs.map(Math.abs));
  const worst = Math.max(...theirs.map((value, i) => Math.abs(value - ours[i]!)));
  expect(worst / scale).toBeLessThan(1e-6);
}

describe('lineBeam() beside dense matrices', () => {
  it('agrees on moments, deflections and reactions under loads by element', () => {
    fc.assert(
      fc.property(beams, (random) => {
        const { beam, oracle, middles, spanAt } = both(random);
        const elementKNm = middles.map((x) => random.w[spanAt(x)]!);
        const ours = stepped(beam, Float64Array.from(elementKNm));
        const theirs = denseBeam({ ...oracle, elementKNm });
        close(ours.momentKNm, theirs.moment);
        close(
          ours.deflectionM.map((v) => 1e6 * v),
          theirs.deflection.map((v) => 1e6 * v),
        );
        close(ours.reactionKN, theirs.reaction);
      }),
      { seed: 11, numRuns: 60 },
    );
  });

  it('agrees on settlements of the supports', () => {
    fc.assert(
      fc.property(beams, (random) => {
        const { beam, oracle } = both(random);
        const settlementM = random.settlementM.slice(0, beam.supportAt.length);
        const theirs = denseBeam({ ...oracle, settlementM });
        const ours = settle(beam, settlementM);
        close(ours.momentKNm, theirs.moment);
        close(ours.reactionKN, theirs.reaction);
      }),
      { seed: 12, numRuns: 60 },
    );
  });

  it('agrees on influence lines of moments and reactions', () => {
    fc.assert(
      fc.property(beams, (random) => {
        const { beam, oracle } = both(random);
        const node = Math.max(1, Math.floor(random.loadAt * (beam.xM.length - 1)));
        const theirs = denseBeam({ ...oracle, nodeKN: oracle.nodeKN.map((_, i) => (i === node ? 1 : 0)) });
        close(
          Array.from(beam.xM, (_, s) => momentInfluence(beam, s)[node]!),
          theirs.moment,
        );
        close(
          beam.supportAt.map((_, j) => reactionInfluence(beam, j)[node]!),
          theirs.reaction,
        );
      }),
      { seed: 13, numRuns: 40 },
    );
  });

  it('agrees on a load between stations, for which the oracle gets a node', () => {
    fc.assert(
      fc.property(beams, (random) => {
        const { beam, oracle, spanAt, lengthM } = both(random);
        const at = random.loadAt * lengthM;
        const xM = [...oracle.xM, at].sort((a, b) => a - b);
        const nodeOf = (station: number): number => xM.indexOf(oracle.xM[station]!);
        const theirs = denseBeam({
          xM,
          ei: xM.slice(1).map((x, e) => random.ei[spanAt((x + xM[e]!) / 2)]!),
          supports: oracle.supports.map(nodeOf),
          springs: [{ node: nodeOf(beam.springAt[0]!), kNPerM: random.springKNPerM }],
          nodeKN: xM.map((x) => (x === at ? 100 : 0)),
          elementKNm: xM.slice(1).map(() => 0),
          settlementM: [],
        });
        const ours = pointLoads(beam, [{ xM: at, loadKN: 100 }]);
        close(
          ours.momentKNm,
          oracle.xM.map((_, s) => theirs.moment[nodeOf(s)]!),
        );
        close(ours.reactionKN, theirs.reaction);
      }),
      { seed: 14, numRuns: 60 },
    );
  });
});
