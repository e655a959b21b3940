import { levelWith } from '../../lib/index.ts';
import type { Appraisal, AppraisedOption, Brief, Site, Spread, Study } from '../../lib/index.ts';
import { spanPaths, spansOf } from '../drawing/alongOption.ts';
import { ofOption } from '../drawing/asked.ts';
import { optionTitle } from '../drawing/optionWords.ts';
import { formLooks } from '../forms/formLook.ts';
import { capitalised, countWords, fixed, listed, money2, moneyUnit, odds, spansText } from '../format.ts';
import type { HtmlChild } from '../html.ts';
import { workedFigure } from '../page/index.ts';

/** Money in the unit of the page, e.g. '6.3 M€'. */
export function moneyWords(value: number, currency: string): string {
  const unit = moneyUnit(currency, value);
  return `${money2(value / unit.per)} ${unit.label}`;
}

/** The budget as money, or null where none is given. */
export const budgetOf = (brief: Brief): number | null =>
  brief.budget === 'unknown' ? null : brief.budget.amount;

/** A price date in words, where none is known that it is not dated. */
export const priceDateWords = (priceDate: string): string =>
  priceDate === 'unknown' ? 'undated' : priceDate;

/** '2026 Q1, EUR'. */
export const pricesWords = (study: Pick<Study, 'brief' | 'books'>): string =>
  study.brief.budget === 'unknown'
    ? study.books.currency
    : `${priceDateWords(study.brief.budget.priceDate)}, ${study.books.currency}`;

/** The first option of each form, in order. */
export function firstOfEachForm(options: readonly AppraisedOption[]): AppraisedOption[] {
  return options.filter((option, i) => options.findIndex(({ form }) => form === option.form) === i);
}

/** How many forms are still to come, of an answer in parts; '' of a whole one. */
export const partWords = ({ forms, toCome }: Appraisal): string =>
  toCome.length === 0
    ? ''
    : `Of ${forms.length + toCome.length} forms ${forms.length} are done so far and ${toCome.length} still to come.`;

/** Which forms are still to come, for where the others stand in order; '' of a whole answer. */
export const toComeWords = ({ toCome }: Appraisal): string =>
  toCome.length === 0
    ? ''
    : `Still to come, and not in the order yet: ${listed(toCome.map((form) => formLooks[form].short))}.`;

/** A finding, and of an answer in parts how much is still to come. */
export function findingOf({ toCome: { length } }: Appraisal, finding: HtmlChild): HtmlChild {
  if (length === 0) return finding;
  return [
    finding,
    ` ${capitalised(countWords(length))} ${length === 1 ? 'form is' : 'forms are'} still to come.`,
  ];
}

/** The page's answer in one or two sentences; before them how much of it there is. */
export function answerWords(appraisal: Appraisal): HtmlChild {
  const part = partWords(appraisal);
  return part === '' ? standingWords(appraisal) : [part, ' ', standingWords(appraisal)];
}

function standingWords({ options, standing, currency }: Appraisal): HtmlChild {
  const leader = options.find((option) => option.number === standing.leader);
  if (!leader) return 'No option stands inside the rules. What would let one in is said at 10+010.';
  const unit = moneyUnit(currency, leader.cost.p50);
  const cost = (point: keyof Spread): HTMLElement =>
    workedFigure(ofOption(leader, `cost/${point}`), money2(leader.cost[point] / unit.per));
  const spans = spanPaths(leader).filter((path) => path !== undefined);
  const first: HtmlChild = [
    `Option ${leader.number}, ${titleInside(leader)} at `,
    workedFigure(spans, spansText(spansOf(leader))),
    ' m, comes out at ',
    cost('p50'),
    ` ${unit.label}, between `,
    cost('p10'),
    ' and ',
    cost('p90'),
    '.',
  ];
  const level = levelWith(standing, leader.number);
  const others = options.filter((option) => level.includes(option.number) && option.form !== leader.form);
  const rivals = firstOfEachForm(others);
  if (rivals.length === 0) {
    const next = options.find((option) => option.form !== leader.form && option.status !== 'out');
    if (!next) return first;
    const share = standing.odds[leader.number]?.[next.number] ?? Number.NaN;
    return [
      first,
      ` Option ${next.number} (${titleInside(next)}) is next; the odds that it is dearer are `,
      workedFigure(`standing/odds/${leader.number}/${next.number}`, odds(share)),
      ' %.',
    ];
  }
  const said = listed(rivals.map((option) => `option ${option.number} (${titleInside(option)})`));
  return [first, ` ${capitalised(said)} cannot be separated from it on cost.`];
}

/** The title of an option inside a sentence. */
function titleInside(option: AppraisedOption): string {
  const title = optionTitle(option);
  return `${title.charAt(0).toLowerCase()}${title.slice(1)}`;
}

/** What to do first, from what is not known yet. */
export function nextWords(brief: Brief): string {
  const preset = brief.obstacles.find((obstacle) => obstacle.clearance?.confirmed === false);
  if (preset?.clearance) {
    return `ask for the headroom over ${preset.name} in writing; ${fixed(preset.clearance.headroomM, 2)} m is a preset.`;
  }
  if (brief.groundStretches.some((stretch) => !stretch.known)) {
    const where = brief.waters.length > 0 ? 'river piers' : 'supports';
    return `ask for boreholes at the ${where}; the ground is not known and every foundation carries its odds.`;
  }
  return 'compare the undominated options and record the decision.';
}

/** What has to be crossed, in a sentence. */
export function crossingWords(site: Site): HtmlChild {
  const names = [...new Set(site.zones.map((zone) => zone.kind))].map((kind) => `a ${kind}`);
  const plain = site.soffitLimits.some((limit) => limit.kind === 'flood') ? ['a flood plain'] : [];
  const all = [...names, ...plain];
  const said = all.length > 0 ? listed(all) : 'open ground';
  return [`${capitalised(said)} in `, workedFigure('site/lengthM', fixed(site.lengthM, 0)), ' m.'];
}
