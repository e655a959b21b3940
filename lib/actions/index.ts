export { loadStandard, type LoadStandard } from './loadStandard.ts';
export { notionalLanes, type NotionalLanes } from './notionalLanes.ts';
export { serviceTraffic, type LongSpanLoad, type TrafficLoad } from './trafficLoad.ts';
export { trafficOnDeck } from './trafficOnDeck.ts';
export { trafficOnCrossLine, worstLaneShare } from './trafficOnCrossLine.ts';
export { aashtoFactors, girderStiffnessM4, type GirderDeck, type GirderFactors } from './aashtoFactors.ts';
export {
  atObtuseCorner,
  cellularCorner,
  closeBeamCorner,
  girderCorner,
  spreadBoxCorner,
} from './obtuseCorner.ts';
export { leverRule } from './leverRule.ts';
export { crossValue, type CrossLine } from './crossLine.ts';
export { rigidCrossbeam, trafficOnGirder, type GirderOptions } from './trafficOnGirder.ts';
export { trafficTorsion, type TrafficTorsion } from './trafficTorsion.ts';
export { trafficEnvelope, type EnvelopeOptions, type TrafficEnvelope } from './trafficEnvelope.ts';
export { plainQuest, trafficOnLine } from './trafficOnLine.ts';
export { trafficOnInfluence } from './trafficOnInfluence.ts';
export {
  concrete,
  lightConcrete,
  materials,
  steelYield,
  usualSteel,
  type Concrete,
  type LightConcrete,
  type SteelGrade,
} from './materials.ts';
