import type { At } from '../model/index.ts';

/** Paths of what any pier shaft is sized for: its loads, what may strike or shake it, and the practice it is held to. */
export const shaftDuties = (at: At) =>
  ({
    height: `${at.foot}/heightM`,
    permanent: `${at.foot}/permanentKN`,
    design: `${at.foot}/articulation/bearingMN`,
    along: `${at.foot}/articulation/alongKN`,
    across: `${at.foot}/articulation/acrossKN`,
    building:
      at.support.articulation.buildingKNm === undefined ? [] : [`${at.foot}/articulation/buildingKNm`],
    struck: at.support.articulation.vesselKN === undefined ? [] : [`${at.foot}/articulation/vesselKN`],
    earthquake: at.site.seismic == null ? [] : ['site/seismic/groundAccelerationG'],
    stress: 'data/substructure/pier/axialShare',
    slenderness: 'data/substructure/pier/slenderness',
    step: 'data/substructure/pier/stepM',
  }) as const;
