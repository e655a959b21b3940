import { uniform } from '../../../mechanics/index.ts';
import { webShear } from '../../concrete-box/webShear.ts';
import type { BeamShear } from '../../common/precast/beamShear.ts';
import { elementsPerSpan } from '../../common/precast/precastModel.ts';
import { pretensioned } from '../../common/precast/pretensioned.ts';
import type { SplicedModel } from './splicedModel.ts';
import { splicedData } from './splicedData.ts';
import type { SizedTendons } from './sizeTendons.ts';

/**
 * Design shear of one beam of every span by element, all of it on the continuous beam, less what inclined tendons and their
 * parasitic moments carry, and the links it asks for beside the ducts.
 */
export function splicedShears(
  model: SplicedModel,
  { straight, tendons, moments }: SizedTendons,
): BeamShear[] {
  const { beam, shape, composite, standard, standardId, most, superimposed, task } = model;
  const { uls } = standard.factors;
  const dead = uniform(beam, model.deadKNm);
  const first = 1e3 * tendons.first * model.tendonM2 * tendons.lastingMPa;
  const second = 1e3 * (tendons.strands - tendons.first) * model.tendonM2 * tendons.lastingMPa;
  const tendonKNm = (i: number): number => first * moments.bare[i]! + second * moments.whole[i]!;
  return task.spansM.map((spanM, span) => {
    const from = beam.supportAt[span]!;
    const step = spanM / elementsPerSpan;
    const out = { mostKN: 0, trafficKN: 0, crushing: 0, crowding: 0, linksM2: 0 };
    for (let e = 0; e < elementsPerSpan; e++) {
      const i = from + e;
      // Slope of the moment of the tendons over the element: the shear they give.
      const carried = (uls.prestress * (tendonKNm(i + 1) - tendonKNm(i))) / step;
      let shearKN = 0;
      let momentKNm = 0;
      for (const [side, at] of [
        ['shearRightKN', i],
        ['shearLeftKN', i + 1],
      ] as const) {
        const lasting = uls.permanent * dead[side][at]! + uls.superimposed * superimposed[side][at]!;
        // The element beside a support is read in its middle third: the tip lies within the depth of the beam.
        const beside =
          (side === 'shearRightKN' && e === 0) || (side === 'shearLeftKN' && e === elementsPerSpan - 1);
        const within = Math.min(composite.topM, step);
        const eased = beside ? Math.sign(lasting) * uls.permanent * model.deadKNm[span]! * within : 0;
        for (const traffic of [most.shearMaxKN[at]!, most.shearMinKN[at]!]) {
          out.trafficKN = Math.max(out.trafficKN, Math.abs(traffic));
          shearKN = Math.max(shearKN, Math.abs(lasting - eased + uls.traffic * traffic + carried));
        }
        const bend =
          uls.permanent * (model.ownKNmAt[at]! + model.wetKNmAt[at]!) +
          uls.superimposed * superimposed.momentKNm[at]!;
        momentKNm = Math.max(
          momentKNm,
          Math.abs(bend + uls.traffic * most.momentMaxKNm[at]!),
          Math.abs(bend + uls.traffic * most.momentMinKNm[at]!),
        );
      }
      const tendonM2 = tendons.strands * model.tendonM2;
      const use = webShear(
        { standardId, standard, concrete: model.beamConcrete },
        shape.webM,
        splicedData.tendons.ductM,
        {
          shearKN,
          momentKNm,
          strandM2: tendonM2 + straight.count * model.strandM2,
          barM2: 0,
          axialMPa: (tendonM2 * tendons.lastingMPa) / composite.areaM2,
          effectiveM: Math.max(
            0.72 * composite.topM,
            composite.topM - Math.min(moments.zM[i]!, composite.topM - moments.zM[i]!),
          ),
          acrossKNm: 0,
        },
      );
      out.mostKN = Math.max(out.mostKN, shearKN);
      out.crushing = Math.max(out.crushing, use.crushing);
      out.crowding = Math.max(out.crowding, use.crowding);
      out.linksM2 += Math.max(use.stirrupsM2PerM, pretensioned.beamBars.leastLinksM2PerM) * step;
    }
    return out;
  });
}
