import { z } from '../zod.ts';
import raw from '../../data/programme.json';
import { methodIds } from '../model/index.ts';

const source = z.string().min(1);
const figure = z.object({ value: z.number(), unit: z.string(), source }).transform((f) => f.value);
const method = z.object({
  setups: figure,
  possessions: z.strictObject({ base: z.number(), perPiece: z.number(), source }),
});
const schema = z.object({
  methods: z.strictObject(
    Object.fromEntries(methodIds.map((id) => [id, method])) as Record<
      (typeof methodIds)[number],
      typeof method
    >,
  ),
  railMarginM: figure,
});

/** Set-ups and possessions of every method, from `data/programme.json`. */
export const methodData = schema.parse(raw);
