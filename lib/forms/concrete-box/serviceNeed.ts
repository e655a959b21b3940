import type { TrafficEnvelope } from '../../actions/index.ts';
import type { Effects } from '../../mechanics/index.ts';
import { boxData } from './boxData.ts';
import type { BoxModel } from './boxModel.ts';
import type { CastOf } from './freshTension.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import { serviceLimits } from './serviceLimits.ts';
import type { StationNeed } from './stationNeed.ts';
import type { TendonGroup } from './tendonGroup.ts';

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

/** Draped force of the heaviest span after all losses that service asks for at a station, kN; Infinity where none will do. */
export function serviceNeed(
  model: ServiceModel,
  sections: ServiceSections,
  own: { readonly effects: Moments },
  group: Pick<TendonGroup, 'heightM'>,
  straightKN: number,
  gradient: Omit<typeof boxData.gradient, 'source'> = boxData.gradient,
): StationNeed {
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
  const straight = limits.map(({ tensionKPa }) =>
    sections.areaM2.map((area) => (spread * straightKN) / area + tensionKPa),
  );
  const { areaM2, inertiaM4, topM, lowM, topLag, lowLag } = sections;
  return (i, { eccentricityM, parasiticM, share }) => {
    const inertia = inertiaM4[i]!;
    const bend = share * eccentricityM - parasiticM;
    const axial = share / areaM2[i]!;
    let most = 0;
    for (let k = 0; k < limits.length; k++) {
      const { aroundM } = limits[k]!;
      const borne = straight[k]![i]!;
      const down = (lowLag[i]! * Math.min(lowM[i]!, eccentricityM + aroundM)) / inertia;
      const up = (topLag[i]! * Math.min(topM[i]!, aroundM - eccentricityM)) / inertia;
      const pulledLow = sagging[i]! * down - borne;
      const pulledTop = -hogging[i]! * up - borne;
      if (pulledLow > 0) most = Math.max(most, forceFor(pulledLow, spread * (axial + bend * down)));
      if (pulledTop > 0) most = Math.max(most, forceFor(pulledTop, spread * (axial - bend * up)));
    }
    return most;
  };
}

/** Force that presses a fibre by as much as it is pulled, kN; where tendons make it worse none will do. */
function forceFor(pulledKPa: number, pressedPerKN: number): number {
  return pressedPerKN > 0 ? pulledKPa / pressedPerKN : Infinity;
}
