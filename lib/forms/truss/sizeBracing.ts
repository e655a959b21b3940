import { trussData } from './trussData.ts';
import type { TrussGeometry } from './trussGeometry.ts';
import type { TrussCase } from './trussCase.ts';

/** Laterals between the two planes, portals at the ends, and what wind does to the planes. */
export interface Bracing {
  readonly massKg: number;
  readonly paintM2: number;
  /** Greatest design chord force from wind with traffic, kN. */
  readonly bottomChordKN: number;
  readonly topChordKN: number;
  /** Design bending of an end post as a leg of the portal, kNm. */
  readonly portalMomentKNm: number;
  /** Characteristic wind on bottom and top laterals, kN per m of bridge. */
  readonly windBottomKNm: number;
  readonly windTopKNm: number;
}

const density = 7850;
const windFactor = 1.5;

/**
 * Wind truss in the plane of each chord. Above: an X in every top panel with struts at the top nodes, and portal frames in
 * the plane of the end posts that carry the upper wind down. Below: the slab is the web of the finished wind girder, so
 * one diagonal in every floor panel holds the wind of erection (trusses and floor beams, no vehicles).
 * Sizes by force and by the slenderness limit of bracing. On a skew struts and portals run along the supports: they take
 * the wind across, W, by W / cos along them and W tan along the road, half of it in either top chord.
 * @param facePerM face of one plane seen from the side, m2 per m of span
 */
export function sizeBracing(geometry: TrussGeometry, c: TrussCase, facePerM: number): Bracing {
  const { wind, bracing } = trussData;
  const { spanM, heightM, panelM } = geometry;
  const onPlanes = wind.pressureKNm2 * wind.dragBothPlanes * facePerM;
  const onFloor = wind.pressureKNm2 * 1.3 * c.floorDepthM;
  const onVehicles = wind.pressureKNm2 * wind.vehicleHeightM;
  const windTopKNm = onPlanes / 2;
  const windBottomKNm = onPlanes / 2 + onFloor + onVehicles;
  const withTraffic = windFactor * wind.withTraffic;
  const { planesM: b, crossM, aheadM } = c;
  const topPanelM = geometry.hangers ? 2 * panelM : panelM;
  const topSpanM = spanM - topPanelM;

  const bottom = laterals([panelM + aheadM], panelM, spanM, windFactor * (windBottomKNm - onVehicles), c);
  const top = laterals(
    [topPanelM + aheadM, topPanelM - aheadM],
    topPanelM,
    topSpanM,
    windFactor * windTopKNm,
    c,
  );
  const struts = Math.round(topSpanM / topPanelM) - 1;
  const longer = crossM / b;
  const strutAreaM2 = areaFor((longer * (windFactor * windTopKNm * topSpanM)) / 2, crossM, c);
  const endPostM = Math.hypot(geometry.hangers ? panelM : panelM / 2, heightM);
  // Each end post takes half the upper wind of half the bridge; it bends most at the portal beam, contraflexure half-way.
  const portalMomentKNm = (longer * (withTraffic * windTopKNm * topSpanM * endPostM)) / 8;
  const portalFullKNm = portalMomentKNm / wind.withTraffic;
  const portalDepthM = 1.2;
  const portalAreaM2 =
    2 * Math.max(0.3 * 0.016, portalFullKNm / (portalDepthM * c.rules.yieldMPa(20) * 1000)) +
    portalDepthM * 0.01;
  const massKg =
    (bottom.volumeM3 + top.volumeM3 + struts * strutAreaM2 * crossM + 2 * portalAreaM2 * crossM) *
    density *
    (1 + bracing.connectionShare);
  return {
    massKg,
    paintM2:
      bottom.paintM2 +
      top.paintM2 +
      struts * crossM * sideM(strutAreaM2) * 4 +
      2 * crossM * 2 * (portalDepthM + 0.3),
    bottomChordKN: (withTraffic * windBottomKNm * spanM ** 2) / (8 * b),
    topChordKN:
      (withTraffic * windTopKNm * topSpanM ** 2) / (8 * b) +
      (withTraffic * windTopKNm * topSpanM * (aheadM / b)) / 4,
    portalMomentKNm,
    windBottomKNm,
    windTopKNm,
  };
}

/**
 * One or two diagonals in each panel, sharing the panel shear, held half-way by each other or by the stringers.
 * @param reachesM how far each of them reaches along the road, m
 */
function laterals(
  reachesM: readonly number[],
  panelM: number,
  lengthM: number,
  windKNm: number,
  c: TrussCase,
): { volumeM3: number; paintM2: number } {
  const panels = Math.max(1, Math.round(lengthM / panelM));
  const diagonals = reachesM.length;
  let volumeM3 = 0;
  let paintM2 = 0;
  for (let k = 0; k < panels; k++) {
    const shear = Math.abs(windKNm * (lengthM / 2 - k * panelM));
    let panelM3 = 0;
    let panelM2 = 0;
    for (const reachM of reachesM) {
      const diagonalM = Math.hypot(c.planesM, reachM);
      const areaM2 = areaFor((shear / diagonals) * (diagonalM / c.planesM), diagonalM / 2, c);
      panelM3 += areaM2 * diagonalM;
      panelM2 += diagonalM * 4 * sideM(areaM2);
    }
    volumeM3 += panelM3;
    paintM2 += panelM2;
  }
  return { volumeM3, paintM2 };
}

/** Area of a closed bracing member for a design compression and its free length, m2. */
function areaFor(forceKN: number, freeM: number, c: TrussCase): number {
  const { bracing } = trussData;
  const bySlenderness = bracing.areaOverRadius2 * (freeM / bracing.slenderness) ** 2;
  // At the slenderness limit a strut works at Euler's stress, less the allowance for imperfection of about a third.
  const stressMPa = Math.min(c.rules.yieldMPa(20), (0.67 * Math.PI ** 2 * 210000) / bracing.slenderness ** 2);
  return Math.max(bracing.leastAreaM2, bySlenderness, forceKN / (stressMPa * 1000));
}

/** Side of a square tube whose wall is a twentieth of it, m. */
function sideM(areaM2: number): number {
  return Math.sqrt(areaM2 / 0.19);
}
