export type { BeamGeometry } from './beam/beamMesh.ts';
export { lineBeam, type LineBeam } from './beam/lineBeam.ts';
export type { Effects } from './beam/effects.ts';
export {
  distributed,
  imposedCurvature,
  pointLoads,
  settle,
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
export {
  addLine,
  addLoadMoment,
  addLoadShear,
  deflectionLine,
  momentLine,
  shearLine,
  sources,
} from './beam/influence.ts';
export { loadTrack, reversed, type AxleGroup, type Track } from './placing/track.ts';
export { beamTrack, straightLine } from './placing/beamTrack.ts';
export { runGroup, type Extremes } from './placing/axles.ts';
export { runTwoGroups } from './placing/twoGroups.ts';
export { lineAreas, type LineAreas } from './placing/areas.ts';
