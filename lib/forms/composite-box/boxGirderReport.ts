import { skewFigures } from '../common/skewEnds.ts';
import { skewDesignKNm, type SkewTorques } from '../common/skewTorque.ts';
import { elementsPerSpan } from '../composite-i/elementsPerSpan.ts';
import { girderFigures, type GirderFigures } from '../composite-i/girderSection.ts';
import { platesAt } from '../composite-i/plateRun.ts';
import type { SizedGirder } from '../composite-i/sizeGirder.ts';
import { totalHog, totalSag } from '../composite-i/stageMoments.ts';
import type { BoxGirderModel } from './boxGirderModel.ts';
import type { BoxSteel } from './boxSteel.ts';
import { bearingPerKNm } from './tubBearings.ts';
import { shearRatioOf, tubConstants } from './tubTorsion.ts';

const work: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };

/** Named figures of the boxes: layout, plates, statics of half a box, torsion of a whole one. */
export function boxGirderFigures(
  model: BoxGirderModel,
  girder: SizedGirder,
  steel: BoxSteel,
  skew: SkewTorques,
): Record<string, number> {
  const { tubs, shape, torsion, field, task, lengthM } = model;
  const { spansM } = task;
  const { run, moments, plateKg } = girder;
  const longest = spansM.indexOf(Math.max(...spansM));
  const middle = longest * elementsPerSpan + elementsPerSpan / 2;
  const inertia = (e: number, tops: BoxGirderModel['short']): number =>
    2 * girderFigures(work, platesAt(run, e), tops[e]).inertiaM4;
  const constants = tubConstants(
    shape,
    model.slab.meanM,
    shearRatioOf(model.modularRatio),
    run.webM[middle]!,
    run.bottomM[middle]!,
  );
  const areaM2 = task.deck.widthM * lengthM;
  const figures: Record<string, number> = {
    boxes: tubs.boxes,
    webSpacingM: tubs.spacingM,
    overhangM: tubs.overhangM,
    boxHeightM: shape.heightM,
    bottomPlateWidthM: shape.bottomM,
    webSlope: shape.slope,
    slabMeanM: model.slab.meanM,
    slabAtWebM: model.slab.rootM,
    boxInnerHeightM: shape.heightM - Math.max(...run.bottomM),
    topFlangeWidthM: run.topWidthM,
    midspanTopFlangeM: run.topM[middle]!,
    midspanBottomPlateM: run.bottomM[middle]!,
    midspanWebM: run.webM[middle]!,
    midspanCompositeInertiaM4: inertia(middle, model.short),
    ribPitchM: field.pitchM,
    ribHeightM: field.stiffener.heightM,
    framePitchM: field.frameM,
    shearLagAtPiers: model.shearLag,
    enclosedAreaM2: torsion.enclosedM2,
    torsionConstantM4: constants.closedM4,
    closedOverOpen: constants.closedM4 / constants.openM4,
    torqueDesignKNm: torsion.mostKNm,
    curveTorqueKNm: torsion.curveKNm,
    ...skewFigures(
      skewDesignKNm(skew, {
        lasting: model.standard.factors.uls.superimposed,
        traffic: model.standard.factors.uls.traffic,
      }),
      1 / bearingPerKNm(model),
    ),
    halfVehicles: model.traffic.vehicleFactor,
    halfUniformKNm: model.traffic.udlKNm,
    steelKgM2: (plateKg + steel.totalKg) / areaM2,
    plateKgM2: (plateKg + steel.leanKg) / areaM2,
    studs: steel.studs,
  };
  for (let span = 0; span < spansM.length; span++) {
    let most = 0;
    for (let i = span * elementsPerSpan; i <= (span + 1) * elementsPerSpan; i++)
      most = Math.max(most, totalSag(moments, i));
    figures[`span${span + 1}SagDesignKNm`] = most;
  }
  for (let pier = 1; pier < spansM.length; pier++) {
    const i = pier * elementsPerSpan;
    figures[`pier${pier}HogDesignKNm`] = totalHog(moments, i);
    figures[`pier${pier}ShearDesignKN`] = Math.max(girder.shearKN[i - 1]!, girder.shearKN[i]!);
    figures[`pier${pier}TopFlangeM`] = Math.max(run.topM[i - 1]!, run.topM[i]!);
    const plateM = Math.max(run.bottomM[i - 1]!, run.bottomM[i]!);
    figures[`pier${pier}BottomPlateM`] = plateM;
    figures[`pier${pier}WebM`] = Math.max(run.webM[i - 1]!, run.webM[i]!);
    figures[`pier${pier}PressedShare`] = model.plate!.pressedShare(plateM);
  }
  return figures;
}
