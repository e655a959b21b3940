import { z } from '../zod.ts';
import raw from '../../data/rates/drivers.json';
import { formIds } from '../model/index.ts';
import { items } from '../takeoff/index.ts';

/** What moves many rates at once. `productivity` moves the months instead. */
export const driverIds = [
  'market',
  'steel',
  'concrete',
  'bars',
  'stays',
  'labour',
  'ground',
  'preliminaries',
  'productivity',
] as const;
export type DriverId = (typeof driverIds)[number];

const reason = z.string().min(1);
const schema = z.strictObject({
  about: z.string(),
  drivers: z
    .array(z.strictObject({ id: z.enum(driverIds), label: z.string().min(1), reason }))
    .length(driverIds.length),
  items: z
    .array(
      z.strictObject({
        item: z.string(),
        shares: z
          .partialRecord(z.enum(driverIds), z.number().min(0).max(1))
          .refine(
            (shares) => Object.values(shares).reduce((a, b) => a + b, 0) <= 1,
            'shares of variance sum to at most 1',
          ),
      }),
    )
    .refine(
      (list) => list.length === items.length && items.every(({ id }) => list.some(({ item }) => item === id)),
      'shares for every item of items.json',
    ),
  localGround: z.strictObject({ sigma: z.number().positive().max(1), everyM: z.number().positive(), reason }),
  optionError: z.strictObject({ sigma: z.number().positive().max(1), reason }),
  modelError: z.array(z.strictObject({ form: z.enum(formIds), sigma: z.number().positive().max(1), reason })),
});

/** Drivers, shares of variance by item, model errors by form, errors of one option and of the ground, from `data/rates/drivers.json`. */
export const driverData = schema.parse(raw);

/** How one item hangs on the drivers: factors on their standard normal draws and on its own; squares sum to 1. */
export interface Loading {
  readonly item: string;
  readonly drivers: readonly { readonly driver: DriverId; readonly factor: number }[];
  readonly own: number;
}

/** Loadings of every item, by item. */
export const loadings: ReadonlyMap<string, Loading> = new Map(
  driverData.items.map(({ item, shares }) => {
    const entries = Object.entries(shares) as [DriverId, number][];
    const shared = entries.reduce((sum, [, share]) => sum + share, 0);
    return [
      item,
      {
        item,
        drivers: entries.map(([driver, share]) => ({ driver, factor: Math.sqrt(share) })),
        own: Math.sqrt(Math.max(0, 1 - shared)),
      },
    ];
  }),
);
