import { trafficOnCrossLine } from '../../actions/index.ts';
import { polygonProperties } from '../../mechanics/index.ts';
import { faceBarsM2 } from './bendingCapacity.ts';
import { boxData } from './boxData.ts';
import type { OwnWeight } from './boxLoads.ts';
import type { BoxLayout } from './boxLayout.ts';
import type { BoxModel } from './boxModel.ts';
import type { BoxTraffic } from './boxTraffic.ts';
import type { Tendons } from './findTendons.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import { ultimateMoments } from './ultimateMoments.ts';
import type { WebDemand } from './webShear.ts';

/** Design shear of the outer web by element of the beam, the worse of its two ends. */
export interface BoxShear {
  readonly demands: readonly WebDemand[];
  /** Share of the traffic shear that one outer web carries with its part of the torsion. */
  readonly webShare: number;
  /** Area enclosed by the middle lines of the outer walls, m2. */
  readonly enclosedM2: number;
  /** Greatest design shear of the deck, kN. */
  readonly mostKN: number;
}

/**
 * Shear of the outer web: an even share of the vertical shear and the flow T / 2A of the closed box (Bredt). A load at y
 * from the middle gives a web 1 / n + y h / 2A of itself, so that lanes are placed across the deck for the web.
 */
export function boxShear(
  model: BoxModel,
  sections: SectionsAlong,
  own: OwnWeight,
  tendons: Tendons,
): BoxShear {
  const { uls } = model.standard.factors;
  const { layout, beam, superimposed, task } = model;
  const { most } = model.traffic;
  const { enclosedM2, wallM } = tube(layout, task.depthM, sections.span.bottomM);
  const perM = wallM / (2 * enclosedM2);
  const webShare = trafficShare(model, perM);
  const torque = curveTorque(model, own.effects.momentKNm);
  const lean = Math.hypot(1, layout.slope);
  const across = webBending(layout, task.depthM, sections.span.webM);
  const { down, up } = ultimateMoments(model, own);
  const momentAt = (i: number): number => Math.max(Math.abs(down[i]!), Math.abs(up[i]!));
  const demands: WebDemand[] = [];
  let mostKN = 0;
  for (let e = 0; e < beam.xM.length - 1; e++) {
    const length = beam.xM[e + 1]! - beam.xM[e]!;
    const share = (tendons.share[e]! + tendons.share[e + 1]!) / 2;
    const tendon =
      (tendons.forceKN *
        (tendons.parasiticM[e + 1]! -
          tendons.parasiticM[e]! -
          share * (tendons.depthM[e + 1]! - tendons.depthM[e]!))) /
      length;
    let shearKN = 0;
    let at = e;
    for (const i of [e, e + 1]) {
      const pick = i === e ? 'shearRightKN' : 'shearLeftKN';
      const lasting =
        uls.permanent * own.effects[pick][i]! +
        uls.superimposed * superimposed[pick][i]! +
        uls.prestress * tendon;
      const moving = [uls.traffic * most.shearMaxKN[i]!, uls.traffic * most.shearMinKN[i]!] as const;
      mostKN = Math.max(mostKN, Math.abs(lasting + moving[0]), Math.abs(lasting + moving[1]));
      const even = lasting / layout.webs;
      const web =
        Math.max(Math.abs(even + webShare * moving[0]), Math.abs(even + webShare * moving[1])) +
        uls.permanent * Math.abs(torque[i]!) * perM;
      if (web > shearKN) {
        shearKN = web;
        at = i;
      }
    }
    const moment = (momentAt(e) + momentAt(e + 1)) / 2;
    demands.push({
      shearKN: lean * shearKN,
      momentKNm: moment / layout.webs,
      strandM2: (share * tendons.strandsPerWeb + tendons.straightStrands / 2 / layout.webs) * model.strandM2,
      barM2: faceBarsM2(sections.span.bottomWidthM) / layout.webs,
      axialMPa: (share * tendons.forceKN + tendons.straightKN) / sections.areaM2[at]! / 1e3,
      effectiveM: task.depthM - boxData.ductCoverM.value,
      acrossKNm: across,
      ...(layout.struts ? { hangKNm: layout.struts.hangKNm } : {}),
    });
  }
  return { demands, webShare, enclosedM2, mostKN };
}

/** Area within the middle lines of the outer walls and the height of an outer wall along its slope. */
export function tube(
  layout: BoxLayout,
  depthM: number,
  bottomM: number,
): { enclosedM2: number; wallM: number } {
  const heightM = Math.max(0.1, depthM - layout.slab.midM / 2 - bottomM / 2);
  const topM = layout.cells * layout.spacingM;
  const points = [
    [-topM / 2, 0],
    [topM / 2, 0],
    [topM / 2 - layout.slope * heightM, -heightM],
    [-topM / 2 + layout.slope * heightM, -heightM],
  ] as const;
  return { enclosedM2: polygonProperties(points).areaM2, wallM: heightM * Math.hypot(1, layout.slope) };
}

/** Traffic of the outer web against that of the deck, vehicles counted as 2P/L. */
export function trafficShare(
  model: Pick<BoxModel, 'task' | 'layout' | 'standard'> & { readonly traffic: Pick<BoxTraffic, 'load'> },
  flowPerM: number,
): number {
  const { task, layout, standard } = model;
  const edge = task.deck.widthM / 2;
  const even = 1 / layout.webs;
  const line = { yM: [-edge, edge], value: [even - edge * flowPerM, even + edge * flowPerM] };
  const turned = { yM: line.yM, value: [line.value[1]!, line.value[0]!] };
  const heaviest = Math.max(
    ...standard.vehicles.map((v) => v.axles.reduce((sum, axle) => sum + axle.loadKN, 0)),
  );
  const perVehicle = (2 * heaviest * (1 + standard.dynamicAllowance)) / Math.max(...task.spansM);
  const weigh = ({
    vehicleFactor,
    udlKNm,
    footwayKNm,
  }: {
    vehicleFactor: number;
    udlKNm: number;
    footwayKNm: number;
  }): number => vehicleFactor * perVehicle + udlKNm + footwayKNm;
  const deck = weigh(model.traffic.load);
  if (!(deck > 0)) return even;
  const sides = task.deck.carriagewayOffsetM === 0 ? [line] : [line, turned];
  return Math.max(
    even,
    ...sides.map((side) => weigh(trafficOnCrossLine(task.standard, task.deck, side)) / deck),
  );
}

/** Torque of a curved deck from M / R along each span held against turning at its supports, kNm at the stations. */
export function curveTorque(
  model: Pick<BoxModel, 'beam' | 'task' | 'superimposed'> & { readonly traffic: Pick<BoxTraffic, 'most'> },
  ownKNm: Float64Array,
): Float64Array {
  const { beam, task, traffic } = model;
  const n = beam.xM.length;
  const torque = new Float64Array(n);
  if (!(task.planRadiusM < Infinity)) return torque;
  const perM = (i: number): number =>
    (ownKNm[i]! + model.superimposed.momentKNm[i]! + traffic.most.momentMaxKNm[i]!) / task.planRadiusM;
  task.spansM.forEach((spanM, span) => {
    const from = beam.supportAt[span]!;
    const to = beam.supportAt[span + 1]!;
    let sum = 0;
    let first = 0;
    for (let i = from; i < to; i++) {
      const length = beam.xM[i + 1]! - beam.xM[i]!;
      const load = ((perM(i) + perM(i + 1)) / 2) * length;
      sum += load;
      first += load * ((beam.xM[i]! + beam.xM[i + 1]!) / 2 - beam.xM[from]!);
    }
    let here = sum - first / spanM;
    for (let i = from; i <= to; i++) {
      torque[i] = Math.max(torque[i]!, Math.abs(here));
      if (i < to) here -= ((perM(i) + perM(i + 1)) / 2) * (beam.xM[i + 1]! - beam.xM[i]!);
    }
  });
  return torque;
}

/** Bending of a web across the deck: half of the root moment of the slab or its ribs, shared by the stiffness of web and slab. */
export function webBending({ slab, ribs, spacingM }: BoxLayout, depthM: number, webM: number): number {
  const web = (4 * webM ** 3) / Math.max(0.3, depthM);
  const deck = (2 * (ribs ? ribs.stiffM3 : slab.midM ** 3)) / spacingM;
  const rootKNm = ribs ? ribs.rootMomentKNm / ribs.spacingM : slab.rootMomentKNm;
  return (0.5 * rootKNm * web) / (web + deck);
}
