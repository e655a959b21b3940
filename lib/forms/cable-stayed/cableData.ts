import { z } from '../../zod.ts';
import json from '../../../data/forms/cable-stayed.json';
import { cited } from '../common/cited.ts';

const n = z.number();
const source = z.string().min(1);

const schema = z.strictObject({
  note: z.string(),
  pylonHeight: z.strictObject({ overMainTwo: n, overMainOne: n, headM: n, source }),
  staySpacingM: z.strictObject({ least: n, most: n, target: n, overMain: n, source }),
  anchorZone: z.strictObject({ spacingM: n, mostOverHeight: n, source }),
  anchorStays: z.strictObject({ least: n, most: n, deckSpacingM: n, source }),
  planeOffsetM: cited,
  crossSpacingM: cited,
  crossDepthOverPlanes: cited,
  slabThickening: z.strictObject({ stepM: n, mostM: n, source }),
  stay: z.strictObject({ strandMm2: n, serviceShare: n, leastStrands: n, mostStrands: n, source }),
  edgeGirder: z.strictObject({
    leastWebMm: n,
    webSlenderness: n,
    flangeWidthM: z.strictObject({ least: n, most: n, overDepth: n }),
    leastFlangeMm: n,
    topOverBottom: n,
    detailShare: n,
    source,
  }),
  modularLong: cited,
  slabStress: cited,
  deflectionOverSpan: cited,
  pylon: z.strictObject({
    fckMPa: n,
    lengthOverHeight: z.strictObject({ least: n, most: n }),
    leastLengthM: n,
    stepM: n,
    widthOverLength: n,
    leastWallM: n,
    wallOverLength: n,
    topOverBase: n,
    leastTopM: n,
    barRatioLeast: n,
    barRatioMost: n,
    barDetailShare: n,
    crackedStiffness: n,
    crossbeamDepthOverLeg: n,
    windPressureKNm2: n,
    windDrag: n,
    outOfPlumb: n,
    source,
  }),
  assumedHeightM: cited,
});

/** Practical figures of cable-stayed decks, `data/forms/cable-stayed.json`. */
export const cableData = schema.parse(json);
