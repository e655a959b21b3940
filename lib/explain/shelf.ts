import adjacentBox from '../../data/forms/adjacent-box.json';
import cableStayed from '../../data/forms/cable-stayed.json';
import compositeBox from '../../data/forms/composite-box.json';
import compositeI from '../../data/forms/composite-i.json';
import cantileverBox from '../../data/forms/cantilever-box.json';
import concreteBox from '../../data/forms/concrete-box.json';
import erection from '../../data/erection.json';
import fatigue from '../../data/forms/fatigue.json';
import floor from '../../data/forms/floor.json';
import plates from '../../data/forms/plates.json';
import portalFrame from '../../data/forms/portal-frame.json';
import precastI from '../../data/forms/precast-i.json';
import precastTrough from '../../data/forms/precast-trough.json';
import spliced from '../../data/forms/spliced.json';
import pretensioned from '../../data/forms/pretensioned.json';
import slab from '../../data/forms/slab.json';
import slabDeck from '../../data/forms/slab-deck.json';
import skewEnds from '../../data/forms/skew-ends.json';
import halfThrough from '../../data/forms/half-through.json';
import steelBox from '../../data/forms/steel-box.json';
import truss from '../../data/forms/truss.json';
import ground from '../../data/ground.json';
import materials from '../../data/materials.json';
import programme from '../../data/programme.json';
import road from '../../data/road.json';
import drivers from '../../data/rates/drivers.json';
import hl93 from '../../data/standards/hl93.json';
import lm1 from '../../data/standards/lm1.json';
import river from '../../data/river.json';
import substructure from '../../data/substructure.json';
import type { FigureValue } from '../model/index.ts';
import { fieldWords } from './fieldWords.ts';

/** Data files by the step after `data`; the files of forms and standards by their own names. */
const files: Readonly<Record<string, unknown>> = {
  substructure,
  river,
  road,
  programme,
  erection,
  drivers,
  ground,
  materials,
  lm1,
  hl93,
  slab,
  'slab-deck': slabDeck,
  floor,
  plates,
  fatigue,
  'composite-i': compositeI,
  'composite-box': compositeBox,
  'cantilever-box': cantileverBox,
  'concrete-box': concreteBox,
  'portal-frame': portalFrame,
  'precast-i': precastI,
  pretensioned,
  spliced,
  'precast-trough': precastTrough,
  'adjacent-box': adjacentBox,
  'skew-ends': skewEnds,
  'half-through': halfThrough,
  'steel-box': steelBox,
  truss,
  'cable-stayed': cableStayed,
};

/** A figure of a data file with what the file says of it. */
export interface Shelved {
  readonly value: FigureValue;
  readonly label: string;
  readonly unit: string;
  /** Where the file says it comes from: an id, or words. */
  readonly source: string | null;
}

/** Fields by which the entries of a list are told apart. */
const named = ['id', 'form', 'item'] as const;

function step(holder: unknown, name: string): unknown {
  if (Array.isArray(holder)) {
    return (
      holder.find((one: unknown) => named.some((key) => fieldOf(one, key) === name)) ?? holder[Number(name)]
    );
  }
  return fieldOf(holder, name);
}

function fieldOf(holder: unknown, key: string): unknown {
  return typeof holder === 'object' && holder !== null && Object.hasOwn(holder, key)
    ? (holder as Readonly<Record<string, unknown>>)[key]
    : undefined;
}

/**
 * A figure of the data files, by file and steps: 'substructure/factors/permanent'. An entry with a `value` stands for
 * it; its source and unit are its own or those of the nearest group around it. Undefined where there is none.
 */
export function shelved(path: string): Shelved | undefined {
  const steps = path.split('/');
  let holder = files[steps[0]!];
  let source: string | null = null;
  let unit = '';
  const words: { readonly words: string; readonly unit: string }[] = [];
  for (const name of steps.slice(1)) {
    words.push(
      Array.isArray(holder) && /^\d$/u.test(name)
        ? { words: `no. ${String(Number(name) + 1)}`, unit: '' }
        : fieldWords(name),
    );
    holder = step(holder, name);
    for (const key of ['source', 'reason'] as const) {
      const words = fieldOf(holder, key);
      if (typeof words === 'string') source = words;
    }
    const own = fieldOf(holder, 'unit');
    if (typeof own === 'string') unit = own;
  }
  const value = fieldOf(holder, 'value') ?? holder;
  if (typeof value !== 'number' && typeof value !== 'string' && typeof value !== 'boolean') return undefined;
  return {
    value,
    label: words.map((one) => one.words).join(', '),
    unit: unit === '-' ? '' : unit === '' ? (words.findLast((one) => one.unit !== '')?.unit ?? '') : unit,
    source,
  };
}
