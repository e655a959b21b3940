import type { At, Descriptor } from '../model/index.ts';
import { girderLines } from '../takeoff/index.ts';
import { asIs, fact, factOf } from './factFigure.ts';
import { halfDeckNeeded, spansOffWater } from './methodFacts.ts';
import { spansOf } from './askedTask.ts';
import { mainUnit } from './workOption.ts';

const zones = (at: At, ...kinds: readonly string[]): string[] =>
  at.site.zones.flatMap(({ kind }, i) =>
    kinds.includes(kind) ? [`site/zones/${i}/fromM`, `site/zones/${i}/toM`] : [],
  );
const limits = (at: At): string[] =>
  at.site.soffitLimits.flatMap(({ kind }, i) =>
    kind === 'road' || kind === 'railway' ? [`site/soffitLimits/${i}/levelM`] : [],
  );

const main = (at: At): number => at.option.units.indexOf(mainUnit(at.option.units));
const mainSpans = (at: At): string[] =>
  spansOf(mainUnit(at.option.units)).map((_, i) => `${at.root}/designs/${main(at)}/task/spansM/${i}`);
const pieceMasses = (at: At): string[] =>
  at.option.designs.flatMap(({ heaviestPiece }, u) =>
    heaviestPiece === null ? [] : [`${at.root}/designs/${u}/heaviestPiece/massT`],
  );
const ends = (at: At, kind: 'zones' | 'waters'): string[] =>
  at.site[kind].flatMap((_, i) => [`site/${kind}/${i}/fromM`, `site/${kind}/${i}/toM`]);
const linesPath = (at: At): string[] => {
  const lines = girderLines(at.option.designs[main(at)]!);
  return lines === undefined ? [] : [`${at.root}/designs/${main(at)}/figures/${lines.figure}`];
};

/** What the rules are told of methods: what can come to the site, and the traffic under the deck. */
export const methodFactFigures: readonly Descriptor[] = [
  fact('craneOnSite', factOf('craneOnSite').meaning, () => ({ crane: 'brief/access/crane' })),
  fact('bargeOnSite', factOf('bargeOnSite').meaning, () => ({ barge: 'brief/access/barge' })),
  fact(
    'spansOffWater',
    'count of the spans whose middle lies farther from every water than a crane on a barge reaches',
    (at) => ({
      supports: at.option.units.flatMap(({ supportsM }, u) =>
        supportsM.map((_, s) => `${at.root}/units/${u}/supportsM/${s}`),
      ),
      waters: ends(at, 'waters'),
      reach: 'data/erection/crane/afloatReachM',
    }),
    ({ supports, waters, reach }) => {
      const bodies = waters.flatMap((fromM, i) => (i % 2 === 0 ? [{ fromM, toM: waters[i + 1]! }] : []));
      return spansOffWater(bodies, supports, reach);
    },
  ),
  fact('falseworkOverRoad', factOf('falseworkOverRoad').meaning, (at) => ({
    stretches: zones(at, 'road'),
    ends: [at.ends.start, at.ends.end],
  })),
  fact('railwayCrossed', factOf('railwayCrossed').meaning, (at) => ({
    stretches: zones(at, 'railway'),
    ends: [at.ends.start, at.ends.end],
  })),
  fact('trafficSpareM', factOf('trafficSpareM').meaning, (at) => ({
    road: [`${at.root}/profile/startLevelM`, `${at.root}/profile/endLevelM`],
    depth: [`${at.root}/depthM/support`, `${at.root}/depthM/midspan`],
    limits: limits(at),
  })),
  fact(
    'unitSpans',
    'spans counted',
    (at) => ({ spans: mainSpans(at) }),
    ({ spans }) => spans.length,
  ),
  asIs('launchYardM', () => ({ given: 'brief/access/launchYardM' })),
  fact(
    'launchYardNeededM',
    'longest of a bed and a half and the tail whose weight about the abutment is so many times that of deck and nose ahead, over the shorter end span; 0 where it is not launched',
    (at) => ({
      spans: mainSpans(at),
      tipping: 'data/erection/launch/tipping',
      bed: 'data/erection/launch/leastBedM',
    }),
  ),
  fact('craneMomentKnown', factOf('craneMomentKnown').meaning, () => ({
    given: 'brief/access/craneMomentTm',
  })),
  asIs('craneMomentTm', () => ({ given: 'brief/access/craneMomentTm' })),
  fact('pickRadiusM', factOf('pickRadiusM').meaning, (at) => ({
    width: 'site/deck/widthM',
    beside: 'data/erection/crane/besideDeckM',
    zones: ends(at, 'zones'),
    waters: ends(at, 'waters'),
  })),
  fact('pickMomentTm', 'greatest of mass x radius of the units / share of the chart', (at) => ({
    masses: pieceMasses(at),
    radius: `${at.root}/facts/pickRadiusM`,
    share: 'data/erection/crane/chartShare',
  })),
  asIs('lanesKept', () => ({ given: 'brief/demands/lanesKept' })),
  fact('gasMain', factOf('gasMain').meaning, () => ({ given: 'brief/demands/gasMain' })),
  fact(
    'halfDeckM',
    'deck width / 2',
    () => ({ width: 'site/deck/widthM' }),
    ({ width }) => width / 2,
  ),
  fact(
    'halfDeckNeededM',
    'lanes x width of a lane past works + two barriers',
    () => ({
      lanes: 'brief/demands/lanesKept',
      lane: 'data/erection/halves/laneM',
      barrier: 'data/erection/halves/barrierM',
    }),
    ({ lanes }) => halfDeckNeeded(lanes),
  ),
  fact('girderLines', factOf('girderLines').meaning, (at) => ({ lines: linesPath(at) })),
  fact('wideningM', 'sum over the strips of what each grows by', (at) => ({
    now: at.study.brief.deck.map((_, i) => `brief/deck/${i}/widthM`),
    ultimate: at.study.brief.deck.map((_, i) => `brief/deck/${i}/ultimateWidthM`),
  })),
];
