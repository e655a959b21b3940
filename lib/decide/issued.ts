import type { Appraisal, Decision, Issued } from '../model/index.ts';
import { sayMoney } from './words.ts';

/** Figures of a fingerprint that are shown: enough to tell two studies apart by eye. */
const SHOWN = 12;

/**
 * What a decision is issued with: the fingerprint of what was asked and what came of it, option by option.
 * @param date the day of issue, '2026-03-02'
 */
export const issuedOn = (date: string, { study, currency, standing, options }: Appraisal): Issued => ({
  date,
  fingerprint: study.fingerprint,
  currency,
  leader: standing.leader,
  options: options.map(({ number, form, status, cost }) => ({ number, form, status, ...cost })),
});

/** How the option that was taken stands now against what it was issued with; nothing where it comes to the same. */
function optionSince(number: number, issued: Issued, { options, currency }: Appraisal): string | null {
  const then = issued.options.find((option) => option.number === number);
  const now = options.find((option) => option.number === number);
  if (then === undefined) return null;
  const before = sayMoney(then.p50, issued.currency);
  if (now === undefined) return `Option ${number}, ${before} at P50 then, is not worked out any more.`;
  if (now.form !== then.form) return `Option ${number} was of another form then.`;
  const after = sayMoney(now.cost.p50, currency);
  const said = `P50 of option ${number} was ${before} then and ${after === before ? 'comes to the same' : `is ${after}`} now`;
  const turned =
    then.status === now.status ? '' : `; it was ${then.status} by the rules and is ${now.status}`;
  return now.cost.p50 === then.p50 && turned === '' ? null : `${said}${turned}.`;
}

/**
 * What has become of an issued decision since: whether the study asks something else now, and what its option comes to.
 * Empty for a draft and where nothing has changed.
 */
export function sinceIssued({ option, issued }: Decision, appraisal: Appraisal): string[] {
  if (issued === null) return [];
  const { fingerprint } = appraisal.study;
  const isSame = issued.fingerprint === fingerprint;
  const told = optionSince(option, issued, appraisal);
  if (isSame && told === null) return [];
  const changed = isSame
    ? 'The study asks what it asked when this was issued, and is worked out otherwise by this version of the tool.'
    : `The study has changed since this was issued: its fingerprint was ${issued.fingerprint.slice(0, SHOWN)} then and is ${fingerprint.slice(0, SHOWN)} now.`;
  const { leader } = appraisal.standing;
  const leads =
    leader === issued.leader
      ? null
      : `${issued.leader === null ? 'No option' : `Option ${issued.leader}`} led on cost then; now ${leader === null ? 'none does' : `option ${leader} does`}.`;
  return [changed, told ?? `Option ${option} comes to the same.`, ...(leads === null ? [] : [leads])];
}
