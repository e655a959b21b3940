export type { BeamGeometry } from './beam/beamMesh.ts';
export { lineBeam, type LineBeam } from './beam/lineBeam.ts';
export type { Effects } from './beam/effects.ts';
export { coupleAt, type CoupleEffects } from './beam/couple.ts';
export { solveDense } from './members/solveDense.ts';
export {
  distributed,
  elementAt,
  imposedCurvature,
  pointLoads,
  settle,
  stepped,
  uniform,
  type PointLoad,
} from './beam/loadings.ts';
export {
  deflectionInfluence,
  momentInfluence,
  reactionInfluence,
  shearInfluence,
  springInfluence,
} from './beam/influence.ts';
export { addLine, deflectionLine, momentLine, shearLine, sources } from './beam/influence.ts';
export { loadTrack, reversed, type AxleGroup, type Track } from './placing/track.ts';
export { beamTrack, straightLine } from './placing/beamTrack.ts';
export { runGroup, type Extremes } from './placing/axles.ts';
export { reactionLines } from './beam/reactionLines.ts';
export { beamStretches } from './placing/beamStretches.ts';
export { sectionLine, type Stretch, type StretchSection } from './placing/stretch.ts';
export { runTwoGroups } from './placing/twoGroups.ts';
export { lineAreas, type LineAreas } from './placing/areas.ts';
export {
  polygonProperties,
  type PolygonProperties,
  type SectionPoint,
} from './sections/polygonProperties.ts';
export { sectionProperties, type SectionPart, type SectionProperties } from './sections/sectionProperties.ts';
export { plasticMoment, type PlasticMoment, type PlasticPart } from './sections/plasticMoment.ts';
export { shearArea } from './sections/shearArea.ts';
export {
  bredt,
  compactTorsion,
  multiCellTorsion,
  openTorsion,
  rectangleTorsion,
  type Cell,
  type SharedWall,
  type Wall,
} from './sections/torsion.ts';
export {
  columnReduction,
  columnSlenderness,
  effectiveWidthRatio,
  internalPlateFactor,
  outstandWidthRatio,
  plateSlenderness,
  shearBucklingFactor,
  webShearCapacity,
  yieldRatio,
  type BucklingCurve,
  type WebShear,
} from './members/plateBuckling.ts';
export {
  planeTruss,
  trussForces,
  trussInfluence,
  type NodeLoad,
  type PlaneTruss,
  type TrussEffects,
  type TrussGeometry,
} from './members/planeTruss.ts';
export {
  frameEffects,
  planeFrame,
  type FrameEffects,
  type FrameFoot,
  type FrameGeometry,
  type FrameLoad,
  type PlaneFrame,
} from './members/planeFrame.ts';
export {
  catenary,
  catenaryCheck,
  ernstModulus,
  mainCableAreaM2,
  mainCableVolumeM3,
  parabolicCable,
  stayForce,
  stayVolumeFan,
  stayVolumeHarp,
  type Catenary,
  type ParabolicCable,
  type StayFan,
  type StayForce,
} from './members/cables.ts';
export {
  archInPlaneCriticalKN,
  archLengthM,
  archLines,
  archMomentInfluence,
  archOutOfPlaneCriticalKN,
  archRise,
  archThrust,
  archThrustInfluence,
  halfSpanMomentKNm,
  type ArchKind,
} from './members/arches.ts';
export { cantileverStages, type CantileverMoments, type CantileverStage } from './stages/cantileverStages.ts';
export { launchStages, type Launch, type LaunchMoments } from './stages/launchStages.ts';
export { creepRedistributed, spanBySpan, type SpanBySpan, type StagedMoments } from './stages/spanBySpan.ts';
