import { limitM, type FormReach, type SpanReached } from '../appraise/formReach.ts';
import { formWords, standardNames, type Figure, type FigureInput } from '../model/index.ts';
import { sourceOf } from './sources.ts';

type Entry = Omit<Figure, 'path' | 'usedBy' | 'because'> & {
  readonly method: string;
  readonly formula: string;
  readonly inputs?: readonly string[];
  readonly sources?: readonly string[];
};

/** Path of a figure of the limiting span of a form: 'reach/composite-i/spanM'. */
export const reachPath = (form: string, name: string): string => `reach/${form}/${name}`;

const computed = (label: string, value: number, unit: string) =>
  ({ label, value, unit, kind: 'computed' }) as const;

/** What is known of one span of the walk. */
function entriesOf(name: string, { spanM, depthM, ownWeightShare, check }: SpanReached): [string, Entry][] {
  const at = `at ${spanM.toFixed(1)} m`;
  return [
    [
      `${name}/utilisation`,
      {
        ...computed(`${check.label}, ${at}`, check.utilisation, ''),
        method: 'checks of the form',
        formula:
          'greatest use of all checks = demand / capacity, at the depth of least cost that carries or nearest to it',
        inputs: [`${name}/depthM`, `${name}/ownWeightShare`, 'lanes', 'widthM'],
      },
    ],
    [
      `${name}/depthM`,
      {
        ...computed(`depth ${at}`, depthM.support, 'm'),
        method: 'search',
        formula:
          'least cost in the published band of depths, beyond it to twice as deep where none inside carries',
        inputs: [],
      },
    ],
    [
      `${name}/ownWeightShare`,
      {
        ...computed(`share of own weight ${at}`, ownWeightShare, ''),
        method: 'ratio',
        formula: 'governing moment or force from own weight / that from everything',
        inputs: [],
      },
    ],
  ];
}

function entries(reach: FormReach): ReadonlyMap<string, Entry> {
  const { form, deck, lanes, ratios, carries, fails, standard } = reach;
  const limit = limitM(reach);
  const list: [string, Entry][] = [
    [
      'widthM',
      {
        label: 'width of the deck',
        value: deck.widthM,
        unit: 'm',
        kind: 'typed',
        method: 'as given',
        formula: 'typed in the question',
      },
    ],
    [
      'lanes',
      {
        ...computed('lanes', lanes, ''),
        method: 'count',
        formula: `lanes of 3.5 m between barriers that take 1 m of the width together; loads of ${standardNames[standard]}`,
        inputs: ['widthM'],
        sources: ['common practice, no source'],
      },
    ],
  ];
  if (Number.isFinite(deck.radiusM)) {
    list.push([
      'radiusM',
      {
        label: 'plan radius',
        value: deck.radiusM,
        unit: 'm',
        kind: 'typed',
        method: 'as given',
        formula: 'typed in the question',
      },
    ]);
  }
  if (carries !== null) list.push(...entriesOf('carries', carries));
  if (fails !== null) list.push(...entriesOf('fails', fails));
  if (carries !== null) {
    list.push([
      'carries/spanM',
      {
        ...computed('longest span found to carry', carries.spanM, 'm'),
        method: 'walk',
        formula: 'the last span of the walk of which every check is within its limit at some depth',
        inputs: ['carries/utilisation'],
      },
    ]);
  }
  if (limit !== null && fails !== null) {
    list.push([
      'spanM',
      {
        ...computed(`limiting span, ${formWords(form)}`, limit, 'm'),
        method: 'walk and halving',
        formula: `spans in the proportion ${ratios.map((one) => one.toFixed(2)).join(' : ')}, from short to long by a factor of 1.2 until none of the depths carries, then halved to 0.5\u00a0%; ended by ${fails.check.label}`,
        inputs: [
          'fails/utilisation',
          'carries/spanM',
          'widthM',
          'lanes',
          ...(Number.isFinite(deck.radiusM) ? ['radiusM'] : []),
        ],
      },
    ]);
  }
  return new Map(list);
}

/**
 * Where a figure of a limiting span comes from; see `reachPath`.
 * @throws RangeError where there is no such figure
 */
export function reachFigure(reaches: readonly FormReach[], path: string): Figure {
  const [root, form, ...rest] = path.split('/');
  const reach = reaches.find((one) => one.form === form);
  const all = root === 'reach' && reach ? entries(reach) : null;
  const name = rest.join('/');
  const entry = all?.get(name);
  if (!all || !entry || form === undefined)
    throw new RangeError(`path: expected a figure of a limiting span, received '${path}'`);
  const { method, formula, inputs = [], sources = [], ...own } = entry;
  const inputOf = (one: string): FigureInput => {
    const { label, value, unit, kind } = all.get(one)!;
    return { label, path: reachPath(form, one), value, unit, kind };
  };
  return {
    ...own,
    path,
    because: { method, formula, inputs: inputs.map(inputOf), sources: sources.map(sourceOf) },
    usedBy: [...all].flatMap(([one, { inputs: of = [] }]) =>
      of.includes(name) ? [reachPath(form, one)] : [],
    ),
  };
}
