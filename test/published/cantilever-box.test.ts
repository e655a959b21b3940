import { describe, expect, it } from 'vitest';
import { cantileverBox } from '../../lib/forms/cantilever-box/index.ts';
import type { Design } from '../../lib/model/index.ts';
import { depthBand, midspanDepthBand } from '../../lib/rules/index.ts';
import { cantileverSpans, cantileverTask } from '../forms/cantilever-box/cases.ts';

const sized = new Map<number, Design>();
/** Three spans at a midspan depth of 1/35, the middle of the usual 1/30 to 1/40. */
const unit = (mainM: number): Design => {
  const known = sized.get(mainM) ?? cantileverBox.size(cantileverTask(cantileverSpans(mainM), mainM / 35));
  sized.set(mainM, known);
  return known;
};
const figure = (mainM: number, name: string): number => unit(mainM).figures[name]!;

/**
 * Laws of cantilever-built decks, from memory and never opened: SETRA guide 2003, mean thickness 0.40 + 0.0035 L m3/m2;
 * strand 0.25 to 0.40 L kg/m2 over built decks. Bands as for boxes of constant depth: 20 % for concrete, 30 % for strand
 * outside the published range.
 */
describe('cantileverBox.size() against empirical quantity laws', () => {
  it.each([70, 100, 150])('needs about the concrete of the law at %i m', (mainM) => {
    expect(Math.abs(figure(mainM, 'concreteM3M2') / (0.4 + 0.0035 * mainM) - 1)).toBeLessThan(0.2);
  });

  it('grows with the span like the law, 0.0035 m3/m2 a metre from 70 to 150 m', () => {
    const slope = (figure(150, 'concreteM3M2') - figure(70, 'concreteM3M2')) / 80;
    expect(Math.abs(slope / 0.0035 - 1)).toBeLessThan(0.2);
  });

  it.each([70, 100, 150])('needs about the strand of built decks at %i m', (mainM) => {
    const share = figure(mainM, 'strandKgM2') / mainM;
    expect(share).toBeGreaterThan(0.25 * 0.7);
    expect(share).toBeLessThan(0.4 * 1.3);
  });

  // SETRA guide 130 to 170 kg/m3, segmental decks 120 to 160; from memory.
  it.each([70, 100, 150])('needs 100 to 170 kg of bars per m3 at %i m', (mainM) => {
    expect(figure(mainM, 'barsKgM3')).toBeGreaterThan(100);
    expect(figure(mainM, 'barsKgM3')).toBeLessThan(170);
  });

  // Slab of a pier of a 120 to 150 m span about 0.8 to 1.2 m; travellers of 40 to 80 t, segments of 3 to 5 m: from memory.
  it('has the slab, travellers and segments that are built at 150 m', () => {
    expect(figure(150, 'bottomSlabAtPiersM')).toBeGreaterThan(0.7);
    expect(figure(150, 'bottomSlabAtPiersM')).toBeLessThan(1.3);
    expect(figure(150, 'travellerKN')).toBeLessThanOrEqual(800);
    expect(figure(150, 'segmentM')).toBeGreaterThanOrEqual(3);
    expect(figure(150, 'segmentM')).toBeLessThanOrEqual(5);
  });
});

describe('how far a cantilevered box reaches', () => {
  // Usual to 150 m, longest built 301 m with light concrete in the middle (published, read): 150 m in C50 must hold.
  it('holds at 150 m', () => {
    expect(unit(150).limitingCheck.utilisation).toBeLessThanOrEqual(1.0001);
  });

  // Gateway bridge at Brisbane, 145-260-145 m in ordinary concrete: from memory.
  it('holds at 260 m, as the longest of ordinary concrete of its day did', () => {
    const design = cantileverBox.size(cantileverTask([145, 260, 145], 260 / 45));
    expect(design.limitingCheck.utilisation).toBeLessThanOrEqual(1.0001);
  });

  it('is refused at 400 m in C50, with the stress over the pier and nine tenths of the moment its own weight', () => {
    const design = unit(400);
    expect(design.limitingCheck.utilisation).toBeGreaterThan(1.5);
    const soffit = design.checks.find(({ id }) => id === 'compression-piers')!;
    expect(soffit.utilisation).toBeGreaterThan(1);
    expect(soffit.unit).toBe('MPa');
    expect(design.ownWeightShare).toBeGreaterThan(0.85);
    expect(design.warnings.some((text) => /Compression of the soffit at the piers: \d+ %/u.test(text))).toBe(
      true,
    );
  });

  // A bare cantilever has w a2 / 2 at the pier, a fixed span w L2 / 12: 1.5 times as much; the haunch brings both closer
  // to the pier. From statics.
  it('hogs more while it is built than a deck struck at once', () => {
    const { figures } = unit(100);
    const ratio = figures.pier1OpenKNm! / figures.pier1AtOnceKNm!;
    expect(ratio).toBeGreaterThan(1.1);
    expect(ratio).toBeLessThan(1.6);
  });
});

/**
 * The two longest of their kind, both with lightweight concrete about the middle of the main span and ballast in side spans
 * too short to balance it. Published and read: Stolma 94-301-72 m, 9 m wide, 3.5 m deep at midspan, lightweight concrete of
 * 1,940 kg/m3 (encyclopaedia); Raftsundet 86-202-298-125 m, 224 m of lightweight concrete of 19.75 kN/m3, 60 MPa (maker of
 * its aggregate). From memory: Stolma's 184 m of it and LC60; a deck of 10.3 m with 7.5 m of carriageway. The ballast is ours.
 */
describe('the longest cantilevered boxes', () => {
  // 9.81 (oven-dry + 150 of bars) / 1000: 1790 and 1863 oven-dry.
  const stolma = (change: object = {}): Design =>
    cantileverBox.size(
      cantileverTask([94, 301, 72], 3.5, {
        widthM: 9,
        strengthMPa: 60,
        light: { densityKgM3: 1790, middleM: [0, 184, 0] },
        ballastKNm: [300, 0, 800],
        ...change,
      }),
    );
  const raftsundet = (depthM: number): Design =>
    cantileverBox.size(
      cantileverTask([86, 202, 298, 125], depthM, {
        strengthMPa: 60,
        light: { densityKgM3: 1863, middleM: [0, 0, 224, 0] },
        ballastKNm: [300, 0, 0, 100],
        deck: { ...cantileverTask([100], 3, { widthM: 10.3 }).deck, carriagewayM: 7.5, lanes: 2 },
      }),
    );

  // Our webs stand 4.7 m apart by the usual overhang: gravel of 18 kN/m3 fills the cells of the 72 m span half as much again
  // as they hold.
  it('holds with the spans of Stolma and its depth at midspan, but for the room of its ballast', () => {
    const design = stolma();
    for (const { id, utilisation } of design.checks)
      if (id !== 'ballast-room') expect(utilisation, id).toBeLessThanOrEqual(1.0001);
    expect(design.limitingCheck.id).toBe('ballast-room');
    expect(design.limitingCheck.utilisation).toBeLessThan(1.6);
    // Published 15 m over the pier is 1/20: ours is deeper and lies within the published band.
    expect(design.depthM.support).toBeLessThanOrEqual(
      depthBand('cantilever-box', 'continuous')[1] * 301 + 1e-9,
    );
  });

  // Missed: the box that was built is 7 m wide (published, read), 6.6 m between webs of 0.4 m. It is heavier, asks for more
  // ballast, and that lacks a tenth of its room; the tendons of the arms lack 3 %. Its piers are cast in and share the couple
  // (from memory), here the abutment takes it alone.
  it('comes within a tenth of holding with the box of Stolma as wide as it was built', () => {
    const built = stolma({ boxWidthM: 6.6, ballastKNm: [400, 0, 850] });
    expect(built.figures['webSpacingM']).toBe(6.6);
    for (const { id, utilisation } of built.checks)
      if (id !== 'ballast-room' && id !== 'service-top') expect(utilisation, id).toBeLessThanOrEqual(1.0001);
    expect(built.limitingCheck.id).toBe('ballast-room');
    expect(built.limitingCheck.utilisation).toBeLessThan(1.1);
    const roomOf = ({ checks }: Design): number => checks.find(({ id }) => id === 'ballast-room')!.capacity;
    expect(roomOf(built) / roomOf(stolma())).toBeGreaterThan(1.3);
  });

  it('does not hold without its ballast, nor in C50 of ordinary weight', () => {
    const bare = stolma({ ballastKNm: [0, 0, 0] });
    expect(bare.checks.find(({ id }) => id === 'hold-down')!.utilisation).toBeGreaterThan(1);
    const ordinary = stolma({ strengthMPa: 50, light: undefined });
    expect(ordinary.limitingCheck.utilisation).toBeGreaterThan(1.05);
  });

  it('holds with the spans of Raftsundet, 5 m deep at midspan (its depth was not found)', () => {
    for (const { id, utilisation } of raftsundet(5).checks)
      expect(utilisation, id).toBeLessThanOrEqual(1.0001);
  });
});

describe('depths of cantilevered boxes', () => {
  it.each([70, 100, 150])('stays inside the published band over the piers at %i m', (mainM) => {
    const [least, most] = depthBand('cantilever-box', 'continuous');
    const ratio = unit(mainM).depthM.support / mainM;
    expect(ratio).toBeGreaterThanOrEqual(least - 1e-9);
    expect(ratio).toBeLessThanOrEqual(most + 1e-9);
  });

  // Kocher valley bridge: a box cantilevered at a constant 6.5 m over 138 m; from memory.
  it('knows a constant 6.5 m over 138 m as outside both bands', () => {
    const ratio = 6.5 / 138;
    expect(ratio).toBeLessThan(depthBand('cantilever-box', 'continuous')[0]);
    expect(ratio).toBeGreaterThan(midspanDepthBand('cantilever-box')![1]);
  });
});
