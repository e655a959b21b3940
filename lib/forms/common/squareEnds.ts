import json from '../../../data/forms/skew-ends.json';
import type { At, Descriptor, MeasuredLine, UnitTask } from '../../model/index.ts';
import { described } from '../../model/index.ts';
import { z } from '../../zod.ts';
import { measured } from './measured.ts';
import { aheadM } from './skewPlanes.ts';

const source = z.string().min(1);
const { sill, triedFrom } = z
  .object({
    sill: z.object({ thicknessM: z.number(), barsKgM3: z.number(), source }),
    triedFrom: z.object({ skewDeg: z.number(), source }),
  })
  .parse(json);

const CONCRETE = 'sills beyond square ends';
const BARS = 'bars of the sills beyond square ends';

/** What closes the wedges between square ends of a unit and skew abutments: sills with a slab on them, at both ends. */
export function squareEndLines({ deck, skewDeg }: Pick<UnitTask, 'deck' | 'skewDeg'>): MeasuredLine[] {
  const longestM = aheadM(deck.widthM, skewDeg);
  const concreteM3 = deck.widthM * longestM * sill.thicknessM;
  const wedges = `two wedges of ${deck.widthM.toFixed(1)} x ${longestM.toFixed(1)} m`;
  return [
    measured('abutments', 'abutment-concrete', concreteM3, CONCRETE, `${wedges}, ${sill.thicknessM} m thick`),
    measured('abutments', 'reinforcement', concreteM3 * sill.barsKgM3, BARS, `${sill.barsKgM3} kg/m3`),
  ];
}

/** Whether ends square to the road are worth pricing beside ends along a skew, degrees either way. */
export const isWorthSquaring = (skewDeg: number): boolean => Math.abs(skewDeg) >= triedFrom.skewDeg;

const isLine =
  (words: string) =>
  (at: At): boolean =>
    at.design.lines[at.index('line')]?.what === words;
const path = 'options/:option/designs/:unit/lines/:line/quantity';

/** Figures of what square ends cost. */
export const squareEndFigures: readonly Descriptor[] = [
  described({
    path,
    when: isLine(CONCRETE),
    label: CONCRETE,
    unit: 'm3',
    method: 'product',
    formula: 'deck width x deck width x tan of the skew x thickness: two wedges, half of that each',
    inputs: (at) => ({
      width: `${at.unit}/task/deck/widthM`,
      skew: `${at.unit}/task/skewDeg`,
      thickness: 'data/skew-ends/sill/thicknessM',
    }),
    compute: ({ width, skew, thickness }) => width ** 2 * Math.tan((skew * Math.PI) / 180) * thickness,
  }),
  described({
    path,
    when: isLine(BARS),
    label: BARS,
    unit: 'kg',
    method: 'product',
    formula: 'concrete of the sills x bars in a m3',
    inputs: (at) => ({
      concrete: at.design.lines.flatMap(({ what }, i) =>
        what === CONCRETE ? [`${at.unit}/lines/${i}/quantity`] : [],
      ),
      bars: 'data/skew-ends/sill/barsKgM3',
    }),
    compute: ({ concrete, bars }) => concrete[0]! * bars,
  }),
];
