import { blockDepth } from './bendingCapacity.ts';
import { ofElement } from './boxConcrete.ts';
import { boxData } from './boxData.ts';
import { ownWeight, type OwnWeight } from './boxLoads.ts';
import { roundUp, type BoxModel } from './boxModel.ts';
import { boxShear, type BoxShear } from './boxShear.ts';
import { boxCompressions, type Compressions } from './boxStress.ts';
import { findTendons, type Tendons } from './findTendons.ts';
import { launchedDeck, type LaunchedDeck } from './launchedDeck.ts';
import { sectionsAlong, type SectionsAlong, type Thicknesses } from './sectionsAlong.ts';
import { ultimateMoments } from './ultimateMoments.ts';
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
    const settled = before !== null && alike(before, box.tendons);
    const grown = grow(model, box, settled);
    if (pass >= mostPasses || (grown === thicknesses && settled)) return box;
    thicknesses = grown;
    before = box.tendons;
  }
}

/** The same tendons to within a hundredth of their strands. */
function alike(a: Tendons, b: Tendons): boolean {
  return (
    a.group.tendonsPerWeb === b.group.tendonsPerWeb &&
    a.group.ductM === b.group.ductM &&
    Math.abs(a.strandsPerWeb - b.strandsPerWeb) <= 0.01 * b.strandsPerWeb
  );
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
    webs: shear.demands.map((demand, e) =>
      webShear(ofElement(model, e), elementWebM(sections, e), ductM, demand),
    ),
  };
}

/** Web thickness in the middle of an element, m. */
function elementWebM(sections: SectionsAlong, element: number): number {
  return (sections.webM[element]! + sections.webM[element + 1]!) / 2;
}

/**
 * Thicker where needed; the same object where nothing is too weak or nothing more can be done. What stresses in service ask for waits
 * until the tendons have settled. Over the piers the bottom slab holds the whole compression zone of ultimate bending.
 */
function grow(model: BoxModel, box: SizedBox, settled: boolean): Thicknesses {
  const t = box.thicknesses;
  const { compressions, tendons } = box;
  let { webM, supportWebM, bottomM, pierBottomM } = t;

  const mostBottomM = roundUp(model.mostBottomM);
  const slabFor = (nowM: number, needM: number): number =>
    Math.max(nowM, Math.min(mostBottomM, roundUp(needM)));
  if (model.task.spansM.length > 1) pierBottomM = slabFor(pierBottomM, zoneOverPiers(model, box));
  if (settled) {
    const { spanSoffit, pierSoffit } = compressions;
    if (spanSoffit.use > 1) bottomM = slabFor(bottomM, thicker(bottomM, spanSoffit.use));
    if (pierSoffit.use > 1) pierBottomM = slabFor(pierBottomM, thicker(pierBottomM, pierSoffit.use));
    pierBottomM = Math.max(pierBottomM, bottomM);
  }

  const most = boxData.webMostM.value;
  box.shear.demands.forEach((demand, e) => {
    const now = elementWebM(box.sections, e);
    const need = Math.min(most, webNeeded(ofElement(model, e), now, tendons.group.ductM, demand));
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

/** Thickness to try next where a stress is past its limit, m. */
export function thicker(nowM: number, use: number): number {
  return nowM * Math.min(1.6, 1 + 1.2 * (use - 1)) + 1e-3;
}

/** Depth of the compression zone over the piers at the ultimate limit, parasitic moment included, m. */
function zoneOverPiers(model: BoxModel, { own, tendons, sections }: SizedBox): number {
  const { up } = ultimateMoments(model, own);
  const { supportAt } = model.beam;
  const effectiveM = model.task.depthM - tendons.group.fromFaceM;
  let zoneM = 0;
  for (const station of supportAt.slice(1, -1)) {
    const parasitic = model.standard.factors.uls.prestress * tendons.forceKN * tendons.parasiticM[station]!;
    const hogging = Math.max(0, up[station]! - parasitic);
    zoneM = Math.max(zoneM, blockDepth(model, hogging, effectiveM, sections.span.bottomWidthM));
  }
  return zoneM;
}
