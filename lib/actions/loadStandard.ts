import { z } from '../zod.ts';
import hl93 from '../../data/standards/hl93.json';
import lm1 from '../../data/standards/lm1.json';
import { standardIds, type StandardId } from '../model/index.ts';

const positive = z.number().positive();
const notNegative = z.number().nonnegative();

const vehicle = z.strictObject({
  id: z.string(),
  /** True: the vehicle counts whole wherever it stands. False: axles that relieve are left out. */
  whole: z.boolean(),
  axles: z.array(z.strictObject({ atM: notNegative, loadKN: positive })).min(1),
  /** Longer distances of the last axle, tried for hogging moments only (the shortest governs the rest). */
  furtherRearGapsM: z.array(positive).optional(),
});

const schema = z.strictObject({
  id: z.enum(standardIds),
  name: z.string(),
  /** Ids in `data/sources.json`. */
  sources: z.array(z.string()).min(1),
  /** True once the figures have been read in the standard itself; false = from memory. */
  read: z.boolean(),
  unitWeights: z.strictObject({ concreteKNm3: positive, steelKNm3: positive, surfacingKNm3: positive }),
  lanes: z.strictObject({
    /** Width of a notional lane; between kerbs narrower than twice that, two lanes from `twoLanesFromM`. */
    widthM: positive,
    twoLanesFromM: positive,
    /** Width within a lane that carries its uniform load. */
    loadedWidthM: positive,
    /** Vehicle of each lane as a share of the lane-1 vehicle; the last holds for the lanes after. */
    vehicleShare: z.array(notNegative).min(1),
    uniformKNm2: z.array(notNegative).min(1),
    furtherUniformKNm2: notNegative,
    remainingKNm2: notNegative,
    /** Nationally set factors on vehicles and uniform loads by lane, and on further lanes and the remaining area. */
    adjustment: z.strictObject({
      vehicle: z.array(notNegative).min(1),
      uniform: z.array(notNegative).min(1),
      further: notNegative,
    }),
    /** Multiple presence factor by number of loaded lanes; the last holds for more. */
    multiplePresence: z.array(positive).min(1),
    wheelGaugeM: positive,
  }),
  vehicles: z.array(vehicle).min(1),
  /** Added to the static vehicle, not to the uniform load. */
  dynamicAllowance: notNegative,
  /** Two of a vehicle in one lane with the lane load, for hogging moments and inner reactions. */
  twoVehicles: z.strictObject({ vehicle: z.string(), share: positive, clearM: positive }).nullable(),
  /** q = constant + numerator / (loaded length + added), within its limits. */
  footway: z.strictObject({
    constantKNm2: notNegative,
    numeratorKNm: notNegative,
    addedM: positive,
    leastKNm2: notNegative,
    mostKNm2: notNegative,
    mostWithVehiclesKNm2: notNegative,
  }),
  /** True where the standard has distribution factors for girder decks (`aashtoFactors`). */
  distributionFactors: z.boolean(),
  /** Law of modulus and tensile strength of concrete. */
  concreteLaw: z.enum(['en-1992', 'aashto']),
  /** Steel of `data/materials.json` taken when nothing is said. */
  steelGrade: z.enum(['S355', 'S460', 'GR50']),
  /** Loaded length the model was written for; null = no limit stated. */
  longestLoadedM: positive.nullable(),
  factors: z.strictObject({
    uls: z.strictObject({
      permanent: positive,
      permanentFavourable: positive,
      superimposed: positive,
      superimposedFavourable: positive,
      traffic: positive,
      prestress: positive,
    }),
    /** Shares of the characteristic traffic in the combination that decides the prestress. */
    sls: z.strictObject({
      vehicle: notNegative,
      uniform: notNegative,
      footway: notNegative,
      combination: z.string(),
      tension: z.string(),
    }),
    fatigue: z.strictObject({ vehicle: notNegative, uniform: notNegative }),
  }),
  /** Divisors of strength (1 / resistance factor where the standard multiplies) and the stress block factor of concrete. */
  resistance: z.strictObject({
    steel: positive,
    steelBuckling: positive,
    concrete: positive,
    reinforcement: positive,
    prestress: positive,
    alphaConcrete: positive,
  }),
  /** Shares of vehicle and uniform load whose worst deflection is limited to span / limitRatio. */
  deflection: z.strictObject({
    combinations: z.array(z.strictObject({ vehicle: notNegative, uniform: notNegative })).min(1),
    limitRatio: positive,
    source: z.string(),
  }),
  /** Braking force = constant + length x perM within limits, per loaded lane or for the whole carriageway. */
  braking: z.strictObject({
    perLane: z.boolean(),
    constantKN: notNegative,
    perMKN: notNegative,
    leastKN: notNegative,
    mostKN: positive,
  }),
});

/** A traffic load standard as read from `data/standards`. Lengths m, forces kN, unit weights kN/m3. */
export type LoadStandard = Readonly<z.infer<typeof schema>>;

const files: Readonly<Record<StandardId, unknown>> = { lm1, hl93 };
const parsed = new Map<StandardId, LoadStandard>();

/**
 * The standard of that id, checked once. A further standard is its id in `lib/model`, its data file named here and its
 * rows in `data/materials.json`.
 * @throws RangeError for an id without a data file.
 */
export function loadStandard(id: StandardId): LoadStandard {
  const known = parsed.get(id);
  if (known) return known;
  if (!(id in files))
    throw new RangeError(`standard: expected one of ${standardIds.join(', ')}, received ${id as string}`);
  const made = schema.parse(files[id]);
  parsed.set(id, made);
  return made;
}
