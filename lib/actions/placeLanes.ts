import { crossPositiveArea, crossValue, type CrossLine } from './crossLine.ts';
import type { LoadStandard } from './loadStandard.ts';
import { notionalLanes } from './notionalLanes.ts';

/** What a member carries of the lanes in their worst position across the deck. */
export interface PlacedLanes {
  /** Sum over lanes of share of the lane-1 vehicle x cross line. */
  readonly vehicle: number;
  /** Sum of uniform loads x cross line, kN/m. */
  readonly uniformKNm: number;
  readonly loadedLanes: number;
}

/**
 * Tries lanes side by side at every 0.25 m across the carriageway, the heavier lanes where the line is higher, only the
 * adverse parts loaded, every number of loaded lanes with its presence factor; returns the worst.
 * @param leftM position of the left kerb, m from the middle of the deck
 * @param weigh vehicle value of 1 against 1 kN/m of uniform load, kN/m, by which arrangements are compared
 * @param mostLanes at most so many lanes are loaded
 */
export function placeLanes(
  standard: LoadStandard,
  line: CrossLine,
  leftM: number,
  carriagewayM: number,
  weigh: number,
  mostLanes = Infinity,
): PlacedLanes {
  const { lanes } = standard;
  const { count, widthM } = notionalLanes(lanes, carriagewayM);
  const slack = carriagewayM - count * widthM;
  const steps = Math.ceil(slack / 0.25);
  let best: PlacedLanes = { vehicle: 0, uniformKNm: 0, loadedLanes: 0 };
  for (let step = 0; step <= steps; step++) {
    const start = leftM + (steps === 0 ? 0 : (slack * step) / steps);
    for (const lean of [-1, 0, 1]) {
      const placed = loadLanes(
        standard,
        line,
        leftM,
        carriagewayM,
        start,
        widthM,
        count,
        lean,
        weigh,
        mostLanes,
      );
      if (placed.vehicle * weigh + placed.uniformKNm > best.vehicle * weigh + best.uniformKNm) best = placed;
    }
  }
  return best;
}

/** `lean` moves the loaded strip within its lane: to its left edge, middle or right edge. */
function loadLanes(
  standard: LoadStandard,
  line: CrossLine,
  leftM: number,
  carriagewayM: number,
  start: number,
  widthM: number,
  count: number,
  lean: number,
  weigh: number,
  mostLanes: number,
): PlacedLanes {
  const { lanes } = standard;
  const loaded = Math.min(lanes.loadedWidthM, widthM);
  const play = ((widthM - loaded) / 2) * lean;
  const strips = Array.from({ length: count }, (_, i) => {
    const middle = start + (i + 0.5) * widthM + play;
    const half = lanes.wheelGaugeM / 2;
    return {
      vehicle: (crossValue(line, middle - half) + crossValue(line, middle + half)) / 2,
      area: crossPositiveArea(line, middle - loaded / 2, middle + loaded / 2),
    };
  }).sort((a, b) => b.vehicle - a.vehicle);

  const further = lanes.adjustment.further;
  const spare =
    crossPositiveArea(line, leftM, start) +
    crossPositiveArea(line, start + count * widthM, leftM + carriagewayM);
  let vehicle = 0;
  let uniformKNm = spare * lanes.remainingKNm2 * further;
  let best: PlacedLanes = { vehicle: 0, uniformKNm: 0, loadedLanes: 0 };
  strips.slice(0, mostLanes).forEach((strip, i) => {
    vehicle +=
      Math.max(0, strip.vehicle) *
      shareOf(lanes.vehicleShare, i, 0) *
      shareOf(lanes.adjustment.vehicle, i, 1);
    const listed = i < lanes.uniformKNm2.length || lanes.furtherUniformKNm2 === 0;
    const q = listed
      ? last(lanes.uniformKNm2, i) * shareOf(lanes.adjustment.uniform, i, 1)
      : lanes.furtherUniformKNm2 * further;
    uniformKNm += strip.area * q;
    const presence = last(lanes.multiplePresence, i);
    const placed = { vehicle: vehicle * presence, uniformKNm: uniformKNm * presence, loadedLanes: i + 1 };
    if (placed.vehicle * weigh + placed.uniformKNm > best.vehicle * weigh + best.uniformKNm) best = placed;
  });
  return best;
}

/** A list of one entry holds for all lanes; a longer one stops at its end with `beyond`. */
function shareOf(list: readonly number[], i: number, beyond: number): number {
  return list.length === 1 ? list[0]! : (list[i] ?? beyond);
}

function last(list: readonly number[], i: number): number {
  return list[Math.min(i, list.length - 1)]!;
}
