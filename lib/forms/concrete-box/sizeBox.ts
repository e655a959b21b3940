import { boxData } from './boxData.ts';
import { ownWeight, type OwnWeight } from './boxLoads.ts';
import { roundUp, type BoxModel } from './boxModel.ts';
import { boxShear, type BoxShear } from './boxShear.ts';
import { boxCompressions, type Compressions } from './boxStress.ts';
import { findTendons, type Tendons } from './findTendons.ts';
import { launchedDeck, type LaunchedDeck } from './launchedDeck.ts';
import { sectionsAlong, type SectionsAlong, type Thicknesses } from './sectionsAlong.ts';
import { webNeeded, webShear, type WebUse } from './webShear.ts';

/** A box with its thicknesses, tendons and stirrups. */
export interface SizedBox {
  readonly thicknesses: Thicknesses;
  readonly sections: SectionsAlong;
  readonly own: OwnWeight;
  readonly launch: LaunchedDeck | null;
  readonly tendons: Tendons;
  readonly compressions: Compressions;
  readonly shear: BoxShear;
  /** Use of the outer web, by element. */
  readonly webs: readonly WebUse[];
}

const mostPasses = 14;

/**
 * Starts from the practical minima and thickens what is too weak until everything holds: webs by shear with torsion,
 * bottom slab by compression in service and at the ultimate limit. Own weight, tendons and losses follow each time.
 */
export function sizeBox(model: BoxModel): SizedBox {
  let thicknesses: Thicknesses = {
    webM: model.leastWebM,
    supportWebM: model.leastWebM,
    bottomM: model.leastBottomM,
    pierBottomM: model.leastBottomM,
  };
  let before: Tendons | null = null;
  for (let pass = 1; ; pass++) {
    const box = workOut(model, thicknesses, before);
    const grown = grow(model, box);
    const settled = before?.strandsPerWeb === box.tendons.strandsPerWeb;
    if (pass >= mostPasses || (grown === thicknesses && settled)) return box;
    thicknesses = grown;
    before = box.tendons;
  }
}

function workOut(model: BoxModel, thicknesses: Thicknesses, before: Tendons | null): SizedBox {
  const sections = sectionsAlong(model, thicknesses);
  const own = ownWeight(model, sections);
  const launch = model.task.method === 'launch' ? launchedDeck(model, sections, own) : null;
  const tendons = findTendons(model, sections, own, launch, before);
  const shear = boxShear(model, sections, own, tendons);
  const { ductM } = tendons.group;
  return {
    thicknesses,
    sections,
    own,
    launch,
    tendons,
    compressions: boxCompressions(model, sections, own, tendons),
    shear,
    webs: shear.demands.map((demand, e) => webShear(model, elementWebM(sections, e), ductM, demand)),
  };
}

/** Web thickness in the middle of an element, m. */
export function elementWebM(sections: SectionsAlong, element: number): number {
  return (sections.webM[element]! + sections.webM[element + 1]!) / 2;
}

/** Thicker where needed; the same object where nothing is too weak or nothing more can be done. */
function grow(model: BoxModel, box: SizedBox): Thicknesses {
  const t = box.thicknesses;
  const { compressions, tendons } = box;
  const hogFlange = tendons.hog.use;
  let { webM, supportWebM, bottomM, pierBottomM } = t;

  const pierUse = Math.max(compressions.pierSoffit.use, hogFlange);
  if (pierUse > 1 && model.task.spansM.length > 1)
    pierBottomM = thicker(pierBottomM, pierUse, model.mostBottomM);
  if (compressions.spanSoffit.use > 1)
    bottomM = thicker(bottomM, compressions.spanSoffit.use, model.mostBottomM);
  pierBottomM = Math.max(pierBottomM, bottomM);

  const most = boxData.webMostM.value;
  box.shear.demands.forEach((demand, e) => {
    const now = elementWebM(box.sections, e);
    const need = Math.min(most, webNeeded(model, now, tendons.group.ductM, demand));
    if (!(need > now + 1e-9)) return;
    const share = (model.supportShare[e]! + model.supportShare[e + 1]!) / 2;
    if (share < 0.3) webM = Math.max(webM, roundUp(need));
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

function thicker(nowM: number, use: number, mostM: number): number {
  return Math.max(nowM, Math.min(roundUp(mostM), roundUp(nowM * Math.min(1.6, 1 + 1.2 * (use - 1)) + 1e-3)));
}
