import { trafficOnInfluence, type TrafficLoad } from '../../actions/index.ts';
import type { Track } from '../../mechanics/index.ts';
import type { CableModel } from './cableModel.ts';
import type { DeckForces } from './sizeEdgeGirder.ts';
import { deckPush, type LastingForces } from './stayForces.ts';
import type { StayLayout } from './stayLayout.ts';

/** A stretch of edge girder with one section. */
export interface DeckZone {
  readonly pylon: number;
  readonly side: -1 | 1;
  /** Distances from the pylon, m. */
  readonly fromM: number;
  readonly toM: number;
  /** Length of one plane it stands for, mirrored stretches included, m. */
  readonly totalM: number;
}

/** Shares of the reach at which the section changes. */
const cuts = [0, 0.25, 0.6, 1];

/** Three stretches on each side of each pylon; of a symmetrical bridge only those of the first pylon, counted twice. */
export function deckZones(layout: StayLayout, symmetrical: boolean): DeckZone[] {
  const zones: DeckZone[] = [];
  const times = symmetrical ? 2 : 1;
  layout.pylons.forEach((_, p) => {
    if (symmetrical && p > 0) return;
    for (const side of [-1, 1] as const) {
      const reachM = reachOf(layout, p, side);
      for (let i = 0; i + 1 < cuts.length; i++) {
        const fromM = cuts[i]! * reachM;
        const toM = cuts[i + 1]! * reachM;
        zones.push({ pylon: p, side, fromM, toM, totalM: (toM - fromM) * times });
      }
    }
  });
  return zones;
}

/** From a pylon to midspan towards the other pylon, or to the end of the unit, m. */
function reachOf(layout: StayLayout, pylon: number, side: -1 | 1): number {
  const { pylons, lengthM } = layout;
  const x = pylons[pylon]!.xM;
  const other = pylons[pylon + side];
  if (other) return Math.abs(other.xM - x) / 2;
  return side === 1 ? lengthM - x : x;
}

/**
 * Forces at the sections of a stretch: at its stays and half-way between, two of each at most, its end nearest the pylon
 * and, in the last stretch, the middle of the last bay. Lasting bending is that of a beam held level at its stays.
 */
export function deckSections(
  zone: DeckZone,
  model: CableModel,
  track: Track,
  lasting: LastingForces,
  traffic: TrafficLoad,
  loadKNm: number,
): DeckForces[] {
  const { layout } = model;
  const { pylon, side, fromM, toM } = zone;
  const { xM: x0, spacingM: s } = layout.pylons[pylon]!;
  const reachM = reachOf(layout, pylon, side);
  const bay = (loadKNm * s * s) / 12;
  const places: { fromPylonM: number; lastingKNm: number }[] = [];
  const stays = layout.stays.filter(
    (stay) => stay.pylon === pylon && stay.side === side && stay.cosine > 0 && !stay.anchor,
  );
  const reaches = stays
    .map((stay) => Math.abs(stay.deckM - x0))
    .filter((r) => r >= fromM - 1e-6 && r <= toM + 1e-6);
  for (const r of [reaches[0], reaches[reaches.length - 1]]) {
    if (r === undefined) continue;
    places.push({ fromPylonM: r, lastingKNm: -bay }, { fromPylonM: r - s / 2, lastingKNm: bay / 2 });
  }
  if (fromM === 0) places.push({ fromPylonM: 0, lastingKNm: -bay });
  if (toM >= reachM - 1e-6) {
    const lastM = Math.max(0, ...stays.map((stay) => Math.abs(stay.deckM - x0)));
    const open = reachM - lastM;
    const ends = layout.pylons[pylon + side] === undefined;
    // A bay that ends on a simple support sags more; the closing bay at midspan is continuous.
    places.push({
      fromPylonM: ends ? lastM + open / 2 : reachM,
      lastingKNm: ends ? (loadKNm * open * open) / 11 : bay / 2,
    });
  }
  const pushes = new Map<number, number>();
  return places.map(({ fromPylonM, lastingKNm }) => {
    const atM = x0 + side * fromPylonM;
    const moment = trafficOnInfluence(traffic, track, model.momentLine(model.stationAt(atM, x0)));
    const permanentKN = deckPush(layout, lasting.stayKN, pylon, side, fromPylonM);
    // Sections of one bay have the same stays beyond them.
    const beyond = stays.filter((stay) => Math.abs(stay.deckM - x0) >= fromPylonM - 1e-9).length;
    let trafficKN = pushes.get(beyond);
    if (trafficKN === undefined) {
      trafficKN = trafficPush(model, track, traffic, pylon, side, fromPylonM);
      pushes.set(beyond, trafficKN);
    }
    return {
      atM,
      permanentKN,
      trafficKN,
      permanentKNm: lastingKNm,
      trafficMaxKNm: moment.max,
      trafficMinKNm: moment.min,
    };
  });
}

/** Greatest push of traffic in the deck at a section, kN. */
function trafficPush(
  model: CableModel,
  track: Track,
  traffic: TrafficLoad,
  pylon: number,
  side: -1 | 1,
  fromM: number,
): number {
  const { layout } = model;
  const x0 = layout.pylons[pylon]!.xM;
  const push = new Float64Array(model.beam.xM.length);
  layout.stays.forEach((stay, i) => {
    if (stay.pylon !== pylon || stay.side !== side || Math.abs(stay.deckM - x0) < fromM - 1e-9) return;
    const line = model.stayLine(i);
    for (let j = 0; j < line.length; j++) push[j]! += line[j]! * stay.cosine;
  });
  return trafficOnInfluence(traffic, track, push).max;
}
