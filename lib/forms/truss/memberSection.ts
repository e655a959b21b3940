import {
  columnReduction,
  effectiveWidthRatio,
  outstandWidthRatio,
  plateSlenderness,
} from '../../mechanics/index.ts';
import type { StandardId } from '../../model/index.ts';
import { trussData } from './trussData.ts';

/** Design forces of one member, kN, both positive numbers; moment about the axis out of the plane of the truss, kNm. */
export interface MemberDemand {
  readonly tensionKN: number;
  readonly compressionKN: number;
  /** Bending that comes with the compression (end posts as legs of the portal), kNm. */
  readonly momentKNm: number;
  /** Stress range force for fatigue, kN. */
  readonly rangeKN: number;
  readonly lengthM: number;
}

/** A welded box or H member. The H has its two flanges in the gusset planes and a web between them. */
export interface MemberSection {
  readonly kind: 'box' | 'H';
  /** Across the truss, between the outer faces, m. */
  readonly widthM: number;
  /** In the plane of the truss, m. */
  readonly depthM: number;
  readonly thicknessMm: number;
  readonly areaM2: number;
  /** Painted perimeter outside, m. */
  readonly perimeterM: number;
  readonly utilisation: number;
  readonly governs: MemberLimit;
}

type MemberLimit = 'net-section' | 'yield' | 'buckling' | 'fatigue' | 'slenderness';

/** What sizing a member needs to know of the standard; made once for a truss by `memberRules`. */
export interface MemberRules {
  readonly standard: StandardId;
  readonly yieldMPa: (thicknessMm: number) => number;
  /** Allowed stress range, MPa. */
  readonly rangeMPa: number;
}

const modulusMPa = 210000;

/**
 * One depth of a kind and width under a standard, with what does not depend on the force. Radii of gyration do not depend
 * on the thickness of thin plates.
 */
interface Profile {
  readonly kind: 'box' | 'H';
  readonly widthM: number;
  readonly depthM: number;
  readonly inPlaneM: number;
  readonly outOfPlaneM: number;
  /** Share that works in compression by plate thickness, mm; NaN until asked for. */
  readonly effective: Float64Array;
}

const families = new Map<string, readonly Profile[]>();

function familyOf(kind: 'box' | 'H', widthM: number, standard: StandardId): readonly Profile[] {
  const key = `${standard} ${kind} ${widthM}`;
  const known = families.get(key);
  if (known) return known;
  const made = trussData.memberDepthsM.values
    .filter((depthM) => depthM <= 2 * widthM)
    .map((depthM) => ({
      kind,
      widthM,
      depthM,
      inPlaneM: radius(kind, depthM, widthM, 'in-plane'),
      outOfPlaneM: radius(kind, depthM, widthM, 'out-of-plane'),
      effective: new Float64Array(trussData.plateMm.most + 1).fill(Number.NaN),
    }));
  families.set(key, made);
  return made;
}

/**
 * Lightest box or H member of the given width that carries the demand, plates in practical steps.
 *
 * Depths are tried from the shallowest; for each the plate thickness follows from the axial force, the column curve
 * (EN 1993-1-1 6.3.1, curve b for a welded box, c for an H bent in the weak direction; AASHTO LRFD 6.9.4 for hl93),
 * effective widths of slender plates, net section and fatigue range. Where even the deepest section needs plates beyond the thickest,
 * that section comes back with a utilisation above 1.
 * @param mostDepthM greatest depth in the plane of the truss, m (bottom chords stay within the floor)
 */
export function memberSection(
  kind: 'box' | 'H',
  widthM: number,
  demand: MemberDemand,
  rules: MemberRules,
  mostDepthM = Infinity,
): MemberSection {
  const family = familyOf(kind, widthM, rules.standard);
  const compressed = demand.compressionKN > 0;
  const mostSlender = compressed
    ? trussData.memberSlenderness.compression
    : trussData.memberSlenderness.tension;
  const leastAreaM2 = leastArea(demand, rules);
  let best: Trial | null = null;
  let stoutest = family[0]!;
  for (const profile of family) {
    if (profile.depthM > mostDepthM) break;
    stoutest = profile;
    if (slendernessOf(profile, demand.lengthM) > mostSlender) continue;
    const leastMm = Math.max(leastPlateMm(profile, compressed), thinnestMm(profile, leastAreaM2));
    if (best !== null && best.use.utilisation <= 1 && areaOf(profile, leastMm) >= best.areaM2) continue;
    const trial = trialOf(profile, leastMm, demand, rules);
    if (best === null || isLighter(trial, best)) best = trial;
  }
  if (best === null) {
    // Too long for the slenderness limit of every depth: the stoutest there is, and its slenderness as the use.
    const trial = trialOf(stoutest, leastPlateMm(stoutest, compressed), demand, rules);
    const slender = slendernessOf(stoutest, demand.lengthM) / mostSlender;
    best = {
      ...trial,
      use: slender > trial.use.utilisation ? { utilisation: slender, governs: 'slenderness' } : trial.use,
    };
  }
  const { profile, thicknessMm, areaM2, use } = best;
  return {
    kind,
    widthM,
    depthM: profile.depthM,
    thicknessMm,
    areaM2,
    perimeterM: kind === 'box' ? 2 * (widthM + profile.depthM) : 4 * profile.depthM + 2 * widthM,
    utilisation: use.utilisation,
    governs: use.governs,
  };
}

interface Use {
  utilisation: number;
  governs: MemberLimit;
}

interface Trial {
  readonly profile: Profile;
  readonly thicknessMm: number;
  readonly areaM2: number;
  readonly use: Use;
}

/** Fitting before not fitting; of fitting ones the lighter, of others the less overstressed. */
function isLighter(a: Trial, b: Trial): boolean {
  const fits = a.use.utilisation <= 1;
  if (fits !== b.use.utilisation <= 1) return fits;
  return fits ? a.areaM2 < b.areaM2 : a.use.utilisation < b.use.utilisation;
}

/** Thinnest plate by handling and, in compression, by the most slender plate used, mm. */
function leastPlateMm(profile: Profile, compressed: boolean): number {
  const { plateMm, mostPlateSlenderness } = trussData;
  if (!compressed) return plateMm.least;
  const { kind, widthM: w, depthM: d } = profile;
  const slenderMm =
    kind === 'box'
      ? (1000 * Math.max(w, d)) / mostPlateSlenderness.box
      : Math.max((500 * d) / mostPlateSlenderness.outstand, (1000 * w) / mostPlateSlenderness.box / webShare);
  return roundUp(Math.max(plateMm.least, slenderMm));
}

/** Area below which a member cannot do, m2: as if nothing buckled and every plate had the yield of the thinnest. */
function leastArea(demand: MemberDemand, rules: MemberRules): number {
  const r = trussData.resistance[rules.standard];
  const fy = rules.yieldMPa(1) * 1000;
  const net = r.fractureFactor * trussData.netAreaRatio.value * r.ultimateMPa * 1000;
  return Math.max(
    demand.tensionKN / (r.yieldFactor * fy),
    demand.tensionKN / net,
    demand.rangeKN / (rules.rangeMPa * 1000),
    demand.compressionKN / (r.bucklingFactor * fy),
  );
}

/** Plate under which a profile has less than an area, mm, in practical steps; corners counted twice, so never too thick. */
function thinnestMm({ kind, widthM: w, depthM: d }: Profile, areaM2: number): number {
  return roundUp((1000 * areaM2) / (kind === 'box' ? 2 * (w + d) : 2 * d + webShare * w));
}

/** Share of the area that works in compression: effective widths of its plates at yield (EN 1993-1-5 4.4). */
function effectiveShare(profile: Profile, thicknessMm: number, fyMPa: number): number {
  const { kind, widthM: w, depthM: d } = profile;
  const t = thicknessMm / 1000;
  if (kind === 'box') return (w * inner(w / t, fyMPa) + d * inner(d / t, fyMPa)) / (w + d);
  const flange = outstandWidthRatio(plateSlenderness(d / 2 / t, fyMPa, 0.43));
  return (2 * d * flange + webShare * w * inner(w / (webShare * t), fyMPa)) / (2 * d + webShare * w);
}

/** Effective share of a plate held on both edges. */
function inner(widthOverThickness: number, fyMPa: number): number {
  return effectiveWidthRatio(plateSlenderness(widthOverThickness, fyMPa, 4));
}

/** Thinnest plate in practical steps that carries the demand: up in proportion of the use, then back by halving. */
function trialOf(profile: Profile, leastMm: number, demand: MemberDemand, rules: MemberRules): Trial {
  const { most, stepMm } = trussData.plateMm;
  let tooThin = 0;
  let thicknessMm = Math.min(leastMm, most);
  let utilisation = useAt(use, profile, thicknessMm, demand, rules);
  while (utilisation > 1 && thicknessMm < most) {
    tooThin = thicknessMm;
    thicknessMm = Math.min(most, Math.max(thicknessMm + stepMm, roundUp(thicknessMm * utilisation)));
    utilisation = useAt(use, profile, thicknessMm, demand, rules);
  }
  while (utilisation <= 1 && tooThin > 0 && thicknessMm - tooThin > stepMm) {
    const middle = roundUp((thicknessMm + tooThin) / 2 - stepMm / 2);
    if (useAt(use, profile, middle, demand, rules) <= 1) thicknessMm = middle;
    else tooThin = middle;
  }
  useAt(use, profile, thicknessMm, demand, rules);
  return { profile, thicknessMm, areaM2: areaOf(profile, thicknessMm), use: { ...use } };
}

const use: Use = { utilisation: 0, governs: 'yield' };

/** Writes the use of a section and what governs it into `out`; returns the use. */
function useAt(
  out: Use,
  profile: Profile,
  thicknessMm: number,
  demand: MemberDemand,
  rules: MemberRules,
): number {
  const areaM2 = areaOf(profile, thicknessMm);
  const fy = rules.yieldMPa(thicknessMm);
  const r = trussData.resistance[rules.standard];
  const yieldKN = areaM2 * fy * 1000;
  const netKN = r.fractureFactor * trussData.netAreaRatio.value * areaM2 * r.ultimateMPa * 1000;
  let utilisation = demand.tensionKN / (r.yieldFactor * yieldKN);
  let governs: MemberLimit = 'yield';
  const netSection = demand.tensionKN / netKN;
  if (netSection > utilisation) {
    utilisation = netSection;
    governs = 'net-section';
  }
  const fatigue = demand.rangeKN / (areaM2 * 1000) / rules.rangeMPa;
  if (fatigue > utilisation) {
    utilisation = fatigue;
    governs = 'fatigue';
  }
  if (demand.compressionKN > 0) {
    let effective = profile.effective[thicknessMm]!;
    if (Number.isNaN(effective))
      effective = profile.effective[thicknessMm] = effectiveShare(profile, thicknessMm, fy);
    const bar = (slendernessOf(profile, demand.lengthM) / Math.PI) * Math.sqrt((effective * fy) / modulusMPa);
    const chi =
      rules.standard === 'lm1' ? columnReduction(bar, profile.kind === 'box' ? 'b' : 'c') : aashtoColumn(bar);
    const bending = (demand.momentKNm * profile.widthM) / 2 / (areaM2 * profile.outOfPlaneM ** 2);
    const buckling =
      demand.compressionKN / (chi * effective * r.bucklingFactor * yieldKN) +
      bending / (r.bucklingFactor * fy * 1000);
    if (buckling > utilisation) {
      utilisation = buckling;
      governs = 'buckling';
    }
  }
  out.utilisation = utilisation;
  out.governs = governs;
  return utilisation;
}

/** AASHTO LRFD 6.9.4.1: 0.658^(lambda2), or 0.877 / lambda2 beyond 2.25 (Pe/Po below 0.44). */
function aashtoColumn(lambdaBar: number): number {
  const square = lambdaBar * lambdaBar;
  return square <= 2.25 ? 0.658 ** square : 0.877 / square;
}

/** Greater slenderness of the two directions. */
function slendernessOf(profile: Profile, lengthM: number): number {
  const { inPlane, outOfPlane } = trussData.bucklingLength;
  return Math.max((inPlane * lengthM) / profile.inPlaneM, (outOfPlane * lengthM) / profile.outOfPlaneM);
}

/** Web of an H as a share of the flange thickness. */
const webShare = 0.6;

function radius(kind: 'box' | 'H', d: number, w: number, about: 'in-plane' | 'out-of-plane'): number {
  if (kind === 'box') {
    const [a, b] = about === 'in-plane' ? [d, w] : [w, d];
    return a * Math.sqrt((3 * b + a) / (12 * (a + b)));
  }
  const area = 2 * d + webShare * w;
  return about === 'in-plane'
    ? Math.sqrt((2 * d ** 3) / 12 / area)
    : Math.sqrt(((d * w * w) / 2 + (webShare * w ** 3) / 12) / area);
}

function areaOf(profile: Profile, thicknessMm: number): number {
  const { kind, widthM: w, depthM: d } = profile;
  const t = thicknessMm / 1000;
  return kind === 'box' ? 2 * t * (w + d - 2 * t) : 2 * t * d + webShare * t * (w - 2 * t);
}

function roundUp(thicknessMm: number): number {
  const { stepMm } = trussData.plateMm;
  return Math.ceil(thicknessMm / stepMm - 1e-9) * stepMm;
}
