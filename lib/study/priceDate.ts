/** How a price date is written, as a problem says it. */
export const priceDateWords = "a quarter ('2026 Q1'), a month ('2026-03'), a day ('2026-03-15') or 'unknown'";

const quarters = [
  /^(?<year>\d{4})[\s-]*Q(?<quarter>[1-4])$/iu,
  /^Q(?<quarter>[1-4])[\s,/-]*(?<year>\d{4})$/iu,
];

const isLeap = (year: number): boolean => year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);

/** Whether a month, and a day of it where one is given, is in the calendar. */
function isInCalendar(year: number, month: number, day = 1): boolean {
  const days = [31, isLeap(year) ? 29 : 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31][month - 1];
  return days !== undefined && day >= 1 && day <= days;
}

/**
 * A price date as the study file writes it: '2026 Q1', '2026-03' or '2026-03-15'. Quarters written the other way round
 * or closed up are put right. Null for any other words, and for a day or a month that is not in the calendar.
 */
export function asPriceDate(words: string): string | null {
  const plain = words.trim();
  for (const quarter of quarters) {
    const found = quarter.exec(plain)?.groups;
    if (found) return `${found['year']} Q${found['quarter']}`;
  }
  const date = /^(\d{4})-(\d{2})(?:-(\d{2}))?$/u.exec(plain);
  if (date === null) return null;
  const [, year, month, day] = date;
  return isInCalendar(Number(year), Number(month), day === undefined ? 1 : Number(day)) ? plain : null;
}
