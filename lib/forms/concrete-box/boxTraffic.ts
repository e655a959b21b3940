import {
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
  readonly service: TrafficEnvelope;
}

const kept = new Map<string, BoxTraffic>();

/**
 * Envelopes of a unit. On a beam of constant stiffness they do not depend on the section, so that trials of depth share
 * them; the last 32 units are kept.
 */
export function boxTraffic(task: UnitTask, beam: LineBeam): BoxTraffic {
  const key = JSON.stringify([task.standard, task.spansM, task.deck]);
  const known = kept.get(key);
  if (known) return known;
  const load = trafficOnDeck(task.standard, task.deck);
  const made = {
    load,
    most: trafficEnvelope(beam, load, { deflection: false }),
    service: trafficEnvelope(beam, serviceTraffic(load), { deflection: false }),
  };
  if (kept.size >= 32) for (const [oldest] of [...kept].slice(0, 16)) kept.delete(oldest);
  kept.set(key, made);
  return made;
}
