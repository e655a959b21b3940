import { platePressedShare } from '../composite-box/stiffenedPlate.ts';
import { fatigueLimitMPa } from '../floor/fatigue.ts';
import type { BoxEffects } from './boxEffects.ts';
import { boxSection, noSection } from './boxSection.ts';
import { steelBoxData } from './steelBoxData.ts';
import type { SteelBoxModel } from './steelBoxModel.ts';

/** Shares used of the plates of one element by what asks for them; rewritten by `boxUse`. */
export interface BoxUse {
  deckSag: number;
  deckHog: number;
  bottomSag: number;
  bottomHog: number;
  /** The same while the box is built, the greatest of deck and bottom. */
  deckStage: number;
  bottomStage: number;
  fatigue: number;
  /** Design stresses, MPa: deck and bottom plate, the greatest of either sign. */
  deckMPa: number;
  bottomMPa: number;
  /** Most of the bending that the webs carry in the hogging or sagging section. */
  webShare: number;
}

export const noBoxUse = (): BoxUse => ({
  deckSag: 0,
  deckHog: 0,
  bottomSag: 0,
  bottomHog: 0,
  deckStage: 0,
  bottomStage: 0,
  fatigue: 0,
  deckMPa: 0,
  bottomMPa: 0,
  webShare: 0,
});

const section = noSection();

/** Share of yield that the bottom plate keeps where it is pressed. */
export function bottomPressedShare(model: SteelBoxModel, bottomM: number): number {
  return platePressedShare(model.field, bottomM, model.yieldMPa(bottomM));
}

/**
 * Elastic stresses at the middles of the plates at both ends of element `e`: deck pressed as ribs between crossbeams and
 * with the local stress of wheels, bottom plate pressed as a stiffened plate, webs by the share that does not buckle.
 */
export function boxUse(
  use: BoxUse,
  model: SteelBoxModel,
  effects: BoxEffects,
  e: number,
  deckM: number,
  webM: number,
  bottomM: number,
  pressed: boolean,
): BoxUse {
  const { rib, standard } = model;
  const { steel, steelBuckling } = standard.resistance;
  const fyDeck = model.yieldMPa(deckM);
  const fyBottom = model.yieldMPa(bottomM);
  const share = bottomPressedShare(model, bottomM);
  const bottomPressedMPa = share >= 1 ? fyBottom / steel : (share * fyBottom) / steelBuckling;
  const { localShare } = steelBoxData.rib;
  const strutMPa = rib.strut >= 1 ? fyDeck / steel : (rib.strut * fyDeck) / steelBuckling;
  const rangeMPa = fatigueLimitMPa(model.id, 'stiffener');
  use.deckSag = use.deckHog = use.bottomSag = use.bottomHog = use.deckStage = use.bottomStage = 0;
  use.fatigue = use.deckMPa = use.bottomMPa = use.webShare = 0;
  for (let end = 0; end < 2; end++) {
    const i = e + end;
    for (let side = -1; side <= 1; side += 2) {
      const final = side > 0 ? effects.sagKNm[i]! : -effects.hogKNm[i]!;
      const stage = side > 0 ? effects.stageSagKNm[i]! : -effects.stageHogKNm[i]!;
      if (!(final > 0 || stage > 0)) continue;
      boxSection(section, model, i, deckM, webM, bottomM, pressed, side as -1 | 1);
      const topZ = section.heightM - section.axisM;
      const perTop = topZ / section.inertiaM4 / 1e3;
      const perBottom = section.axisM / section.inertiaM4 / 1e3;
      // The bottom of the ribs lies nearer to the axis than the plate.
      const atRib = Math.max(0.5, (topZ - rib.axisM - rib.lowM) / topZ);
      const deckMPa =
        side > 0
          ? Math.min(strutMPa, (fyDeck / steel - localShare * rib.crossbeamMPa) / atRib)
          : Math.min(fyDeck / steel, (fyDeck / steel - localShare * rib.spanMPa) / atRib);
      const bottomMPa = side > 0 ? fyBottom / steel : bottomPressedMPa;
      const deck = deckMPa > 0 ? (final * perTop) / deckMPa : Infinity;
      const bottom = (final * perBottom) / bottomMPa;
      if (side > 0) {
        use.deckSag = Math.max(use.deckSag, deck);
        use.bottomSag = Math.max(use.bottomSag, bottom);
      } else {
        use.deckHog = Math.max(use.deckHog, deck);
        use.bottomHog = Math.max(use.bottomHog, bottom);
      }
      // No wheels while it is built.
      use.deckStage = Math.max(use.deckStage, (stage * perTop) / (side > 0 ? strutMPa : fyDeck / steel));
      use.bottomStage = Math.max(use.bottomStage, (stage * perBottom) / bottomMPa);
      use.deckMPa = Math.max(use.deckMPa, final * perTop);
      use.bottomMPa = Math.max(use.bottomMPa, final * perBottom);
      use.webShare = Math.max(use.webShare, section.websM4 / section.inertiaM4);
    }
    boxSection(section, model, i, deckM, webM, bottomM, pressed, 0);
    use.fatigue = Math.max(
      use.fatigue,
      (effects.rangeKNm[i]! * section.axisM) / section.inertiaM4 / 1e3 / rangeMPa,
    );
  }
  return use;
}
