import { faceBarsM2 } from '../concrete-box/bendingCapacity.ts';
import { boxData } from '../concrete-box/boxData.ts';
import { curveTorque, trafficShare, tube, webBending } from '../concrete-box/boxShear.ts';
import type { WebDemand } from '../concrete-box/webShear.ts';
import { cantileverData } from './cantileverData.ts';
import type { CantileverModel } from './cantileverModel.ts';
import { haunchedSkew } from './haunchedSkew.ts';
import type { FoundStrands } from './findStrands.ts';
import type { HaunchedSections } from './sectionsAlong.ts';
import type { StagedWeight } from './stages.ts';
import { strandStates, ultimateInUse } from './tendonNeeds.ts';

/** Design shear of the outer web by element of the beam, the worse of its two ends. */
export interface HaunchedShear {
  readonly demands: readonly WebDemand[];
  /** Share of the traffic shear that one outer web carries with its part of the torsion, at midspan. */
  readonly webShare: number;
  /** Area enclosed by the middle lines of the outer walls at midspan, m2. */
  readonly enclosedM2: number;
  /** Greatest design shear of the deck, and what the inclined bottom slab takes of it there, kN. */
  readonly mostKN: number;
  readonly chordKN: number;
  /** Greatest design torque of skew ends, kNm; 0 on square supports. */
  readonly skewKNm: number;
}

/**
 * Shear of the outer web with Bredt torsion as in a box of constant depth. In the haunch the compression of the bottom
 * slab, M / z of the lasting moments without factors, is inclined and carries M / z tan(beta) of the shear. Skew ends twist
 * the end spans.
 */
export function haunchedShear(
  model: CantileverModel,
  sections: HaunchedSections,
  weight: StagedWeight,
  found: FoundStrands,
): HaunchedShear {
  const { uls } = model.standard.factors;
  const { layout, beam, superimposed, depthM } = model;
  const { most } = model.traffic;
  const torque = curveTorque(model, weight.lastingKNm);
  const skew = haunchedSkew(model, sections, weight);
  const skewKNm = skew.lastingKNm.map(
    (lasting, span) => uls.permanent * Math.abs(lasting) + uls.traffic * Math.abs(skew.trafficKNm[span]!),
  );
  let span = 0;
  const lean = Math.hypot(1, layout.slope);
  const states = strandStates(model, found.stresses);
  const { lasting } = states;
  const demands: WebDemand[] = [];
  let mostKN = 0;
  let chordThere = 0;
  const middle = tube(layout, model.task.depthM, sections.midspan.bottomM);
  const webShare = trafficShare(model, middle.wallM / (2 * middle.enclosedM2));
  const parasitic = (i: number): number =>
    found.parasiticBottomKNm[i]! + lasting.topParasitic * found.parasiticTopKNm[i]!;
  for (let e = 0; e < beam.xM.length - 1; e++) {
    if (e >= beam.supportAt[span + 1]!) span++;
    const length = beam.xM[e + 1]! - beam.xM[e]!;
    const slope = (depthM[e + 1]! - depthM[e]!) / length;
    const tendon = (parasitic(e + 1) - parasitic(e)) / length;
    const deep = (depthM[e]! + depthM[e + 1]!) / 2;
    const { enclosedM2, wallM } = tube(layout, deep, (sections.bottomM[e]! + sections.bottomM[e + 1]!) / 2);
    const perM = wallM / (2 * enclosedM2);
    let shearKN = 0;
    let at = e;
    for (const i of [e, e + 1]) {
      const pick = i === e ? 'shearRightKN' : 'shearLeftKN';
      const own = i === e ? weight.shearRightKN[i]! : weight.shearLeftKN[i]!;
      const hogging = Math.min(0, weight.lastingKNm[i]! + superimposed.momentKNm[i]!);
      const lever = depthM[i]! - cantileverData.topTendons.coverM - sections.bottomM[i]! / 2;
      // Hogging grows with the depth towards the pier, so that the chord takes part of the shear.
      const chord = (-hogging / lever) * slope;
      const fixed =
        uls.permanent * own + uls.superimposed * superimposed[pick][i]! + uls.prestress * tendon + chord;
      const moving = [uls.traffic * most.shearMaxKN[i]!, uls.traffic * most.shearMinKN[i]!] as const;
      for (const part of moving) {
        if (Math.abs(fixed + part) > mostKN) {
          mostKN = Math.abs(fixed + part);
          chordThere = Math.abs(chord);
        }
      }
      const even = fixed / layout.webs;
      const web =
        Math.max(Math.abs(even + webShare * moving[0]), Math.abs(even + webShare * moving[1])) +
        (uls.permanent * Math.abs(torque[i]!) + skewKNm[span]!) * perM;
      if (web > shearKN) {
        shearKN = web;
        at = i;
      }
    }
    const { max, min } = ultimateInUse(model, weight, found.use, [states.open, states.lasting], found, at);
    const moment = Math.max(Math.abs(max), Math.abs(min));
    const strands = Math.max(found.top[at]!, found.bottom[at]!);
    const forceKN = found.top[at]! * lasting.topKN + found.bottom[at]! * lasting.bottomKN;
    demands.push({
      shearKN: lean * shearKN,
      momentKNm: moment / layout.webs,
      strandM2: (strands * model.strandM2) / layout.webs,
      barM2: faceBarsM2(sections.bottomWidthM[at]!) / layout.webs,
      axialMPa: forceKN / sections.areaM2[at]! / 1e3,
      effectiveM: depthM[at]! - cantileverData.topTendons.coverM,
      acrossKNm: webBending(layout, deep, (sections.webM[e]! + sections.webM[e + 1]!) / 2),
      ...(layout.struts ? { hangKNm: layout.struts.hangKNm } : {}),
    });
  }
  return {
    demands,
    webShare,
    enclosedM2: middle.enclosedM2,
    mostKN,
    chordKN: chordThere,
    skewKNm: Math.max(...skewKNm),
  };
}

/** Duct that a web has to do without: tendons rise through it to their anchorages. */
export function webDuctM(): number {
  const { sizes } = boxData.tendons;
  return sizes[Math.floor(sizes.length / 2)]!.ductM;
}
