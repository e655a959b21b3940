import type { Facts, FactValue } from '../model/index.ts';
import { fact as factById, source } from './book.ts';
import { factValue, type Evaluated } from './evaluate.ts';
import type { Fact } from './rule.ts';
import { placeholder } from './template.ts';

/** Decimal places of a step: 0.01 -> 2. */
const placesOf = (step: number): number => Math.max(0, Math.ceil(-Math.log10(step) - 1e-9));

/** At most so many decimals, none of them a trailing zero, with a true minus. */
const plain = (x: number, places: number): string => String(Number(x.toFixed(places)) + 0).replace('-', '−');

/**
 * A fact's value as it is printed, with its unit: '63 m', '1/26', '15 %', 'straight', 'not known'.
 * Numbers are rounded to the fact's step.
 */
export function printed(entry: Fact, value: FactValue): string {
  if (value === 'unknown') return 'not known';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string') return value;
  if (entry.shown === 'one-over') return value > 0 ? `1/${plain(1 / value, 1 / value < 20 ? 1 : 0)}` : '0';
  if (!Number.isFinite(value)) return entry.id === 'planRadiusM' ? 'straight' : 'without limit';
  if (entry.shown === 'percent') return `${plain(value * 100, 0)} %`;
  const figure = plain(value, placesOf(entry.step ?? 0.01));
  return entry.unit === '' ? figure : entry.unit === 'deg' ? `${figure}°` : `${figure} ${entry.unit}`;
}

/** The limits a fact was held against, printed; those of true comparisons first where there are any. */
function printedLimits(node: Evaluated, entry: Fact): readonly string[] {
  const found: { readonly text: string; readonly holds: boolean }[] = [];
  const visit = (part: Evaluated): void => {
    if ('all' in part) part.all.forEach(visit);
    else if ('any' in part) part.any.forEach(visit);
    else if ('not' in part) visit(part.not);
    else if (part.fact !== entry.id) return;
    else if ('between' in part)
      found.push({
        text: part.between.map((end) => printed(entry, end)).join(' to '),
        holds: part.truth === true,
      });
    else
      found.push({
        text: printed(entry, 'than' in part ? part.limit : part.value),
        holds: part.truth === true,
      });
  };
  visit(node);
  const holding = found.filter(({ holds }) => holds);
  return [...new Set((holding.length > 0 ? holding : found).map(({ text }) => text))];
}

/**
 * Fills a reason template: `{fact}` becomes the fact's value with its unit, `{limit:fact}` the limit the evaluated
 * condition held it against, `{fact?one|more}` the word for one or that for any other number.
 */
export function reasonOf(template: string, node: Evaluated, facts: Facts): string {
  type Words = string | undefined;
  return template.replace(placeholder, (_whole, limit: Words, id: string, one: Words, more: Words) => {
    const entry = factById(id);
    if (limit !== undefined) return printedLimits(node, entry).join(' or ');
    const value = factValue(facts, id);
    if (one !== undefined && more !== undefined) return value === 1 ? one : more;
    return printed(entry, value);
  });
}

/** Sentence for a condition that hangs on facts nobody knows yet. */
export function unknownReason(title: string, missing: Iterable<string>): string {
  const labels = [...missing].map((id) => factById(id).label);
  return `not known yet: ${labels.join(', ')}; needed for: ${title}`;
}

/** Citation as it is printed: 'Khan 2010, table 1.2 (read)'; several are parted by semicolons. */
export function cite(ids: readonly string[]): string {
  return ids
    .map((id) => {
      const { text, read, origin } = source(id);
      return origin === undefined ? `${text} (${read ? 'read' : 'from memory'})` : text;
    })
    .join('; ');
}
