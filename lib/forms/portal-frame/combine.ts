import type { ChainEffects, FrameModel } from './frameModel.ts';
import { portalData } from './portalData.ts';
import type { FrameTraffic, TrafficRange } from './frameTraffic.ts';

/** An action that may come with any one of several factors, each on effects of its own. */
export type Action = readonly (readonly [effects: ChainEffects | null, factor: number])[];

/** Shares of vehicles and uniform load, with braking either way beside them. */
interface TrafficShare {
  readonly vehicle: number;
  readonly uniform: number;
  readonly brakingKN: number;
}

/** One combination on one kind of feet. */
export interface Combination {
  readonly actions: readonly Action[];
  readonly traffic: { readonly vehicle: TrafficRange; readonly uniform: TrafficRange };
  readonly braking: ChainEffects;
  readonly shares: readonly TrafficShare[];
}

export type Limit = 'ultimate' | 'characteristic' | 'frequent';

/**
 * Combinations of a limit state, on stiff and on soft feet. Fill presses with its least, at rest, or as the warm deck
 * pushes into it; temperature comes either way; shrinkage or none; braking beside the vertical load of its group.
 * @param parasitic restraint of the prestress on each kind of feet, or null
 */
export function combinations(
  model: FrameModel,
  traffic: FrameTraffic,
  limit: Limit,
  parasitic: readonly ChainEffects[] | null,
): Combination[] {
  const { standard, standardId, prestressed } = model;
  const { uls, sls } = standard.factors;
  const { earth, temperature, shrinkage, cracked, service } = portalData;
  const group = portalData.factors[standardId];
  const ultimate = limit === 'ultimate';
  const held = prestressed ? 1 : cracked.share;
  const warm =
    (ultimate
      ? group.temperature
      : limit === 'frequent'
        ? service.frequentTemperature
        : service.characteristicTemperature) * held;
  const dry = (ultimate ? group.shrinkage : 1) * shrinkage.relaxed * (shrinkage.strain / 1e-5) * held;
  const more = (factor: number): number => (ultimate ? factor : 1);
  const brakingKN = group.braking * brakingOf(model);
  const full = more(uls.traffic);
  const shares: TrafficShare[] =
    limit === 'frequent'
      ? [
          {
            vehicle: sls.vehicle,
            uniform: standard.distributionFactors ? sls.footway : sls.uniform,
            brakingKN: 0,
          },
        ]
      : [
          { vehicle: full, uniform: full, brakingKN: 0 },
          {
            vehicle: full * group.vehicleWithBraking,
            uniform: full * group.uniformWithBraking,
            brakingKN: full * brakingKN,
          },
        ];
  const behind = limit === 'frequent' ? sls.vehicle : full;
  const perK = temperature.expansion1PerK / 1e-5;
  return model.cases.map((one, k) => ({
    traffic: traffic.cases[k]!,
    braking: one.braking,
    shares,
    actions: [
      [
        [one.own, more(uls.permanent)],
        [one.own, more(uls.permanentFavourable)],
      ],
      [
        [one.superimposed, more(uls.superimposed)],
        [one.superimposed, more(uls.superimposedFavourable)],
      ],
      [
        [one.earth, earth.activePressure * more(uls.permanentFavourable)],
        [one.earth, earth.restPressure * more(uls.permanent)],
        [one.pressedEarth, more(uls.permanent)],
      ],
      [
        [null, 0],
        [one.longer, warm * perK * temperature.warmerK],
        [one.longer, -warm * perK * temperature.colderK],
      ],
      [
        [null, 0],
        [one.topWarmer, warm * temperature.topWarmerK],
        [one.topWarmer, -warm * temperature.topCoolerK],
      ],
      [
        [null, 0],
        [one.longer, -dry],
      ],
      ...one.surcharge.map((side): Action => [
        [null, 0],
        [side, behind],
      ]),
      ...(parasitic ? [[[parasitic[k]!, more(uls.prestress)]] satisfies Action] : []),
    ],
  }));
}

/** Characteristic braking force of the deck, kN. */
export function brakingOf({ standard, task, shape }: FrameModel): number {
  const { perLane, constantKN, perMKN, leastKN, mostKN } = standard.braking;
  const one = Math.min(mostKN, Math.max(leastKN, constantKN + perMKN * shape.lengthM));
  return perLane ? one * Math.max(1, Math.ceil(task.deck.lanes / 2)) : one;
}

/** Moment and the thrust that comes with it. */
export interface Combined {
  readonly momentKNm: number;
  /** Without the thrust of traffic, which only helps. */
  readonly thrustKN: number;
}

/** Worst moment of a combination at a node: tension of the inner face (1) or of the outer face (-1), positive. */
export function worstMoment(
  { actions, traffic, braking, shares }: Combination,
  node: number,
  sign: 1 | -1,
): Combined {
  let momentKNm = 0;
  let thrustKN = 0;
  for (const action of actions) {
    let best = -Infinity;
    let thrust = 0;
    for (const [effects, factor] of action) {
      const moment = effects ? sign * factor * effects.momentKNm[node]! : 0;
      if (moment > best) {
        best = moment;
        thrust = effects ? factor * effects.thrustKN[node]! : 0;
      }
    }
    momentKNm += best;
    thrustKN += thrust;
  }
  let most = 0;
  for (const { vehicle, uniform, brakingKN } of shares) {
    const of = (range: TrafficRange): number =>
      sign > 0 ? range.momentMaxKNm[node]! : -range.momentMinKNm[node]!;
    most = Math.max(
      most,
      vehicle * of(traffic.vehicle) +
        uniform * of(traffic.uniform) +
        brakingKN * Math.abs(braking.momentKNm[node]!),
    );
  }
  return { momentKNm: momentKNm + most, thrustKN };
}

/**
 * Greatest shear of a combination in a member, either way, kN.
 * @param steadyKN shear that is always there, such as that of inclined tendons
 */
export function worstShear(
  { actions, traffic, braking, shares }: Combination,
  member: number,
  steadyKN = 0,
): number {
  let worst = 0;
  for (const sign of [1, -1]) {
    let sum = sign * steadyKN;
    for (const action of actions)
      sum += Math.max(
        ...action.map(([effects, factor]) => (effects ? sign * factor * effects.shearKN[member]! : 0)),
      );
    let most = 0;
    for (const { vehicle, uniform, brakingKN } of shares) {
      const of = (range: TrafficRange): number =>
        sign > 0 ? range.shearMaxKN[member]! : -range.shearMinKN[member]!;
      most = Math.max(
        most,
        vehicle * of(traffic.vehicle) +
          uniform * of(traffic.uniform) +
          brakingKN * Math.abs(braking.shearKN[member]!),
      );
    }
    worst = Math.max(worst, sum + most);
  }
  return worst;
}
