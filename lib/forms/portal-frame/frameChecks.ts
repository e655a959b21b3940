import type { Check } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import type { FaceBars } from './frameBars.ts';
import type { FrameModel } from './frameModel.ts';
import { portalData } from './portalData.ts';
import type { SizedFrame } from './sizeFrame.ts';
import { shakenAcross, struckAcross } from './wallAcross.ts';

/** All limit states of a sized frame; labels as they are printed. */
export function frameChecks(model: FrameModel, sized: SizedFrame): Check[] {
  const { faces, shear, tendons, across: wheels, traffic } = sized;
  const worse = (a: FaceBars, b: FaceBars): FaceBars => (b.use > a.use ? b : a);
  const of = (...ids: FaceBars['id'][]): FaceBars =>
    ids.map((id) => faces.find((face) => face.id === id)!).reduce(worse);
  const pair = (id: string, label: string, face: FaceBars): Check[] => [
    check(
      `bending-${id}`,
      `bending ${label} with the bars that fit`,
      face.designKNm,
      face.capacityKNm,
      'kNm',
    ),
    check(`bars-${id}`, `bars ${label} that fit`, face.use * face.fitsM2, face.fitsM2, 'm2'),
  ];
  const checks = [
    ...pair('midspan', 'at midspan', of('soffit')),
    ...pair('knee', 'at the knee in the deck', of('top')),
    ...pair('wall', 'in the earth face of the walls', of('first-outer', 'last-outer')),
    ...pair('wall-inner', 'in the open face of the walls', of('first-inner', 'last-inner')),
    ...(model.task.spansM.length > 1
      ? pair('wall-middle', 'in the middle wall', of('middle-left', 'middle-right'))
      : []),
    check(
      'shear',
      'shear of the deck, with links where the concrete alone is not enough',
      shear.deck.demandKN,
      shear.deck.capacityKN,
      'kN',
    ),
    check(
      'shear-walls',
      'shear of the walls, with links where the concrete alone is not enough',
      shear.walls.demandKN,
      shear.walls.capacityKN,
      'kN',
    ),
    check('bars-across', 'bars across for the wheels that fit', wheels.lowM2PerM, wheels.fitsM2PerM, 'm2/m'),
    traffic.deflectionsM
      .map((deflectionM, span) =>
        check(
          'deflection',
          'deflection under traffic',
          deflectionM / (tendons ? 1 : portalData.cracked.share),
          model.task.spansM[span]! / model.standard.deflection.limitRatio,
          'm',
        ),
      )
      .reduce((a, b) => (b.utilisation > a.utilisation ? b : a)),
  ];
  for (const [id, label, across] of [
    [
      'wall-across',
      'the middle wall struck across the road, bending in its own plane',
      struckAcross(model, sized),
    ],
    [
      'quake-across',
      'a wall in an earthquake across the road, bending in its own plane',
      shakenAcross(model, sized),
    ],
  ] as const)
    if (across) checks.push(check(id, label, across.demandKNm, across.capacityKNm, 'kNm'));
  if (tendons)
    checks.push(
      check(
        'service-tension',
        model.standardId === 'lm1'
          ? 'concrete round the tendons stays compressed in frequent service'
          : 'tension of the concrete in service',
        tendons.needKN,
        tendons.forceKN,
        'kN of tendon force',
      ),
      check(
        'tendon-room',
        'strands that the deck has room for',
        tendons.strands,
        tendons.mostStrands,
        'strands',
      ),
      check(
        'compression',
        'compression of the deck in service and on the day of stressing',
        tendons.compression.stressMPa,
        tendons.compression.limitMPa,
        'MPa',
      ),
      check(
        'stressing',
        'tension of the deck on the day of stressing',
        tendons.freshTension.stressMPa,
        tendons.freshTension.limitMPa,
        'MPa',
      ),
    );
  return checks;
}
