import type { Brief, Obstacle, Site, SoffitLimit, Water, WaterBody, Zone } from '../model/index.ts';
import { deckSpec } from './deckSpec.ts';
import { roadCurves } from './roadCurves.ts';
import { widestBarred } from './widestBarred.ts';

function zoneOf(obstacle: Obstacle): Zone[] {
  if (obstacle.supports === 'none') return [];
  const { fromM, toM, kind, name, pierPremium } = obstacle;
  const hard = obstacle.supports === 'hard';
  return [{ fromM, toM, kind, name, hard, ...(hard || pierPremium === 'unknown' ? {} : { pierPremium }) }];
}

function clearanceLimit(obstacle: Obstacle): SoffitLimit[] {
  const clearance = obstacle.clearance;
  if (clearance === null) return [];
  return [
    {
      fromM: clearance.fromM,
      toM: clearance.toM,
      levelM: clearance.datumLevelM + clearance.headroomM,
      reason: obstacle.name,
      kind: obstacle.kind,
    },
  ];
}

/**
 * A flood level that is not known cannot be kept clear of: the ordinary level stands in, over the same stretch. The
 * afflux that is allowed is kept clear of as well, whatever the bridge turns out to make of it.
 */
function floodLimit(water: Water): SoffitLimit {
  const known = water.floodLevelM !== 'unknown';
  const afflux = known && water.allowedAffluxM !== 'unknown' ? water.allowedAffluxM : 0;
  return {
    fromM: water.floodFromM,
    toM: water.floodToM,
    levelM: (water.floodLevelM === 'unknown' ? water.levelM : water.floodLevelM) + water.freeboardM + afflux,
    reason: known
      ? `${water.name}, flood level and freeboard`
      : `${water.name}, ordinary level and freeboard, flood level unknown`,
    kind: 'flood',
  };
}

const known = (value: number | 'unknown'): number | null => (value === 'unknown' ? null : value);

function bodyOf(water: Water): WaterBody {
  const { name, fromM, toM, levelM, floodFromM, floodToM, freeboardM } = water;
  return {
    name,
    fromM,
    toM,
    levelM,
    floodLevelM: known(water.floodLevelM),
    river: {
      floodFromM,
      floodToM,
      freeboardM,
      flowM3s: known(water.flowM3s),
      velocityMs: known(water.velocityMs),
      allowedAffluxM: known(water.allowedAffluxM),
      grainMm: known(water.grainMm),
      siltFactor: known(water.siltFactor),
      vesselDwtT: known(water.vesselDwtT),
      vesselSpeedMs: known(water.vesselSpeedMs),
    },
  };
}

/** Innermost places of the abutments where either has a window. */
function windowsOf({ startM, endM, startLatestM, endEarliestM }: Brief['crossing']): Pick<Site, 'windows'> {
  const windows = {
    startLatestM: startLatestM === undefined || startLatestM === 'unknown' ? startM : startLatestM,
    endEarliestM: endEarliestM === undefined || endEarliestM === 'unknown' ? endM : endEarliestM,
  };
  return windows.startLatestM > startM || windows.endEarliestM < endM ? { windows } : {};
}

/**
 * Turns a checked brief into the site as the later stages read it: barred stretches, lowest allowed soffits, water,
 * ground and the deck, all in metres and plain data. The brief has been checked by `readStudy`; nothing throws here.
 */
export function survey(brief: Brief): Site {
  const { crossing, obstacles } = brief;
  const zones = obstacles.flatMap(zoneOf);
  const radius = crossing.planRadiusM;
  return {
    startM: crossing.startM,
    endM: crossing.endM,
    lengthM: crossing.endM - crossing.startM,
    ...windowsOf(crossing),
    groundX: crossing.ground.map((point) => point.chainageM),
    groundZ: crossing.ground.map((point) => point.levelM),
    zones,
    soffitLimits: [...obstacles.flatMap(clearanceLimit), ...brief.waters.map(floodLimit)],
    waters: brief.waters.map(bodyOf),
    groundStretches: brief.groundStretches,
    road: brief.road,
    roadCurves: roadCurves(brief.road, brief.loading),
    deck: deckSpec(brief.deck, brief.surfacingM, brief.loading),
    standard: brief.loading,
    planRadiusM: radius === 'unknown' ? null : radius === 'straight' ? Infinity : radius,
    skewDeg: crossing.skewDeg === 'unknown' ? null : crossing.skewDeg,
    seismic:
      crossing.groundAccelerationG === 'unknown'
        ? null
        : {
            groundAccelerationG: crossing.groundAccelerationG,
            siteClass: crossing.siteClass === 'unknown' ? null : crossing.siteClass,
          },
    mainOpening: widestBarred(zones, crossing.startM, crossing.endM),
  };
}
