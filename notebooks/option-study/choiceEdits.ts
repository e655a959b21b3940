import {
  formModule,
  saidOf,
  searchedChoices,
  type AppraisedOption,
  type AskedVariant,
  type FormId,
  type KeptOption,
  type Study,
  type Variant,
} from '../../lib/index.ts';
import { choicesSaid, formChoices, type FigureField, type SpanField } from '../forms/formChoices.ts';
import type { Figure } from '../page/index.ts';
import { keptOf, withVariant } from './handEdits.ts';
import { askedAt, mainSupports, putAsked, spansBetween } from './spanChoices.ts';

/** A way of making a unit: with it, without it, or whichever costs least. */
export type Way = 'with' | 'without' | 'unknown';

/** The choices that a form leaves, in the order in which they are asked. */
export function choicesOf(form: FormId): (keyof Variant)[] {
  const { choices = [] } = formModule(form);
  return (Object.keys(formChoices) as (keyof Variant)[]).filter((key) => choices.includes(key));
}

/** Whether the search makes a choice where nobody has. */
const isSearched = (key: string): boolean => searchedChoices.some((one) => one === key);

/** What nothing is asked of: everything the search can choose of a form is left to it. */
const nothingAsked = (form: FormId): AskedVariant =>
  Object.fromEntries(
    choicesOf(form)
      .filter(isSearched)
      .map((key) => [key, 'unknown']),
  );

/** How an option is asked to be made; of one that is not kept yet nothing is asked. */
const askedOf = ({ options }: Study, { number, form }: AppraisedOption): AskedVariant =>
  options.kept.find((kept) => kept.number === number)?.variant ?? nothingAsked(form);

/** The study with an option asked to be made otherwise; where nothing is asked any more it is left to least cost. */
function withAsked(study: Study, option: AppraisedOption, asked: AskedVariant): Study {
  const nothing = nothingAsked(option.form);
  const isNothing =
    Object.keys(asked).length === Object.keys(nothing).length &&
    Object.values(asked).every((value) => value === 'unknown');
  return withVariant(study, option, isNothing ? null : asked);
}

/** The variant without a choice, or with it left to the search where the search can make it. */
function cleared(asked: AskedVariant, key: keyof Variant): AskedVariant {
  const { [key]: _gone, ...others } = asked;
  return isSearched(key) ? { ...others, [key]: 'unknown' } : others;
}

/** Whether an option is asked to be made with a way or without it. */
export function wayOf(study: Study, option: AppraisedOption, key: keyof Variant): Way {
  const asked = askedOf(study, option)[key];
  return asked === 'unknown' ? asked : asked === undefined ? 'without' : 'with';
}

/** The study with an option asked to be made with a way or without it. */
export function withWay(study: Study, option: AppraisedOption, key: keyof Variant, way: Way): Study {
  if (wayOf(study, option, key) === way) return study;
  const { [key]: _before, ...others } = askedOf(study, option);
  if (way === 'without') return withAsked(study, option, others);
  return withAsked(study, option, { ...others, [key]: way === 'with' ? true : way });
}

/** Spans of the main unit of an option as the study keeps it, m. */
export const mainSpans = (study: Study, option: AppraisedOption): number[] =>
  spansBetween(mainSupports(keptOf(study, option).units));

/** A figure that is asked of an option, of one of its spans where it is one by span; 'unknown' where none is. */
export function askedFigure(study: Study, option: AppraisedOption, field: FigureField, span = 0): Figure {
  const value = askedAt(askedOf(study, option), field.steps);
  if (field.kind === 'by-span') {
    const spanM = mainSpans(study, option)[span] ?? NaN;
    const own = (value as readonly number[] | undefined)?.[span];
    return own === undefined || own === field.usual(spanM) ? 'unknown' : own;
  }
  if (typeof value === 'number') return value;
  return value === undefined && field.plain !== undefined ? field.plain : 'unknown';
}

/** The study with a figure asked of an option; 'unknown' leaves it to what the form finds. */
export function withAskedFigure(
  study: Study,
  option: AppraisedOption,
  field: FigureField,
  value: Figure,
  span = 0,
): Study {
  if (askedFigure(study, option, field, span) === value) return study;
  const asked = askedOf(study, option);
  const [key] = field.steps;
  if (field.kind === 'by-span') {
    const list = listWith(field, mainSpans(study, option), askedAt(asked, field.steps), span, value);
    return withAsked(study, option, putAsked(asked, field.steps, list));
  }
  if (value === 'unknown') return withAsked(study, option, cleared(asked, key));
  return withAsked(study, option, putAsked(asked, field.steps, value === field.plain ? undefined : value));
}

/** The figures by span with one of them changed; undefined where every span has the usual one. */
function listWith(
  { usual }: SpanField,
  spansM: readonly number[],
  before: unknown,
  span: number,
  value: Figure,
): number[] | undefined {
  const had = (before ?? []) as readonly number[];
  const list = spansM.map((spanM, s) =>
    s !== span ? (had[s] ?? usual(spanM)) : value === 'unknown' ? usual(spanM) : value,
  );
  return list.every((one, s) => one === usual(spansM[s]!)) ? undefined : list;
}

/** What is asked of how an option kept by hand is made, in words; empty where all of it is left to what the form finds. */
export function askedWords({ form, variant }: KeptOption): string[] {
  if (variant === undefined) return [];
  const without = choicesOf(form).filter((key) => isSearched(key) && variant[key] === undefined);
  return [...choicesSaid(saidOf(variant)), ...without.flatMap((key) => formChoices[key].without ?? [])];
}
