import type { At, Descriptor, RiverCrossed } from '../model/index.ts';
import { asIs, fact, factOf } from './factFigure.ts';
import { governingRivers } from './riverFacts.ts';

const rivers = (at: At): readonly RiverCrossed[] => at.option.rivers ?? [];

/** A field of the river by which one of the rules judges; nothing where no river is crossed. */
const ofRiver =
  (which: keyof ReturnType<typeof governingRivers>, field: keyof RiverCrossed) =>
  (at: At): Readonly<Record<string, string>> => {
    const river = governingRivers(rivers(at))[which];
    return river === undefined
      ? { crossed: `${at.root}/facts/riversCrossed` }
      : { figure: `${at.root}/rivers/${rivers(at).indexOf(river)}/${field}` };
  };

/** A fact of the governing river; without a river it is not known. */
const ofGoverning = (
  id: string,
  which: keyof ReturnType<typeof governingRivers>,
  field: keyof RiverCrossed = id as keyof RiverCrossed,
): readonly Descriptor[] => [
  { ...asIs(id, ofRiver(which, field)), when: (at) => rivers(at).length > 0 },
  fact(id, 'no river is crossed', ofRiver(which, field)),
];

/** What the rules are told of the rivers. */
export const riverFactFigures: readonly Descriptor[] = [
  fact('riversCrossed', factOf('riversCrossed').meaning, (at) => ({
    starts: at.site.waters.map((_, i) => `site/waters/${i}/fromM`),
    crossing: [at.ends.start, at.ends.end],
  })),
  ...ofGoverning('floodFlowM3s', 'afflux', 'flowM3s'),
  ...ofGoverning('affluxM', 'afflux'),
  ...ofGoverning('allowedAffluxM', 'afflux'),
  ...ofGoverning('freeboardM', 'freeboard'),
  ...ofGoverning('freeboardNeededM', 'freeboard'),
  ...ofGoverning('waterwayM', 'waterway'),
  ...ofGoverning('regimeWidthM', 'waterway'),
  fact('flowSpread', 'greatest of the rivers; once only one way is known, 1', (at) => ({
    spreads: rivers(at).map((_, r) => `${at.root}/rivers/${r}/flowSpread`),
  })),
  fact('floodLevelsKnown', factOf('floodLevelsKnown').meaning, (at) => ({
    levels: rivers(at).map(({ water }) => `site/waters/${water}/floodLevelM`),
  })),
  fact('scourBasis', factOf('scourBasis').meaning, (at) => ({
    given: rivers(at).flatMap(({ water }) =>
      ['flowM3s', 'velocityMs', 'siltFactor', 'grainMm'].map(
        (field) => `site/waters/${water}/river/${field}`,
      ),
    ),
  })),
];
