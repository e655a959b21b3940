import { webShear } from '../../concrete-box/webShear.ts';
import { beamMoments, diaphragmsWithin, noMoments } from './beamMoments.ts';
import { pretensioned } from './pretensioned.ts';
import { elementsPerSpan, type PrecastModel } from './precastModel.ts';
import { strandsAt, type StrandPlan, type StrandsThere } from './strandPlan.ts';

/** Links of one beam of a span and how far its web is used. */
export interface BeamShear {
  readonly mostKN: number;
  /** Of traffic alone, characteristic. */
  readonly trafficKN: number;
  /** Struts over their strength, links over what fits. */
  readonly crushing: number;
  readonly crowding: number;
  /** Volume of the links along one beam, m3 for each metre of link height. */
  readonly linksM2: number;
}

const moments = noMoments();
const there: StrandsThere = { areaM2: 0, zM: 0 };

/**
 * Design shear of one beam by element of its span and the links it asks for: own weight and slab on a simple span, the
 * rest on the span by itself or the continuous beam, whichever is worse, less what draped strands carry. The length next to a support is checked at the structural
 * depth from it.
 */
export function beamShear(model: PrecastModel, span: number, plan: StrandPlan): BeamShear {
  const { shape, composite, standard, standardId } = model;
  const { uls } = standard.factors;
  const spanM = model.task.spansM[span]!;
  const step = spanM / elementsPerSpan;
  const first = model.beam.supportAt[span]!;
  const heightM = composite.topM;
  const force = plan.count * model.strandM2 * plan.stress.lastingMPa;
  const kind = model.kind.relief[standardId];
  const { endOver } = pretensioned.relief[kind];
  const rise = kind === 'draped' ? (plan.endM - plan.midM) / (endOver * spanM) : 0;
  // Torsion of a closed cell loads one web up by T z / 2 A and the other down: as if both carried T z / A of shear.
  const twist = model.torsion ? (model.torsion.armM * shape.depthM) / model.torsion.cellM2 : 0;
  const leastM2PerM = pretensioned.beamBars.leastLinksM2PerM;
  let mostKN = 0;
  let trafficKN = 0;
  let crushing = 0;
  let crowding = 0;
  let linksM2 = 0;
  for (let e = 0; e < elementsPerSpan; e++) {
    const middle = Math.min(e + 0.5, elementsPerSpan - e - 0.5);
    const sloped = middle / elementsPerSpan < endOver;
    const carried = sloped ? uls.prestress * 1e3 * force * rise : 0;
    let shearKN = 0;
    for (const i of [e, e + 1]) {
      // At the support itself the shear is read at the structural depth from it.
      const x =
        i === 0
          ? Math.min(heightM, step)
          : i === elementsPerSpan
            ? spanM - Math.min(heightM, step)
            : i * step;
      const away = Math.abs(x - i * step);
      const own = (model.ownKNm + model.wetKNm) * (spanM / 2 - x) + diaphragmShear(model, spanM, x);
      const side = i === e ? 'shearRightKN' : 'shearLeftKN';
      const towards = Math.sign(spanM / 2 - x);
      const alone = model.simple[span]!;
      for (const [effects, envelope, at] of [
        [model.superimposed, model.most, first + i],
        [alone.superimposed, alone.most, i],
      ] as const) {
        const added = effects[side][at]!;
        const lasting =
          uls.permanent * own + uls.superimposed * (added - Math.sign(added) * model.superimposedKNm * away);
        for (const traffic of [envelope.shearMaxKN[at]!, envelope.shearMinKN[at]!]) {
          trafficKN = Math.max(trafficKN, Math.abs(traffic));
          shearKN = Math.max(
            shearKN,
            Math.abs(lasting + uls.traffic * traffic - towards * carried) +
              uls.traffic * twist * Math.abs(traffic),
          );
        }
      }
    }
    mostKN = Math.max(mostKN, shearKN);
    beamMoments(model, span, Math.round(middle), moments);
    strandsAt(model, plan, middle / elementsPerSpan, there);
    const use = webShear({ standardId, standard, concrete: model.beamConcrete }, shape.webM, 0, {
      shearKN,
      momentKNm: Math.max(0, moments.design),
      strandM2: there.areaM2,
      barM2: 0,
      axialMPa: (there.areaM2 * plan.stress.lastingMPa) / composite.areaM2,
      effectiveM: Math.max(0.72 * heightM, heightM - there.zM),
      acrossKNm: 0,
    });
    crushing = Math.max(crushing, use.crushing);
    crowding = Math.max(crowding, use.crowding);
    linksM2 += Math.max(use.stirrupsM2PerM, leastM2PerM) * step;
  }
  return { mostKN, trafficKN, crushing, crowding, linksM2 };
}

/** Shear of the diaphragms within a simple span at x, kN; the mean of both sides under a diaphragm. */
function diaphragmShear(model: PrecastModel, spanM: number, x: number): number {
  const count = diaphragmsWithin(model, spanM);
  let shear = (count * model.diaphragmKN) / 2;
  for (let k = 1; k <= count; k++) {
    const past = x - (spanM * k) / (count + 1);
    shear -= (past > 1e-9 ? 1 : past > -1e-9 ? 0.5 : 0) * model.diaphragmKN;
  }
  return shear;
}
