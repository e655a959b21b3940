import type { Appraisal, AppraisedOption, Brief, Site, Study } from '../../lib/index.ts';
import { spansOf } from '../drawing/alongOption.ts';
import { optionTitle } from '../drawing/optionWords.ts';
import { currencySign, fixed, listed, money2, moneyUnit, odds, spansText } from '../format.ts';

/** Money in the unit of the page, e.g. '6.3 M€'. */
export function moneyWords(value: number, currency: string): string {
  const unit = moneyUnit(currency, value);
  return `${money2(value / unit.per)} ${unit.label}`;
}

/** The budget as money, or null where none is given. */
export const budgetOf = (brief: Brief): number | null =>
  brief.budget === 'unknown' ? null : brief.budget.amount;

/** '2026 Q1, EUR'. */
export const pricesWords = (study: Pick<Study, 'brief' | 'books'>): string =>
  study.brief.budget === 'unknown'
    ? study.books.currency
    : `${study.brief.budget.priceDate}, ${study.books.currency}`;

/** An option in running text: 'Composite I-girders at 41 + 63 + 41 m'. */
export const optionWords = (option: AppraisedOption): string =>
  `${optionTitle(option)} at ${spansText(spansOf(option))} m`;

/** The first option of each form, in order. */
export function firstOfEachForm(options: readonly AppraisedOption[]): AppraisedOption[] {
  return options.filter((option, i) => options.findIndex(({ form }) => form === option.form) === i);
}

/** The page's answer in one or two sentences. */
export function answerWords({ options, standing, currency }: Appraisal): string {
  const leader = options.find((option) => option.number === standing.leader);
  if (!leader) return 'No option stands inside the rules. What would let one in is said at 10+010.';
  const { p10, p50, p90 } = leader.cost;
  const unit = moneyUnit(currency, p50);
  const range = `${money2(p10 / unit.per)} and ${money2(p90 / unit.per)}`;
  const first = `${optionWords(leader)} come out at ${money2(p50 / unit.per)} ${unit.label}, between ${range}.`;
  const group = standing.groups.find((one) => one.includes(leader.number)) ?? [];
  const others = options.filter((option) => group.includes(option.number) && option.form !== leader.form);
  const rivals = firstOfEachForm(others);
  if (rivals.length === 0) {
    const next = options.find((option) => option.form !== leader.form && option.status !== 'out');
    if (!next) return first;
    const share = standing.odds[leader.number]?.[next.number] ?? Number.NaN;
    return `${first} ${optionTitle(next)} are next; the odds that they are dearer are ${odds(share)} %.`;
  }
  const said = listed(
    rivals.map((option) => `option ${option.number} (${optionTitle(option).toLowerCase()})`),
  );
  return `${first} ${said.charAt(0).toUpperCase()}${said.slice(1)} cannot be separated from them on cost.`;
}

/** What to do first, from what is not known yet. */
export function nextWords(brief: Brief): string {
  const preset = brief.obstacles.find((obstacle) => obstacle.clearance?.confirmed === false);
  if (preset?.clearance) {
    return `ask for the headroom over ${preset.name} in writing; ${fixed(preset.clearance.headroomM, 2)} m is a preset.`;
  }
  if (brief.groundStretches.some((stretch) => !stretch.known)) {
    return 'ask for boreholes at the river piers; the ground is not known and every foundation carries its odds.';
  }
  return 'compare the undominated options and record the decision.';
}

/** What has to be crossed, in a sentence. */
export function crossingWords(site: Site): string {
  const names = [...new Set(site.zones.map((zone) => zone.kind))].map((kind) => `a ${kind}`);
  const plain = site.soffitLimits.some((limit) => limit.kind === 'flood') ? ['a flood plain'] : [];
  const all = [...names, ...plain];
  const said = all.length > 0 ? listed(all) : 'open ground';
  return `${said.charAt(0).toUpperCase()}${said.slice(1)} in ${fixed(site.lengthM, 0)} m.`;
}

/** '€/m²' of the study's currency. */
export const perM2Words = (currency: string): string => `${currencySign(currency)}/m²`;
