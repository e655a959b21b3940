import { fixed } from '../format.ts';
import { h } from '../html.ts';
import { choiceInput, figureInput, type Figure, type FigureInput } from '../page/index.ts';
import { FIRST_RADIUS_M, hasRoom, limits, presetQuestion, type Question } from './question.ts';

export interface QuestionSentence {
  readonly element: HTMLElement;
}

export interface QuestionSentenceSpec {
  readonly question: Question;
  /** In words, the span that is asked for; follows the question. */
  readonly asked: HTMLElement;
  /** Every valid question while a figure moves. */
  readonly input: (question: Question) => void;
  /** Once at the end of each go. */
  readonly change: () => void;
}

const between = (key: keyof typeof limits): { min: { value: number }; max: { value: number } } => ({
  min: { value: limits[key][0] },
  max: { value: limits[key][1] },
});

/**
 * The question as one sentence with its figures inside it. A length that leaves no room for the opening is refused
 * beside the length, and the last question that could be answered is kept.
 */
export function questionSentence({ question, asked, input, change }: QuestionSentenceSpec): QuestionSentence {
  let draft = question;
  const unit = h('span', { hidden: question.lengthM === 'unknown' }, ' m');
  let radiusM = question.radiusM === 'straight' ? FIRST_RADIUS_M : question.radiusM;

  const put = (part: Partial<Question>): void => {
    draft = { ...draft, ...part };
    unit.hidden = draft.lengthM === 'unknown';
    if (hasRoom(draft)) {
      length.refuse(null);
      input(draft);
      return;
    }
    const take = (lengthM: Question['lengthM']) => (): void => {
      length.set(lengthM, 'typed');
      put({ lengthM });
      change();
    };
    length.refuse(
      `Refused: at least ${fixed(draft.openingM, 1)} m, because both abutments stand outside the opening. The last answer is kept.`,
      [
        { words: `Take ${fixed(draft.openingM, 1)}`, take: take(draft.openingM) },
        { words: 'Not known', take: take('unknown') },
      ],
    );
  };
  const figure = (
    key: 'openingM' | 'pierM' | 'widthM',
    label: string,
    places: number,
    step: number,
  ): HTMLElement =>
    figureInput({
      label,
      value: question[key],
      origin: question[key] === presetQuestion[key] && key !== 'openingM' ? 'preset' : 'typed',
      places,
      unit: 'm',
      step,
      ...between(key),
      input: (value) => {
        if (value !== 'unknown') put({ [key]: value });
      },
      change,
    }).element;

  const length: FigureInput = figureInput({
    label: 'length between abutments',
    value: question.lengthM,
    places: 0,
    unit: 'm',
    step: 5,
    unknown: 'not known',
    from: 200,
    ...between('lengthM'),
    input: (value: Figure) => put({ lengthM: value }),
    change,
  });
  const radius = figureInput({
    label: 'plan radius',
    value: radiusM,
    places: 0,
    unit: 'm',
    step: 10,
    ...between('radiusM'),
    input: (value) => {
      if (value === 'unknown') return;
      radiusM = value;
      put({ radiusM });
    },
    change,
  });
  const ofRadius = h(
    'span',
    { hidden: question.radiusM === 'straight' },
    ' of ',
    radius.element,
    ' m radius',
  );
  const line = choiceInput<'straight' | 'curved'>({
    label: 'line of the road',
    value: question.radiusM === 'straight' ? 'straight' : 'curved',
    choices: [
      { value: 'straight', words: 'straight' },
      { value: 'curved', words: 'on a curve' },
    ],
    change(value) {
      ofRadius.hidden = value === 'straight';
      put({ radiusM: value === 'straight' ? 'straight' : radiusM });
      change();
    },
  });

  const element = h(
    'span',
    { class: 'question' },
    'A clear opening of ',
    figure('openingM', 'clear opening', 1, 1),
    ' m between piers ',
    figure('pierM', 'thickness of piers', 1, 0.1),
    ' m thick asks for ',
    asked,
    '. The deck is ',
    figure('widthM', 'deck width', 1, 0.1),
    ' m wide and ',
    line.element,
    ofRadius,
    '; the length between abutments is ',
    length.element,
    unit,
    '. ',
  );
  return { element };
}
