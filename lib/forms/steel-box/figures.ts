import type { At, Descriptor } from '../../model/index.ts';
import { formManual, linesOf, spansOf, steelLinesOf } from '../common/formManual.ts';
import { steelBoxCheckFigures } from './checkFigures.ts';
import { deck, layout } from './layoutFigures.ts';
import { statics } from './staticsFigures.ts';

const { figure, sized } = formManual('steel-box');

const area = (at: At) => ({ spans: spansOf(at), width: `${at.unit}/task/deck/widthM` });
const sum = (values: readonly number[]): number => values.reduce((all, one) => all + one, 0);
/** Steel of the lines named, per m2 of deck. */
const perM2 = (name: string, label: string, formula: string, ...what: readonly string[]): Descriptor =>
  figure(name, {
    label,
    unit: 'kg/m2',
    method: 'ratio',
    formula,
    inputs: (at) => ({ steel: what.length > 0 ? linesOf(at, ...what) : steelLinesOf(at), ...area(at) }),
    compute: ({ steel, spans, width }) => sum(steel) / (sum(spans) * width),
  });

/** Steel box: layout, deck, plates and statics, masses, checks. */
export const steelBoxFigures: readonly Descriptor[] = [
  ...[...layout, ...deck, ...statics].map((row) => sized(...row)),
  perM2('deckPlateKgM2', 'deck plate per m2 of deck', 'deck plate / (length x deck width)', 'deck plate'),
  perM2(
    'deckRibsKgM2',
    'ribs per m2 of deck',
    'ribs of the deck / (length x deck width)',
    'ribs of the deck',
  ),
  perM2(
    'crossbeamsKgM2',
    'crossbeams and brackets per m2 of deck',
    'crossbeams and brackets / (length x deck width)',
    'crossbeams and brackets',
  ),
  perM2(
    'deckSystemKgM2',
    'deck plate, ribs and crossbeams per m2 of deck',
    'the three / (length x deck width)',
    'deck plate',
    'ribs of the deck',
    'crossbeams and brackets',
  ),
  perM2('steelKgM2', 'structural steel per m2 of deck', 'all lines of steel / (length x deck width)'),
  ...steelBoxCheckFigures,
];
