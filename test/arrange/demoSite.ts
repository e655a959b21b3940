import { survey } from '../../lib/site/index.ts';
import type { Obstacle, Site } from '../../lib/model/index.ts';
import { plainBrief } from '../site/demoBrief.ts';

/** A barred or soft stretch of the shape [from, to, name], in metres from the start. */
export type DemoZone = readonly [from: number, to: number, name?: string];

/** A level crossing of a given length with hard and soft stretches and nothing else. */
export function demoSite(
  lengthM: number,
  hard: readonly DemoZone[] = [],
  soft: readonly DemoZone[] = [],
): Site {
  const zone =
    (supports: 'hard' | 'soft') =>
    ([fromM, toM, name]: DemoZone, i: number): Obstacle => ({
      kind: 'river',
      name: name ?? `${supports} ${i + 1}`,
      fromM,
      toM,
      supports,
      pierPremium: 'unknown',
      clearance: null,
    });
  const plain = plainBrief();
  return survey({
    ...plain,
    crossing: {
      ...plain.crossing,
      endM: lengthM,
      ground: [
        { chainageM: 0, levelM: 0 },
        { chainageM: lengthM, levelM: 0 },
      ],
    },
    obstacles: [...hard.map(zone('hard')), ...soft.map(zone('soft'))],
  });
}

/** The same site seen from the other end. */
export function mirroredSite(site: Site): Site {
  const turn = (x: number): number => site.startM + site.endM - x;
  const turned = <T extends { readonly fromM: number; readonly toM: number }>(zone: T): T => ({
    ...zone,
    fromM: turn(zone.toM),
    toM: turn(zone.fromM),
  });
  return {
    ...site,
    zones: site.zones.map(turned).reverse(),
    mainOpening: site.mainOpening === null ? null : turned(site.mainOpening),
    groundX: site.groundX.map(turn).reverse(),
    groundZ: [...site.groundZ].reverse(),
  };
}
