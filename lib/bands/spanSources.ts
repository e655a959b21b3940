import { z } from '../zod.ts';
import raw from '../../data/span-guidance.json';
import { formIds, type FormId } from '../model/index.ts';

const end = z.number().positive().nullable();
const schema = z.strictObject({
  note: z.string(),
  forms: z.array(
    z.strictObject({
      form: z.enum(formIds),
      ranges: z
        .array(z.strictObject({ source: z.string(), fromM: end, toM: end, of: z.string().optional() }))
        .min(1),
    }),
  ),
});

/** Spans that one source names for a form, m; an end it leaves open is null. `of` says what exactly it speaks of. */
export type SpanSource = Readonly<z.infer<typeof schema>['forms'][number]['ranges'][number]>;

const byForm: ReadonlyMap<FormId, readonly SpanSource[]> = new Map(
  schema.parse(raw).forms.map(({ form, ranges }) => [form, ranges]),
);

/** What single sources say of the span of a form, side by side. Shown where they disagree; the rules set the spans. */
export const spanSources = (form: FormId): readonly SpanSource[] => byForm.get(form) ?? [];
