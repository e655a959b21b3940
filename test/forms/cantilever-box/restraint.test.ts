import { describe, expect, it } from 'vitest';
import { heldPier } from '../../../lib/forms/cantilever-box/heldPiers.ts';
import { cantileverBox } from '../../../lib/forms/cantilever-box/index.ts';
import { restraintOf } from '../../../lib/forms/cantilever-box/restraint.ts';
import { trafficOnDeck } from '../../../lib/actions/index.ts';
import { lineBeam } from '../../../lib/mechanics/index.ts';
import type { ShaftUnder } from '../../../lib/model/index.ts';
import { plainDeck } from '../composite-i/cases.ts';
import { cantileverTask } from './cases.ts';

const load = trafficOnDeck('lm1', plainDeck(12));

/** A deck of constant stiffness, E I = 30e6 x 10, its axis so far above its shafts, m. */
function deckOn(spansM: readonly number[], castIn: readonly number[], aboveM = 0) {
  const geometry = { spansM, eiKNm2: () => 1, stationsPerSpan: 20, extraStationsM: [] };
  const beam = lineBeam(geometry);
  const heldPiers = castIn.map((support) => heldPier(geometry, beam, support, load));
  const sections = { lowM: new Float64Array(beam.xM.length).fill(aboveM), midspan: { inertiaM4: 10 } };
  return { beam, model: { beam, heldPiers, concrete: { ecmMPa: 30_000 } }, sections };
}

const EI = 30e6 * 10;
const shaft = (support: number, more: Partial<ShaftUnder> = {}): ShaftUnder => ({
  support,
  heightM: 20,
  eiKNm2: 6e7,
  shortenedM: 0,
  cooledM: 0,
  ...more,
});
const moved = ({ shortenedM }: ShaftUnder): number => shortenedM;

describe('restraintOf()', () => {
  const b = (6 * 6e7 * 0.02) / 400;
  const s = (4 * 6e7) / 20;

  it('one shaft pushed under two even spans bends them by its couple, shared by 3 E I / l, by hand', () => {
    const { beam, model, sections } = deckOn([50, 50], [1]);
    const { leftKNm, rightKNm, pulledKN } = restraintOf(
      model,
      sections,
      [shaft(1, { shortenedM: 0.02 })],
      moved,
    );
    const k = (2 * 3 * EI) / 50;
    const couple = (b * k) / (k + s);
    const pier = beam.supportAt[1]!;
    expect(leftKNm[pier]).toBeCloseTo(-couple / 2, 3);
    expect(rightKNm[pier]).toBeCloseTo(couple / 2, 3);
    expect(rightKNm[pier + 10]).toBeCloseTo(couple / 4, 3);
    // 12 E I push / h^3 less 6 E I theta / h^2.
    const theta = couple / k;
    expect(pulledKN[pier + 1]).toBeCloseTo((12 * 6e7 * 0.02) / 8000 - (6 * 6e7 * theta) / 400, 3);
    expect(pulledKN[pier]).toBe(0);
  });

  it('two shafts drawn together under an even middle span sag it evenly, by hand', () => {
    const { beam, model, sections } = deckOn([50, 80, 50], [1, 2]);
    const both = [shaft(1, { shortenedM: 0.02 }), shaft(2, { shortenedM: -0.02 })];
    const { rightKNm, leftKNm, pulledKN } = restraintOf(model, sections, both, moved);
    // Turned alike the opposite ways: 2 E I / l of the middle span and 3 E I / l of a side span.
    const [middle, side] = [(2 * EI) / 80, (3 * EI) / 50];
    const theta = b / (middle + side + s);
    const [from, to] = [beam.supportAt[1]!, beam.supportAt[2]!];
    for (const i of [from, from + 7, to - 1]) expect(rightKNm[i]).toBeCloseTo(middle * theta, 3);
    expect(leftKNm[from]).toBeCloseTo(-side * theta, 3);
    expect(rightKNm[to]).toBeCloseTo(-side * theta, 3);
    expect(pulledKN[from + 1]).toBeCloseTo((12 * 6e7 * 0.02) / 8000 - (6 * 6e7 * theta) / 400, 3);
    expect(pulledKN.at(-1)).toBeCloseTo(0, 6);
  });

  it('counts the force of a shaft about the axis of the deck above it', () => {
    const low = deckOn([50, 80, 50], [1, 2]);
    const high = deckOn([50, 80, 50], [1, 2], 3);
    const both = [shaft(1, { shortenedM: 0.02 }), shaft(2, { shortenedM: -0.02 })];
    const at = ({ model, sections, beam }: typeof low): number =>
      restraintOf(model, sections, both, moved).rightKNm[beam.supportAt[1]! + 10]!;
    expect(at(high)).toBeGreaterThan(at(low));
  });
});

describe('a box over shafts that hold it', () => {
  const spans = [65, 110, 65];
  const sized = (shafts?: readonly ShaftUnder[]) =>
    cantileverBox.size(cantileverTask(spans, 2.8, { castInPiers: 2, ...(shafts ? { shafts } : {}) }));
  const pair = (eiKNm2: number) => [
    shaft(1, { eiKNm2, shortenedM: 0.022, cooledM: 0.02 }),
    shaft(2, { eiKNm2, shortenedM: -0.022, cooledM: -0.02 }),
  ];

  it('is what it was over shafts without stiffness, and says where they are not known', () => {
    const soft = sized(pair(1e-3));
    const unknown = sized();
    expect(soft.figures['bottomStrandMean']).toBe(unknown.figures['bottomStrandMean']);
    expect(soft.figures['pulledKN']).toBeLessThan(1e-3);
    expect(unknown.warnings.join(' ')).toMatch(/Shafts .* are not known/u);
    expect(soft.warnings.join(' ')).not.toMatch(/are not known/u);
  });

  it('takes more strand in its spans the stiffer they are', () => {
    const strands = [1e7, 6e7, 2e8].map((ei) => sized(pair(ei)).figures['bottomStrandMean']!);
    expect(strands[1]).toBeGreaterThan(strands[0]!);
    expect(strands[2]).toBeGreaterThan(strands[1]!);
    const { pulledKN, span2RestraintKNm } = sized(pair(6e7)).figures;
    expect(pulledKN).toBeGreaterThan(0);
    expect(span2RestraintKNm).toBeGreaterThan(0);
  });
});
