import { trafficOnDeck, trafficOnInfluence, type TrafficLoad } from '../../actions/index.ts';
import {
  beamTrack,
  deflectionInfluence,
  lineBeam,
  plasticMoment,
  type PlasticPart,
} from '../../mechanics/index.ts';
import type { Check } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import { middleStation } from '../common/middleStation.ts';
import { steppedStiffness } from '../common/steppedStiffness.ts';
import { elementsPerSpan } from '../composite-i/elementsPerSpan.ts';
import { girderFigures, type GirderFigures } from '../composite-i/girderSection.ts';
import { fatigueLimitMPa } from '../floor/fatigue.ts';
import { halfThroughData } from './halfThroughData.ts';
import type { HalfThroughUnit } from './halfThroughUnit.ts';
import { edgePlates, edgeStiffness, edgeWebKN, spacingAt } from './sizeEdgeGirder.ts';

/** All limit states of the edge girders, their frames and the floor. */
export function halfThroughChecks(unit: HalfThroughUnit): Check[] {
  const { case: c, use, girder, floor } = unit;
  const fy = c.yieldMPa(0.04);
  const range = fatigueLimitMPa(c.task.standard, 'stiffener');
  const { web } = halfThroughData;
  const slender = Math.max(
    ...girder.webM.map((t, e) => (girder.choice.heightM - girder.topM[e]! - girder.bottomM[e]!) / t),
  );
  const checks = [
    check('bending-spans', 'bending in the spans', use.sag * fy, fy, 'MPa'),
    check('top-flange', 'top flange as a bar between U-frames', use.topFlange * fy, fy, 'MPa'),
    check('u-frame', 'posts of the U-frames', use.postKNm, use.postMayKNm, 'kNm'),
    check('fatigue', 'fatigue of the flanges', use.fatigue * range, range, 'MPa'),
    check('shear', 'shear of the webs', use.shear.demandKN, use.shear.capacityKN, 'kN'),
    check('impact', 'vehicle against a girder', use.impactKNm, use.impactMayKNm, 'kNm'),
    deflection(unit),
  ];
  if (c.task.spansM.length > 1)
    checks.push(
      check('bending-piers', 'bending at the piers', use.hog * fy, fy, 'MPa'),
      check('bending-shear', 'bending with shear at the piers', bendingShear(unit), 1, '1'),
    );
  // Webs are sized to this limit: it is news only where the thickest web does not reach it.
  if (slender > web.mostHeightOverThickness * 1.0001)
    checks.push(
      check('web-slenderness', 'web height over thickness', slender, web.mostHeightOverThickness, '1'),
    );
  if (c.task.method === 'launch') checks.push(launching(unit));
  return [...checks, ...floor.checks];
}

/** Bending with shear beside inner supports (EN 1993-1-5 7.1), the worst. */
function bendingShear({ case: c, girder }: HalfThroughUnit): number {
  const gamma = c.standard.resistance.steel;
  let worst = 0;
  for (let j = 1; j < c.task.spansM.length; j++) {
    const station = j * elementsPerSpan;
    for (const e of [station - 1, station]) {
      const p = edgePlates(girder, e);
      const plate = (widthM: number, heightM: number, bottomM: number, thicknessM: number): PlasticPart => ({
        kind: 'rect',
        widthM,
        heightM,
        bottomM,
        fyMPa: c.yieldMPa(thicknessM) / gamma,
      });
      const flanges = [
        plate(p.topWidthM, p.topM, p.heightM - p.topM, p.topM),
        plate(p.bottomWidthM, p.bottomM, 0, p.bottomM),
      ];
      const webHeight = p.heightM - p.topM - p.bottomM;
      const whole = plasticMoment(
        [...flanges, plate(p.webM, webHeight, p.bottomM, p.webM)],
        'hogging',
      ).momentKNm;
      const alone = plasticMoment(flanges, 'hogging').momentKNm;
      const share =
        girder.demand.shearKN[e]! / edgeWebKN(c, p.webM, webHeight, spacingAt(c, girder.choice, e));
      const more = share > 0.5 ? Math.max(0, 1 - alone / whole) * (2 * share - 1) ** 2 : 0;
      worst = Math.max(worst, -girder.demand.hogKNm[station]! / whole + more);
    }
  }
  return worst;
}

/** Traffic deflection at the middles of the spans over the limit of the standard; the worst span. */
function deflection({ case: c, girder }: HalfThroughUnit): Check {
  const { spansM } = c.task;
  const beam = lineBeam({
    spansM,
    stationsPerSpan: elementsPerSpan,
    eiKNm2: steppedStiffness(c.elementM, edgeStiffness(girder)),
  });
  const track = beamTrack(beam);
  const loads = deflectionLoads(c);
  const { limitRatio } = c.standard.deflection;
  let worst = check('deflection', 'deflection under traffic', 0, spansM[0]! / limitRatio, 'm');
  spansM.forEach((spanM, span) => {
    const line = deflectionInfluence(beam, middleStation(beam, span));
    const most = Math.max(...loads.map((load) => trafficOnInfluence(load, track, line).max));
    const next = check(worst.id, worst.label, most, spanM / limitRatio, 'm');
    if (next.utilisation > worst.utilisation) worst = next;
  });
  return worst;
}

/** The worse girder under the characteristic load; under AASHTO LRFD 3.6.1.3.2 (from memory) half of all lanes, by its combinations. */
function deflectionLoads(c: HalfThroughUnit['case']): TrafficLoad[] {
  if (c.task.standard === 'lm1') return [c.traffic];
  const deck = trafficOnDeck(c.task.standard, c.task.deck);
  return c.standard.deflection.combinations.map(({ vehicle, uniform }) => ({
    ...deck,
    vehicleFactor: (vehicle * deck.vehicleFactor) / 2,
    udlKNm: (uniform * deck.udlKNm) / 2,
    footwayKNm: 0,
  }));
}

const work: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };

/** Steel of girders and floor hangs over the longest span just before its nose lands; every section passes the last support. */
function launching({ case: c, girder, steelKg }: HalfThroughUnit): Check {
  const { noseOverSpan: nose, noseOverDeckWeight: light } = halfThroughData.launching;
  const spanM = Math.max(...c.task.spansM);
  const weightKNm = ((steelKg / c.lengthM) * 9.81e-3) / 2;
  const own = (1 - nose) ** 2 / 2 + nose * light * (1 - nose / 2);
  const moment = c.standard.factors.uls.permanent * own * weightKNm * spanM ** 2;
  const fy = c.yieldMPa(0.04);
  let worst = 0;
  for (let e = 0; e < c.elementM.length; e++) {
    const plates = edgePlates(girder, e);
    const { centroidM, inertiaM4 } = girderFigures(work, plates);
    const arm = Math.max(centroidM, plates.heightM - centroidM);
    worst = Math.max(worst, (moment * arm) / inertiaM4 / 1000);
  }
  return check('launching', 'bare steel over the longest span during the launch', worst, fy, 'MPa');
}
