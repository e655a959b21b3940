import {
  concrete,
  materials,
  steelYield,
  usualSteel,
  type Concrete,
  type LoadStandard,
  type SteelGrade,
} from '../../actions/index.ts';
import { plateThicknessesMm, thickestPlateM } from '../common/plates.ts';
import { girderFigures, steelArea, type GirderPlates, type GirderTop } from '../composite-i/girderSection.ts';
import { cableData } from './cableData.ts';

/** Forces of one edge girder at one section: compression positive, moments sagging positive, characteristic. */
export interface DeckForces {
  readonly atM: number;
  readonly permanentKN: number;
  readonly trafficKN: number;
  readonly permanentKNm: number;
  readonly trafficMaxKNm: number;
  readonly trafficMinKNm: number;
}

/** Half the deck as one composite girder. */
export interface EdgeCase {
  readonly standard: LoadStandard;
  /** Soffit to top of slab, m. */
  readonly depthM: number;
  readonly slabM: number;
  readonly deckWidthM: number;
  /** Slab that goes with one girder, m. */
  readonly slabWidthM: number;
  /** Greatest design shear of a bay, kN. */
  readonly shearKN: number;
}

export interface EdgeGirder {
  readonly plates: GirderPlates;
  /** Slab of the stretch, m. */
  readonly slabM: number;
  readonly utilisation: number;
  /** Slab stress under lasting load over its limit. */
  readonly slabUse: number;
  readonly massKgPerM: number;
  readonly eiKNm2: number;
  readonly worst: DeckForces;
  readonly paintM2PerM: number;
}

/**
 * Lightest edge girder for all sections of a stretch. Lasting compression and bending act on the section with the slab
 * at its long-term modulus, traffic on the short-term one; the bottom flange is checked in tension (traffic sagging, no
 * traffic compression) and in compression (traffic hogging with it), the slab in compression. The slab is made thicker
 * where its own stress or the thickest flanges ask for it, flanges are tried narrow and wide.
 */
export function sizeEdgeGirder(edge: EdgeCase, sections: readonly DeckForces[]): EdgeGirder {
  const { stepM, mostM } = cableData.slabThickening;
  let girder = lightestPlates(edge, edge.slabM, sections);
  const over = (one: EdgeGirder): number => Math.max(one.slabUse, one.utilisation);
  for (let slabM = edge.slabM + stepM; over(girder) > 1 && slabM <= mostM + 1e-9; slabM += stepM) {
    const thicker = lightestPlates(edge, slabM, sections);
    if (over(thicker) < over(girder)) girder = thicker;
  }
  return girder;
}

function lightestPlates(edge: EdgeCase, slabM: number, sections: readonly DeckForces[]): EdgeGirder {
  const { least, most, overDepth } = cableData.edgeGirder.flangeWidthM;
  const usual = Math.min(most, Math.max(least, overDepth * (edge.depthM - slabM)));
  let best: EdgeGirder | null = null;
  for (const widthM of [usual, (usual + most) / 2, most]) {
    const girder = platesOfWidth(edge, slabM, widthM, sections);
    const better =
      best === null ||
      (girder.utilisation <= 1
        ? !(best.utilisation <= 1) || girder.massKgPerM < best.massKgPerM
        : girder.utilisation < best.utilisation);
    if (better) best = girder;
  }
  return best!;
}

/** Thinnest flanges of a width that fit, or the thickest there are. */
function platesOfWidth(
  edge: EdgeCase,
  slabM: number,
  widthM: number,
  sections: readonly DeckForces[],
): EdgeGirder {
  const most = thickestPlateM(edge.standard.id) * 1000;
  const series = plateThicknessesMm.filter((mm) => mm >= cableData.edgeGirder.leastFlangeMm && mm <= most);
  const shape = edgeShape(edge, slabM, widthM);
  const thickest = edgeUse(shape, series[series.length - 1]!, sections);
  if (!(thickest.utilisation <= 1)) return thickest;
  let low = 0;
  let high = series.length - 1;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (edgeUse(shape, series[middle]!, sections).utilisation <= 1) high = middle;
    else low = middle + 1;
  }
  return edgeUse(shape, series[low]!, sections);
}

/** What stays the same while the flange thickness is sought. */
interface EdgeShape {
  readonly standard: LoadStandard;
  readonly slabM: number;
  readonly girderM: number;
  readonly widthM: number;
  readonly webMm: number;
  readonly grade: SteelGrade;
  readonly steelMPa: number;
  readonly slabConcrete: Concrete;
  readonly ratio: number;
  readonly short: GirderTop;
  readonly long: GirderTop;
}

function edgeShape(edge: EdgeCase, slabM: number, widthM: number): EdgeShape {
  const { standard } = edge;
  const g = cableData.edgeGirder;
  const girderM = Math.max(0.4, edge.depthM - slabM);
  const grade = usualSteel(standard.id);
  const steelMPa = materials.steel[grade].eMPa;
  const slabConcrete = concrete(standard.id, materials.concreteDefaultMPa[standard.id].slab);
  const ratio = steelMPa / slabConcrete.ecmMPa;
  const webMm = Math.max(
    g.leastWebMm,
    Math.ceil((1000 * girderM) / g.webSlenderness),
    Math.ceil(edge.shearKN / (0.8 * girderM * (steelYield(grade, 16) / Math.sqrt(3)))),
  );
  const topOf = (n: number): GirderTop => ({
    slabAreaM2: (edge.slabWidthM * slabM) / n,
    slabInertiaM4: (edge.slabWidthM * slabM ** 3) / 12 / n,
    slabAboveM: slabM / 2,
    barAreaM2: 0,
    barAboveM: 0,
  });
  return {
    standard,
    slabM,
    girderM,
    widthM,
    webMm,
    grade,
    steelMPa,
    slabConcrete,
    ratio,
    short: topOf(ratio),
    long: topOf(ratio * cableData.modularLong.value),
  };
}

const lasting = { areaM2: 0, centroidM: 0, inertiaM4: 0 };
const lively = { areaM2: 0, centroidM: 0, inertiaM4: 0 };

/** Use of one section by all sets of forces. */
function edgeUse(shape: EdgeShape, bottomMm: number, sections: readonly DeckForces[]): EdgeGirder {
  const { standard, girderM, widthM, slabM, slabConcrete, ratio } = shape;
  const { uls } = standard.factors;
  const g = cableData.edgeGirder;
  const longRatio = ratio * cableData.modularLong.value;
  const plates: GirderPlates = {
    heightM: girderM,
    topWidthM: widthM,
    topM: Math.max(g.leastFlangeMm, g.topOverBottom * bottomMm) / 1000,
    bottomWidthM: widthM,
    bottomM: bottomMm / 1000,
    webM: shape.webMm / 1000,
  };
  girderFigures(lasting, plates, shape.long);
  girderFigures(lively, plates, shape.short);
  const fy = steelYield(shape.grade, bottomMm) * 1000;
  const bottomWLong = lasting.inertiaM4 / lasting.centroidM;
  const bottomWShort = lively.inertiaM4 / lively.centroidM;
  const topLong = (girderM + slabM - lasting.centroidM) / lasting.inertiaM4;
  const topShort = (girderM + slabM - lively.centroidM) / lively.inertiaM4;
  const slabLimit = cableData.slabStress.value * slabConcrete.fckMPa;
  let utilisation = -1;
  let slabUse = 0;
  let worst = sections[0]!;
  for (const s of sections) {
    const axial = s.permanentKN / lasting.areaM2;
    const trafficAxial = s.trafficKN / lively.areaM2;
    const tension =
      (uls.permanent * s.permanentKNm) / bottomWLong +
      (uls.traffic * s.trafficMaxKNm) / bottomWShort -
      uls.permanentFavourable * axial;
    const pressed =
      uls.permanent * (axial - s.permanentKNm / bottomWLong) +
      uls.traffic * (trafficAxial - s.trafficMinKNm / bottomWShort);
    const slabLasting = (axial + s.permanentKNm * topLong) / longRatio;
    const slabUltimate =
      uls.permanent * slabLasting + (uls.traffic * (trafficAxial + s.trafficMaxKNm * topShort)) / ratio;
    slabUse = Math.max(slabUse, slabLasting / 1000 / slabLimit, slabUltimate / 1000 / slabConcrete.fcdMPa);
    const use = Math.max(
      (tension * standard.resistance.steel) / fy,
      (pressed * standard.resistance.steelBuckling) / fy,
    );
    if (use > utilisation) {
      utilisation = use;
      worst = s;
    }
  }
  return {
    plates,
    slabM,
    utilisation,
    slabUse,
    massKgPerM: steelArea(plates) * materials.steelDensityKgM3 * (1 + g.detailShare),
    eiKNm2: shape.steelMPa * 1000 * lively.inertiaM4,
    worst,
    paintM2PerM: 2 * girderM + 3 * widthM,
  };
}
