import { girderFigures, steelArea, type GirderFigures, type GirderTop } from './girderSection.ts';
import { elementsPerSpan } from './elementsPerSpan.ts';
import type { GirderModel } from './girderModel.ts';
import { platesAt } from './plateRun.ts';
import type { SizedGirder } from './sizeGirder.ts';
import { totalHog, totalSag } from './stageMoments.ts';

/** Own weight (steel and slab) of the governing characteristic moment, 0 to 1. */
export function ownWeightShare(girder: SizedGirder): number {
  const { steelStage, superimposed, traffic } = girder.effects;
  let most = 0;
  let share = 0;
  for (let i = 0; i < traffic.momentMaxKNm.length; i++) {
    const own = steelStage.momentKNm[i]!;
    const lasting = superimposed.momentKNm[i]!;
    const total = own + lasting + (own + lasting < 0 ? traffic.momentMinKNm[i]! : traffic.momentMaxKNm[i]!);
    if (!(Math.abs(total) > most)) continue;
    most = Math.abs(total);
    share = own / total;
  }
  return Math.min(1, Math.max(0, share));
}

const work: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };

/** Named figures of the statics and of the two drawn sections, per girder. */
export function girderFiguresOf(model: GirderModel, girder: SizedGirder): Record<string, number> {
  const { spansM } = model.task;
  const { run, moments, effects, secondary, plateKg } = girder;
  const longest = spansM.indexOf(Math.max(...spansM));
  const middle = longest * elementsPerSpan + elementsPerSpan / 2;
  const inertia = (e: number, top?: GirderTop): number =>
    girderFigures(work, platesAt(run, e), top).inertiaM4;
  const area = model.task.deck.widthM * model.lengthM;
  const figures: Record<string, number> = {
    girders: model.layout.count,
    spacingM: model.layout.spacingM,
    girderHeightM: model.girderM,
    ...(model.heights.haunched
      ? {
          pierGirderHeightM: Math.max(...model.heights.atStationM),
          middleHeightM: run.heightM[middle]!,
        }
      : {}),
    ...(model.substringers ? { substringerKgM: model.substringers.beam.massKgPerM } : {}),
    slabMeanM: model.slab.meanM,
    slabAtGirderM: model.slab.rootM,
    modularRatio: model.modularRatio,
    curvatureFactor: model.curve,
    laneVehicles: model.traffic.vehicleFactor,
    trafficUniformKNm: model.traffic.udlKNm,
    topFlangeWidthM: run.topWidthM,
    bottomFlangeWidthM: run.bottomWidthM,
    midspanTopFlangeM: run.topM[middle]!,
    midspanBottomFlangeM: run.bottomM[middle]!,
    midspanWebM: run.webM[middle]!,
    midspanSteelAreaM2: steelArea(platesAt(run, middle)),
    midspanSteelInertiaM4: inertia(middle),
    midspanCompositeInertiaM4: inertia(middle, model.short[middle]),
    sagDesignKNm: greatest(girder, (i) => totalSag(moments, i)),
    steelKgM2: (plateKg + secondary.totalKg) / area,
    plateKgM2: plateKg / area,
    studs: secondary.studs,
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
    figures[`pier${pier}PermanentKNm`] =
      effects.steelStage.momentKNm[i]! + effects.superimposed.momentKNm[i]!;
    figures[`pier${pier}TrafficKNm`] = effects.traffic.momentMinKNm[i]!;
    figures[`pier${pier}TopFlangeM`] = Math.max(run.topM[i - 1]!, run.topM[i]!);
    figures[`pier${pier}BottomFlangeM`] = Math.max(run.bottomM[i - 1]!, run.bottomM[i]!);
    figures[`pier${pier}WebM`] = Math.max(run.webM[i - 1]!, run.webM[i]!);
    figures[`pier${pier}CrackedInertiaM4`] = inertia(i, model.cracked[i]);
  }
  return figures;
}

function greatest(girder: SizedGirder, at: (i: number) => number): number {
  let most = 0;
  for (let i = 0; i < girder.effects.traffic.momentMaxKNm.length; i++) most = Math.max(most, at(i));
  return most;
}
