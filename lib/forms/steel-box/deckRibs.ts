import {
  loadStandard,
  materials,
  trafficOnInfluence,
  usualSteel,
  type TrafficLoad,
} from '../../actions/index.ts';
import {
  columnReduction,
  columnSlenderness,
  deflectionInfluence,
  lineBeam,
  loadTrack,
  momentInfluence,
  runGroup,
  straightLine,
  type AxleGroup,
  type Extremes,
} from '../../mechanics/index.ts';
import type { StandardId } from '../../model/index.ts';
import { steelBoxData } from './steelBoxData.ts';

/** A closed rib with the deck plate over one pitch. */
export interface DeckRib {
  readonly heightM: number;
  readonly thicknessM: number;
  /** Rib alone. */
  readonly areaM2: number;
  /** Centroid of the rib alone below the middle of the deck plate, m. */
  readonly centroidM: number;
  /** Rib with plate. */
  readonly inertiaM4: number;
  /** Axis of rib with plate below the middle of the plate, and depth of the bottom of the rib below that axis, m. */
  readonly axisM: number;
  readonly lowM: number;
  /** Share of yield kept as a strut between crossbeams. */
  readonly strut: number;
  /** Design stress under wheels alone at the bottom of the rib, tension in its span and compression over a crossbeam, MPa. */
  readonly spanMPa: number;
  readonly crossbeamMPa: number;
  /** Stress range of the fatigue lorry, MPa, and deflection under one vehicle over the span between crossbeams. */
  readonly rangeMPa: number;
  readonly deflectionRatio: number;
}

/** Trapezoidal rib of a height and wall thickness with a deck plate. */
export function ribSection(
  heightM: number,
  thicknessM: number,
  deckM: number,
): Pick<DeckRib, 'areaM2' | 'centroidM' | 'inertiaM4' | 'axisM' | 'lowM'> {
  const { pitchM, topM, bottomM } = steelBoxData.rib;
  const wall = 2 * Math.hypot(heightM, (topM - bottomM) / 2) * thicknessM;
  const foot = bottomM * thicknessM;
  const plate = pitchM * deckM;
  const areaM2 = wall + foot;
  const fromPlate = deckM / 2;
  const centroidM = (wall * (heightM / 2) + foot * heightM) / areaM2 + fromPlate;
  const axisM = (areaM2 * centroidM) / (areaM2 + plate);
  const inertiaM4 =
    (wall * heightM ** 2) / 12 +
    wall * (heightM / 2 + fromPlate - axisM) ** 2 +
    foot * (heightM + fromPlate - axisM) ** 2 +
    plate * axisM ** 2;
  return { areaM2, centroidM, inertiaM4, axisM, lowM: heightM + fromPlate - axisM };
}

/** What wheels and weight do to a rib that runs over crossbeams `pitchM` apart. */
interface RibEffects {
  /** Design moments of one rib, kNm, sagging in its span and hogging over a crossbeam. */
  readonly spanKNm: number;
  readonly crossbeamKNm: number;
  readonly rangeKNm: number;
  /** Deflection under traffic times EI, m x kNm2. */
  readonly deflectionEI: number;
}

const kept = new Map<string, RibEffects>();

/** Continuous over rigid crossbeams; vehicles of the standard on one rib with the share of a wheel that it takes. */
function ribEffects(id: StandardId, pitchM: number): RibEffects {
  const key = `${id} ${pitchM.toFixed(6)}`;
  const known = kept.get(key);
  if (known) return known;
  const standard = loadStandard(id);
  const { crossbeam, rib, deckFatigue } = steelBoxData;
  const beam = lineBeam({
    spansM: new Array<number>(crossbeam.spans).fill(pitchM),
    stationsPerSpan: 10,
  });
  const middle = Math.floor(crossbeam.spans / 2);
  const inSpan = beam.supportAt[middle]! + 5;
  const over = beam.supportAt[middle]!;
  const uniformKNm2 = Math.max(...standard.lanes.uniformKNm2);
  const load: TrafficLoad = {
    standard: id,
    vehicleFactor: rib.wheelShare / 2,
    udlKNm: uniformKNm2 * rib.pitchM,
    footwayKNm: 0,
    shearRatio: 1,
    loadedLanes: 1,
    distribution: 'lever rule',
  };
  const track = loadTrack(beam.xM);
  const moment = momentInfluence(beam, inSpan);
  const deadKNm = 3 * rib.pitchM;
  const { uls } = standard.factors;
  const lorry = deckFatigue[id];
  const group: AxleGroup = {
    atM: lorry.atM,
    loadKN: lorry.loadKN.map((kN) => (kN * lorry.factor * rib.wheelShare) / 2),
    whole: true,
  };
  const out: Extremes = { max: 0, min: 0 };
  runGroup(track, group, straightLine(track.xM, moment), -1, out);
  const made = {
    spanKNm:
      uls.traffic * trafficOnInfluence(load, track, moment).max +
      (uls.permanent * deadKNm * pitchM ** 2) / 24,
    crossbeamKNm:
      -uls.traffic * trafficOnInfluence(load, track, momentInfluence(beam, over)).min +
      (uls.permanent * deadKNm * pitchM ** 2) / 12,
    rangeKNm: out.max - out.min,
    deflectionEI:
      Math.max(...standard.deflection.combinations.map(({ vehicle }) => vehicle)) *
      trafficOnInfluence({ ...load, udlKNm: 0 }, track, deflectionInfluence(beam, inSpan)).max,
  };
  if (kept.size >= 128) kept.clear();
  kept.set(key, made);
  return made;
}

/**
 * Lightest closed rib that holds wheels, endless life and stiffness between crossbeams `pitchM` apart; the strongest where
 * none does.
 * @param deckM deck plate, m; `yieldMPa` of a thickness, m
 */
export function sizeRib(
  id: StandardId,
  pitchM: number,
  deckM: number,
  yieldMPa: (thicknessM: number) => number,
): DeckRib {
  const { heightsM, thicknessesM, deflectionOverSpan } = steelBoxData.rib;
  const effects = ribEffects(id, pitchM);
  const { resistance } = loadStandard(id);
  const limit = steelBoxData.deckFatigue.rangeMPa[id];
  const eKNm2 = materials.steel[usualSteel(id)].eMPa * 1e3;
  let best: DeckRib | null = null;
  let strongest: DeckRib | null = null;
  for (const thicknessM of thicknessesM) {
    for (const heightM of heightsM) {
      const section = ribSection(heightM, thicknessM, deckM);
      const fy = yieldMPa(thicknessM);
      const perMPa = section.lowM / section.inertiaM4 / 1e3;
      const gyration = Math.sqrt(section.inertiaM4 / (section.areaM2 + steelBoxData.rib.pitchM * deckM));
      const rib: DeckRib = {
        heightM,
        thicknessM,
        ...section,
        strut: columnReduction(columnSlenderness(pitchM, gyration, fy), 'b'),
        spanMPa: effects.spanKNm * perMPa,
        crossbeamMPa: effects.crossbeamKNm * perMPa,
        rangeMPa: effects.rangeKNm * perMPa,
        deflectionRatio: effects.deflectionEI / (eKNm2 * section.inertiaM4) / pitchM,
      };
      strongest = rib;
      const holds =
        Math.max(rib.spanMPa, rib.crossbeamMPa) <= fy / resistance.steel &&
        rib.rangeMPa <= limit &&
        rib.deflectionRatio <= deflectionOverSpan;
      if (holds && (best === null || rib.areaM2 < best.areaM2)) best = rib;
    }
  }
  return best ?? strongest!;
}
