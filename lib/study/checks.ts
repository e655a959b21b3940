import type { Brief, Crossing, Problem, Study } from '../model/index.ts';
import { namesField } from './assumed.ts';
import { problem } from './problem.ts';

type Path = readonly (string | number)[];

const ODDS_TOLERANCE = 1e-6;
/** Longest crossing the search is made for, m. */
const LONGEST_M = 20_000;

/** The end of a stretch, which stands at `path`, lies beyond its start. */
function rising(path: Path, fromM: number, toM: number): Problem[] {
  if (fromM < toM) return [];
  const remedy = 'Exchange the start and the end or correct one of them';
  return [problem('reversed', path, `more than the start at ${fromM}`, `${toM}`, { unit: 'm', remedy })];
}

/** The windows of the abutments lie inside the crossing and leave room between them. */
function windowProblems({
  startM,
  endM,
  startLatestM = 'unknown',
  endEarliestM = 'unknown',
}: Crossing): Problem[] {
  const path = ['brief', 'crossing'];
  const remedy = "Put the innermost place of an abutment inside the crossing, or 'unknown' where it is fixed";
  const latest = startLatestM === 'unknown' ? startM : startLatestM;
  const earliest = endEarliestM === 'unknown' ? endM : endEarliestM;
  const found: Problem[] = [];
  if (!(latest >= startM && latest < endM)) {
    const expected = `from ${startM}, the start of the crossing, to less than ${endM}, its end`;
    found.push(problem('outside', [...path, 'startLatestM'], expected, `${latest}`, { unit: 'm', remedy }));
  }
  if (!(earliest <= endM && earliest > startM)) {
    const expected = `from more than ${startM}, the start of the crossing, to ${endM}, its end`;
    found.push(problem('outside', [...path, 'endEarliestM'], expected, `${earliest}`, { unit: 'm', remedy }));
  }
  if (found.length === 0 && !(latest < earliest)) {
    const expected = `more than ${latest}, as far along as the start abutment may stand`;
    found.push(
      problem('reversed', [...path, 'endEarliestM'], expected, `${earliest}`, { unit: 'm', remedy }),
    );
  }
  return found;
}

function crossingProblems({ crossing }: Brief): Problem[] {
  const { startM, endM, ground } = crossing;
  const path = ['brief', 'crossing'];
  const found = rising([...path, 'endM'], startM, endM);
  if (found.length > 0) return found;
  if (endM - startM > LONGEST_M) {
    found.push(
      problem(
        'too-large-value',
        [...path, 'endM'],
        `a crossing of at most ${LONGEST_M}`,
        `${endM - startM}`,
        { unit: 'm' },
      ),
    );
  }
  found.push(...windowProblems(crossing));
  ground.forEach((point, i) => {
    const before = ground[i - 1];
    if (before === undefined || point.chainageM > before.chainageM) return;
    found.push(
      problem(
        'reversed',
        [...path, 'ground', i, 'chainageM'],
        `more than ${before.chainageM}`,
        `${point.chainageM}`,
        {
          unit: 'm',
          remedy: 'Put the points in order of chainage',
        },
      ),
    );
  });
  const first = ground[0]!.chainageM;
  const last = ground.at(-1)!.chainageM;
  const remedy = 'Add ground levels up to both abutments';
  if (!(first <= startM)) {
    const at = [...path, 'ground', 0, 'chainageM'];
    found.push(
      problem('outside', at, `at most ${startM}, the start of the crossing`, `${first}`, {
        unit: 'm',
        remedy,
      }),
    );
  }
  if (!(last >= endM)) {
    const at = [...path, 'ground', ground.length - 1, 'chainageM'];
    found.push(
      problem('outside', at, `at least ${endM}, the end of the crossing`, `${last}`, { unit: 'm', remedy }),
    );
  }
  return found;
}

function obstacleProblems({ crossing, obstacles }: Brief): Problem[] {
  return obstacles.flatMap((obstacle, i) => {
    const path = ['brief', 'obstacles', i];
    const { fromM, toM, clearance } = obstacle;
    const found = rising([...path, 'toM'], fromM, toM);
    if (clearance !== null) {
      found.push(...rising([...path, 'clearance', 'toM'], clearance.fromM, clearance.toM));
    }
    if (obstacle.supports !== 'hard') return found;
    for (const abutmentM of [crossing.startM, crossing.endM]) {
      if (fromM < abutmentM && toM > abutmentM) {
        found.push(
          problem(
            'outside',
            [...path, 'supports'],
            `no abutment in a barred stretch`,
            `an abutment at ${abutmentM} m`,
            {
              remedy: 'Move the abutment out of the stretch or shorten the stretch',
            },
          ),
        );
      }
    }
    return found;
  });
}

function waterProblems({ waters }: Brief): Problem[] {
  return waters.flatMap((water, i) => {
    const path = ['brief', 'waters', i];
    const found = [
      ...rising([...path, 'toM'], water.fromM, water.toM),
      ...rising([...path, 'floodToM'], water.floodFromM, water.floodToM),
    ];
    const { floodLevelM, levelM } = water;
    if (floodLevelM !== 'unknown' && !(floodLevelM >= levelM)) {
      const expected = `at least the ordinary level of ${levelM}`;
      found.push(problem('too-small', [...path, 'floodLevelM'], expected, `${floodLevelM}`, { unit: 'm' }));
    }
    return found;
  });
}

function groundProblems({ crossing, groundStretches }: Brief): Problem[] {
  const path = ['brief', 'groundStretches'];
  const found: Problem[] = [];
  groundStretches.forEach((stretch, i) => {
    found.push(...rising([...path, i, 'toM'], stretch.fromM, stretch.toM));
    const sum = stretch.classes.reduce((total, { odds }) => total + odds, 0);
    if (!(Math.abs(sum - 1) <= ODDS_TOLERANCE)) {
      found.push(
        problem(
          'does-not-sum',
          [...path, i, 'classes'],
          'odds that add up to 1',
          `a sum of ${Number(sum.toPrecision(6))}`,
        ),
      );
    }
    stretch.classes.forEach(({ bearingLevelM, bearingDepthM }, c) => {
      if ((bearingLevelM === undefined) !== (bearingDepthM === undefined)) return;
      const [code, received] =
        bearingLevelM === undefined ? (['missing', 'neither'] as const) : (['outside', 'both'] as const);
      const remedy = 'Say at which level it bears, or how deep below the ground, not both';
      const expected = 'one of bearingLevelM and bearingDepthM';
      found.push(
        problem(code, [...path, i, 'classes', c, 'bearingLevelM'], expected, received, { unit: 'm', remedy }),
      );
    });
    const before = groundStretches[i - 1];
    if (before !== undefined && before.toM !== stretch.fromM) {
      const remedy = 'Let each stretch begin where the one before ends';
      found.push(
        problem('outside', [...path, i, 'fromM'], `${before.toM}`, `${stretch.fromM}`, { unit: 'm', remedy }),
      );
    }
  });
  const remedy = 'Extend the stretches of ground to both abutments';
  const first = groundStretches[0]!.fromM;
  const last = groundStretches.at(-1)!.toM;
  if (!(first <= crossing.startM)) {
    found.push(
      problem('outside', [...path, 0, 'fromM'], `at most ${crossing.startM}`, `${first}`, {
        unit: 'm',
        remedy,
      }),
    );
  }
  if (!(last >= crossing.endM)) {
    const at = [...path, groundStretches.length - 1, 'toM'];
    found.push(problem('outside', at, `at least ${crossing.endM}`, `${last}`, { unit: 'm', remedy }));
  }
  return found;
}

function deckProblems({ deck }: Brief): Problem[] {
  if (deck.some(({ kind }) => kind === 'lane')) return [];
  return [
    problem('missing', ['brief', 'deck'], "at least one strip of kind 'lane'", 'none', {
      remedy: 'Add a lane',
    }),
  ];
}

/** Every start value to be confirmed names a field of this brief. */
function assumedProblems(study: Study): Problem[] {
  return study.assumed.flatMap((path, i) => {
    if (namesField(study, path)) return [];
    const expected = "the path of a field of the brief, such as 'brief.road.startLevelM'";
    const remedy = 'Correct the path or take it out of the list';
    return [problem('refused', ['assumed', i], expected, `'${path}'`, { remedy })];
  });
}

function bookProblems({ books }: Study): Problem[] {
  const path = ['books', 'rates'];
  return books.rates.flatMap((rate, i) => {
    const found: Problem[] = [];
    if (!(rate.p10 <= rate.p50 && rate.p50 <= rate.p90)) {
      const received = `${rate.p10}, ${rate.p50}, ${rate.p90}`;
      found.push(problem('reversed', [...path, i, 'p50'], 'low, likely and high in rising order', received));
    }
    if (books.rates.findIndex(({ item }) => item === rate.item) !== i) {
      const remedy = 'Keep one of the rates for this item';
      found.push(
        problem('refused', [...path, i, 'item'], 'an item that is typed over once', `'${rate.item}' again`, {
          remedy,
        }),
      );
    }
    return found;
  });
}

function numberedOnce(path: Path, numbered: readonly { readonly number: number }[]): Problem[] {
  return numbered.flatMap(({ number }, i) => {
    if (numbered.findIndex((other) => other.number === number) === i) return [];
    const remedy = 'Give it the next free number';
    return [problem('refused', [...path, i, 'number'], 'a number given once', `${number} again`, { remedy })];
  });
}

function optionProblems({ options }: Study): Problem[] {
  const found = [
    ...numberedOnce(['options', 'register'], options.register),
    ...numberedOnce(['options', 'kept'], options.kept),
  ];
  options.kept.forEach((kept, k) => {
    kept.units.forEach((unit, u) => {
      const path = ['options', 'kept', k, 'units', u];
      unit.supportsM.forEach((x, i) => {
        const before = unit.supportsM[i - 1];
        if (before === undefined || x > before) return;
        found.push(
          problem('reversed', [...path, 'supportsM', i], `more than ${before}`, `${x}`, { unit: 'm' }),
        );
      });
      const joint = kept.units[u - 1]?.supportsM.at(-1);
      if (joint !== undefined && joint !== unit.supportsM[0]) {
        const remedy = 'Let each unit begin on the last support of the one before';
        found.push(
          problem('outside', [...path, 'supportsM', 0], `${joint}`, `${unit.supportsM[0]!}`, {
            unit: 'm',
            remedy,
          }),
        );
      }
      (unit.pylons ?? []).forEach((pylon, i) => {
        if (pylon < unit.supportsM.length) return;
        const expected = `at most ${unit.supportsM.length - 1}, the last support`;
        found.push(problem('outside', [...path, 'pylons', i], expected, `${pylon}`));
      });
    });
  });
  return found;
}

/** A decision drops no option twice, and not the one it takes forward; one that is issued knows what that came to. */
function decisionProblems({ decision }: Study): Problem[] {
  if (decision === null) return [];
  const { option: taken, dropped, issued } = decision;
  const found = dropped.flatMap(({ option }, i) => {
    const isFirst = dropped.findIndex((other) => other.option === option) === i;
    if (isFirst && option !== taken) return [];
    const expected =
      option === taken ? `another option than ${taken}, which is taken forward` : 'an option dropped once';
    const remedy = 'Take this entry out';
    return [problem('refused', ['decision', 'dropped', i, 'option'], expected, `${option}`, { remedy })];
  });
  if (issued !== null && issued.options.every(({ number }) => number !== taken)) {
    const remedy = 'Name an option of the results it was issued with, or leave `issued` empty';
    const expected = 'an option that had been worked out when it was issued';
    found.push(problem('refused', ['decision', 'option'], expected, `${taken}`, { remedy }));
  }
  return found;
}

/** What a study must also satisfy beyond the shape of its file; all problems, in the order of the file. */
export function checkStudy(study: Study): Problem[] {
  const { brief } = study;
  return [
    ...crossingProblems(brief),
    ...deckProblems(brief),
    ...obstacleProblems(brief),
    ...waterProblems(brief),
    ...groundProblems(brief),
    ...assumedProblems(study),
    ...bookProblems(study),
    ...optionProblems(study),
    ...decisionProblems(study),
  ];
}
