import { ofElement } from '../concrete-box/boxConcrete.ts';
import { boxData } from '../concrete-box/boxData.ts';
import { roundUp } from '../concrete-box/boxModel.ts';
import { thicker } from '../concrete-box/sizeBox.ts';
import type { Thicknesses } from '../concrete-box/sectionsAlong.ts';
import { webNeeded, webShear, type WebUse } from '../concrete-box/webShear.ts';
import type { CantileverModel } from './cantileverModel.ts';
import { findStrands, type FoundStrands } from './findStrands.ts';
import { haunchedBending, zonesM, type HaunchedBending } from './haunchedBending.ts';
import { haunchedShear, webDuctM, type HaunchedShear } from './haunchedShear.ts';
import {
  haunchedSections,
  slabShare,
  webShareAtEnd,
  webShareOnArm,
  type HaunchedSections,
} from './sectionsAlong.ts';
import { stagedWeight, type StagedWeight } from './stages.ts';
import { haunchedStresses, type HaunchedStresses } from './stresses.ts';

/** A haunched box with its thicknesses, tendons and stirrups. */
export interface SizedHaunched {
  readonly thicknesses: Thicknesses;
  readonly sections: HaunchedSections;
  readonly weight: StagedWeight;
  readonly found: FoundStrands;
  readonly bending: HaunchedBending;
  readonly stresses: HaunchedStresses;
  readonly shear: HaunchedShear;
  /** Use of the outer web, by element. */
  readonly webs: readonly WebUse[];
}

/** A box whose ultimate bending is not yet worked out. */
type Unbent = Omit<SizedHaunched, 'bending'>;

const mostPasses = 12;
/** Thickening away from the pier counts towards the pier slab only where enough of it is left. */
const leastShare = 0.2;

/**
 * Starts from the practical minima (or a box found before) and thickens what is too weak until everything holds: bottom
 * slab by compression in all stages and by the zone of ultimate bending, webs by shear with torsion. Weight, stages,
 * tendons and creep follow each time.
 */
export function sizeHaunched(model: CantileverModel, start: SizedHaunched | null): SizedHaunched {
  let thicknesses: Thicknesses = start?.thicknesses ?? {
    webM: model.leastWebM,
    supportWebM: model.leastWebM,
    bottomM: model.leastBottomM,
    pierBottomM: model.leastBottomM,
  };
  let found: FoundStrands | null = null;
  for (let pass = 1; ; pass++) {
    const box = workOut(model, thicknesses, found);
    const grown = grow(model, box);
    if (pass >= mostPasses || grown === thicknesses)
      return { ...box, bending: haunchedBending(model, box.sections, box.weight, box.found) };
    thicknesses = grown;
    found = box.found;
  }
}

function workOut(model: CantileverModel, thicknesses: Thicknesses, before: FoundStrands | null): Unbent {
  const sections = haunchedSections(model, thicknesses);
  const weight = stagedWeight(model, sections);
  const found = findStrands(model, sections, weight, before);
  const shear = haunchedShear(model, sections, weight, found);
  return {
    thicknesses,
    sections,
    weight,
    found,
    stresses: haunchedStresses(model, sections, weight, found),
    shear,
    webs: shear.demands.map((demand, e) =>
      webShear(ofElement(model, e), webOf(sections, e), webDuctM(), demand),
    ),
  };
}

/** Web thickness in the middle of an element, m. */
function webOf(sections: HaunchedSections, element: number): number {
  return (sections.webM[element]! + sections.webM[element + 1]!) / 2;
}

/** Thicker where needed; the same object where nothing is too weak or nothing more can be done. */
function grow(model: CantileverModel, box: Unbent): Thicknesses {
  const t = box.thicknesses;
  const { sections, stresses } = box;
  const zones = zonesM(model, sections, box.weight, box.found);
  let { webM, supportWebM, bottomM, pierBottomM } = t;
  const mostBottomM = roundUp(model.mostBottomM);
  const slab = (needM: number): number => Math.min(mostBottomM, roundUp(needM));
  for (let i = 0; i < sections.areaM2.length; i++) {
    const now = sections.bottomM[i]!;
    const use = stresses.soffitUse[i]!;
    const need = Math.max(zones[i]!, use > 1 ? thicker(now, use) : 0);
    if (!(need > now + 1e-6)) continue;
    const share = model.armAt[i]! >= 0 ? slabShare(model.way[i]!) : 0;
    if (share < leastShare) bottomM = Math.max(bottomM, slab(need));
    else pierBottomM = Math.max(pierBottomM, slab(t.bottomM + (need - t.bottomM) / share));
  }
  pierBottomM = Math.max(pierBottomM, bottomM);

  const most = boxData.webMostM.value;
  const webShare = (i: number): number =>
    Math.max(model.armAt[i]! >= 0 ? webShareOnArm(model.way[i]!) : 0, webShareAtEnd(model, i));
  box.shear.demands.forEach((demand, e) => {
    const now = webOf(sections, e);
    const need = Math.min(most, webNeeded(ofElement(model, e), now, webDuctM(), demand));
    if (!(need > now + 1e-9)) return;
    const share = (webShare(e) + webShare(e + 1)) / 2;
    if (share < leastShare) webM = Math.max(webM, roundUp(need));
    else supportWebM = Math.max(supportWebM, Math.min(most, roundUp(t.webM + (need - t.webM) / share)));
  });
  supportWebM = Math.max(supportWebM, webM);
  const same =
    webM === t.webM &&
    supportWebM === t.supportWebM &&
    bottomM === t.bottomM &&
    pierBottomM === t.pierBottomM;
  return same ? t : { webM, supportWebM, bottomM, pierBottomM };
}
