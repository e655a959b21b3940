import type { Check } from '../../model/index.ts';
import { elementAt, lineBeam } from '../../mechanics/index.ts';
import { check } from '../common/checks.ts';
import { trafficDeflection } from '../concrete-box/boxChecks.ts';
import { stiffnessAt } from '../concrete-box/boxConcrete.ts';
import { boxData } from '../concrete-box/boxData.ts';
import type { StressUse } from '../concrete-box/boxStress.ts';
import type { BendingUse } from '../concrete-box/ultimateBending.ts';
import { underSlabChecks } from '../concrete-box/underSlab.ts';
import { tipsM } from './arms.ts';
import type { CantileverModel } from './cantileverModel.ts';
import { haunchedBearingChecks } from './haunchedBearings.ts';
import type { Hold } from './heldDown.ts';
import { mostBottomStrands, mostTopStrands } from './findStrands.ts';
import { cellsAlong, type HaunchedSections } from './sectionsAlong.ts';
import type { SizedHaunched } from './sizeHaunched.ts';
import { stationsPerSpan } from './stiffDeck.ts';

/** All limit states of a haunched box and of its top slab; labels as they are printed. */
export function haunchedChecks(model: CantileverModel, box: SizedHaunched): Check[] {
  const { found, bending, stresses, sections, shear, webs } = box;
  const most = (values: Float64Array): number => values.reduce((a, b) => Math.max(a, b), 0);
  const worst = (pick: (e: number) => number): number =>
    webs.reduce((at, _, e) => (pick(e) > pick(at) ? e : at), 0);
  const crushed = worst((e) => webs[e]!.crushing);
  const crowded = worst((e) => webs[e]!.crowding);
  const crushedKN = shear.demands[crushed]!.shearKN;
  const piers = model.depthsM.size;
  // Less than a strand a web is no tendon.
  const needed = (need: Float64Array, there: Float64Array): [number, number] => {
    let at = 0;
    const use = (i: number): number =>
      need[i]! < model.layout.webs ? 0 : need[i]! / Math.max(1e-9, there[i]!);
    for (let i = 1; i < need.length; i++) if (use(i) > use(at)) at = i;
    return [need[at]!, there[at]!];
  };
  return [
    ...(piers > 0
      ? [
          moment('stage-bending', 'bending of the free arms with their travellers', bending.stage),
          moment('bending-piers', 'bending over the piers', bending.hog),
          check(
            'service-top',
            'top slab: compressed while cantilevering and in service',
            ...needed(found.needTop, found.top),
            'strands',
          ),
          stress('compression-piers', 'compression of the soffit at the piers', stresses.pierSoffit),
        ]
      : [check('balance', 'pier to cantilever from', 1, 0, 'piers')]),
    ...holdDown(box.weight.holds),
    moment('bending-spans', 'bending in the spans', bending.sag),
    check(
      'service-bottom',
      'bottom slab: compressed in service after creep',
      ...needed(found.needBottom, found.bottom),
      'strands',
    ),
    stress('compression-spans', 'compression of the soffit in the spans', stresses.spanSoffit),
    stress('compression-top', 'compression of the top slab', stresses.top),
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
    check(
      'top-room',
      'strands that the top slab has room for',
      most(found.top),
      mostTopStrands(model),
      'strands',
    ),
    check(
      'bottom-room',
      'strands that the bottom slab has room for',
      most(found.bottom),
      mostBottomStrands(sections),
      'strands',
    ),
    ...ballastRoom(model, sections),
    check('inner-height', 'height inside for the forms', boxData.leastInnerM.value, sections.innerM, 'm'),
    deflection(model, sections),
    ...haunchedBearingChecks(model, box),
    ...model.layout.slab.checks,
    ...underSlabChecks(model.layout),
  ];
}

/** The support that comes nearest to lifting while a longer arm is built; none where all arms are balanced. */
export function worstHold(holds: readonly Hold[]): Hold | null {
  const use = ({ upliftKN, weightKN }: Hold): number => upliftKN / Math.max(1e-9, weightKN);
  return holds.reduce<Hold | null>((a, b) => (a === null || use(b) > use(a) ? b : a), null);
}

function holdDown(holds: readonly Hold[]): Check[] {
  const worst = worstHold(holds);
  if (!worst) return [];
  const { upliftKN, weightKN } = worst;
  return [check('hold-down', 'weight that holds the longer arm of a pier down', upliftKN, weightKN, 'kN')];
}

/**
 * Deflection on the beam whose stiffness follows a law of the depth; where spans that hold an arm down have thicknesses of
 * their own that law does not know, on the beam of the sections found.
 */
function deflection(model: CantileverModel, sections: HaunchedSections): Check {
  const { beam, task } = model;
  const eiKNm2 = model.concrete.ecmMPa * 1e3 * sections.midspan.inertiaM4;
  if (model.anchors.length === 0) return trafficDeflection(model, eiKNm2);
  const found = lineBeam({
    spansM: task.spansM,
    stationsPerSpan,
    extraStationsM: tipsM(model.arms, task.spansM, stationsPerSpan),
    eiKNm2: (xM) => {
      const e = elementAt(beam.xM, xM);
      const share = (xM - beam.xM[e]!) / (beam.xM[e + 1]! - beam.xM[e]!);
      const inertiaM4 = (1 - share) * sections.inertiaM4[e]! + share * sections.inertiaM4[e + 1]!;
      return stiffnessAt(model, xM) * (inertiaM4 / sections.midspan.inertiaM4);
    },
  });
  return trafficDeflection({ ...model, beam: found }, eiKNm2);
}

/** Gravel of the span that is filled most against its cells, m3; none without ballast. */
function ballastRoom(model: CantileverModel, sections: HaunchedSections): Check[] {
  const { beam, task } = model;
  const { ballastKNm } = task;
  if (!ballastKNm?.some((kNm) => kNm > 0)) return [];
  const cellsM2 = cellsAlong(model, sections);
  const checks = task.spansM.map((spanM, span) => {
    let roomM3 = 0;
    for (let e = beam.supportAt[span]!; e < beam.supportAt[span + 1]!; e++)
      roomM3 += ((cellsM2[e]! + cellsM2[e + 1]!) / 2) * (beam.xM[e + 1]! - beam.xM[e]!);
    const fillM3 = (ballastKNm[span]! * spanM) / boxData.ballast.weightKNm3;
    return check('ballast-room', 'ballast that the cells of a span have room for', fillM3, roomM3, 'm3');
  });
  return [checks.reduce((worst, next) => (next.utilisation > worst.utilisation ? next : worst))];
}

function moment(id: string, label: string, use: BendingUse): Check {
  return check(id, label, use.demandKNm, use.capacityKNm, 'kNm');
}

function stress(id: string, label: string, { stressMPa, limitMPa }: StressUse): Check {
  return check(id, label, stressMPa, limitMPa, 'MPa');
}
