export { loadStandard, type LoadStandard } from './loadStandard.ts';
export { notionalLanes, type NotionalLanes } from './notionalLanes.ts';
export { serviceTraffic, type LongSpanLoad, type TrafficLoad } from './trafficLoad.ts';
export { trafficOnDeck } from './trafficOnDeck.ts';
export { fatigueOnCrossLine, trafficOnCrossLine } from './trafficOnCrossLine.ts';
export { rigidCrossbeam, trafficOnGirder } from './trafficOnGirder.ts';
export { trafficTorsion, type TrafficTorsion } from './trafficTorsion.ts';
export { trafficEnvelope, type EnvelopeOptions, type TrafficEnvelope } from './trafficEnvelope.ts';
export { trafficOnInfluence } from './trafficOnInfluence.ts';
