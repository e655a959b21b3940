import {
  columnReduction,
  columnSlenderness,
  effectiveWidthRatio,
  internalPlateFactor,
  plateSlenderness,
} from '../../mechanics/index.ts';
import { girderFigures, type GirderFigures, type GirderPlates } from '../composite-i/girderSection.ts';
import { criticalForceKN, endShare, steelKNm2 } from './uFrame.ts';

/** What holds the top flange of a girder. */
export interface Bed {
  /** Stiffness of an ordinary frame and of an end frame, kN/m. */
  readonly frameKNm: number;
  readonly endKNm: number;
  readonly spacingM: number;
  readonly spanM: number;
}

/** Resistance of the plates of an element: yields in MPa by thickness, partial factors, fatigue range, MPa. */
export interface EdgeRules {
  readonly yieldMPa: (thicknessM: number) => number;
  readonly gammaM0: number;
  readonly gammaM1: number;
  readonly rangeMPa: number;
}

/** Shares used of the flanges of one element, and the force in the top flange; rewritten by `flangeUse`. */
export interface FlangeUse {
  /** Top flange pressed between frames, bottom flange pulled: in the spans. */
  sagTop: number;
  sagBottom: number;
  /** Top flange pulled, bottom flange pressed between cross-girders: over piers. */
  hogTop: number;
  hogBottom: number;
  /** Flanges that are pulled, with posts welded to them. */
  fatigueTop: number;
  fatigueBottom: number;
  /** Design force of the pressed top flange with its part of the web, and its critical force, kN. */
  forceKN: number;
  criticalKN: number;
}

export const noFlangeUse = (): FlangeUse => ({
  sagTop: 0,
  sagBottom: 0,
  hogTop: 0,
  hogBottom: 0,
  fatigueTop: 0,
  fatigueBottom: 0,
  forceKN: 0,
  criticalKN: Infinity,
});

const gross: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };
const net: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };

/** Lateral bending stiffness of the top flange, kNm2. */
export function flangeStiffness(plates: GirderPlates): number {
  return (steelKNm2 * plates.topM * plates.topWidthM ** 3) / 12;
}

/** Critical force of the top flange of some plates on a bed of frames, kN. */
export function criticalOnBedKN(plates: GirderPlates, bed: Bed): number {
  const flange = flangeStiffness(plates);
  const bedKNm2 = bed.frameKNm / bed.spacingM;
  return criticalForceKN(bedKNm2, flange, endShare(bed.endKNm, bedKNm2, flange), bed.spacingM, bed.spanM);
}

/**
 * Elastic stresses of bare steel against yield, web reduced where it buckles in bending (EN 1993-1-5 4.4); the pressed
 * top flange with a third of the pressed web as a bar on the bed of the frames, curve d (EN 1993-2 6.3.4.2); over piers
 * the bottom flange as a strut between cross-girders.
 */
export function flangeUse(
  use: FlangeUse,
  plates: GirderPlates,
  bed: Bed,
  rules: EdgeRules,
  sagKNm: number,
  hogKNm: number,
  rangeKNm: number,
): FlangeUse {
  const { heightM: h, topM: tt, bottomM: tb, webM } = plates;
  use.sagTop = use.sagBottom = use.hogTop = use.hogBottom = use.forceKN = 0;
  use.criticalKN = Infinity;
  girderFigures(gross, plates);
  const fyTop = rules.yieldMPa(tt);
  const fyBottom = rules.yieldMPa(tb);
  if (sagKNm > 0) {
    const pressedM = Math.max(0, h - tt - gross.centroidM);
    reduced(plates, rules.yieldMPa(webM), true);
    const top = stress(sagKNm, net, h - tt / 2);
    const bottom = stress(sagKNm, net, tb / 2);
    const area = plates.topWidthM * tt + (webM * pressedM) / 3;
    use.forceKN = top * 1000 * area;
    use.criticalKN = criticalOnBedKN(plates, bed);
    const chi = columnReduction(Math.sqrt((area * fyTop * 1000) / use.criticalKN), 'd');
    use.sagTop = (top / fyTop) * Math.max(rules.gammaM0, rules.gammaM1 / chi);
    use.sagBottom = (rules.gammaM0 * bottom) / fyBottom;
  }
  if (hogKNm < 0) {
    const pressedM = Math.max(0, gross.centroidM - tb);
    reduced(plates, rules.yieldMPa(webM), false);
    const top = stress(-hogKNm, net, h - tt / 2);
    const bottom = stress(-hogKNm, net, tb / 2);
    const area = plates.bottomWidthM * tb + (webM * pressedM) / 3;
    const gyrationM = Math.sqrt((tb * plates.bottomWidthM ** 3) / 12 / area);
    const chi = columnReduction(columnSlenderness(bed.spacingM, gyrationM, fyBottom), 'd');
    use.hogTop = (rules.gammaM0 * top) / fyTop;
    use.hogBottom =
      (bottom / fyBottom) * (chi < 1 ? Math.max(rules.gammaM0, rules.gammaM1 / chi) : rules.gammaM0);
  }
  const range = rangeKNm / gross.inertiaM4 / 1000 / rules.rangeMPa;
  use.fatigueTop = hogKNm < 0 ? range * (h - tt - gross.centroidM) : 0;
  use.fatigueBottom = sagKNm > 0 ? range * (gross.centroidM - tb) : 0;
  return use;
}

function stress(momentKNm: number, section: GirderFigures, z: number): number {
  return (momentKNm * Math.abs(section.centroidM - z)) / section.inertiaM4 / 1000;
}

/** Section without the buckled strip of the web on its pressed side, into `net`. */
function reduced(plates: GirderPlates, fyMPa: number, topPressed: boolean): void {
  const { heightM: h, topM: tt, bottomM: tb, webM } = plates;
  const webHeight = h - tt - tb;
  const pressedM = topPressed ? h - tt - gross.centroidM : gross.centroidM - tb;
  if (!(pressedM > 0)) {
    girderFigures(net, plates);
    return;
  }
  const psi = Math.max(-3, -(webHeight - pressedM) / pressedM);
  const ratio = effectiveWidthRatio(plateSlenderness(webHeight / webM, fyMPa, internalPlateFactor(psi)), psi);
  const gap = (1 - ratio) * pressedM;
  const from = 0.4 * ratio * pressedM + gap / 2;
  girderFigures(net, plates, undefined, gap * webM, topPressed ? h - tt - from : tb + from, gap);
}
