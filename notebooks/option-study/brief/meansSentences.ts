import type { Study } from '../../../lib/index.ts';
import type { HtmlChild } from '../../html.ts';
import { putAt, type Figure, type Made, type Path } from '../../page/index.ts';
import { fromYesNo, gasMainChoices, lanesKeptChoices, yesNoOf, type YesNo } from './briefChoices.ts';
import type { InWords } from './inWords.ts';
import { groundProved, priceDate, provedOf } from './madeFields.ts';

/** Whether the ground is proved. */
export function groundSentence({ fields }: InWords, study: Study): HtmlChild {
  return [
    'The ground is ',
    fields.choice(groundProved, {
      label: 'ground',
      choices: [
        { value: 'unknown', words: 'not proved' },
        { value: 'known', words: 'proved' },
        ...(provedOf(study) === 'part' ? [{ value: 'part' as const, words: 'proved in part' }] : []),
      ],
    }),
    provedOf(study) === 'known' ? '. ' : ': each stretch carries its odds. ',
  ];
}

function yesNo({ fields }: InWords, key: 'crane' | 'barge'): HTMLElement {
  const path: Path = ['brief', 'access', key];
  return fields.choice<YesNo>(
    {
      key: path.join('.'),
      get: ({ brief }) => yesNoOf(brief.access[key]),
      put: (study, value) => putAt(study, path, fromYesNo(value)),
      owns: [path],
    },
    {
      label: key,
      choices: [
        { value: 'yes', words: 'can' },
        { value: 'no', words: 'cannot' },
        { value: 'unknown', words: 'may or may not' },
      ],
    },
  );
}

/** What can be brought to the site and what can work there. */
export function accessSentence(words: InWords): HtmlChild {
  const { fields } = words;
  const limit = (key: string, label: string, unit: string, from: number, most: number): HTMLElement =>
    fields.figure(['brief', 'access', key], {
      label,
      places: 0,
      unit,
      unknown: 'unknown',
      from,
      min: { value: 1 },
      max: { value: most },
    });
  return [
    'The longest piece that comes by road is ',
    limit('haulLengthM', 'longest piece', 'm', 25, 1000),
    ' m, the heaviest ',
    limit('haulMassT', 'heaviest piece', 't', 40, 1e5),
    ' t. A crane ',
    yesNo(words, 'crane'),
    ' stand beside the bridge, a barge ',
    yesNo(words, 'barge'),
    ' come to it. The largest crane there has a load moment of ',
    limit('craneMomentTm', 'load moment of the largest crane', 'tm', 1000, 1e6),
    ' tm; level ground in line behind an abutment is ',
    fields.figure(['brief', 'access', 'launchYardM'], {
      label: 'level ground behind an abutment',
      places: 0,
      unit: 'm',
      unknown: 'an unknown number of',
      from: 60,
      min: { value: 0 },
      max: { value: 10_000 },
    }),
    ' m long. ',
  ];
}

const lanesPath: Path = ['brief', 'demands', 'lanesKept'];

/** What else the bridge is asked for: a gas main, traffic beside the works. */
export function demandsSentence({ fields }: InWords): HtmlChild {
  return [
    'It carries ',
    fields.choice(['brief', 'demands', 'gasMain'], { label: 'gas main', choices: gasMainChoices }),
    '; ',
    fields.choice<string>(
      {
        key: lanesPath.join('.'),
        get: ({ brief }) => String(brief.demands.lanesKept),
        put: (study, lanes) => putAt(study, lanesPath, Number(lanes)),
        owns: [lanesPath],
      },
      { label: 'lanes kept in use', choices: lanesKeptChoices },
    ),
    ' in use on a bridge on the same line while it is built. ',
  ];
}

/** The budget with its price date and scope, or that there is none. */
export function budgetSentence(
  { fields }: InWords,
  { brief, books }: Study,
  amount: Made<Figure>,
): HtmlChild {
  const isKnown = brief.budget !== 'unknown';
  return [
    'The budget is ',
    fields.figure(amount, {
      label: 'budget',
      places: 2,
      unit: `M${books.currency}`,
      per: 1e-6,
      step: 0.1,
      unknown: 'not given',
      from: 1,
      min: { value: 0, open: true },
      max: { value: 1e7 },
    }),
    isKnown && [
      ` million ${books.currency} at `,
      fields.words(priceDate, { label: 'price date', most: 500 }),
      ' prices, for: ',
      fields.words(['brief', 'budget', 'includes'], { label: 'what the budget includes', most: 21_000 }),
    ],
    '. ',
  ];
}
