import { trafficOnInfluence, type LoadStandard, type TrafficLoad } from '../../actions/index.ts';
import type { SizedTruss } from './sizeTruss.ts';

const modulusMPa = 210000;

/**
 * Greatest deflection of midspan under traffic on one truss, m, by virtual work: sum of N n l / EA over all members, with
 * N for a unit load at each floor node, n for a unit load at midspan. Gussets make real trusses a little stiffer.
 */
export function trussDeflection(truss: SizedTruss, standard: LoadStandard, traffic: TrafficLoad): number {
  const { geometry } = truss;
  const n = geometry.panels;
  // Influence lines of the geometry itself hold at its height.
  const ordinates = new Float64Array(n + 1);
  const middle = n / 2;
  for (const { member, section } of truss.members) {
    const line = member.influence;
    const low = line[Math.floor(middle)]!;
    const high = line[Math.ceil(middle)]!;
    const unit = (low + high) / 2;
    const flexibility = (unit * member.lengthM) / (modulusMPa * 1000 * section.areaM2);
    for (let j = 1; j < n; j++) {
      ordinates[j]! += flexibility * line[j]!;
      if (member.count === 2) ordinates[j]! += flexibility * line[n - j]!;
    }
  }
  let most = 0;
  for (const load of deflectionLoads(standard, traffic))
    most = Math.max(most, trafficOnInfluence(load, geometry.nodesM, ordinates).max);
  return most;
}

/** Loads that a deflection limit is written for: the characteristic ones, or AASHTO LRFD 3.6.1.3.2 (from memory). */
function deflectionLoads(standard: LoadStandard, traffic: TrafficLoad): TrafficLoad[] {
  if (standard.id === 'lm1') return [traffic];
  return [
    { ...traffic, udlKNm: 0, footwayKNm: 0 },
    { ...traffic, vehicleFactor: traffic.vehicleFactor / 4, footwayKNm: 0 },
  ];
}
