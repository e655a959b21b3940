import { materials } from '../../actions/index.ts';
import type { MeasuredLine } from '../../model/index.ts';
import { measured } from '../common/measured.ts';
import { steelArea } from '../composite-i/girderSection.ts';
import { halfThroughData } from './halfThroughData.ts';
import type { HalfThroughUnit } from './halfThroughUnit.ts';
import { edgePlates } from './sizeEdgeGirder.ts';

/** Measured lines of the superstructure: girders by plate, frames, floor, slab, robust kerbs, paint. */
export function halfThroughLines(unit: HalfThroughUnit): MeasuredLine[] {
  const { case: c, girder, floor, panels } = unit;
  const density = materials.steelDensityKgM3;
  const { lengthM } = c;
  const steel = (kg: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'plate-girder-steel', kg, what, how);
  const alongKg = (areaM2: (e: number) => number): number =>
    2 * c.elementM.reduce((sum, length, e) => sum + density * areaM2(e) * length, 0);
  const webHeight = (e: number): number => girder.choice.heightM - girder.topM[e]! - girder.bottomM[e]!;
  const wide = `2 girders, ${mm(girder.widthM)} mm wide, ${density} kg/m3`;
  const crossCount = panels.reduce((sum, n) => sum + n, 0) + 1;
  const { section } = girder.post;
  const deckM2 = c.task.deck.widthM * lengthM;
  const { kerb } = halfThroughData;
  const kerbM3 = 2 * kerb.heightM * kerb.widthM * lengthM;
  return [
    steel(
      alongKg((e) => girder.webM[e]! * webHeight(e)),
      'webs',
      `2 girders ${girder.choice.heightM.toFixed(2)} m high`,
    ),
    steel(
      alongKg((e) => girder.topM[e]! * girder.widthM),
      'top flanges',
      wide,
    ),
    steel(
      alongKg((e) => girder.bottomM[e]! * girder.widthM),
      'bottom flanges',
      wide,
    ),
    steel(
      2 * girder.postsKg,
      'posts of the U-frames',
      `${mm(section.depthM)} mm deep at ${crossCount} cross-girders, ${girder.endFrames} at each support`,
    ),
    steel(2 * girder.bearingKg, 'bearing stiffeners', 'design reactions beyond the posts at the supports'),
    steel(
      2 * girder.detailKg,
      'welds, splices and bolts',
      `${(100 * halfThroughData.detailShare.value).toFixed(0)} % of the girders`,
    ),
    steel(
      crossCount * floor.crossGirder.massKgPerM * floor.crossM,
      'cross-girders',
      `${crossCount} of ${floor.crossM.toFixed(1)} m, ${floor.crossGirder.massKgPerM.toFixed(0)} kg/m`,
    ),
    steel(girder.endCrossKg, 'end frames', `cross-girders at supports, ${girder.endFrames} frames each`),
    measured('deck', 'deck-concrete', floor.slab.meanM * deckM2, 'deck slab', `${mm(floor.slab.meanM)} mm`),
    measured(
      'deck',
      'deck-concrete',
      kerbM3,
      'robust kerbs',
      `2 of ${mm(kerb.heightM)} x ${mm(kerb.widthM)} mm before the girders`,
    ),
    measured(
      'deck',
      'reinforcement',
      floor.barsKgM2 * deckM2,
      'bars of the slab',
      `${floor.barsKgM2.toFixed(0)} kg/m2`,
    ),
    measured('deck', 'reinforcement', kerb.barsKgM3 * kerbM3, 'bars of the kerbs', `${kerb.barsKgM3} kg/m3`),
    measured('deck', 'slab-formwork', deckM2, 'formwork of the slab', 'deck area'),
    measured('deck', 'paint', paintM2(unit), 'girders, posts and floor', 'outside surfaces'),
  ];
}

/** Painted surface, m2. */
function paintM2({ case: c, girder, floor }: HalfThroughUnit): number {
  let girders = 0;
  for (let e = 0; e < c.elementM.length; e++) {
    const { heightM, topWidthM, topM, bottomM, webM } = edgePlates(girder, e);
    girders += 2 * (2 * heightM + 4 * topWidthM + topM + bottomM - 2 * webM) * c.elementM[e]!;
  }
  // A post shows twice its area over its thickness.
  const { areaM2, section } = girder.post;
  const posts =
    ((2 * 2 * girder.postsKg) / (materials.steelDensityKgM3 * areaM2)) * (areaM2 / (section.webMm / 1000));
  return girders + posts + floor.paintM2PerM * c.lengthM;
}

/** Heaviest piece of one girder, cut into pieces of the usual length. */
export function heaviestPiece({ case: c, girder }: HalfThroughUnit): { lengthM: number; massT: number } {
  const pieces = Math.max(1, Math.ceil(c.lengthM / halfThroughData.pieceLengthM.value - 1e-9));
  const lengthM = c.lengthM / pieces;
  let massT = 0;
  for (let p = 0; p < pieces; p++) {
    let mass = 0;
    let start = 0;
    for (let e = 0; e < c.elementM.length; e++) {
      const end = start + c.elementM[e]!;
      const overlap = Math.min(end, (p + 1) * lengthM) - Math.max(start, p * lengthM);
      if (overlap > 0)
        mass += (materials.steelDensityKgM3 / 1000) * steelArea(edgePlates(girder, e)) * overlap;
      start = end;
    }
    massT = Math.max(massT, mass);
  }
  return { lengthM, massT };
}

function mm(lengthM: number): string {
  return (lengthM * 1000).toFixed(0);
}
