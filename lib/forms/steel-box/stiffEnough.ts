import { pointLoads, stepped, type LineBeam } from '../../mechanics/index.ts';
import type { BoxEffects } from './boxEffects.ts';
import { boxSection, noSection, type BoxPlates } from './boxSection.ts';
import { steelBoxData } from './steelBoxData.ts';
import { elementsPerSpan, type SteelBoxModel } from './steelBoxModel.ts';

const section = noSection();

type Flanges = Pick<BoxPlates, 'deckM' | 'bottomM'>;

/**
 * Deck and bottom plate by element, m, of a box as stiff as the deflection of its spans asks, with the least steel: where
 * both a load on the span and a unit load in its middle bend it, in proportion to the depth and the root of their product
 * (least mass at a given virtual work), on the weaker flange first and on both alike once they are equal.
 * @param now plates that the deflections of `effects` belong to
 * @param strong plates that are strong enough; returned themselves where they are stiff enough
 * @param aim deflection over its limit
 */
export function stiffEnough(
  model: SteelBoxModel,
  effects: BoxEffects,
  now: BoxPlates,
  strong: BoxPlates,
  aim: number,
): Flanges {
  const nowM4 = inertias(model, now);
  const strongM4 = inertias(model, strong);
  const wantedM4 = strongM4.slice();
  const leastShare = Math.min(...strongM4.map((m4, e) => m4 / nowM4[e]!));
  // The span that gives most first: what stiffens it stiffens its neighbours too.
  const spans = effects.deflections.map((ratio, span) => ({ ratio, span })).sort((a, b) => b.ratio - a.ratio);
  for (const { ratio, span } of spans) {
    // A span that its strong plates leave stiff enough to be sure needs no closer look.
    if (ratio <= aim * leastShare) continue;
    const work = virtualWork(effects.beam, model, span);
    const allowed = (aim / ratio) * sum(work, (w, e) => w / nowM4[e]!);
    if (sum(work, (w, e) => w / wantedM4[e]!) <= allowed) continue;
    const shape = work.map((w, e) =>
      w > 0 ? model.elementDepthM[e]! * Math.sqrt(w / model.elementM[e]!) : 0,
    );
    const most = Math.max(...shape.map((m4, e) => m4 / wantedM4[e]!));
    const stiffened = (scale: number, e: number): number =>
      Math.max(wantedM4[e]!, (scale * shape[e]!) / most);
    let low = 0;
    let high = mostStiffer;
    for (let k = 0; k < 24; k++) {
      const middle = (low + high) / 2;
      if (sum(work, (w, e) => w / stiffened(middle, e)) > allowed) low = middle;
      else high = middle;
    }
    wantedM4.set(work.map((_, e) => stiffened(high, e)));
  }
  if (wantedM4.every((wanted, e) => wanted <= noticeable * strongM4[e]!)) return strong;
  const deckM = strong.deckM.slice();
  const bottomM = strong.bottomM.slice();
  wantedM4.forEach((wanted, e) => {
    if (wanted > noticeable * strongM4[e]!) thicken(model, strong, e, wanted, deckM, bottomM);
  });
  return { deckM, bottomM };
}

/** Inertia over that of plates that are strong enough from which plates change. */
const noticeable = 1.001;
/** No plates make a box this many times stiffer than its strength asks. */
const mostStiffer = 20;

function sum(work: Float64Array, of: (work: number, e: number) => number): number {
  let total = 0;
  for (let e = 0; e < work.length; e++) total += of(work[e]!, e);
  return total;
}

/** Product of the moments of a uniform load on a span and a unit load in its middle, by element along its length, kN2 m3. */
function virtualWork(beam: LineBeam, model: SteelBoxModel, span: number): Float64Array {
  const { elementM, supportsM } = model;
  const load = new Float64Array(elementM.length);
  load.fill(1, span * elementsPerSpan, (span + 1) * elementsPerSpan);
  const laid = stepped(beam, load).momentKNm;
  const middleM = (supportsM[span]! + supportsM[span + 1]!) / 2;
  const unit = pointLoads(beam, [{ xM: middleM, loadKN: 1 }]).momentKNm;
  return elementM.map((lengthM, e) => (lengthM * (laid[e]! * unit[e]! + laid[e + 1]! * unit[e + 1]!)) / 2);
}

function inertiaOf(
  model: SteelBoxModel,
  plates: BoxPlates,
  e: number,
  deckM: number,
  bottomM: number,
): number {
  const pressed = plates.pressed[e] === 1;
  let twice = 0;
  for (let i = e; i <= e + 1; i++)
    twice += boxSection(section, model, i, deckM, plates.webM[e]!, bottomM, pressed, 0).inertiaM4;
  return twice / 2;
}

function inertias(model: SteelBoxModel, plates: BoxPlates): Float64Array {
  return plates.deckM.map((deckM, e) => inertiaOf(model, plates, e, deckM, plates.bottomM[e]!));
}

/** Thickens one element until it has the inertia wanted: share 0 to 1 fills up the weaker flange, beyond that both grow alike. */
function thicken(
  model: SteelBoxModel,
  strong: BoxPlates,
  e: number,
  wantedM4: number,
  deckM: Float64Array,
  bottomM: Float64Array,
): void {
  const deckWide = model.task.deck.widthM;
  const bottomWide = model.layout.topM - 2 * model.layout.slope * model.elementDepthM[e]!;
  const ribsM2 = (deckWide * model.rib.areaM2) / steelBoxData.rib.pitchM;
  const mostDeckM = Math.max(steelBoxData.deckPlate.mostM, strong.deckM[e]!);
  const mostBottomM = Math.max(steelBoxData.bottom.mostM, strong.bottomM[e]!);
  /** Plates of flanges that have at least `areaM2` each. */
  const platesOf = (areaM2: number): readonly [deck: number, bottom: number] => [
    Math.min(mostDeckM, Math.max(strong.deckM[e]!, (areaM2 - ribsM2) / deckWide)),
    Math.min(mostBottomM, Math.max(strong.bottomM[e]!, areaM2 / bottomWide)),
  ];
  let low = 0;
  let high = Math.max(mostDeckM * deckWide + ribsM2, mostBottomM * bottomWide);
  for (let k = 0; k < 14; k++) {
    const middle = (low + high) / 2;
    if (inertiaOf(model, strong, e, ...platesOf(middle)) < wantedM4) low = middle;
    else high = middle;
  }
  [deckM[e], bottomM[e]] = platesOf(high);
}
