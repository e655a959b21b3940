import { bottomWidth } from './boxLayout.ts';
import { boxEffects, type BoxEffects } from './boxEffects.ts';
import type { BoxPlates } from './boxSection.ts';
import { boxSteel, type BoxSteel } from './boxSteel.ts';
import { flangeNeeds, mostUsed, pressedZones, sizeWebs, stepped } from './sizePlates.ts';
import { steelBoxData } from './steelBoxData.ts';
import type { SteelBoxModel } from './steelBoxModel.ts';
import { stiffEnough } from './stiffEnough.ts';

/** Box with its plates. */
export interface SizedSteelBox {
  readonly model: SteelBoxModel;
  readonly plates: BoxPlates;
  readonly effects: BoxEffects;
  readonly steel: BoxSteel;
}

/** Rounds of plates, weight and forces from a first guess, from the plates of a box much alike, and where weight decides most. */
const rounds = { guessed: 3, alike: 2, launched: 5 };
/** Rounds added while the box still gives too much under traffic, or what stiffened it has drawn too much to itself. */
const stiffer = 4;
/** Deflection over its limit that plates are sized for. */
const aim = 0.97;

/**
 * Plates, weight and forces found in turn until they agree. Placing traffic takes most of the time: its forces are found
 * for the first plates, and for those after them where the first were a guess or stiffness asks for plates of its own, as
 * they hardly change otherwise.
 */
export function sizeSteelBox(model: SteelBoxModel, before: SizedSteelBox | null): SizedSteelBox {
  let plates = before?.plates ?? guess(model);
  let steel = boxSteel(model, plates, null);
  let effects = boxEffects(model, plates, steel.ownKNm, null);
  const launched = model.task.method === 'launch';
  const last = (launched ? rounds.launched : before ? rounds.alike : rounds.guessed) - 1;
  let stiffened = false;
  for (let round = 0; round <= last + stiffer; round++) {
    if (
      round > last &&
      !(Math.max(...effects.deflections) > 1 || (stiffened && mostUsed(model, effects, plates) > 1))
    )
      break;
    const pressed = pressedZones(model, effects);
    const webM = sizeWebs(model, effects, plates);
    const strong = { ...flangeNeeds(model, effects, { ...plates, webM, pressed }), webM, pressed };
    const needs = stiffEnough(model, effects, plates, strong, aim);
    plates = {
      deckM: stepped(model, needs.deckM, model.task.deck.widthM),
      webM,
      bottomM: stepped(model, needs.bottomM, bottomWidth(model.layout, model.pierDepthM)),
      pressed,
    };
    steel = boxSteel(model, plates, effects);
    const guessed = before === null && round === 0;
    stiffened = needs !== strong;
    effects = boxEffects(model, plates, steel.ownKNm, guessed || stiffened ? null : effects);
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
