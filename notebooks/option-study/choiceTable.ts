import type { AppraisedOption, Study, Variant } from '../../lib/index.ts';
import { supportName } from '../drawing/alongOption.ts';
import { ofOption } from '../drawing/asked.ts';
import { mainDesign, mainDesignPath } from '../drawing/sectionRow.ts';
import { fixed } from '../format.ts';
import { formChoices, type ChoiceField, type FigureField } from '../forms/formChoices.ts';
import { h, type HtmlChild } from '../html.ts';
import {
  standing,
  workedFigure,
  type Fields,
  type Figure,
  type Made,
  type Path,
  type StudyStore,
} from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';
import { fieldRow, listAction } from './brief/fieldTable.ts';
import { problemBeside } from './brief/problemBeside.ts';
import {
  askedFigure,
  choicesOf,
  mainSpans,
  wayOf,
  withAskedFigure,
  withWay,
  type Way,
} from './choiceEdits.ts';
import { placesOf } from './handEdits.ts';
import { askedAt, mainSupports } from './spanChoices.ts';
import type { StudyCells } from './studyCells.ts';

/** What of a choice, and of which option, a field asks for. */
interface Asked {
  readonly option: () => AppraisedOption;
  readonly key: keyof Variant;
  /** Place of the variant in the study, whether the option is kept yet or not. */
  readonly at: Path;
}

/** Where the variant of an option stands among those kept, which go by their numbers. */
const placeOf = ({ options }: Study, { number }: AppraisedOption): Path => [
  'options',
  'kept',
  options.kept.filter((kept) => kept.number < number).length,
  'variant',
];

const wayMade = ({ option, key, at }: Asked): Made<Way> => ({
  key: `choice.${key}`,
  get: (study) => wayOf(study, option(), key),
  put: (study, way) => withWay(study, option(), key, way),
  owns: [[...at, key]],
});

const figureMade = ({ option, at }: Asked, field: FigureField, span?: number): Made<Figure> => ({
  key: `choice.${field.steps.join('.')}${span === undefined ? '' : `.${span}`}`,
  get: (study) => askedFigure(study, option(), field, span),
  put: (study, value) => withAskedFigure(study, option(), field, value, span),
  owns: [[...at, ...field.steps, ...(span === undefined ? [] : [span])]],
});

function fieldOf(fields: Fields, asked: Asked, field: ChoiceField, spans: readonly string[]): HtmlChild {
  if (field.kind === 'way')
    return fields.choice<Way>(wayMade(asked), {
      label: field.label,
      choices: [
        { value: 'unknown', words: 'as costs least' },
        { value: 'with', words: 'with' },
        { value: 'without', words: 'without' },
      ],
    });
  const { label, unit, places, step, from, empty } = field;
  const rules = {
    places,
    step,
    from,
    unknown: empty,
    min: { value: 0 },
    ...(unit !== undefined && { unit }),
  };
  if (field.kind === 'figure') {
    const { plain, least = plain ?? 0, most } = field;
    const limits = { min: { value: least }, ...(most !== undefined && { max: { value: most } }) };
    return fields.figure(figureMade(asked, field), { label, ...rules, ...limits });
  }
  return spans.map((name, span) =>
    h(
      'span',
      { class: 'by-span' },
      `${name} `,
      fields.figure(figureMade(asked, field, span), { label: `${label} of ${name}`, ...rules }),
    ),
  );
}

/** How a unit comes out in what a field asks for, where that can be told. */
function madeWords(option: AppraisedOption, key: keyof Variant, field: ChoiceField): HtmlChild {
  const { variant = {} } = option;
  if (field.kind === 'way') return variant[key] === undefined ? 'without' : 'with';
  const { steps, places } = field;
  const value = askedAt(variant, steps);
  const path = ofOption(option, `variant/${steps.join('/')}`);
  if (field.kind === 'by-span') {
    const list = (value ?? []) as readonly number[];
    return list.map((one, i) => [i === 0 ? '' : ', ', workedFigure(`${path}/${i}`, fixed(one, places))]);
  }
  if (typeof value === 'number') return workedFigure(path, fixed(value, places));
  if (field.plain !== undefined) return fixed(field.plain, places);
  const found = field.found?.(mainDesign(option)?.figures ?? {});
  if (found === undefined) return '';
  const of = found.of.map((name) => `${mainDesignPath(option)}/figures/${name}`);
  return workedFigure(of, fixed(found.value, places));
}

/** Names of the spans of the main unit: A-P1, P1-P2. */
function spanNames(option: AppraisedOption): string[] {
  const places = placesOf(option.units);
  const names = mainSupports(option.units).map((x) => supportName(nearest(places, x), places.length));
  return names.slice(1).map((name, i) => `${names[i]!}\u2013${name}`);
}

function nearest(places: readonly number[], x: number): number {
  const away = places.map((place) => Math.abs(place - x));
  return away.indexOf(Math.min(...away));
}

/**
 * How the main unit of the reference is asked to be made, a row for each choice of its form, folded until it is wanted:
 * empty = as the form finds. Nothing for a form that is made in one way only.
 */
export function choiceTable(graph: Graph, store: StudyStore, { reference }: StudyCells): HTMLElement {
  const now = (): AppraisedOption | null => {
    const state = graph.state(reference);
    return 'value' in state ? state.value : null;
  };
  /** As it was last worked out: a kept option that the brief has left no way to be made is still asked to be made otherwise. */
  let seen: AppraisedOption | null = null;
  const inHand = ({ options }: Study): AppraisedOption | null => {
    const held = now();
    if (held !== null) seen = held;
    return held ?? (options.kept.some(({ number }) => number === seen?.number) ? seen : null);
  };
  let isUnfolded = false;
  /** Says how the reference comes out, in the table as it stands; nothing where it cannot be worked out. */
  let sayMade: (option: AppraisedOption | null) => void = () => {};

  function build(study: Study, fields: Fields): HtmlChild {
    const first = inHand(study);
    if (first === null) return null;
    const choices = rowsOf(study, first);
    if (choices.length === 0) return null;
    const option = (): AppraisedOption => {
      const held = now();
      return held?.number === first.number ? held : first;
    };
    const made: (readonly [cell: HTMLElement, key: keyof Variant, field: ChoiceField])[] = [];
    const at = placeOf(study, first);
    const spans = spanNames(first);
    const rows = choices.flatMap((key) =>
      shownFields(study, first, key).flatMap((field) => {
        const cell = h('span', {});
        made.push([cell, key, field]);
        const unit = field.kind === 'way' || field.unit === undefined ? '' : `, ${field.unit}`;
        return fieldRow([
          `${field.label}${unit}`,
          fieldOf(fields, { option, key, at }, field, spans),
          [cell, ' ', backAction(store, fields, option, key, field)],
        ]);
      }),
    );
    sayMade = (worked) => {
      if (worked !== null && worked.number !== first.number) return;
      for (const [cell, key, field] of made) {
        const next = h('span', {}, worked && madeWords(worked, key, field));
        // While a pier is dragged most stay what they are.
        if (!cell.isEqualNode(next)) cell.replaceChildren(...next.childNodes);
      }
    };
    sayMade(now());
    const head = ['choice', 'asked for', 'worked out'];
    const details = h(
      'details',
      { class: 'behind choices', open: isUnfolded },
      h('summary', {}, 'How its main unit is made'),
      h(
        'table',
        { class: 'brief-table', 'aria-label': 'How its main unit is made' },
        h(
          'thead',
          {},
          h(
            'tr',
            {},
            head.map((words) => h('th', { scope: 'col' }, words)),
          ),
        ),
        h('tbody', {}, rows),
      ),
    );
    details.addEventListener('toggle', () => {
      isUnfolded = details.open;
    });
    return details;
  }

  graph.watch(reference, (state) => {
    if (state.state === 'ready') sayMade(state.value);
  });
  return standing(graph, store, {
    say: problemBeside,
    follows: [reference],
    shape(study) {
      const option = inHand(study);
      if (option === null) return null;
      const fields = rowsOf(study, option).map((key) => shownFields(study, option, key).length);
      return [option.number, option.form, placeOf(study, option), spanNames(option), fields];
    },
    build,
  }).element;
}

/** Choices that are given a row: whether ends stand square is no question without a skew, unless it has been answered. */
function rowsOf(study: Study, option: AppraisedOption): (keyof Variant)[] {
  const { skewDeg } = study.brief.crossing;
  const isSkew = typeof skewDeg === 'number' && skewDeg !== 0;
  return choicesOf(option.form).filter(
    (key) => key !== 'squareEnds' || isSkew || wayOf(study, option, key) !== 'unknown',
  );
}

/** Fields of a choice: the first, and the others once that is made. */
function shownFields(study: Study, option: AppraisedOption, key: keyof Variant): readonly ChoiceField[] {
  const [first, ...others] = formChoices[key].fields;
  if (others.length === 0 || first.kind !== 'figure') return [first];
  return askedFigure(study, option, first) === 'unknown' ? [first] : [first, ...others];
}

/** The way back from what was asked for to what the form finds; out of the way while nothing is asked. */
function backAction(
  store: StudyStore,
  fields: Fields,
  option: () => AppraisedOption,
  key: keyof Variant,
  field: ChoiceField,
): HTMLElement {
  const isAsked = (study: Study): boolean =>
    field.kind === 'way'
      ? wayOf(study, option(), key) !== 'unknown'
      : field.kind === 'figure'
        ? askedFigure(study, option(), field) !== 'unknown'
        : mainSpans(study, option()).some(
            (_, span) => askedFigure(study, option(), field, span) !== 'unknown',
          );
  const back = (study: Study): Study =>
    field.kind === 'way'
      ? withWay(study, option(), key, 'unknown')
      : field.kind === 'figure'
        ? withAskedFigure(study, option(), field, 'unknown')
        : mainSpans(study, option()).reduce(
            (left, _, span) => withAskedFigure(left, option(), field, 'unknown', span),
            study,
          );
  const name = `give back ${field.label} to what the form finds`;
  const action = listAction('give back', name, `back.${key}.${field.label}`, () =>
    store.edit(back, { what: field.label }),
  );
  fields.follow([], (draft) => action.toggleAttribute('hidden', !isAsked(draft)));
  return action;
}
