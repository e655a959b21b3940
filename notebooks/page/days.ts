/** '2 December 2026'. */
export const dateWords = (date: Date): string =>
  date.toLocaleDateString('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });

const two = (part: number): string => String(part).padStart(2, '0');

/** The day of a date where it is read, as a study writes it: '2026-12-02'. */
export const dayOf = (date: Date): string =>
  `${date.getFullYear()}-${two(date.getMonth() + 1)}-${two(date.getDate())}`;

/** A day of a study in words, '2 December 2026'; a day written otherwise stays as it is. */
export function dayWords(day: string): string {
  const [, year, month, date] = /^(\d{4})-(\d{2})-(\d{2})$/u.exec(day) ?? [];
  if (year === undefined) return day;
  const at = new Date(Number(year), Number(month) - 1, Number(date));
  return dayOf(at) === day ? dateWords(at) : day;
}
