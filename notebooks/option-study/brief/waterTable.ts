import type { Study, Water } from '../../../lib/index.ts';
import { h } from '../../html.ts';
import { standing, type Fields, type Path, type StudyStore } from '../../page/index.ts';
import type { Graph } from '../../reactive/index.ts';
import { fieldRow, focusField, listAction } from './fieldTable.ts';
import { withEntry, withoutEntry } from './listEdits.ts';
import { problemBeside } from './problemBeside.ts';

const list: Path = ['brief', 'waters'];

/** A water at the lowest ground between the abutments, standing no deeper than that ground; its flood is not known. */
function newWater({ brief }: Study): Water {
  const { startM, endM, ground } = brief.crossing;
  const between = ground.filter(({ chainageM }) => chainageM > startM && chainageM < endM);
  const lowest = (between.length > 0 ? between : ground).reduce((low, point) =>
    point.levelM < low.levelM ? point : low,
  );
  const fromM = Math.max(startM, lowest.chainageM - 5);
  const toM = Math.min(endM, lowest.chainageM + 5);
  return {
    name: `Water ${brief.waters.length + 1}`,
    fromM,
    toM,
    levelM: lowest.levelM,
    floodLevelM: 'unknown',
    floodReturnYears: 'unknown',
    freeboardM: 1,
    floodFromM: fromM,
    floodToM: toM,
    flowM3s: 'unknown',
    velocityMs: 'unknown',
    allowedAffluxM: 'unknown',
    grainMm: 'unknown',
    siltFactor: 'unknown',
    vesselDwtT: 'unknown',
    vesselSpeedMs: 'unknown',
  };
}

function row(fields: Fields, store: StudyStore, water: Water, index: number): HTMLElement[] {
  const at = (key: string): Path => [...list, index, key];
  const named = `water ${index + 1}`;
  const metres = (what: string, key: string, places: number): HTMLElement =>
    fields.figure(at(key), { label: `${named}, ${what}`, places, unit: 'm', step: places > 1 ? 0.1 : 1 });
  return fieldRow([
    fields.words(at('name'), { label: `${named}, name`, most: 500 }),
    metres('from', 'fromM', 1),
    metres('to', 'toM', 1),
    metres('level', 'levelM', 2),
    fields.figure(at('floodLevelM'), {
      label: `${named}, flood level`,
      places: 2,
      unit: 'm',
      step: 0.1,
      unknown: 'unknown',
      from: water.levelM,
    }),
    fields.figure(at('floodReturnYears'), {
      label: `${named}, flood once in`,
      places: 0,
      unit: 'years',
      step: 10,
      unknown: 'unknown',
      from: 100,
      min: { value: 1 },
      max: { value: 100_000 },
    }),
    metres('flood from', 'floodFromM', 1),
    metres('flood to', 'floodToM', 1),
    fields.figure(at('freeboardM'), {
      label: `${named}, freeboard`,
      places: 2,
      unit: 'm',
      step: 0.1,
      min: { value: 0 },
      max: { value: 50 },
    }),
    listAction('take out', `take out ${water.name}`, `take.waters.${index}`, () =>
      store.edit((study) => withoutEntry(study, list, index), { what: `taking out ${water.name}` }),
    ),
  ]);
}

/** The waters of the crossing in a table, each with its flood, which may be unknown. */
export function waterTable(graph: Graph, store: StudyStore): HTMLElement {
  const { element } = standing(graph, store, {
    say: problemBeside,
    shape: ({ brief }) => brief.waters.length,
    build: ({ brief }, fields) => [
      brief.waters.length > 0 &&
        h(
          'div',
          { class: 'across' },
          h(
            'table',
            { class: 'brief-table waters' },
            h('caption', {}, 'Water and its flood'),
            h(
              'thead',
              {},
              h(
                'tr',
                {},
                ['', 'from', 'to', 'level', 'flood', 'once in, years', 'from', 'to', 'freeboard', ''].map(
                  (words) => h('th', { scope: 'col' }, words),
                ),
              ),
            ),
            h(
              'tbody',
              {},
              brief.waters.map((water, index) => row(fields, store, water, index)),
            ),
          ),
        ),
      h(
        'p',
        { class: 'list-actions' },
        listAction('Add a water', 'Add a water', 'add.waters', () => {
          const at = brief.waters.length;
          store.edit((study) => withEntry(study, list, at, newWater(study)), { what: 'adding a water' });
          focusField(element, `brief.waters.${at}.name`);
        }),
      ),
    ],
  });
  return element;
}
