import type { Design, MeasuredLine, Site, Spread, Support } from '../model/index.ts';
import { quantitiesOf } from '../takeoff/index.ts';
import type { Range } from './data.ts';
import { programmeData } from './data.ts';
import { supportWeeks } from './supportWeeks.ts';

/** One activity of the programme: start and duration, months from the start on site. */
export interface Activity {
  readonly id: 'establish' | 'supports' | 'steel' | 'deck' | 'finishes' | 'demobilise';
  readonly label: string;
  readonly startMonths: Spread;
  readonly months: Spread;
}

export interface Programme {
  readonly activities: readonly Activity[];
  readonly months: Spread;
  /** Preliminaries: establishment once and the likely months on site. */
  readonly lines: readonly MeasuredLine[];
}

type Speed = keyof Range;
const speeds: readonly [Speed, Speed, Speed] = ['low', 'likely', 'high'];

/**
 * Programme of an option: establishment, supports by crews side by side, steel in the shop at the same time, decks unit after
 * unit (with its splices and tendon stages) once enough supports stand and the steel is there, finishes, demobilisation.
 *
 * Quick, likely and slow durations belong to one driver of productivity, so every activity is quick or slow together: then
 * low, likely and high of the whole are the network run with all low, all likely and all high durations, and they are the
 * 10, 50 and 90 % points when the durations are. The ground is taken in its likeliest class.
 */
export function planProgramme(
  site: Site,
  designs: readonly Design[],
  supports: readonly Support[],
): Programme {
  const runs = speeds.map((speed) => network(site, designs, supports, speed));
  const [low, likely, high] = [runs[0]!, runs[1]!, runs[2]!];
  const months = (weeks: number): number => weeks / programmeData.weeksPerMonth;
  const activities = likely.map((activity, i): Activity => {
    const spread = (pick: (a: Weeks) => number): Spread => ({
      p10: months(pick(low[i]!)),
      p50: months(pick(activity)),
      p90: months(pick(high[i]!)),
    });
    return {
      id: activity.id,
      label: activity.label,
      startMonths: spread((a) => a.start),
      months: spread((a) => a.weeks),
    };
  });
  const end = (run: readonly Weeks[]): number => months(Math.max(...run.map((a) => a.start + a.weeks)));
  const total: Spread = { p10: end(low), p50: end(likely), p90: end(high) };
  return {
    activities,
    months: total,
    lines: [
      { part: 'preliminaries', item: 'site-setup', quantity: 1, what: 'site establishment', how: 'once' },
      {
        part: 'preliminaries',
        item: 'site-month',
        quantity: total.p50,
        what: 'months on site',
        how: 'likely programme',
      },
    ],
  };
}

interface Weeks {
  readonly id: Activity['id'];
  readonly label: string;
  readonly start: number;
  readonly weeks: number;
}

function network(
  site: Site,
  designs: readonly Design[],
  supports: readonly Support[],
  speed: Speed,
): Weeks[] {
  const data = programmeData;
  const establish = data.establish[speed];
  const each = supports.map((support) => supportWeeks(support, designs, speed));
  const work = each.reduce((sum, weeks) => sum + weeks, 0);
  const supportsWeeks = Math.max(work / data.crews, ...each);
  const steelT = quantitiesOf(designs.flatMap((design) => design.lines)).structuralSteelKg / 1000;
  const steelWeeks = steelT > 0 ? data.steelLead[speed] + steelT / data.steelT[speed] : 0;
  const startsAfter = Math.max(...designs.map((design) => data.methods[design.task.method].startsAfter));
  const methods = new Set(designs.map((design) => design.task.method));
  const deckWeeks =
    [...methods].reduce((sum, method) => sum + data.methods[method].fixed[speed], 0) +
    designs.reduce(
      (sum, design) =>
        sum + lengthOf(design) / data.methods[design.task.method].deckM[speed] + stagingWeeks(design, speed),
      0,
    );
  // Erection starts when half the steel is made and cannot end before the rest has come.
  const deckStart = Math.max(establish + startsAfter * supportsWeeks, steelWeeks / 2);
  const deckEnd = Math.max(deckStart + deckWeeks, establish + supportsWeeks, steelWeeks);
  const finishes = data.finishesFixed[speed] + (site.lengthM * site.deck.widthM) / data.finishesM2[speed];
  const list: Weeks[] = [
    { id: 'establish', label: 'site establishment', start: 0, weeks: establish },
    { id: 'supports', label: 'foundations, piers and abutments', start: establish, weeks: supportsWeeks },
  ];
  if (steelWeeks > 0) list.push({ id: 'steel', label: 'steel in the shop', start: 0, weeks: steelWeeks });
  list.push(
    { id: 'deck', label: 'deck', start: deckStart, weeks: deckEnd - deckStart },
    { id: 'finishes', label: 'finishes', start: deckEnd, weeks: finishes },
    { id: 'demobilise', label: 'demobilisation', start: deckEnd + finishes, weeks: data.demobilise[speed] },
  );
  return list;
}

/** Weeks that splices and tendon stages add to the erection of a unit. */
function stagingWeeks({ staging }: Design, speed: Speed): number {
  if (!staging) return 0;
  return staging.splices * programmeData.spliceRow[speed] + staging.stages * programmeData.tendonStage[speed];
}

const lengthOf = (design: Design): number => design.task.spansM.reduce((sum, span) => sum + span, 0);
