import type { AskedVariant, KeptOption, Unit } from '../../lib/index.ts';
import { formChoices, type SpanField } from '../forms/formChoices.ts';

/** What stands at steps from a variant; undefined where nothing does. */
export const askedAt = (variant: AskedVariant, steps: readonly string[]): unknown =>
  steps.reduce<unknown>(
    (value, step) =>
      typeof value === 'object' && value !== null ? (value as Record<string, unknown>)[step] : undefined,
    variant,
  );

/** The same variant with another value there; undefined takes it away. */
export function putAsked(
  variant: object | undefined,
  [step = '', ...steps]: readonly string[],
  value: unknown,
): AskedVariant {
  const { [step]: before, ...others } = { ...variant } as Record<string, unknown>;
  const next = steps.length === 0 ? value : putAsked(before as object | undefined, steps, value);
  return next === undefined ? others : { ...others, [step]: next };
}

/** Supports of the main unit, the one that is made as the variant asks, m. */
export const mainSupports = (units: readonly Unit[]): readonly number[] =>
  (units.find(({ role }) => role === 'main') ?? units[0]!).supportsM;

/** Spans between supports, m. */
export const spansBetween = (supportsM: readonly number[]): number[] =>
  supportsM.slice(1).map((x, i) => x - supportsM[i]!);

/** Choices that are a figure for each span. */
const spanFields: readonly SpanField[] = Object.values(formChoices).flatMap(({ fields }) =>
  fields.filter((field) => field.kind === 'by-span'),
);

/** The span of a row of supports that covers most of a stretch. */
function spanOver(supportsM: readonly number[], fromM: number, toM: number): number {
  const covered = supportsM.slice(1).map((x, i) => Math.min(x, toM) - Math.max(supportsM[i]!, fromM));
  return covered.indexOf(Math.max(...covered));
}

/**
 * An option laid out on other units. What was asked of its spans one by one goes along: each span has the figure of the span
 * that covered most of it; what was the usual for that span is the usual for this one, and no length is longer than its span.
 */
export function laidOn(kept: KeptOption, units: readonly Unit[]): KeptOption {
  const { variant } = kept;
  if (variant === undefined) return { ...kept, units };
  const [before, after] = [mainSupports(kept.units), mainSupports(units)];
  const wereM = spansBetween(before);
  const moved = spanFields.reduce((asked, { steps, usual, unit }) => {
    const list = askedAt(asked, steps) as readonly number[] | undefined;
    if (list === undefined) return asked;
    const next = spansBetween(after).map((spanM, i) => {
      const over = spanOver(before, after[i]!, after[i + 1]!);
      const had = list[over] ?? usual(spanM);
      if (had === usual(wereM[over]!)) return usual(spanM);
      return unit === 'm' ? Math.min(had, spanM) : had;
    });
    return putAsked(asked, steps, next);
  }, variant);
  return { ...kept, units, variant: moved };
}
