import { z } from '../zod.ts';
import raw from '../../data/substructure.json';

const source = z.string().min(1);
const figure = z.object({ value: z.number(), unit: z.string(), source }).transform((f) => f.value);
const figureList = z
  .object({ value: z.array(z.number()).min(1), unit: z.string(), source })
  .transform((f) => f.value);
const figures = <K extends string>(...keys: K[]) =>
  z.strictObject(Object.fromEntries(keys.map((key) => [key, figure])) as Record<K, typeof figure>);

const movement = figures('expansionPerK', 'rangeK', 'shorteningPerM');
const impact = figures('reachM', 'forceKN', 'heightM');
const ground = z.strictObject({
  allowableKPa: figure,
  shaftKPa: figure,
  baseKPa: figure,
  leastDepthM: figure,
  intoStratumM: figure,
  socketDiameters: figure,
  scours: z.boolean(),
});

const schema = z.strictObject({
  about: z.string(),
  concrete: figures('fckMPa', 'fcdMPa', 'fydMPa', 'weightKNm3', 'modulusMPa', 'crackedShare'),
  factors: figures('permanent', 'traffic', 'wind', 'windWithTraffic', 'favourable', 'imposed'),
  braking: z.strictObject({
    lm1: figures('baseKN', 'perMKN', 'capKN'),
    hl93: figures('truckShare', 'trainShare', 'truckKN', 'laneKNm'),
  }),
  wind: figures('pressureKNm2', 'trafficHeightM'),
  friction: figures('coefficient'),
  movement: z.strictObject({
    composite: movement,
    prestressed: movement,
    reinforced: movement,
    jointGroupMm: figure,
  }),
  bearings: figures(
    'perLine',
    'heightM',
    'rubberStrain',
    'brakingStrain',
    'leastRubberM',
    'mostRubberM',
    'rubberShearMPa',
    'rubberPressureMPa',
    'mostElastomericMN',
    'tieDownShare',
  ),
  seismic: figures(
    'amplification',
    'behaviour',
    'orthogonalShare',
    'shaftShare',
    'soilA',
    'soilB',
    'soilC',
    'soilD',
    'soilE',
  ),
  vessel: figures('factor', 'presetSpeedMs', 'alongShare'),
  integral: figures('mostMovementMm', 'mostSkewDeg'),
  impact: z.strictObject({ road: impact, railway: impact }),
  pier: figures(
    'axialShare',
    'slenderness',
    'effectiveLength',
    'leastLeafM',
    'leastColumnM',
    'leafWidthShare',
    'leastLeafWidthM',
    'headDepthM',
    'hollowPrice',
    'leastHollowM',
    'hollowFromM',
    'framedHollowAboveM',
    'wallM',
    'stepM',
    'leafBarsKgM3',
    'columnBarsKgM3',
    'hollowBarsKgM3',
    'framedLeafBarsKgM3',
    'framedHollowBarsKgM3',
    'verticalShare',
  ),
  pylon: figures('legLengthM', 'legsBeyondDeckM'),
  scour: figures('generalRiverM', 'generalPlainM', 'localFactor', 'embedmentM'),
  ground: z.strictObject({ rock: ground, gravel: ground, 'stiff-clay': ground, 'soft-clay': ground }),
  footing: figures(
    'deepestM',
    'baseFriction',
    'shearKPa',
    'designPressure',
    'coverM',
    'leastOverhangM',
    'leastDepthM',
    'stepM',
    'soilKNm3',
    'barsKgM3',
  ),
  piles: z.strictObject({
    diametersM: figureList,
    lateralKN: figureList,
    safety: figure,
    concreteMPa: figure,
    tensionShare: figure,
    spacing: figure,
    longestInStratumM: figure,
    mostDiameters: figure,
    perPileM3: figure,
    capDepthDiameters: figure,
    leastCapDepthM: figure,
    capCoverM: figure,
    barsKgM3: figure,
  }),
  pit: figures(
    'workingSpaceM',
    'slope',
    'freeboardM',
    'toeShare',
    'sealShare',
    'protectionM',
    'protectionReach',
  ),
  abutment: z.strictObject({
    bankSeatIntegralBarsKgM3: figure,
    fullHeightIntegralBarsKgM3: figure,
    spillThroughBarsKgM3: figure,
    spillThroughIntegralBarsKgM3: figure,
    columnPerHeight: figure,
    leastColumnM: figure,
    columnSpacingM: figure,
    columnPressureWidths: figure,
    bermM: figure,
    pileHeelShares: figureList,
    bankSeatUpToM: figure,
    seatBeamM: figure,
    leastStemM: figure,
    stemPerHeight: figure,
    backWallM: figure,
    wingM: figure,
    wingMeanHeight: figure,
    wingFootingWidth: figure,
    wingFootingM: figure,
    heelShare: figure,
    footingPerHeight: figure,
    activePressure: figure,
    surchargeKPa: figure,
    barsKgM3: figure,
  }),
});

/** Figures of `data/substructure.json`, checked once; every figure there carries its unit and its source. */
export const substructureData = schema.parse(raw);

/** Figures of one ground class. */
export type GroundFigures = (typeof substructureData.ground)[keyof typeof substructureData.ground];
