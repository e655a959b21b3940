import {
  columnReduction,
  columnSlenderness,
  effectiveWidthRatio,
  internalPlateFactor,
  plateSlenderness,
  yieldRatio,
} from '../../mechanics/index.ts';
import { compositeData } from './compositeData.ts';
import {
  bareGirder,
  girderFigures,
  type GirderFigures,
  type GirderPlates,
  type GirderTop,
} from './girderSection.ts';
import { hasAlong } from './webStiffener.ts';
import type { GirderModel } from './girderModel.ts';
import type { StageMoments } from './stageMoments.ts';

/** Utilisations of the flanges of one element by what asks for them; rewritten by `elementChecks`. */
export interface ElementUse {
  /** Top flange while the slab is cast, buckling between bracings included. */
  castTop: number;
  sagTop: number;
  sagBottom: number;
  hogTop: number;
  /** Bottom flange in compression, buckling between bracings included. */
  hogBottom: number;
  /** Bottom flange under characteristic load with shrinkage. */
  service: number;
  fatigueTop: number;
  fatigueBottom: number;
  /** Greatest bottom and top flange stresses at ultimate, MPa. */
  bottomMPa: number;
  topMPa: number;
}

export const noUse = (): ElementUse => ({
  castTop: 0,
  sagTop: 0,
  sagBottom: 0,
  hogTop: 0,
  hogBottom: 0,
  service: 0,
  fatigueTop: 0,
  fatigueBottom: 0,
  bottomMPa: 0,
  topMPa: 0,
});

const steel: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };
const lasting: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };
const short: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };
const cracked: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };
/** Plates of the element, as high as at the end that is looked at. */
const here = { heightM: 0, topWidthM: 0, topM: 0, bottomWidthM: 0, bottomM: 0, webM: 0 };

/**
 * Elastic stresses summed over the stages at the two ends of element `e` (EN 1994-2 6.2.1.5, AASHTO LRFD 6.10.1.1.1),
 * at the middles of the flanges, against yield. Hogging: slab cracked, web reduced where it buckles in bending
 * (EN 1993-1-5 4.4), bottom flange as a strut between bracings (EN 1993-2 6.3.4.2) with the moment a quarter of the
 * bay away from the peak. Fatigue: `fatigueMPaPerKNm...` see `fatigueRange`.
 * @param equivalentKNm moment range equivalent to the whole traffic, by station, kNm, and the stress it may cause, MPa
 */
export function elementChecks(
  use: ElementUse,
  model: GirderModel,
  plates: GirderPlates,
  e: number,
  m: StageMoments,
  equivalentKNm: Float64Array,
  fatigueMPa: number,
): ElementUse {
  const { topM: tt, bottomM: tb } = plates;
  const zBottom = tb / 2;
  const fyTop = model.yieldMPa(tt);
  const fyBottom = model.yieldMPa(tb);
  const { steel: gammaM0, steelBuckling: gammaM1 } = model.standard.resistance;
  const top = model.cracked[e]!;
  here.heightM = plates.heightM;
  here.topWidthM = plates.topWidthM;
  here.topM = plates.topM;
  here.bottomWidthM = plates.bottomWidthM;
  here.bottomM = plates.bottomM;
  here.webM = plates.webM;
  stageFigures(model, e);
  const bracingM = model.bracingM[e]!;
  const favourable = model.standard.factors.uls.permanentFavourable / model.standard.factors.uls.permanent;
  let zTop = plates.heightM - tt / 2;
  let shrinkTension = shrinkageAtBottom(model, e, zBottom);
  const inCracked = model.isCracked[e] === 1;

  use.castTop = use.sagTop = use.sagBottom = use.hogTop = use.hogBottom = use.service = 0;
  use.fatigueTop = use.fatigueBottom = use.bottomMPa = use.topMPa = 0;
  let lost = false;
  for (let end = 0; end < 2; end++) {
    const i = e + end;
    if (model.heights.haunched) {
      here.heightM = model.heights.atStationM[i]!;
      zTop = here.heightM - tt / 2;
      stageFigures(model, e);
      shrinkTension = shrinkageAtBottom(model, e, zBottom);
      lost = false;
    }
    const cast = (m.cast[i]! * (zTop - steel.centroidM)) / steel.inertiaM4 / 1e3;
    if (cast > 0) {
      const chi = strutReduction(plates.topWidthM, tt, plates.webM, zTop - steel.centroidM, bracingM, fyTop);
      use.castTop = Math.max(use.castTop, (cast / fyTop) * buckled(chi, 1, gammaM0, gammaM1));
    }
    if (m.steel[i]! + m.lasting[i]! + m.sag[i]! > 0) {
      const bottom =
        fibre(m.steel[i]!, steel, zBottom) +
        fibre(m.lasting[i]!, lasting, zBottom) +
        fibre(m.sag[i]!, short, zBottom);
      const compressed =
        fibre(m.steel[i]!, steel, zTop) + fibre(m.lasting[i]!, lasting, zTop) + fibre(m.sag[i]!, short, zTop);
      use.sagBottom = Math.max(use.sagBottom, (gammaM0 * bottom) / fyBottom);
      use.sagTop = Math.max(use.sagTop, (-gammaM0 * compressed) / fyTop);
      const service =
        fibre(m.steelChar[i]!, steel, zBottom) +
        fibre(m.lastingChar[i]!, lasting, zBottom) +
        fibre(m.trafficChar[i]!, short, zBottom) +
        shrinkTension;
      use.service = Math.max(use.service, service / fyBottom);
      use.bottomMPa = Math.max(use.bottomMPa, bottom);
      use.topMPa = Math.max(use.topMPa, -compressed);
    }
    const steelHog = m.steel[i]! > 0 ? favourable * m.steel[i]! : m.steel[i]!;
    const onBars = m.lasting[i]! + m.shrinkage[i]! + m.hog[i]!;
    if (steelHog + onBars < 0) {
      let bottom = fibre(steelHog, steel, zBottom) + fibre(onBars, cracked, zBottom);
      let tension = fibre(steelHog, steel, zTop) + fibre(onBars, cracked, zTop);
      if (bottom < 0 && !lost) {
        lost = true;
        if (reduceWeb(model, here, top, bottom, tension)) {
          bottom = fibre(steelHog, steel, zBottom) + fibre(onBars, cracked, zBottom);
          tension = fibre(steelHog, steel, zTop) + fibre(onBars, cracked, zTop);
        }
      }
      use.hogTop = Math.max(use.hogTop, (gammaM0 * tension) / fyTop);
      use.bottomMPa = Math.max(use.bottomMPa, -bottom);
      use.topMPa = Math.max(use.topMPa, tension);
      if (model.plate) {
        const share = model.plate.pressedShare(tb);
        use.hogBottom = Math.max(use.hogBottom, (-bottom / fyBottom) * buckled(share, 1, gammaM0, gammaM1));
      } else {
        const peak = Math.max(totalHogAt(m, e), totalHogAt(m, e + 1));
        const drop = peak > 0 ? 1 - Math.max(0, Math.min(totalHogAt(m, e), totalHogAt(m, e + 1))) / peak : 0;
        const near = Math.max(0.75, 1 - (drop * 0.25 * bracingM) / model.elementM[e]!);
        const chi = strutReduction(
          plates.bottomWidthM,
          tb,
          plates.webM,
          cracked.centroidM - zBottom,
          bracingM,
          fyBottom,
        );
        use.hogBottom = Math.max(use.hogBottom, (-bottom / fyBottom) * buckled(chi, near, gammaM0, gammaM1));
      }
    }
    const section = inCracked ? cracked : short;
    const range = Math.abs(fibre(equivalentKNm[i]!, section, zBottom));
    const topRange = inCracked ? Math.abs(fibre(equivalentKNm[i]!, section, zTop)) : 0;
    use.fatigueBottom = Math.max(use.fatigueBottom, range / fatigueMPa);
    use.fatigueTop = Math.max(use.fatigueTop, topRange / fatigueMPa);
  }
  return use;
}

/** Sections of the plates `here` in every stage. */
function stageFigures(model: GirderModel, e: number): void {
  girderFigures(steel, here, bareGirder);
  girderFigures(lasting, here, model.lasting[e]);
  girderFigures(short, here, model.short[e]);
  girderFigures(cracked, here, model.cracked[e]);
}

/** Stress at height z, MPa, tension positive below the centroid under sagging. */
function fibre(momentKNm: number, section: GirderFigures, z: number): number {
  return (momentKNm * (section.centroidM - z)) / section.inertiaM4 / 1e3;
}

function totalHogAt(m: StageMoments, i: number): number {
  return -(m.steel[i]! + m.lasting[i]! + m.shrinkage[i]! + m.hog[i]!);
}

/** Strength divisor of a flange that may buckle: none below the plateau of the curve, else at the reduced moment `near` the peak. */
function buckled(chi: number, near: number, gammaM0: number, gammaM1: number): number {
  return chi < 1 ? Math.max(gammaM0, (near * gammaM1) / chi) : gammaM0;
}

/** Reduction of a flange with a third of the compressed web as a strut between bracings, curve d. */
function strutReduction(
  widthM: number,
  thicknessM: number,
  webM: number,
  compressedM: number,
  bracingM: number,
  fyMPa: number,
): number {
  const area = widthM * thicknessM + (webM * Math.max(0, compressedM)) / 3;
  const gyration = Math.sqrt((thicknessM * widthM * widthM * widthM) / 12 / area);
  return columnReduction(columnSlenderness(bracingM, gyration, fyMPa), 'd');
}

/** Tension at the bottom flange from prevented shrinkage of the slab, MPa. */
function shrinkageAtBottom(model: GirderModel, e: number, zBottom: number): number {
  const force = model.shrinkageKN[e]!;
  if (!(force > 0)) return 0;
  const arm = here.heightM + model.lasting[e]!.slabAboveM - lasting.centroidM;
  return (
    Math.max(0, (force * arm * (lasting.centroidM - zBottom)) / lasting.inertiaM4 - force / lasting.areaM2) /
    1e3
  );
}

/**
 * Takes what buckles of the web out of the steel and cracked sections; false when nothing does. A stiffener along a deep
 * web makes two panels of it: one beside the flange, one to the neutral axis whose edge is less pressed
 * (EN 1993-1-5 4.4(4), from memory).
 */
function reduceWeb(
  model: GirderModel,
  plates: GirderPlates,
  top: GirderTop,
  bottomMPa: number,
  topMPa: number,
): boolean {
  const webHeight = plates.heightM - plates.topM - plates.bottomM;
  const psi = Math.max(-3, -Math.max(0, topMPa) / -bottomMPa);
  const fy = model.yieldMPa(plates.webM);
  const compressed = webHeight / (1 - psi);
  const share = (panelM: number, ratio: number, edge: number): number =>
    effectiveWidthRatio(
      plateSlenderness(panelM / plates.webM, fy, internalPlateFactor(ratio)) * Math.sqrt(edge),
      ratio,
    );
  let gap: number;
  let axis: number;
  const stiffenerM = hasAlong(model, webHeight)
    ? compositeData.web.along.fromFlangeOverHeight * webHeight
    : 0;
  if (stiffenerM > 0 && stiffenerM < compressed) {
    const edge = 1 - stiffenerM / compressed;
    const low = (1 - share(stiffenerM, edge, 1)) * stiffenerM;
    const rest = compressed - stiffenerM;
    const high = (1 - share(webHeight - stiffenerM, Math.max(-3, psi / edge), edge)) * rest;
    gap = low + high;
    if (!(gap > 0)) return false;
    axis =
      plates.bottomM + ((low * stiffenerM) / 2 + high * (stiffenerM + 0.4 * (rest - high) + high / 2)) / gap;
  } else {
    const ratio = share(webHeight, psi, 1);
    if (ratio >= 1) return false;
    gap = (1 - ratio) * compressed;
    axis = plates.bottomM + 0.4 * ratio * compressed + gap / 2;
  }
  girderFigures(steel, plates, bareGirder, gap * plates.webM, axis, gap);
  girderFigures(cracked, plates, top, gap * plates.webM, axis, gap);
  return true;
}

/** Thinnest flange of a width that keeps class 3 in compression at a stress, m. */
export function leastFlangeM(widthM: number, webM: number, stressMPa: number): number {
  if (!(stressMPa > 0)) return 0;
  return (widthM - webM) / 2 / (compositeData.outstandSlenderness.value * yieldRatio(stressMPa));
}
