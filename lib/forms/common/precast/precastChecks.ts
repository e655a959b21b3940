import { trafficOnDeck, trafficOnInfluence } from '../../../actions/index.ts';
import { beamTrack, deflectionInfluence } from '../../../mechanics/index.ts';
import type { Check } from '../../../model/index.ts';
import { check } from '../checks.ts';
import { beamSolidsM3 } from './beamSolids.ts';
import { liftingSafety } from './liftingStability.ts';
import { pretensioned } from './pretensioned.ts';
import { elementsPerSpan, type PrecastModel } from './precastModel.ts';
import type { SizedBeams } from './sizeBeams.ts';
import type { Use } from './spanUse.ts';

/** Every limit state of the beams where it is used most, and of the slab on them. */
export function precastChecks(model: PrecastModel, beams: SizedBeams): Check[] {
  const { strands } = beams;
  const most = (pick: (use: (typeof strands)[number]['use']) => Use): Use =>
    strands.map(({ use }) => pick(use)).reduce((worst, next) => (next.use > worst.use ? next : worst));
  const row = (id: string, label: string, { demand, capacity }: Use, unit: string): Check =>
    check(id, label, demand, capacity, unit);
  return [
    row(
      'service-tension',
      'soffit in service, after losses',
      most((use) => use.tension),
      'MPa',
    ),
    row(
      'service-compression',
      'top of the beam in service',
      most((use) => use.compression),
      'MPa',
    ),
    row(
      'bending',
      'bending at midspan',
      most((use) => use.bending),
      'kNm',
    ),
    row(
      'release-top',
      'top of the beam at release',
      most((use) => use.releaseTop),
      'MPa',
    ),
    row(
      'release-bottom',
      'soffit at release',
      most((use) => use.releaseBottom),
      'MPa',
    ),
    ...beamChecks(model, beams, { piece: 'beam', pressed: 'beam ends pressed together at the piers' }),
  ];
}

/** What a beam is called that comes whole or in pieces, and what is pressed at the piers. */
interface BeamWords {
  readonly piece: string;
  readonly pressed: string;
}

/** What beams in one piece and spliced ones have alike: webs, deflection, lifting, the road, the slab, the piers. */
export function beamChecks(
  model: PrecastModel,
  { shears, piers }: Pick<SizedBeams, 'shears' | 'piers'>,
  { piece, pressed }: BeamWords,
): Check[] {
  const greatest = (values: readonly number[]): number => Math.max(0, ...values);
  const { haul, lifting, continuity } = pretensioned;
  const { lengthM, massT } = heaviestBeam(model);
  const safety = liftingSafety(model, lengthM);
  const struts = greatest(shears.map(({ crushing }) => crushing));
  const links = greatest(shears.map(({ crowding }) => crowding));
  const bars = greatest(piers.map(({ ratio }) => ratio));
  const ends = greatest(piers.map((pier) => pier.pressed));
  return [
    check('web-struts', 'shear: struts in the web', struts, 1, '1'),
    check('web-links', 'shear: links that fit in the web', links, 1, '1'),
    check('deflection', 'deflection under traffic', ...deflection(model), 'm'),
    check('lifting', `${piece} stable while it hangs`, lifting.leastSafety, safety, '1'),
    check('hauled-length', `length of a ${piece} on the road`, lengthM, haul.lengthM, 'm'),
    check('hauled-mass', `mass of a ${piece} on the road`, massT, haul.massT, 't'),
    ...model.slab.checks,
    ...(piers.length > 0
      ? [
          check('pier-bars', 'bars of the slab over the piers', bars, continuity.mostRatio, '1'),
          check('pier-compression', pressed, ends, 1, '1'),
        ]
      : []),
  ];
}

/** The longest beam or piece: its length, m, and mass, t. */
export function heaviestBeam(model: PrecastModel): { readonly lengthM: number; readonly massT: number } {
  const lengthM = model.pieceLengthM ?? Math.max(...model.task.spansM);
  const gamma = model.standard.unitWeights.concreteKNm3;
  return { lengthM, massT: (model.ownKNm * lengthM + gamma * beamSolidsM3(model, lengthM)) / 9.81 };
}

/** Deflection of the longest span under all lanes shared by all beams, and what the standard allows, m. */
function deflection(model: PrecastModel): [demand: number, capacity: number] {
  const { task, beam, layout, standard, standardId } = model;
  const spanM = Math.max(...task.spansM);
  const span = task.spansM.indexOf(spanM);
  const { combinations, limitRatio } = standard.deflection;
  const line = deflectionInfluence(beam, beam.supportAt[span]! + elementsPerSpan / 2);
  const track = beamTrack(beam);
  // Under EN every beam for what it carries; AASHTO shares the lanes out evenly (2.5.2.6.2, from memory).
  const load = standardId === 'lm1' ? model.traffic : trafficOnDeck(standardId, task.deck);
  const share = standardId === 'lm1' ? 1 : 1 / layout.count;
  const deepest = combinations.map(
    ({ vehicle, uniform }) =>
      trafficOnInfluence(
        {
          ...load,
          vehicleFactor: vehicle * share * load.vehicleFactor,
          udlKNm: uniform * share * load.udlKNm,
          footwayKNm: uniform * share * load.footwayKNm,
        },
        track,
        line,
      ).max,
  );
  return [Math.max(...deepest), spanM / limitRatio];
}
