import { bottomWidth } from './boxLayout.ts';
import { boxEffects, type BoxEffects } from './boxEffects.ts';
import { boxSection, noSection, type BoxPlates } from './boxSection.ts';
import { boxSteel, type BoxSteel } from './boxSteel.ts';
import { flangeNeeds, pressedZones, sizeWebs, stepped } from './sizePlates.ts';
import { steelBoxData } from './steelBoxData.ts';
import { elementsPerSpan, type SteelBoxModel } from './steelBoxModel.ts';

/** Box with its plates. */
export interface SizedSteelBox {
  readonly model: SteelBoxModel;
  readonly plates: BoxPlates;
  readonly effects: BoxEffects;
  readonly steel: BoxSteel;
}

/** Rounds of plates, weight and forces from a first guess, from the plates of a box much alike, and where weight decides most. */
const rounds = { guessed: 3, alike: 2, launched: 5 };
/** Rounds added while the box still gives too much under traffic. */
const stiffer = 4;
/** Deflection over its limit that plates are sized for. */
const aim = 0.97;

/**
 * Plates, weight and forces found in turn until they agree. Placing traffic takes most of the time: its forces are found
 * for the first plates, and for those after them where the first were a guess, as they hardly change once weight and
 * stiffness lie about right.
 */
export function sizeSteelBox(model: SteelBoxModel, before: SizedSteelBox | null): SizedSteelBox {
  let plates = before?.plates ?? guess(model);
  let steel = boxSteel(model, plates, null);
  let effects = boxEffects(model, plates, steel.ownKNm, null);
  const launched = model.task.method === 'launch';
  const last = (launched ? rounds.launched : before ? rounds.alike : rounds.guessed) - 1;
  for (let round = 0; round <= last + stiffer; round++) {
    if (round > last && !(Math.max(...effects.deflections) > 1)) break;
    const pressed = pressedZones(model, effects);
    const webM = sizeWebs(model, effects, plates);
    const leastM = bottomForStiffness(model, plates, effects);
    const needs = flangeNeeds(model, effects, { ...plates, webM, pressed }, leastM);
    plates = {
      deckM: stepped(model, needs.deck, model.task.deck.widthM),
      webM,
      bottomM: stepped(model, needs.bottom, bottomWidth(model.layout, model.pierDepthM)),
      pressed,
    };
    steel = boxSteel(model, plates, effects);
    const guessed = before === null && round === 0;
    effects = boxEffects(model, plates, steel.ownKNm, guessed ? null : effects);
  }
  return { model, plates, effects, steel };
}

function guess(model: SteelBoxModel): BoxPlates {
  const elements = model.elementM.length;
  const longest = Math.max(...model.task.spansM);
  return {
    deckM: new Float64Array(elements).fill(model.deckM),
    webM: new Float64Array(elements).fill(0.014),
    bottomM: Float64Array.from(
      model.elementDepthM,
      (depth) => steelBoxData.bottom.leastM * (1 + longest / 150) * (depth / model.task.depthM),
    ),
    pressed: new Uint8Array(elements).fill(1),
  };
}

const section = noSection();

/** Thinnest bottom plate of every span at which it is as stiff as its limit asks, m. */
function bottomForStiffness(model: SteelBoxModel, plates: BoxPlates, effects: BoxEffects): number[] {
  const { leastM, mostM } = steelBoxData.bottom;
  return effects.deflections.map((ratio, span) => {
    const station = span * elementsPerSpan + elementsPerSpan / 2;
    const inertia = (bottomM: number): number =>
      boxSection(
        section,
        model,
        station,
        plates.deckM[station]!,
        plates.webM[station]!,
        bottomM,
        plates.pressed[station] === 1,
        0,
      ).inertiaM4;
    const wanted = (ratio / aim) * inertia(plates.bottomM[station]!);
    if (inertia(leastM) >= wanted) return leastM;
    let low = leastM;
    let high = mostM;
    for (let k = 0; k < 12; k++) {
      const middle = (low + high) / 2;
      if (inertia(middle) < wanted) low = middle;
      else high = middle;
    }
    return high;
  });
}
