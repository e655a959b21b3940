import { concrete, loadStandard, materials, type CrossLine, type LoadStandard } from '../../actions/index.ts';
import type { Check, DeckSpec, StandardId } from '../../model/index.ts';
import { barDesignMPa, barKg } from '../common/bars.ts';
import { check } from '../common/checks.ts';
import type { SlabDesign } from '../common/slab/designSlab.ts';
import { slabData } from '../common/slab/slabData.ts';
import type { Strengths } from './bendingCapacity.ts';
import { boxData } from './boxData.ts';
import { lineReaction, worstAxles } from './strutReaction.ts';
import type { StrutPlan } from './strutPlan.ts';
import { webShear, type WebUse } from './webShear.ts';

/** Ribs across the deck under its slab: out to the edges under the wings, and from web to web in the cells. */
export interface Ribs {
  /** Along the deck, m. */
  readonly spacingM: number;
  readonly widthM: number;
  /** From the top of the slab, at the webs and inside, and at the edge of the deck, m. */
  readonly rootM: number;
  readonly edgeM: number;
  /** Below the slab, m3 and formed m2 per m of deck. */
  readonly concreteM3M: number;
  readonly formsM2M: number;
  /** Bars, kg per m of deck. */
  readonly barsKgM: number;
  /** Design effects of one rib: hogging at an outer web, sagging in a cell, kNm; shear, kN. */
  readonly rootMomentKNm: number;
  readonly insideMomentKNm: number;
  readonly shearKN: number;
  /** Stiffness across the deck of ribs and slab as the cube of the thickness of a slab as stiff, m3. */
  readonly stiffM3: number;
  readonly checks: readonly Check[];
}

/** What ribs are sized for. */
export interface RibCase {
  readonly standard: StandardId;
  readonly deck: DeckSpec;
  readonly plan: StrutPlan;
  /** Least depth of the box, m. */
  readonly depthM: number;
  /** Slab that spans from rib to rib. */
  readonly slab: Pick<SlabDesign, 'midM'>;
}

/** Characteristic effects of one rib across the deck: kNm or kN. */
interface Effect {
  readonly lasting: number;
  readonly superimposed: number;
  readonly traffic: number;
}

/**
 * Sizes the ribs: beams across the deck that the slab rests on, cantilevers beyond the outer webs and spans between webs, as
 * deep at the webs as keeps the bars of one face within the practical ratio and the stirrups within what fits.
 */
export function designRibs({ standard: id, deck, plan, depthM, slab }: RibCase): Ribs {
  const standard = loadStandard(id);
  const { spacingM, widthM, depthStepM, edgeBelowM, mostDepthM } = boxData.ribs;
  const { cells, spacingM: cellM, overhangM: wingM } = plan;
  const webM = (cells * cellM) / 2;
  const lines = crossLines(deck.widthM, webM, cellM);
  const onLine = (line: CrossLine): Effect => effectOf(id, deck, line, slab.midM, spacingM);
  const [wing, inside, wingShear, insideShear] = [
    onLine(lines.wing),
    onLine(lines.inside),
    onLine(lines.wingShear),
    onLine(lines.insideShear),
  ];
  const edgeM = slab.midM + edgeBelowM;
  const made = { concrete: concrete(id, materials.concreteDefaultMPa[id].box), standardId: id, standard };
  const at = (rootM: number) => {
    const below = rootM - slab.midM;
    const gamma = standard.unitWeights.concreteKNm3 * widthM;
    // Stem under a wing from `edgeBelowM` at the edge to `below` at the web; level in a cell.
    const ownWing = gamma * wingM ** 2 * (edgeBelowM / 2 + (below - edgeBelowM) / 6);
    const continuity = slabData.continuity.value;
    const root = ultimate(standard, wing, ownWing);
    const span = continuity * ultimate(standard, inside, (gamma * below * cellM ** 2) / 8);
    const shearKN = Math.max(
      ultimate(standard, wingShear, (gamma * wingM * (edgeBelowM + below)) / 2),
      ultimate(standard, insideShear, (gamma * below * cellM) / 2),
    );
    const effectiveM = rootM - slabData.barAxisM.value;
    const perKNm = 1 / (slabData.leverRatio.value * effectiveM * barDesignMPa(id) * 1e3);
    // Over an inner web the rib hogs as much as it sags between two.
    const topM2 = perKNm * Math.max(root, cells > 1 ? span : 0);
    const lowM2 = perKNm * span;
    const shear = stirrups(made, shearKN, effectiveM, topM2);
    return { root, span, shearKN, effectiveM, topM2, lowM2, shear };
  };
  const fits = (rootM: number): boolean => {
    const { topM2, lowM2, effectiveM, shear } = at(rootM);
    const ratio = Math.max(topM2, lowM2) / (widthM * effectiveM);
    return ratio <= slabData.steelRatioMost.value && shear.crowding <= 1 && shear.crushing <= 1;
  };
  let rootM = Math.ceil(edgeM / depthStepM - 1e-9) * depthStepM;
  while (rootM < mostDepthM - 1e-9 && !fits(rootM)) rootM += depthStepM;
  rootM = Number(rootM.toFixed(6));
  const { root, span, shearKN, effectiveM, topM2, lowM2, shear } = at(rootM);
  const below = rootM - slab.midM;
  const insideM = cells * cellM;
  const stemM2 = 2 * wingM * ((edgeBelowM + below) / 2) + insideM * below;
  const leastM2 = slabData.steelRatioLeast.value * widthM * rootM;
  const stirrupKg = barKg(shear.stirrupsM2PerM, rootM) * deck.widthM;
  const barsKg =
    barKg(Math.max(topM2, leastM2)) * (2 * wingM + 0.5 * insideM) +
    barKg(Math.max(lowM2, leastM2)) * insideM +
    barKg(leastM2) * (2 * wingM + 0.5 * insideM) +
    stirrupKg;
  return {
    spacingM,
    widthM,
    rootM,
    edgeM,
    concreteM3M: (stemM2 * widthM) / spacingM,
    formsM2M: (2 * stemM2) / spacingM,
    barsKgM: (slabData.lapAndDetail.value * barsKg) / spacingM,
    rootMomentKNm: root,
    insideMomentKNm: span,
    shearKN,
    stiffM3: slab.midM ** 3 + (widthM / spacingM) * rootM ** 3,
    checks: [
      check(
        'rib-bars',
        'ribs across the deck: bars within the practical ratio',
        Math.max(topM2, lowM2) / (widthM * effectiveM),
        slabData.steelRatioMost.value,
        '1',
      ),
      check(
        'rib-shear',
        'ribs across the deck: shear',
        shearKN,
        shearKN / Math.max(shear.crushing, shear.crowding, 1e-9),
        'kN',
      ),
      check(
        'rib-room',
        'height under the ribs inside for the forms',
        boxData.leastInnerM.value,
        Math.max(0, depthM - rootM - boxData.bottomSlab.leastM),
        'm',
      ),
    ],
  };
}

/** Influence across the deck on one rib: moment and shear at an outer web from its wing, and in the outermost cell. */
function crossLines(
  widthM: number,
  webM: number,
  cellM: number,
): Readonly<Record<'wing' | 'inside' | 'wingShear' | 'insideShear', CrossLine>> {
  const edgeM = widthM / 2;
  const innerM = webM - cellM;
  const step = 1e-3;
  return {
    wing: { yM: [-edgeM, webM, edgeM], value: [0, 0, edgeM - webM] },
    wingShear: { yM: [-edgeM, webM - step, webM, edgeM], value: [0, 0, 1, 1] },
    inside: { yM: [-edgeM, innerM, webM - cellM / 2, webM, edgeM], value: [0, 0, cellM / 4, 0, 0] },
    insideShear: { yM: [-edgeM, innerM, webM, webM + step, edgeM], value: [0, 0, 1, 0, 0] },
  };
}

function effectOf(
  id: StandardId,
  deck: DeckSpec,
  line: CrossLine,
  thicknessM: number,
  spacingM: number,
): Effect {
  const { slabKNm, superimposedKNm, trafficKNm, axleSets } = lineReaction(
    id,
    deck,
    line,
    thicknessM,
    spacingM,
  );
  const axles = worstAxles({ axleSets }, spacingM, (x) => Math.max(0, 1 - Math.abs(x) / spacingM));
  return {
    lasting: slabKNm * spacingM,
    superimposed: superimposedKNm * spacingM,
    traffic: trafficKNm * spacingM + axles,
  };
}

function ultimate({ factors: { uls } }: LoadStandard, effect: Effect, own: number): number {
  return (
    uls.permanent * (effect.lasting + own) +
    uls.superimposed * effect.superimposed +
    uls.traffic * effect.traffic
  );
}

function stirrups(made: Strengths, shearKN: number, effectiveM: number, barM2: number): WebUse {
  return webShear(made, boxData.ribs.widthM, 0, {
    shearKN,
    momentKNm: 0,
    strandM2: 0,
    barM2,
    axialMPa: 0,
    effectiveM,
    acrossKNm: 0,
  });
}
