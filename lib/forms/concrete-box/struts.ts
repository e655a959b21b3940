import { concrete, loadStandard, materials } from '../../actions/index.ts';
import type { Check, DeckSpec, StandardId } from '../../model/index.ts';
import { barDesignMPa, barKg } from '../common/bars.ts';
import { check } from '../common/checks.ts';
import { slabData } from '../common/slab/slabData.ts';
import type { SlabDesign } from '../common/slab/designSlab.ts';
import { boxData } from './boxData.ts';
import { strutRiseM, type StrutPlan } from './strutPlan.ts';
import { strutReaction, worstAxles } from './strutReaction.ts';

/** Struts under both wings of a box and the thickening of the slab along their heads. */
export interface Struts {
  /** Along the deck, of each row, m. */
  readonly spacingM: number;
  /** From the axis of the outer web at the top to the heads, m. */
  readonly outM: number;
  /** Height, horizontal length and length of a strut, m. */
  readonly riseM: number;
  readonly runM: number;
  readonly lengthM: number;
  /** Side of its square section, m. */
  readonly sideM: number;
  /** Design force of a strut, kN. */
  readonly forceKN: number;
  /** Design load that a row hangs into its web, kN per m of deck. */
  readonly hangKNm: number;
  /** Pull of the heads across the top slab, kN per m of deck: characteristic lasting and traffic, and design. */
  readonly tie: { readonly lastingKNm: number; readonly trafficKNm: number; readonly ultimateKNm: number };
  /** Thickening along the heads: depth from the top of the slab and width, m, and bars of both, kg per m of deck. */
  readonly beamM: number;
  readonly beamWidthM: number;
  readonly beamBarsKgM: number;
  /** Bars of the struts, kg per m3 of them. */
  readonly barsKgM3: number;
  readonly checks: readonly Check[];
}

/** Height, horizontal length and length of a strut in a box of some depth and lean of its webs, m. */
export function strutShape(
  outM: number,
  depthM: number,
  slope: number,
): { readonly riseM: number; readonly runM: number; readonly lengthM: number } {
  const riseM = strutRiseM(depthM);
  const runM = outM + slope * (depthM - boxData.struts.footAboveSoffitM);
  return { riseM, runM, lengthM: Math.hypot(riseM, runM) };
}

/** Concrete of both rows where the box is `depthM` deep, m3 per m of deck; 0 without struts. */
export function strutsM3M(struts: Struts | undefined, depthM: number, slope: number): number {
  if (!struts) return 0;
  return (2 * struts.sideM ** 2 * strutShape(struts.outM, depthM, slope).lengthM) / struts.spacingM;
}

/** What struts are sized for. */
export interface StrutCase {
  readonly standard: StandardId;
  readonly deck: DeckSpec;
  readonly plan: StrutPlan;
  /** Least depth of the box, where struts are flattest, and greatest, where they are longest. */
  readonly depthM: number;
  readonly deepestM: number;
  /** Horizontal over vertical of the outer webs. */
  readonly slope: number;
  readonly slab: Pick<SlabDesign, 'midM' | 'rootM' | 'edgeM'>;
}

/**
 * Sizes a row of struts from the load on its line of heads: force by the slope of the strut, section as a slender strut of
 * concrete under that force and its own weight, slab thickened along the heads to span from strut to strut.
 */
export function designStruts({ standard: id, deck, plan, depthM, deepestM, slope, slab }: StrutCase): Struts {
  const { factors, unitWeights } = loadStandard(id);
  const { uls } = factors;
  const { spacingM, beamWidthM } = boxData.struts;
  const { riseM, runM, lengthM } = strutShape(plan.outM, depthM, slope);
  const overhangShare = plan.overhangM / (plan.overhangM + plan.outM);
  const thicknessM =
    overhangShare * ((slab.rootM + slab.edgeM) / 2) +
    (1 - overhangShare) * (slab.midM + (slab.rootM - slab.midM) / 4);
  const line = strutReaction(id, deck, plan, thicknessM, spacingM);

  const beam = designBeam(id, slab.rootM, (t) => {
    const own = unitWeights.concreteKNm3 * beamWidthM * (t - slab.rootM);
    const ultimateKNm =
      uls.permanent * (line.slabKNm + own) +
      uls.superimposed * line.superimposedKNm +
      uls.traffic * line.trafficKNm;
    const half = spacingM / 2;
    const axles = worstAxles(line, half, (x) => Math.max(0, (half - Math.abs(x)) / 2));
    const beside = worstAxles(line, spacingM, (x) => (x >= 0 && x <= spacingM ? 1 - x / spacingM : 0));
    return {
      momentKNm: slabData.continuity.value * ((ultimateKNm * spacingM ** 2) / 8 + uls.traffic * axles),
      shearKN: (ultimateKNm * spacingM) / 2 + uls.traffic * beside,
    };
  });
  const own = unitWeights.concreteKNm3 * beamWidthM * (beam.depthM - slab.rootM);
  const lasting = (line.slabKNm + own + line.superimposedKNm) * spacingM;
  const traffic =
    line.trafficKNm * spacingM + worstAxles(line, spacingM, (x) => Math.max(0, 1 - Math.abs(x) / spacingM));
  const ultimate =
    (uls.permanent * (line.slabKNm + own) + uls.superimposed * line.superimposedKNm) * spacingM +
    uls.traffic * traffic;
  const forceKN = (ultimate * lengthM) / riseM;
  const long = strutShape(plan.outM, deepestM, slope);
  const longest = { forceKN: (ultimate * long.lengthM) / long.riseM, ...long };
  const strut = designSection(id, [{ forceKN, lengthM, runM }, longest]);
  const pull = runM / riseM / spacingM;
  return {
    spacingM,
    outM: plan.outM,
    riseM,
    runM,
    lengthM,
    sideM: strut.sideM,
    forceKN,
    hangKNm: ultimate / spacingM,
    tie: { lastingKNm: pull * lasting, trafficKNm: pull * traffic, ultimateKNm: pull * ultimate },
    beamM: beam.depthM,
    beamWidthM,
    beamBarsKgM: 2 * beam.barsKgM,
    barsKgM3: slabData.lapAndDetail.value * barKg(boxData.struts.barsShare),
    checks: [
      check('wing-struts', 'struts under the wings: force', strut.forceKN, strut.capacityKN, 'kN'),
      check(
        'wing-beams',
        'slab along the heads of the struts: bars within the practical ratio',
        beam.ratio,
        slabData.steelRatioMost.value,
        '1',
      ),
    ],
  };
}

/** Share of the section that presses on under a force off its middle by imperfection and bending. */
export function pressedShare(lengthM: number, sideM: number, offM: number): number {
  const even = 1 - (2 * offM) / sideM;
  return Math.max(0, Math.min(1.14 * even - (0.02 * lengthM) / sideM, even));
}

/** A strut that a section has to carry. */
interface StrutLoad {
  readonly forceKN: number;
  readonly lengthM: number;
  readonly runM: number;
}

/** Least side of a square strut in steps, pinned at both ends, bending under its own weight over its run; the worst used. */
function designSection(
  id: StandardId,
  loads: readonly StrutLoad[],
): { readonly sideM: number; readonly forceKN: number; readonly capacityKN: number } {
  const { leastSideM, mostSideM, sideStepM, bucklingOver, designShare } = boxData.struts;
  const { unitWeights, factors } = loadStandard(id);
  const { fcdMPa } = concrete(id, materials.concreteDefaultMPa[id].box);
  const capacity = (sideM: number, { forceKN, lengthM, runM }: StrutLoad): number => {
    const own = (factors.uls.permanent * unitWeights.concreteKNm3 * sideM ** 2 * lengthM * runM) / 8;
    const offM = lengthM / bucklingOver + own / forceKN;
    return sideM ** 2 * designShare * fcdMPa * 1e3 * pressedShare(lengthM, sideM, offM);
  };
  const use = (sideM: number, load: StrutLoad): number =>
    load.forceKN / Math.max(1e-9, capacity(sideM, load));
  const worst = (sideM: number): StrutLoad =>
    loads.reduce((one, other) => (use(sideM, other) > use(sideM, one) ? other : one));
  let sideM = leastSideM;
  while (sideM < mostSideM - 1e-9 && use(sideM, worst(sideM)) > 1) sideM += sideStepM;
  sideM = Number(sideM.toFixed(6));
  const load = worst(sideM);
  return { sideM, forceKN: load.forceKN, capacityKN: capacity(sideM, load) };
}

/** Slab thickened along the heads until the bars of one face stay within the practical ratio; bars of one row, kg per m. */
function designBeam(
  id: StandardId,
  slabM: number,
  effects: (depthM: number) => { readonly momentKNm: number; readonly shearKN: number },
): { readonly depthM: number; readonly ratio: number; readonly barsKgM: number } {
  const { beamWidthM: widthM, beamStepM, mostBeamM } = boxData.struts;
  const fy = barDesignMPa(id) * 1e3;
  const at = (depthM: number) => {
    const effectiveM = depthM - slabData.barAxisM.value;
    const leverM = slabData.leverRatio.value * effectiveM;
    const { momentKNm, shearKN } = effects(depthM);
    const areaM2 = Math.max(momentKNm / (leverM * fy), slabData.steelRatioLeast.value * widthM * depthM);
    // Struts in the concrete as flat as the webs are sized for.
    const stirrupsM2M = shearKN / (leverM * fy * boxData.shear.designCot);
    return { ratio: areaM2 / (widthM * effectiveM), areaM2, stirrupsM2M };
  };
  let depthM = slabM;
  while (depthM < mostBeamM && at(depthM).ratio > slabData.steelRatioMost.value) depthM += beamStepM;
  depthM = Number(depthM.toFixed(6));
  const { ratio, areaM2, stirrupsM2M } = at(depthM);
  const aroundM = depthM + widthM;
  return {
    depthM,
    ratio,
    barsKgM: slabData.lapAndDetail.value * (barKg(2 * areaM2) + barKg(stirrupsM2M, aroundM)),
  };
}
