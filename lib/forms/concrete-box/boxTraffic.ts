import {
  atObtuseCorner,
  cellularCorner,
  loadStandard,
  serviceTraffic,
  trafficEnvelope,
  trafficOnDeck,
  type TrafficEnvelope,
  type TrafficLoad,
} from '../../actions/index.ts';
import type { LineBeam } from '../../mechanics/index.ts';
import type { UnitTask } from '../../model/index.ts';

/** Traffic on the whole deck as a line beam of constant stiffness meets it. */
export interface BoxTraffic {
  readonly load: TrafficLoad;
  /** Characteristic. */
  readonly most: TrafficEnvelope;
  /** In the combination that decides the prestress. */
  readonly service: Pick<TrafficEnvelope, 'momentMaxKNm' | 'momentMinKNm'>;
}

const kept = new Map<string, BoxTraffic>();

/**
 * Envelopes of a unit. On a beam of constant stiffness they do not depend on the section, so that trials of depth share
 * them; the last 32 units are kept.
 */
export function boxTraffic(task: UnitTask, beam: LineBeam): BoxTraffic {
  // The factor falls with depth: what is kept for one depth of a skew deck is not that of another.
  const corner = cellularCorner({ spanM: Math.max(...task.spansM), depthM: task.depthM }, task.skewDeg ?? 0);
  const key = JSON.stringify([task.standard, task.spansM, task.deck, corner]);
  const known = kept.get(key);
  if (known) return known;
  const made = trafficOnBox(beam, atObtuseCorner(trafficOnDeck(task.standard, task.deck), corner));
  if (kept.size >= 32) for (const [oldest] of [...kept].slice(0, 16)) kept.delete(oldest);
  kept.set(key, made);
  return made;
}

/** Envelopes of a load on a beam, characteristic and in the combination that decides the prestress. */
export function trafficOnBox(beam: LineBeam, load: TrafficLoad): BoxTraffic {
  const most = trafficEnvelope(beam, load, { deflection: false });
  return { load, most, service: serviceMoments(beam, load, most) };
}

/** Where all loads are taken at the same share, as in Service III, the characteristic moments are scaled. */
function serviceMoments(beam: LineBeam, load: TrafficLoad, most: TrafficEnvelope): BoxTraffic['service'] {
  const { vehicle, uniform, footway } = loadStandard(load.standard).factors.sls;
  if (vehicle !== uniform || vehicle !== footway)
    return trafficEnvelope(beam, serviceTraffic(load), { deflection: false });
  return {
    momentMaxKNm: most.momentMaxKNm.map((moment) => vehicle * moment),
    momentMinKNm: most.momentMinKNm.map((moment) => vehicle * moment),
  };
}
