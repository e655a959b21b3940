import { loadStandard, trafficOnDeck, trafficOnInfluence, type TrafficLoad } from '../../actions/index.ts';
import { beamTrack, deflectionInfluence, plasticMoment, type PlasticPart } from '../../mechanics/index.ts';
import type { Check } from '../../model/index.ts';
import { barDesignMPa } from '../common/bars.ts';
import { check } from '../common/checks.ts';
import { compositeData } from './compositeData.ts';
import { elementChecks, noUse } from './elementChecks.ts';
import { fatigueLimitMPa } from './fatigueRange.ts';
import { elementsPerSpan } from './elementsPerSpan.ts';
import type { GirderModel } from './girderModel.ts';
import { girderFigures, steelArea, type GirderFigures } from './girderSection.ts';
import { platesAt } from './plateRun.ts';
import { midStations, type SizedGirder } from './sizeGirder.ts';
import { webCapacityKN } from './sizePlates.ts';
import { totalHog } from './stageMoments.ts';
import { mostWebSlenderness } from './webStiffener.ts';

/** All limit states of a sized girder and of its slab; labels as they are printed. */
export function girderChecks(model: GirderModel, girder: SizedGirder): Check[] {
  const checks = [...flangeChecks(model, girder), ...webChecks(model, girder), deflection(model, girder)];
  if (model.task.method === 'launch') checks.push(launching(model, girder));
  const least = compositeData.leastGirderM.value;
  const roomM = model.task.depthM - model.slab.rootM;
  if (roomM < least)
    checks.push(check('girder-depth', 'height left for the girder under the slab', least, roomM, 'm'));
  if (model.substringers) {
    const { beam } = model.substringers;
    checks.push(check('substringers', `substringers, ${beam.governs}`, beam.utilisation, 1, '1'));
  }
  return [...checks, ...model.slab.checks];
}

interface Worst {
  value: number;
  element: number;
}

/** Flange stresses: the worst element of each kind, as a share of yield or of the fatigue range. */
function flangeChecks(model: GirderModel, girder: SizedGirder): Check[] {
  const fatigueMPa = fatigueLimitMPa(model.standardId);
  const use = noUse();
  const kinds = {
    cast: { value: 0, element: 0 },
    sag: { value: 0, element: 0 },
    hog: { value: 0, element: 0 },
    service: { value: 0, element: 0 },
    fatigue: { value: 0, element: 0 },
  };
  const keep = (worst: Worst, value: number, element: number): void => {
    if (!(value > worst.value)) return;
    worst.value = value;
    worst.element = element;
  };
  for (let e = 0; e < model.elementM.length; e++) {
    elementChecks(use, model, platesAt(girder.run, e), e, girder.moments, girder.equivalentKNm, fatigueMPa);
    keep(kinds.cast, use.castTop, e);
    keep(kinds.sag, Math.max(use.sagTop, use.sagBottom), e);
    keep(kinds.hog, Math.max(use.hogTop, use.hogBottom), e);
    keep(kinds.service, use.service, e);
    keep(kinds.fatigue, Math.max(use.fatigueTop, use.fatigueBottom), e);
  }
  const ofYield = (id: string, label: string, worst: Worst): Check => {
    const fy = model.yieldMPa(girder.run.bottomM[worst.element]!);
    return check(id, label, worst.value * fy, fy, 'MPa');
  };
  const checks = [
    ofYield('casting', 'top flange while the slab is cast', kinds.cast),
    ofYield('bending-spans', 'bending in the spans', kinds.sag),
    ofYield('service-stress', 'bottom flange stress in service, with shrinkage', kinds.service),
    check('fatigue', 'fatigue of the flanges', kinds.fatigue.value * fatigueMPa, fatigueMPa, 'MPa'),
  ];
  if (model.task.spansM.length > 1)
    checks.splice(2, 0, ofYield('bending-piers', 'bending at the piers', kinds.hog));
  return checks;
}

/** Shear of the web, and bending with shear at inner supports (EN 1993-1-5 7.1). */
function webChecks(model: GirderModel, girder: SizedGirder): Check[] {
  const { run, shearKN } = girder;
  let worst = 0;
  let demand = 0;
  let capacity = 1;
  for (let e = 0; e < shearKN.length; e++) {
    const resistance = capacityAt(model, girder, e);
    if (shearKN[e]! / resistance <= worst) continue;
    worst = shearKN[e]! / resistance;
    demand = shearKN[e]!;
    capacity = resistance;
  }
  const checks = [check('shear', 'shear of the webs', demand, capacity, 'kN')];
  let slender = 0;
  let most = 1;
  run.webM.forEach((t, e) => {
    const heightM = run.heightM[e]! - run.topM[e]! - run.bottomM[e]!;
    const allowed = mostWebSlenderness(model, heightM);
    if (heightM / t / allowed > slender / most) [slender, most] = [heightM / t, allowed];
  });
  // Webs are sized to this limit: it is news only where the thickest web does not reach it.
  if (slender > most * 1.0001)
    checks.push(check('web-slenderness', 'web height over thickness', slender, most, '1'));
  let together = 0;
  for (let j = 1; j < model.task.spansM.length; j++) {
    const station = j * elementsPerSpan;
    for (const e of [station - 1, station]) {
      const share = shearKN[e]! / capacityAt(model, girder, e);
      const { whole, flanges } = plasticAtPier(model, run, e, model.heights.atStationM[station]!);
      const bending = -totalHog(girder.moments, station) / whole;
      together = Math.max(
        together,
        bending + (share > 0.5 ? Math.max(0, 1 - flanges / whole) * (2 * share - 1) ** 2 : 0),
      );
    }
  }
  if (model.task.spansM.length > 1)
    checks.push(check('bending-shear', 'bending with shear at the piers', together, 1, '1'));
  return checks;
}

function capacityAt(model: GirderModel, girder: SizedGirder, e: number): number {
  const { run } = girder;
  return webCapacityKN(model, e, run.webM[e]!, run.heightM[e]! - run.topM[e]! - run.bottomM[e]!);
}

/** Plastic moments of steel and bars in hogging: the whole section, and without the web. */
function plasticAtPier(
  model: GirderModel,
  run: SizedGirder['run'],
  e: number,
  heightM: number,
): { whole: number; flanges: number } {
  const { topM, bottomM, webM, topWidthM, bottomWidthM } = platesAt(run, e);
  const top = model.cracked[e]!;
  const barM = 0.02;
  const bars: PlasticPart = {
    kind: 'rect',
    widthM: top.barAreaM2 / barM,
    heightM: barM,
    bottomM: heightM + top.barAboveM - barM / 2,
    fyMPa: barDesignMPa(model.standardId),
  };
  const gamma = model.standard.resistance.steel;
  const plate = (widthM: number, height: number, bottom: number, thicknessM: number): PlasticPart => ({
    kind: 'rect',
    widthM,
    heightM: height,
    bottomM: bottom,
    fyMPa: model.yieldMPa(thicknessM) / gamma,
  });
  const flanges = [
    bars,
    plate(topWidthM, topM, heightM - topM, topM),
    plate(bottomWidthM, bottomM, 0, bottomM),
  ];
  const web = plate(webM, heightM - topM - bottomM, bottomM, webM);
  return {
    whole: plasticMoment([...flanges, web], 'hogging').momentKNm,
    flanges: plasticMoment(flanges, 'hogging').momentKNm,
  };
}

/** Traffic deflection at the middles of the spans over the limit of the standard; the worst span. */
function deflection(model: GirderModel, girder: SizedGirder): Check {
  const { deflection: rule } = loadStandard(model.standardId);
  const beam = girder.effects.shortBeam;
  const track = beamTrack(beam);
  let worst = check(
    'deflection',
    'deflection under traffic',
    0,
    model.task.spansM[0]! / rule.limitRatio,
    'm',
  );
  midStations(model).forEach((station, span) => {
    const line = deflectionInfluence(beam, station);
    const most = Math.max(...deflectionLoads(model).map((load) => trafficOnInfluence(load, track, line).max));
    const next = check(worst.id, worst.label, most, model.task.spansM[span]! / rule.limitRatio, 'm');
    if (next.utilisation > worst.utilisation) worst = next;
  });
  return worst;
}

/**
 * Traffic on one girder for deflection: the characteristic load on the worst girder; under AASHTO LRFD 2.5.2.6.2 and
 * 3.6.1.3.2 (from memory) all lanes shared equally, the vehicle alone or a quarter of it with the lane load.
 */
function deflectionLoads(model: GirderModel): TrafficLoad[] {
  if (model.standardId === 'lm1') return [model.traffic];
  const deck = trafficOnDeck(model.standardId, model.task.deck);
  const n = model.layout.count;
  return [
    { ...deck, vehicleFactor: deck.vehicleFactor / n, udlKNm: 0, footwayKNm: 0 },
    { ...deck, vehicleFactor: (0.25 * deck.vehicleFactor) / n, udlKNm: deck.udlKNm / n, footwayKNm: 0 },
  ];
}

const figures: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };

/**
 * Launching of the bare steel: a nose leads, the girder hangs over the longest span just before it lands, and every
 * section passes the last support. Stress of the weakest section against yield, factor of permanent loads.
 */
function launching(model: GirderModel, girder: SizedGirder): Check {
  const { noseOverSpan: nose, noseOverDeckWeight: light } = compositeData.launching;
  const spanM = Math.max(...model.task.spansM);
  const weightKNm = (girder.effects.steelKg / model.lengthM) * 9.81e-3;
  const own = (1 - nose) ** 2 / 2 + nose * light * (1 - nose / 2);
  const moment = model.standard.factors.uls.permanent * own * weightKNm * spanM ** 2;
  let worst = 0;
  let fy = model.yieldMPa(0.02);
  for (let e = 0; e < model.elementM.length; e++) {
    const plates = platesAt(girder.run, e);
    const { centroidM, inertiaM4 } = girderFigures(figures, plates);
    const lever = Math.max(centroidM - plates.bottomM / 2, plates.heightM - plates.topM / 2 - centroidM);
    const yieldMPa = Math.min(model.yieldMPa(plates.bottomM), model.yieldMPa(plates.topM));
    const stress = (moment * lever) / inertiaM4 / 1e3;
    if (stress / yieldMPa <= worst / fy) continue;
    worst = stress;
    fy = yieldMPa;
  }
  return check('launching', 'bare girder over the longest span during the launch', worst, fy, 'MPa');
}

/** Heaviest piece of one girder, t, when it is cut into pieces of the usual length. */
export function heaviestPiece(model: GirderModel, girder: SizedGirder): { lengthM: number; massT: number } {
  const pieces = Math.max(1, Math.ceil(model.lengthM / compositeData.pieceLengthM.value - 1e-9));
  const lengthM = model.lengthM / pieces;
  const { elementM } = model;
  const kg = elementM.map((_, e) => 7.85 * steelArea(platesAt(girder.run, e)));
  let most = 0;
  let start = 0;
  for (let p = 0; p < pieces; p++) {
    const from = p * lengthM;
    let mass = 0;
    start = 0;
    for (let e = 0; e < elementM.length; e++) {
      const overlap = Math.min(start + elementM[e]!, from + lengthM) - Math.max(start, from);
      if (overlap > 0) mass += kg[e]! * overlap;
      start += elementM[e]!;
    }
    most = Math.max(most, mass);
  }
  return { lengthM, massT: most };
}
