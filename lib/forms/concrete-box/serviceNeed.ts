import { boxData } from './boxData.ts';
import type { OwnWeight } from './boxLoads.ts';
import type { BoxModel } from './boxModel.ts';
import type { BoxTraffic } from './boxTraffic.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import type { TendonGroup } from './tendonGroup.ts';
import type { TendonLine } from './tendonLine.ts';

/** What service asks to know of a deck. */
export type ServiceModel = Pick<BoxModel, 'standardId' | 'concrete' | 'superimposed' | 'archedKNm'> & {
  readonly task: Pick<BoxModel['task'], 'depthM'>;
  readonly traffic: Pick<BoxTraffic, 'service'>;
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
  own: Pick<OwnWeight, 'effects'>,
  group: Pick<TendonGroup, 'heightM'>,
  straightKN: number,
  gradient: Omit<typeof boxData.gradient, 'source'> = boxData.gradient,
): LineNeed {
  const { service } = model.traffic;
  const spread = boxData.prestressSpread[model.standardId];
  const tension = boxData.serviceTensionMPa[model.standardId] * 1e3;
  // Stiffness times free curvature of the gradient with traffic.
  const warm =
    (gradient.withTraffic * gradient.expansion1PerK * model.concrete.ecmMPa * 1e3 * sections.span.inertiaM4) /
    model.task.depthM;
  const around =
    model.standardId === 'lm1' ? group.heightM / 2 + boxData.decompressedAroundDuctM.value : Infinity;
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
      const straight = (spread * straightKN) / area + tension;
      const down = (sections.lowLag[i]! * Math.min(sections.lowM[i]!, e + around)) / inertia;
      const up = (sections.topLag[i]! * Math.min(sections.topM[i]!, around - e)) / inertia;
      const bend = share[i]! * e - parasiticM[i]!;
      const axial = share[i]! / area;
      const lowNeed = (sagging[i]! * down - straight) / (spread * (axial + bend * down));
      const highNeed = (-hogging[i]! * up - straight) / (spread * (axial - bend * up));
      most = Math.max(
        most,
        forceFor(lowNeed, sagging[i]! * down > straight),
        forceFor(highNeed, -hogging[i]! * up > straight),
      );
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
