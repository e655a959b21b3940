import { z } from '../../zod.ts';
import json from '../../../data/forms/steel-box.json';
import { cited } from '../common/cited.ts';

const source = z.string().min(1);
const number = z.number();
const list = z.array(number).min(1);
const lorry = z.object({ atM: list, loadKN: list, factor: number, source });

const schema = z.object({
  layout: z.object({
    overhangOverWidth: number,
    mostOverhangM: number,
    mostOneCellM: number,
    mostCellM: number,
    webSlope: number,
    bottomOverTop: number,
    source,
  }),
  deckPlate: z.object({
    leastM: number,
    thinSurfacingM: number,
    surfacingM: number,
    clearOverThickness: number,
    mostM: number,
    source,
  }),
  rib: z.object({
    pitchM: number,
    topM: number,
    bottomM: number,
    heightsM: list,
    thicknessesM: list,
    wheelShare: number,
    deflectionOverSpan: number,
    localShare: number,
    source,
  }),
  crossbeam: z.object({
    mostPitchM: number,
    spans: number,
    depthOverSpan: number,
    bracketDepthOverReach: number,
    leastDepthM: number,
    underRibM: number,
    mostOverBox: number,
    webM: number,
    mostWebM: number,
    deckShareOfSpan: number,
    leastFlangeM2: number,
    mostFlangeM2: number,
    tipM: number,
    detailShare: number,
    edgeArmM: number,
    mostClearM: number,
    source,
  }),
  deckFatigue: z.object({
    lm1: lorry,
    hl93: lorry,
    rangeMPa: z.object({ lm1: number, hl93: number }),
    source,
  }),
  web: z.object({
    leastM: number,
    mostM: number,
    panelM: number,
    panelOverThickness: number,
    ribHeightM: number,
    source,
  }),
  bottom: z.object({
    leastM: number,
    mostM: number,
    ribPitchM: number,
    spanPitchM: number,
    spanRibM: number,
    source,
  }),
  plateChangeKgPerM: cited,
  leastPlateLengthM: cited,
  lorryLanes: cited,
  frame: z.object({
    bottomHeightsM: list,
    postHeightsM: list,
    bracedEvery: number,
    diagonalStressShare: number,
    diagonalLeastKgM: number,
    distortionShare: number,
    source,
  }),
  strut: z.object({ slenderness: number, diametersM: list, source }),
  diaphragm: z.object({
    leastM: number,
    openingM2: number,
    ribShare: number,
    bearingStressShare: number,
    shearDepthShare: number,
    source,
  }),
  bearings: z.object({ fromWebsM: number, source }),
  haunch: z.object({
    power: number,
    leastDeeper: number,
    constantOverSpan: number,
    pierOverSpan: list,
    endReach: number,
    source,
  }),
  cantilever: z.object({
    segmentM: number,
    craneKN: number,
    towerEveryM: number,
    imbalance: number,
    leastOverLongest: number,
    source,
  }),
  launch: z.object({
    noseOverSpan: number,
    noseOverDeckWeight: number,
    noseStiffness: number,
    yardOverSpan: number,
    bearingM: number,
    source,
  }),
  pieceM: cited,
  insidePaintM2PerT: cited,
  weldsShare: cited,
  leastDepthM: cited,
  assumedHeightM: cited,
});

/** Practical figures of orthotropic steel boxes, `data/forms/steel-box.json`. */
export const steelBoxData = schema.parse(json);
