import { ofElement } from '../concrete-box/boxConcrete.ts';
import { boxData } from '../concrete-box/boxData.ts';
import { roundUp } from '../concrete-box/boxModel.ts';
import { thicker } from '../concrete-box/sizeBox.ts';
import { webNeeded, webShear, type WebUse } from '../concrete-box/webShear.ts';
import type { CantileverModel } from './cantileverModel.ts';
import { findStrands, type FoundStrands } from './findStrands.ts';
import { haunchedBending, zonesM, type HaunchedBending } from './haunchedBending.ts';
import { haunchedShear, webDuctM, type HaunchedShear } from './haunchedShear.ts';
import {
  haunchedSections,
  middleOf,
  slabShare,
  startThicknesses,
  webShareAtEnd,
  webShareOnArm,
  type HaunchedSections,
  type HaunchedThicknesses,
  type MiddleThicknesses,
} from './sectionsAlong.ts';
import { stagedWeight, type StagedWeight } from './stages.ts';
import { haunchedStresses, type HaunchedStresses } from './stresses.ts';

/** A haunched box with its thicknesses, tendons and stirrups. */
export interface SizedHaunched {
  readonly thicknesses: HaunchedThicknesses;
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
  let thicknesses = start?.thicknesses ?? startThicknesses(model);
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

function workOut(
  model: CantileverModel,
  thicknesses: HaunchedThicknesses,
  before: FoundStrands | null,
): Unbent {
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
function grow(model: CantileverModel, box: Unbent): HaunchedThicknesses {
  const t = box.thicknesses;
  const { sections, stresses } = box;
  const zones = zonesM(model, sections, box.weight, box.found);
  let { supportWebM, pierBottomM } = t;
  // What a span asks for: its own where it holds an arm down, else that of all others.
  const webs = model.task.spansM.map((_, span) => middleOf(t, span).webM);
  const bottoms = model.task.spansM.map((_, span) => middleOf(t, span).bottomM);
  const mostBottomM = roundUp(model.mostBottomM);
  const slab = (needM: number): number => Math.min(mostBottomM, roundUp(needM));
  const { supportAt } = model.beam;
  let span = 0;
  for (let i = 0; i < sections.areaM2.length; i++) {
    if (i > supportAt[span + 1]!) span++;
    const now = sections.bottomM[i]!;
    const use = stresses.soffitUse[i]!;
    const need = Math.max(zones[i]!, use > 1 ? thicker(now, use) : 0);
    if (!(need > now + 1e-6)) continue;
    const share = model.armAt[i]! >= 0 ? slabShare(model.way[i]!) : 0;
    const { bottomM } = middleOf(t, span);
    if (share < leastShare) bottoms[span] = Math.max(bottoms[span]!, slab(need));
    else pierBottomM = Math.max(pierBottomM, slab(bottomM + (need - bottomM) / share));
  }

  const most = boxData.webMostM.value;
  const webShare = (i: number): number =>
    Math.max(model.armAt[i]! >= 0 ? webShareOnArm(model.way[i]!) : 0, webShareAtEnd(model, i));
  span = 0;
  box.shear.demands.forEach((demand, e) => {
    if (e >= supportAt[span + 1]!) span++;
    const now = webOf(sections, e);
    const need = Math.min(most, webNeeded(ofElement(model, e), now, webDuctM(), demand));
    if (!(need > now + 1e-9)) return;
    const share = (webShare(e) + webShare(e + 1)) / 2;
    const { webM } = middleOf(t, span);
    if (share < leastShare) webs[span] = Math.max(webs[span]!, roundUp(need));
    else supportWebM = Math.max(supportWebM, Math.min(most, roundUp(webM + (need - webM) / share)));
  });
  // Arms that balance each other weigh the same: their spans have the same thicknesses.
  for (const values of [webs, bottoms]) evenOut(model, t, values);
  const common = (values: readonly number[], known: number): number =>
    Math.max(known, ...values.filter((_, k) => t.holding[k] === null));
  const grown: HaunchedThicknesses = {
    webM: common(webs, t.webM),
    supportWebM: Math.max(supportWebM, ...webs),
    bottomM: common(bottoms, t.bottomM),
    pierBottomM: Math.max(pierBottomM, ...bottoms),
    holding: t.holding.map((own, k) => own && { webM: webs[k]!, bottomM: bottoms[k]! }),
  };
  const alike = (a: MiddleThicknesses | null, b: MiddleThicknesses | null): boolean =>
    a?.webM === b?.webM && a?.bottomM === b?.bottomM;
  const same =
    alike(grown, t) &&
    grown.supportWebM === t.supportWebM &&
    grown.pierBottomM === t.pierBottomM &&
    grown.holding.every((own, k) => alike(own, t.holding[k]!));
  return same ? t : grown;
}

/** Raises what holding spans ask for to that of the other side of a pier whose arms balance each other. */
function evenOut({ arms, anchors }: CantileverModel, t: HaunchedThicknesses, values: number[]): void {
  const balanced = arms.filter(
    ({ side, span, support }) =>
      side < 0 &&
      t.holding[span] !== null &&
      t.holding[span + 1] !== null &&
      !anchors.some((anchor) => anchor.support === support),
  );
  for (const ordered of [balanced, [...balanced].reverse()])
    for (const { span } of ordered)
      values[span] = values[span + 1] = Math.max(values[span]!, values[span + 1]!);
}
