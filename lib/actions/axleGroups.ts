import type { StandardId } from '../model/index.ts';
import { reversed, type AxleGroup } from '../mechanics/index.ts';
import { loadStandard, type LoadStandard } from './loadStandard.ts';

/** Vehicles of a standard as axle groups with dynamic allowance, both ways round, made once. */
export interface StandardGroups {
  readonly usual: readonly AxleGroup[];
  /** Longer wheelbases, for hogging moments, and the weight of the heaviest. */
  readonly longer: readonly AxleGroup[];
  readonly longerKN: number;
  /** The vehicles of the two-vehicle rule, with the distance between first axles; null without such a rule. */
  readonly two: {
    readonly groups: ReadonlySet<AxleGroup>;
    readonly apartM: number;
    readonly share: number;
  } | null;
}

const made = new Map<StandardId, StandardGroups>();

export function axleGroups(id: StandardId): StandardGroups {
  const known = made.get(id);
  if (known) return known;
  const standard = loadStandard(id);
  const usual = standard.vehicles.map((vehicle) => ({
    id: vehicle.id,
    groups: bothWays(standard, vehicle.axles, vehicle.whole),
  }));
  const longer = standard.vehicles.flatMap((vehicle) =>
    (vehicle.furtherRearGapsM ?? []).flatMap((gapM) => {
      const rear = vehicle.axles[vehicle.axles.length - 1]!;
      const before = vehicle.axles.slice(0, -1);
      const atM = before[before.length - 1]!.atM + gapM;
      return bothWays(standard, [...before, { atM, loadKN: rear.loadKN }], vehicle.whole);
    }),
  );
  const rule = standard.twoVehicles;
  const pair = rule ? usual.find((vehicle) => vehicle.id === rule.vehicle) : undefined;
  const groups: StandardGroups = {
    usual: usual.flatMap((vehicle) => vehicle.groups),
    longer,
    longerKN: Math.max(0, ...longer.map((group) => group.loadKN.reduce((sum, load) => sum + load, 0))),
    two:
      rule && pair
        ? { groups: new Set(pair.groups), apartM: lengthM(pair.groups[0]!) + rule.clearM, share: rule.share }
        : null,
  };
  made.set(id, groups);
  return groups;
}

function bothWays(
  standard: LoadStandard,
  axles: readonly { readonly atM: number; readonly loadKN: number }[],
  whole: boolean,
): AxleGroup[] {
  const group: AxleGroup = {
    atM: axles.map((axle) => axle.atM),
    loadKN: axles.map((axle) => axle.loadKN * (1 + standard.dynamicAllowance)),
    whole,
  };
  const back = reversed(group);
  const same = group.atM.every(
    (at, i) => Math.abs(at - back.atM[i]!) < 1e-9 && group.loadKN[i] === back.loadKN[i],
  );
  return same ? [group] : [group, back];
}

function lengthM(group: AxleGroup): number {
  return group.atM[group.atM.length - 1]!;
}
