import { z } from '../zod.ts';
import raw from '../../data/rates/items.json';

const materials = [
  'concreteM3',
  'reinforcementKg',
  'prestressKg',
  'structuralSteelKg',
  'stayCableKg',
  'mainCableKg',
] as const;

const schema = z.strictObject({
  items: z
    .array(
      z.strictObject({
        id: z.string().min(1),
        label: z.string().min(1),
        unit: z.string().min(1),
        material: z.enum(materials).nullable(),
      }),
    )
    .refine((items) => new Set(items.map((item) => item.id)).size === items.length, 'ids must differ'),
});

/** One item of the bill: what a measured line may name. `material` is the key of `Quantities` it counts into, or null. */
export type Item = z.infer<typeof schema>['items'][number];

/** Every item of `data/rates/items.json`, in the order of the file. */
export const items: readonly Item[] = schema.parse(raw).items;

const byId: ReadonlyMap<string, Item> = new Map(items.map((item) => [item.id, item]));

/** The item a line names. Throws a RangeError on a name that is not in `data/rates/items.json`. */
export function itemOf(id: string): Item {
  const item = byId.get(id);
  if (item === undefined) {
    throw new RangeError(
      `item of a measured line: expected one of data/rates/items.json, received '${id}'; add it there and to the rate packs`,
    );
  }
  return item;
}
