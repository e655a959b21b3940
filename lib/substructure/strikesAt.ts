import type { Strike } from '../model/index.ts';
import { substructureData } from './data.ts';
import type { Setting } from './setting.ts';

/**
 * What may strike a support that stands free: the nearest vehicle or train along the road, whatever way it drives; the
 * largest vessel head-on across it, or with a share of its force along it, at the ordinary water level.
 */
export function strikesAt({ impact, vesselKN, waterLevelM, groundLevelM }: Setting): Strike[] {
  const { alongShare } = substructureData.vessel;
  const strikes: Strike[] = [];
  if (impact !== null) strikes.push({ alongKN: impact.forceKN, acrossKN: 0, aboveGroundM: impact.heightM });
  if (vesselKN !== null && waterLevelM !== null) {
    const aboveGroundM = waterLevelM - groundLevelM;
    strikes.push(
      { alongKN: 0, acrossKN: vesselKN, aboveGroundM },
      { alongKN: alongShare * vesselKN, acrossKN: 0, aboveGroundM },
    );
  }
  return strikes;
}
