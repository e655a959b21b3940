import { z } from '../zod.ts';
import rawGround from '../../data/ground.json' with { type: 'json' };
import {
  groundClassIds,
  type Crossing,
  type GroundOdds,
  type GroundStretch,
  type Unknown,
} from '../model/index.ts';

const preset = z
  .strictObject({
    about: z.string(),
    classes: z.record(z.enum(groundClassIds), z.strictObject({ label: z.string() })),
    unknown: z.array(
      z.strictObject({
        ground: z.enum(groundClassIds),
        odds: z.number().positive(),
        bearingDepthM: z.number().min(0),
        source: z.string(),
      }),
    ),
  })
  .parse(rawGround);

/** Name of a ground class as it is printed, by id. */
export const groundLabels: Readonly<Record<GroundOdds['ground'], string>> = {
  rock: preset.classes.rock.label,
  gravel: preset.classes.gravel.label,
  'stiff-clay': preset.classes['stiff-clay'].label,
  'soft-clay': preset.classes['soft-clay'].label,
};

/** A stretch of ground as the file may give it. */
export interface GivenStretch {
  readonly fromM: number;
  readonly toM: number;
  readonly known?: boolean | undefined;
  readonly classes: readonly GroundOdds[] | Unknown;
}

/**
 * Preset odds of ground nobody has looked at; the bearing stratum follows the ground. On the sides of a valley a level one
 * would lie under as much soft ground as the valley is deep.
 */
const presetOdds: readonly GroundOdds[] = preset.unknown.map(({ ground, odds, bearingDepthM }) => ({
  ground,
  odds,
  bearingDepthM,
}));

/**
 * Fills in what the file leaves unknown about the ground: no stretches at all become one stretch over the crossing, a
 * stretch of unknown classes takes the preset odds of `data/ground.json`. A stretch counts as known only if it says so.
 */
export function fillGround(given: readonly GivenStretch[] | Unknown, crossing: Crossing): GroundStretch[] {
  const stretches =
    given === 'unknown'
      ? [{ fromM: crossing.startM, toM: crossing.endM, classes: 'unknown' as const }]
      : given;
  return stretches.map((stretch: GivenStretch) => {
    const { fromM, toM, classes } = stretch;
    if (classes === 'unknown') return { fromM, toM, known: false, classes: presetOdds };
    return { fromM, toM, known: stretch.known ?? false, classes };
  });
}
