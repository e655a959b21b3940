import {
  trafficOnCrossLine,
  trafficOnInfluence,
  worstLaneShare,
  type CrossLine,
  type LoadStandard,
} from '../../actions/index.ts';
import { loadTrack, runGroup, straightLine, type Extremes } from '../../mechanics/index.ts';
import type { DeckSpec, StandardId } from '../../model/index.ts';
import { superimposedOn } from '../common/superimposed.ts';
import type { BoxLayout } from './boxLayout.ts';
import { steelBoxData } from './steelBoxData.ts';

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

/** Design forces of a crossbeam and its moment range under the fatigue lorry. */
export interface Demand {
  readonly momentKNm: number;
  readonly shearKN: number;
  readonly rangeKNm: number;
}

/** Forces of all parts of one crossbeam. */
export interface CrossBeamDemands {
  readonly between: Demand;
  readonly bracket: Demand;
  /** On a strut under the middle of a cell, kN; 0 without. */
  readonly strutKN: number;
}

const demands = new Map<string, CrossBeamDemands>();

/**
 * Loads of the deck on one crossbeam: the same whatever the depth of the box.
 * @param spanM between webs, or from a web to the strut under the middle of a cell, m
 */
export function crossBeamDemands(beam: CrossBeamCase, spanM: number): CrossBeamDemands {
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

/** Design load of the worst strut, kN. */
function onStrut(beam: CrossBeamCase, spanM: number): number {
  const { layout } = beam;
  const lines = Array.from({ length: layout.cells }, (_, i): CrossLine => {
    const y = (i + 0.5) * layout.cellM - layout.topM / 2;
    return { yM: [-far, y - spanM, y, y + spanM, far], value: [0, 0, 1, 0, 0] };
  });
  return lastingOn(beam) * spanM + beam.standard.factors.uls.traffic * trafficOf(beam, lines);
}
