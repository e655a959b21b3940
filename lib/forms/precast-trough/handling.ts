import { openTorsion } from '../../mechanics/index.ts';
import type { Check } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import { heaviestBeam } from '../common/precast/precastChecks.ts';
import type { PrecastModel } from '../common/precast/precastModel.ts';
import { troughData } from './troughData.ts';
import { webAxisM } from './troughShape.ts';

/** Torsion constant of a trough before its slab, m4: bottom slab, webs and flanges as thin plates. */
export function openTroughM4({ shape, standardId }: PrecastModel): number {
  const { bottomWidthM, webM, flangeWidthM, flangeM } = troughData.trough;
  return openTorsion([
    { lengthM: bottomWidthM, thicknessM: shape.bottomFlangeM },
    ...[0, 1].map(() => ({
      lengthM: shape.depthM - shape.bottomFlangeM - flangeM,
      thicknessM: webM[standardId],
    })),
    ...[0, 1].map(() => ({ lengthM: flangeWidthM, thicknessM: flangeM })),
  ]);
}

/**
 * Before the slab closes it a trough is weak in torsion and its webs stand free: twist on the road, where one end is held
 * against rolling and the road falls otherwise under the other, and bending of the webs at their foot under the wet slab.
 */
export function handlingChecks(model: PrecastModel): Check[] {
  const { shape, standardId, releaseConcrete, beamConcrete } = model;
  const { crossFall, impact } = troughData.handling;
  const lengthM = heaviestBeam(model).lengthM;
  // The weight stands above its seat by the centroid; the held end takes half of what rolls.
  const torqueKNm = (impact * crossFall * model.ownKNm * lengthM * shape.centroidM) / 2;
  const twistMPa = (torqueKNm * shape.bottomFlangeM) / openTroughM4(model) / 1e3;
  return [
    check('hauling-twist', 'twist of a trough on the road', twistMPa, 0.7 * releaseConcrete.fctmMPa, 'MPa'),
    check(
      'wet-webs',
      'webs of a trough under the wet slab',
      (wetWebKNm(model) * 6) / troughData.trough.webM[standardId] ** 2 / 1e3,
      beamConcrete.fctmMPa,
      'MPa',
    ),
  ];
}

/**
 * Design moment at the foot of a web under wet slab, men and forms, kNm per m: the leaning web is pushed out, and what lies
 * outside comes down on the outer tip of the flange, what lies inside on the inner tip.
 */
function wetWebKNm(model: PrecastModel): number {
  const { standard, slab, layout, shape, standardId } = model;
  const { webSlope, flangeWidthM } = troughData.trough;
  const axisM = webAxisM(shape.depthM, standardId);
  const pressure =
    standard.factors.uls.permanent * standard.unitWeights.concreteKNm3 * slab.midM +
    1.5 * troughData.handling.formworkKNm2;
  const outside = pressure * Math.max(0, layout.spacingM / 2 - axisM - flangeWidthM / 2);
  const inside = pressure * Math.max(0, axisM - flangeWidthM / 2);
  const above = pressure * flangeWidthM;
  const pushed = webSlope * (outside + inside + above) * (shape.depthM - shape.bottomFlangeM);
  return Math.max(
    Math.abs(pushed + ((outside - inside) * flangeWidthM) / 2),
    Math.abs(pushed + (outside * flangeWidthM) / 2),
  );
}
