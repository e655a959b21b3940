import { loadTrack, straightLine, type Extremes, type Track } from '../mechanics/index.ts';
import { plainQuest, trafficOnLine } from './trafficOnLine.ts';
import type { TrafficLoad } from './trafficLoad.ts';

/**
 * Greatest and least effect of a traffic load on any influence line given by ordinates, straight between stations
 * (members of a truss, stays, pylons).
 * @param stations x of the ordinates, m, rising; a track of `loadTrack` where many lines share the same stations
 * @throws RangeError when the lengths differ or the stations do not rise
 */
export function trafficOnInfluence(
  load: TrafficLoad,
  stations: ArrayLike<number> | Track,
  ordinates: ArrayLike<number>,
): { max: number; min: number; beyondScope: boolean } {
  const track = 'placings' in stations ? stations : loadTrack(stations);
  if (track.xM.length !== ordinates.length) {
    throw new RangeError(
      `ordinates: expected ${track.xM.length}, one a station, received ${ordinates.length}`,
    );
  }
  const out: Extremes = { max: 0, min: 0 };
  const beyondScope = trafficOnLine(load, track, straightLine(track.xM, ordinates), plainQuest, out);
  return { max: out.max, min: out.min, beyondScope };
}
