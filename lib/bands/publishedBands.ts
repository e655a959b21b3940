import { z } from '../zod.ts';
import raw from '../../data/published-bands.json';
import { formIds, type FormId } from '../model/index.ts';

const law = z.strictObject({ constant: z.number(), factor: z.number(), power: z.number() });
const schema = z.strictObject({
  note: z.string(),
  bands: z.array(
    z.strictObject({
      form: z.enum(formIds),
      column: z.enum(['concrete', 'steel', 'bars', 'strand']),
      span: z.literal('longest'),
      low: law,
      high: law,
      widen: z.number().min(0).max(1),
      source: z.string(),
      scope: z.string(),
    }),
  ),
});

/** Laws of published quantities, from `data/published-bands.json`. */
const bandLaws = schema.parse(raw).bands;

export type BandColumn = (typeof bandLaws)[number]['column'];

/** What has been published for one quantity per m2 of deck, m3 or kg. */
export interface PublishedBand {
  readonly low: number;
  readonly high: number;
}

/**
 * Published bands of the quantities of a superstructure per m2 of deck, by column, for a form at its longest span;
 * columns nobody has published for the form are absent. A check beside our figures, never their origin.
 *
 * @param spansM spans of the unit, m
 */
export function publishedBands(
  form: FormId,
  spansM: readonly number[],
): Partial<Record<BandColumn, PublishedBand>> {
  const longest = Math.max(...spansM);
  const at = ({ constant, factor, power }: z.infer<typeof law>): number =>
    constant + factor * longest ** power;
  return Object.fromEntries(
    bandLaws
      .filter((band) => band.form === form)
      .map(({ column, low, high, widen }) => {
        const ends = [at(low), at(high)];
        return [column, { low: Math.min(...ends) * (1 - widen), high: Math.max(...ends) * (1 + widen) }];
      }),
  );
}
