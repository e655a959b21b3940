import type { TrafficEnvelope } from '../../actions/index.ts';
import type { Effects } from '../../mechanics/index.ts';
import { boxData } from './boxData.ts';
import type { BoxModel } from './boxModel.ts';
import type { CastOf } from './freshTension.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import { serviceLimits } from './serviceLimits.ts';
import type { TendonGroup } from './tendonGroup.ts';
import type { TendonLine } from './tendonLine.ts';

/** Of the effects of a load service asks for the moments. */
type Moments = Pick<Effects, 'momentKNm'>;

/** What service asks to know of a deck. */
export type ServiceModel = CastOf &
  Pick<BoxModel, 'archedKNm'> & {
    readonly task: Pick<BoxModel['task'], 'depthM'>;
    readonly superimposed: Moments;
    readonly traffic: { readonly service: Pick<TrafficEnvelope, 'momentMaxKNm' | 'momentMinKNm'> };
  };

/** Section properties along a deck, and the inertia by which its free curvature is judged. */
export type ServiceSections = Pick<
  SectionsAlong,
  'areaM2' | 'inertiaM4' | 'topM' | 'lowM' | 'topLag' | 'lowLag'
> & {
  readonly span: { readonly inertiaM4: number };
};

/** Draped force that a limit asks for along a line of the tendons, kN; one that is `enough` or more may be said as soon as that is known. */
export type LineNeed = (line: TendonLine, enough?: number) => number;

/** Draped force of the heaviest span after all losses that service asks for along a given line of the tendons, kN; Infinity where none will do. */
export function serviceNeed(
  model: ServiceModel,
  sections: ServiceSections,
  own: { readonly effects: Moments },
  group: Pick<TendonGroup, 'heightM'>,
  straightKN: number,
  gradient: Omit<typeof boxData.gradient, 'source'> = boxData.gradient,
): LineNeed {
  const { service } = model.traffic;
  const spread = boxData.prestressSpread[model.standardId];
  // Stiffness times free curvature of the gradient with traffic.
  const warm =
    (gradient.withTraffic * gradient.expansion1PerK * model.concrete.ecmMPa * 1e3 * sections.span.inertiaM4) /
    model.task.depthM;
  const limits = serviceLimits(model, group.heightM);
  const n = sections.areaM2.length;
  const sagging = new Float64Array(n);
  const hogging = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const lasting = own.effects.momentKNm[i]! + model.superimposed.momentKNm[i]!;
    const arched = model.archedKNm[i]! * warm;
    sagging[i] =
      lasting +
      service.momentMaxKNm[i]! +
      Math.max(arched * gradient.topWarmerK, -arched * gradient.topCoolerK);
    hogging[i] =
      lasting +
      service.momentMinKNm[i]! +
      Math.min(arched * gradient.topWarmerK, -arched * gradient.topCoolerK);
  }
  // The station that ruled a line out is asked first about the next: its neighbours are ruled out by the same one.
  let first = 0;
  return ({ eccentricityM, parasiticM, share }, enough = Infinity) => {
    let most = 0;
    for (let k = -1; k < n; k++) {
      const i = k < 0 ? first : k;
      const area = sections.areaM2[i]!;
      const inertia = sections.inertiaM4[i]!;
      const e = eccentricityM[i]!;
      const bend = share[i]! * e - parasiticM[i]!;
      const axial = share[i]! / area;
      for (const { aroundM, tensionKPa } of limits) {
        const straight = (spread * straightKN) / area + tensionKPa;
        const down = (sections.lowLag[i]! * Math.min(sections.lowM[i]!, e + aroundM)) / inertia;
        const up = (sections.topLag[i]! * Math.min(sections.topM[i]!, aroundM - e)) / inertia;
        const lowNeed = (sagging[i]! * down - straight) / (spread * (axial + bend * down));
        const highNeed = (-hogging[i]! * up - straight) / (spread * (axial - bend * up));
        most = Math.max(
          most,
          forceFor(lowNeed, sagging[i]! * down > straight),
          forceFor(highNeed, -hogging[i]! * up > straight),
        );
      }
      if (most >= enough) {
        first = i;
        return most;
      }
    }
    return most;
  };
}

/** A negative force for a fibre in tension means that the tendons make it worse. */
function forceFor(need: number, inTension: boolean): number {
  if (!inTension) return 0;
  return need > 0 ? need : Infinity;
}
