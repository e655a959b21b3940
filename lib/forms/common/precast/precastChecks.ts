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
  const { strands, shears, piers } = beams;
  const most = (pick: (use: (typeof strands)[number]['use']) => Use): Use =>
    strands.map(({ use }) => pick(use)).reduce((worst, next) => (next.use > worst.use ? next : worst));
  const row = (id: string, label: string, { demand, capacity }: Use, unit: string): Check =>
    check(id, label, demand, capacity, unit);
  const greatest = (values: readonly number[]): number => Math.max(0, ...values);
  const { haul, lifting, continuity } = pretensioned;
  const piece = heaviestBeam(model);
  const checks = [
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
    check('web-struts', 'shear: struts in the web', greatest(shears.map((s) => s.crushing)), 1, '1'),
    check('web-links', 'shear: links that fit in the web', greatest(shears.map((s) => s.crowding)), 1, '1'),
    check('deflection', 'deflection under traffic', ...deflection(model), 'm'),
    check(
      'lifting',
      'beam stable while it hangs',
      lifting.leastSafety,
      liftingSafety(model, piece.lengthM),
      '1',
    ),
    check('hauled-length', 'length of a beam on the road', piece.lengthM, haul.lengthM, 'm'),
    check('hauled-mass', 'mass of a beam on the road', piece.massT, haul.massT, 't'),
    ...model.slab.checks,
  ];
  if (piers.length > 0)
    checks.push(
      check(
        'pier-bars',
        'bars of the slab over the piers',
        greatest(piers.map((p) => p.ratio)),
        continuity.mostRatio,
        '1',
      ),
      check(
        'pier-compression',
        'beam ends pressed together at the piers',
        greatest(piers.map((p) => p.pressed)),
        1,
        '1',
      ),
    );
  return checks;
}

/** The longest beam or piece: its length, m, and mass, t. */
export function heaviestBeam(model: PrecastModel): { readonly lengthM: number; readonly massT: number } {
  const lengthM = model.pieceLengthM ?? Math.max(...model.task.spansM);
  const gamma = model.standard.unitWeights.concreteKNm3;
  return { lengthM, massT: (model.ownKNm * lengthM + gamma * beamSolidsM3(model, lengthM)) / 9.81 };
}

/** Deflection of the longest span under all lanes shared by all beams, and what the standard allows, m. */
export function deflection(model: PrecastModel): [demand: number, capacity: number] {
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
