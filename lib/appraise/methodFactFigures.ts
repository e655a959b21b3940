import type { At, Descriptor } from '../model/index.ts';
import { fact, factOf } from './factFigure.ts';

const zones = (at: At, ...kinds: readonly string[]): string[] =>
  at.appraisal.site.zones.flatMap(({ kind }, i) =>
    kinds.includes(kind) ? [`site/zones/${i}/fromM`, `site/zones/${i}/toM`] : [],
  );
const limits = (at: At): string[] =>
  at.appraisal.site.soffitLimits.flatMap(({ kind }, i) =>
    kind === 'road' || kind === 'railway' ? [`site/soffitLimits/${i}/levelM`] : [],
  );

/** What the rules are told of methods: what can come to the site, and the traffic under the deck. */
export const methodFactFigures: readonly Descriptor[] = [
  fact('craneOnSite', factOf('craneOnSite').meaning, () => ({ crane: 'brief/access/crane' })),
  fact('bargeOnSite', factOf('bargeOnSite').meaning, () => ({ barge: 'brief/access/barge' })),
  fact('falseworkOverRoad', factOf('falseworkOverRoad').meaning, (at) => ({
    stretches: zones(at, 'road'),
    ends: ['site/startM', 'site/endM'],
  })),
  fact('railwayCrossed', factOf('railwayCrossed').meaning, (at) => ({
    stretches: zones(at, 'railway'),
    ends: ['site/startM', 'site/endM'],
  })),
  fact('trafficSpareM', factOf('trafficSpareM').meaning, (at) => ({
    road: [`${at.root}/profile/startLevelM`, `${at.root}/profile/endLevelM`],
    depth: [`${at.root}/depthM/support`, `${at.root}/depthM/midspan`],
    limits: limits(at),
  })),
];
