import type { Check } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import { bendingCapacity, compressionDepth } from '../concrete-box/bendingCapacity.ts';
import type { FaceBars } from './frameBars.ts';
import type { FrameModel } from './frameModel.ts';
import { portalData } from './portalData.ts';
import type { SizedFrame } from './sizeFrame.ts';

/** Centroid of the half of evenly spread bars that is in tension, from the pressed edge of a wall: share of its width. */
const PULLED_BARS_AT = 0.75;

/**
 * A wall struck across the road by a vessel as a cantilever off its footing, without what the deck would hold of it: bending
 * in its plane against its weight and that of the deck with half of its upright bars. Null where nothing strikes it so.
 */
function struckAcross(
  model: FrameModel,
  { faces }: SizedFrame,
): { readonly demandKNm: number; readonly capacityKNm: number } | null {
  const { shape, task, cases } = model;
  const demands = shape.walls.flatMap(({ struck, heightM }, w) =>
    struck.map((node, k) => task.strikes![w]![k]!.acrossKN * (heightM + shape.nodes[node]![1])),
  );
  const demandKNm = Math.max(0, ...demands);
  if (!(demandKNm > 0)) return null;
  const middle = shape.walls.findIndex(({ name }) => name === 'middle');
  const { footM } = shape.walls[middle]!;
  const { widthM } = task.deck;
  const barM2 = faces
    .filter(({ id }) => id === 'middle-left' || id === 'middle-right')
    .reduce((sum, { placedM2 }) => sum + placedM2[0]!, 0);
  const plane = { widthM: footM, flangeM: widthM, websM: footM };
  const steel = { barM2: barM2 / 2, barDepthM: PULLED_BARS_AT * widthM, strandM2: 0, strandDepthM: 0 };
  const { own, superimposed } = cases[0]!;
  const weightKN = own.feet[middle]!.verticalKN + superimposed.feet[middle]!.verticalKN;
  return {
    demandKNm,
    capacityKNm:
      bendingCapacity(model, steel, plane) +
      weightKN * (widthM / 2 - compressionDepth(model, plane, weightKN)),
  };
}

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
  const across = struckAcross(model, sized);
  if (across)
    checks.push(
      check(
        'wall-across',
        'the middle wall struck across the road, bending in its own plane',
        across.demandKNm,
        across.capacityKNm,
        'kNm',
      ),
    );
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
