import {
  materials,
  trafficOnCrossLine,
  trafficOnInfluence,
  worstLaneShare,
  type CrossLine,
  type LoadStandard,
} from '../../actions/index.ts';
import {
  columnReduction,
  columnSlenderness,
  loadTrack,
  runGroup,
  straightLine,
  type Extremes,
} from '../../mechanics/index.ts';
import type { DeckSpec, StandardId } from '../../model/index.ts';
import { superimposedOn } from '../common/superimposed.ts';
import type { BoxLayout } from './boxLayout.ts';
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

/** What a crossbeam is sized for. */
export interface CrossBeamCase {
  readonly id: StandardId;
  readonly standard: LoadStandard;
  readonly deck: DeckSpec;
  readonly layout: BoxLayout;
  /** Distance of crossbeams, m. */
  readonly pitchM: number;
  readonly deckM: number;
  readonly ribHeightM: number;
  /** Weight of deck plate and ribs, kN/m2. */
  readonly plateKNm2: number;
  /** Least and greatest height of the box along the unit, m. */
  readonly boxM: number;
  readonly deepestM: number;
  readonly yieldMPa: (thicknessM: number) => number;
}

interface Demand {
  readonly momentKNm: number;
  readonly shearKN: number;
  readonly rangeKNm: number;
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
  const { between, bracket } = demandsOf(beam, spanM);
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
  const strut = strutted
    ? sizeStrut(beam, demandsOf(beam, spanM).strutKN)
    : { diameterM: 0, kg: 0, utilisation: 0 };
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

interface Demands {
  readonly between: Demand;
  readonly bracket: Demand;
  /** On a strut under the middle of a cell, kN; 0 without. */
  readonly strutKN: number;
}

const demands = new Map<string, Demands>();

/** Loads of the deck on one crossbeam: the same whatever the depth of the box. */
function demandsOf(beam: CrossBeamCase, spanM: number): Demands {
  const { id, deck, layout, pitchM, plateKNm2 } = beam;
  const key = `${id} ${Object.values(deck).join()} ${layout.cells} ${pitchM} ${plateKNm2} ${spanM}`;
  const known = demands.get(key);
  if (known) return known;
  const made = {
    between: betweenWebs(beam, spanM),
    bracket: onBracket(beam),
    strutKN: spanM < layout.cellM ? onStrut(beam, spanM) : 0,
  };
  if (demands.size >= 64) demands.clear();
  demands.set(key, made);
  return made;
}

/** Traffic over one bay each way, kN or kNm by the line; `lines` are tried and the worst taken. */
function trafficOf(beam: CrossBeamCase, lines: readonly CrossLine[]): number {
  const { pitchM } = beam;
  const stations = [-pitchM, 0, pitchM];
  // On a short loaded length nearly the whole vehicle counts against 1 kN/m over half of it.
  const weigh = 1000 / (2 * pitchM);
  return Math.max(
    ...lines.map(
      (line) =>
        trafficOnInfluence(trafficOnCrossLine(beam.id, beam.deck, line, weigh), stations, [0, 1, 0]).max,
    ),
  );
}

/** Range of the fatigue lorry in the worst lane. */
function rangeOf(beam: CrossBeamCase, lines: readonly CrossLine[]): number {
  const { pitchM, id } = beam;
  const lorry = steelBoxData.deckFatigue[id];
  const track = loadTrack([-pitchM, 0, pitchM]);
  const out: Extremes = { max: 0, min: 0 };
  const group = { atM: lorry.atM, loadKN: lorry.loadKN.map((kN) => kN * lorry.factor), whole: true };
  runGroup(track, group, straightLine(track.xM, [0, 1, 0]), -1, out);
  return (out.max - out.min) * Math.max(...lines.map((line) => worstLaneShare(id, beam.deck, line)));
}

const far = 1e3;

/** Pieces of the crossbeam between supports across the deck: [start, length]. */
function piecesOf({ layout }: CrossBeamCase, spanM: number): [fromM: number, spanM: number][] {
  const count = Math.round(layout.topM / spanM);
  return Array.from({ length: count }, (_, i) => [i * spanM - layout.topM / 2, spanM]);
}

function betweenWebs(beam: CrossBeamCase, spanM: number): Demand {
  const pieces = piecesOf(beam, spanM);
  const bend = pieces.map(([y, s]): CrossLine => ({
    yM: [-far, y, y + s / 2, y + s, far],
    value: [0, 0, s / 4, 0, 0],
  }));
  const shear = pieces.flatMap(([y, s]): CrossLine[] => [
    { yM: [-far, y - 1e-3, y, y + s, far], value: [0, 0, 1, 0, 0] },
    { yM: [-far, y, y + s, y + s + 1e-3, far], value: [0, 0, 1, 0, 0] },
  ]);
  const { uls } = beam.standard.factors;
  const lastingKNm = lastingOn(beam);
  return {
    momentKNm: (lastingKNm * spanM ** 2) / 8 + uls.traffic * trafficOf(beam, bend),
    shearKN: (lastingKNm * spanM) / 2 + uls.traffic * trafficOf(beam, shear),
    rangeKNm: rangeOf(beam, bend),
  };
}

/** Design weight of deck plate, ribs, crossbeam and surfacing on one crossbeam, kN/m. */
function lastingOn({ pitchM, plateKNm2, deck, standard }: CrossBeamCase): number {
  const { uls } = standard.factors;
  const crossKNm = 1.5;
  return (
    uls.permanent * (plateKNm2 * pitchM + crossKNm) +
    uls.superimposed * superimposedOn(deck).surfacingKNm2 * pitchM
  );
}

function onBracket(beam: CrossBeamCase): Demand {
  const { layout, deck, pitchM } = beam;
  const { uls } = beam.standard.factors;
  const a = layout.overhangM;
  const root = layout.topM / 2;
  const lines = (value: number): CrossLine[] => [
    { yM: [-far, root, root + a, far], value: [0, 0, value, value] },
    { yM: [-far, -root - a, -root, far], value: [value, value, 0, 0] },
  ];
  const step = (): CrossLine[] => [
    { yM: [-far, root - 1e-3, root, far], value: [0, 0, 1, 1] },
    { yM: [-far, -root, -root + 1e-3, far], value: [1, 1, 0, 0] },
  ];
  const lastingKNm = lastingOn(beam);
  const edgeKN = (uls.superimposed * superimposedOn(deck).edgesKNm * pitchM) / 2;
  const arm = Math.max(0, a - steelBoxData.crossbeam.edgeArmM);
  return {
    momentKNm: (lastingKNm * a ** 2) / 2 + edgeKN * arm + uls.traffic * trafficOf(beam, lines(a)),
    shearKN: lastingKNm * a + edgeKN + uls.traffic * trafficOf(beam, step()),
    rangeKNm: rangeOf(beam, lines(a)),
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

/** Design load of the worst strut, kN. */
function onStrut(beam: CrossBeamCase, spanM: number): number {
  const { layout } = beam;
  const lines = Array.from({ length: layout.cells }, (_, i): CrossLine => {
    const y = (i + 0.5) * layout.cellM - layout.topM / 2;
    return { yM: [-far, y - spanM, y, y + spanM, far], value: [0, 0, 1, 0, 0] };
  });
  return lastingOn(beam) * spanM + beam.standard.factors.uls.traffic * trafficOf(beam, lines);
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
