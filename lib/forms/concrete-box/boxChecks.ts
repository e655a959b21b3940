import { trafficOnInfluence, type TrafficLoad } from '../../actions/index.ts';
import { beamTrack, deflectionInfluence } from '../../mechanics/index.ts';
import type { Check, SupportReaction } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import { middleStation } from '../common/middleStation.ts';
import type { SkewTorques } from '../common/skewTorque.ts';
import { skewTurnings } from '../common/skewTurning.ts';
import { bearingChecks } from './boxBearings.ts';
import { boxData } from './boxData.ts';
import { boxService } from './boxService.ts';
import type { BoxModel } from './boxModel.ts';
import type { BoxTraffic } from './boxTraffic.ts';
import type { StressUse } from './boxStress.ts';
import { mostStrandsPerWeb } from './findTendons.ts';
import type { BendingUse } from './ultimateBending.ts';
import { underSlabChecks } from './underSlab.ts';
import type { SizedBox } from './sizeBox.ts';

/**
 * All limit states of a sized box, of its top slab and of its bearings; labels as they are printed.
 * @param skew torques of skew ends by span
 */
export function boxChecks(
  model: BoxModel,
  box: SizedBox,
  reactions: readonly SupportReaction[],
  skew: SkewTorques,
): Check[] {
  const { tendons, compressions, webs } = box;
  const continuous = model.task.spansM.length > 1;
  const worst = (pick: (e: number) => number): number => {
    let at = 0;
    webs.forEach((_, e) => {
      if (pick(e) > pick(at)) at = e;
    });
    return at;
  };
  const crushed = worst((e) => webs[e]!.crushing);
  const crowded = worst((e) => webs[e]!.crowding);
  const crushedKN = box.shear.demands[crushed]!.shearKN;
  const most = mostStrandsPerWeb(model);
  const service = boxService(model, box);
  const checks: Check[] = [
    check(
      'service-tension',
      model.standardId === 'lm1'
        ? 'frequent service: compressed round the tendons, faces uncracked'
        : 'tension of the concrete in service',
      service.needKN,
      service.forceKN,
      'kN of tendon force',
    ),
    bending('bending-spans', 'bending in the spans', tendons.sag),
    ...(continuous ? [bending('bending-piers', 'bending over the piers', tendons.hog)] : []),
    stress('compression-spans', 'compression of the soffit in the spans', compressions.spanSoffit),
    ...(continuous
      ? [stress('compression-piers', 'compression of the soffit at the piers', compressions.pierSoffit)]
      : []),
    stress('compression-top', 'compression of the top slab', compressions.top),
    stress('stressing', 'tension of the concrete on the day of stressing', compressions.freshTension),
    check(
      'web-struts',
      'shear and torsion: struts of the outer web',
      crushedKN,
      crushedKN / Math.max(1e-9, webs[crushed]!.crushing),
      'kN',
    ),
    check(
      'web-stirrups',
      'shear and torsion: stirrups that fit into the outer web',
      webs[crowded]!.crowding * boxData.stirrupRatioMost.value,
      boxData.stirrupRatioMost.value,
      '1',
    ),
    check('tendon-room', 'strands that a web has room for', tendons.strandsPerWeb, most, 'strands'),
    check(
      'inner-height',
      'height inside for the forms',
      boxData.leastInnerM.value,
      Math.max(0, box.sections.pier.outline.innerM),
      'm',
    ),
    trafficDeflection(model, model.concrete.ecmMPa * 1e3 * box.sections.span.inertiaM4),
    ...bearingChecks(
      {
        model,
        ownKNm: box.own.effects.momentKNm,
        depthM: reactions.map(() => model.task.depthM),
        bottomWidthM: reactions.map(() => box.sections.span.bottomWidthM),
        onTwo: reactions.map(() => true),
        skew: skewTurnings(skew, model.task.spansM, model.traffic.load.udlKNm),
      },
      reactions,
    ),
  ];
  if (box.launch) {
    const { compressionMPa } = box.launch;
    const { strengthShare } = boxData.launching;
    checks.push(
      check(
        'launching',
        'compression of the concrete while launching',
        compressionMPa,
        boxData.compression.transfer * strengthShare * model.concrete.fckMPa,
        'MPa',
      ),
    );
  }
  return [...checks, ...model.layout.slab.checks, ...underSlabChecks(model.layout)];
}

function bending(id: string, label: string, use: BendingUse): Check {
  return check(id, label, use.demandKNm, use.capacityKNm, 'kNm');
}

function stress(id: string, label: string, { stressMPa, limitMPa }: StressUse): Check {
  return check(id, label, stressMPa, limitMPa, 'MPa');
}

/** A box on its beam with its traffic. */
type OnBeam = Pick<BoxModel, 'beam' | 'task' | 'standardId'> & { readonly traffic: Pick<BoxTraffic, 'load'> };

/** Traffic deflection at the middles of the spans over the limit; the worst span. `ei` is the stiffness of a beam of 1, kNm2. */
export function trafficDeflection(model: OnBeam, ei: number): Check {
  const { spansM } = model.task;
  const limit = boxData.deflectionRatio.value;
  const checks = spansM.map((spanM, span) =>
    check('deflection', 'deflection under traffic', midspanDeflection(model, span) / ei, spanM / limit, 'm'),
  );
  return checks.reduce((worst, next) => (next.utilisation > worst.utilisation ? next : worst));
}

/** Deflection of the middle of a span on stiffness 1, m x kNm2. */
function midspanDeflection(model: OnBeam, span: number): number {
  const { beam } = model;
  const line = deflectionInfluence(beam, middleStation(beam, span));
  const track = beamTrack(beam);
  return Math.max(...deflectionLoads(model).map((load) => trafficOnInfluence(load, track, line).max));
}

/** Characteristic traffic; under AASHTO LRFD 3.6.1.3.2 (from memory) the vehicle, or a quarter of it with the lane load. */
function deflectionLoads(model: OnBeam): TrafficLoad[] {
  const { load } = model.traffic;
  if (model.standardId === 'lm1') return [load];
  return [
    { ...load, udlKNm: 0, footwayKNm: 0 },
    { ...load, vehicleFactor: load.vehicleFactor / 4, footwayKNm: 0 },
  ];
}
