import { materials } from '../../actions/index.ts';
import { columnReduction, columnSlenderness } from '../../mechanics/index.ts';
import { crossBeamDemands, type CrossBeamCase, type Demand } from './crossBeamLoads.ts';
import { steelBoxData } from './steelBoxData.ts';

/** Crossbeams of the deck: between the webs, and as brackets beyond them. */
export interface CrossBeam {
  readonly depthM: number;
  readonly bracketDepthM: number;
  readonly webM: number;
  /** Bottom flanges between the webs and of the brackets at their root. */
  readonly flangeM2: number;
  readonly bracketFlangeM2: number;
  /** Strut under the middle of a cell: diameter of its two tubes, m; 0 without. */
  readonly strutM: number;
  /** Crossbeam with brackets and struts, kg each. */
  readonly beamKg: number;
  readonly strutsKg: number;
  /** Greatest share used of bending, shear and fatigue, and of the struts. */
  readonly utilisation: number;
  readonly strutUtilisation: number;
}

/**
 * Sizes the crossbeam as simple beams between webs (and a strut under the middle of a wide cell), brackets as cantilevers,
 * the deck plate as their top flange. Loads reach it over the influence triangle of one bay each way.
 */
export function sizeCrossBeam(beam: CrossBeamCase): CrossBeam {
  const { layout, pitchM } = beam;
  const d = steelBoxData.crossbeam;
  const strutted = layout.cellM > d.mostClearM;
  const spanM = strutted ? layout.cellM / 2 : layout.cellM;
  const depthM = Math.min(
    d.mostOverBox * beam.boxM,
    Math.max(d.leastDepthM, beam.ribHeightM + d.underRibM, d.depthOverSpan * spanM),
  );
  const bracketDepthM = Math.min(
    d.mostOverBox * beam.boxM,
    Math.max(depthM, d.bracketDepthOverReach * layout.overhangM),
  );
  const { between, bracket, strutKN } = crossBeamDemands(beam, spanM);
  const webM = webFor(beam, Math.max(between.shearKN, bracket.shearKN), depthM);
  const effectiveM = Math.min(pitchM, d.deckShareOfSpan * spanM);
  const inner = flangeFor(beam, between, depthM, webM.thicknessM, effectiveM);
  const outer = flangeFor(
    beam,
    bracket,
    bracketDepthM,
    webM.thicknessM,
    Math.min(pitchM, 2 * d.deckShareOfSpan * layout.overhangM),
  );
  const density = materials.steelDensityKgM3;
  const innerM3 = layout.topM * (depthM * webM.thicknessM + inner.flangeM2);
  const meanM = (bracketDepthM + d.tipM) / 2;
  const outerM3 = 2 * layout.overhangM * (meanM * webM.thicknessM + 0.75 * outer.flangeM2);
  const strut = strutted ? sizeStrut(beam, strutKN) : { diameterM: 0, kg: 0, utilisation: 0 };
  return {
    depthM,
    bracketDepthM,
    webM: webM.thicknessM,
    flangeM2: inner.flangeM2,
    bracketFlangeM2: outer.flangeM2,
    strutM: strut.diameterM,
    beamKg: (1 + d.detailShare) * density * (innerM3 + outerM3),
    strutsKg: strut.kg,
    utilisation: Math.max(inner.utilisation, outer.utilisation, webM.utilisation),
    strutUtilisation: strut.utilisation,
  };
}

/** Web whose depth below the ribs carries the shear. */
function webFor(
  beam: CrossBeamCase,
  shearKN: number,
  depthM: number,
): { thicknessM: number; utilisation: number } {
  const d = steelBoxData.crossbeam;
  const netM = Math.max(0.1, depthM - beam.ribHeightM);
  const perM = (1e3 * beam.yieldMPa(d.webM)) / Math.sqrt(3) / beam.standard.resistance.steel;
  const needM = shearKN / (netM * perM);
  const thicknessM = Math.min(d.mostWebM, Math.max(d.webM, Math.ceil(needM * 500 - 1e-9) / 500));
  return { thicknessM, utilisation: needM / thicknessM };
}

/** Use that bottom flanges are sized for. */
const flangeAim = 0.98;

/** Bottom flange for which bending and endless life hold at its middle, found by moving its area a few times. */
function flangeFor(
  beam: CrossBeamCase,
  demand: Demand,
  depthM: number,
  webM: number,
  deckWidthM: number,
): { flangeM2: number; utilisation: number } {
  const { leastFlangeM2, mostFlangeM2 } = steelBoxData.crossbeam;
  const deckM2 = deckWidthM * beam.deckM;
  const webM2 = depthM * webM;
  const fy = beam.yieldMPa(0.02) / beam.standard.resistance.steel;
  const limit = steelBoxData.deckFatigue.rangeMPa[beam.id];
  const useOf = (flangeM2: number): number => {
    const area = deckM2 + webM2 + flangeM2;
    const axis = (webM2 * (depthM / 2) + flangeM2 * depthM) / area;
    const inertia =
      deckM2 * axis ** 2 +
      (webM2 * depthM ** 2) / 12 +
      webM2 * (depthM / 2 - axis) ** 2 +
      flangeM2 * (depthM - axis) ** 2;
    const modulus = 1e3 * (inertia / (depthM - axis));
    return Math.max(demand.momentKNm / modulus / fy, demand.rangeKNm / modulus / limit);
  };
  let flangeM2 = leastFlangeM2;
  for (let round = 0; round < 8; round++) {
    const wanted = useOf(flangeM2) / flangeAim;
    flangeM2 = Math.min(
      mostFlangeM2,
      Math.max(leastFlangeM2, flangeM2 + (wanted - 1) * (flangeM2 + webM2 / 6)),
    );
  }
  return { flangeM2, utilisation: useOf(flangeM2) };
}

/** A pair of tubes from the middle of a cell down to its lower corners. */
function sizeStrut(
  beam: CrossBeamCase,
  loadKN: number,
): { diameterM: number; kg: number; utilisation: number } {
  const { layout, deepestM, boxM, standard } = beam;
  const { slenderness, diametersM } = steelBoxData.strut;
  const runM = layout.cellM / 2 - layout.slope * boxM * (layout.cells === 1 ? 1 : 0.5);
  const longM = Math.hypot(runM, deepestM);
  // Flattest where the box is lowest, longest where it is highest.
  const forceKN = (loadKN / 2) * (Math.hypot(runM, boxM) / boxM);
  let found = { diameterM: 0, kg: 0, utilisation: Infinity };
  for (const diameterM of diametersM) {
    const thicknessM = diameterM / slenderness;
    const area = Math.PI * (diameterM - thicknessM) * thicknessM;
    const fy = beam.yieldMPa(thicknessM);
    const chi = columnReduction(columnSlenderness(longM, 0.34 * diameterM, fy), 'a');
    const capacityKN = (1e3 * chi * area * fy) / standard.resistance.steelBuckling;
    const meanM = Math.hypot(runM, (deepestM + 2 * boxM) / 3);
    found = {
      diameterM,
      kg: layout.cells * 2 * meanM * area * materials.steelDensityKgM3,
      utilisation: forceKN / capacityKN,
    };
    if (found.utilisation <= 1) break;
  }
  return found;
}
