import { combinations, type Action, type Combination } from './combine.ts';
import type { ChainEffects, FrameModel } from './frameModel.ts';
import type { FrameTraffic } from './frameTraffic.ts';
import { portalData } from './portalData.ts';

type Parasitic = readonly ChainEffects[] | null;

/** What stands beside every accident: permanent loads, fill with its least or at rest and prestress, all with a factor of 1. */
function standing(model: FrameModel, parasitic: Parasitic, k: number): Action[] {
  const { own, superimposed, earth } = model.cases[k]!;
  const { activePressure, restPressure } = portalData.earth;
  return [
    [[own, 1]],
    [[superimposed, 1]],
    [
      [earth, activePressure],
      [earth, restPressure],
    ],
    ...(parasitic ? [[[parasitic[k]!, 1]] satisfies Action] : []),
  ];
}

/**
 * A wall struck either way, on stiff and on soft feet, beside what stands and the usual share of temperature, without traffic
 * (EN 1990 6.4.3.3, from memory; the share of temperature that is there most of the time is that of the frequent one, table
 * A2.1).
 */
function struckCombinations(model: FrameModel, traffic: FrameTraffic, parasitic: Parasitic): Combination[] {
  const { temperature, service, cracked } = portalData;
  const warm = service.frequentTemperature * (model.prestressed ? 1 : cracked.share);
  const perK = temperature.expansion1PerK / 1e-5;
  return model.cases.flatMap((one, k) =>
    one.strikes.flat().map((strike): Combination => ({
      traffic: traffic.cases[k]!,
      braking: one.braking,
      shares: [],
      actions: [
        ...standing(model, parasitic, k),
        [
          [one.longer, warm * perK * temperature.warmerK],
          [one.longer, -warm * perK * temperature.colderK],
        ],
        [
          [one.topWarmer, warm * temperature.topWarmerK],
          [one.topWarmer, -warm * temperature.topCoolerK],
        ],
        eitherWay(strike, 1),
      ],
    })),
  );
}

/**
 * An earthquake along the road either way, on stiff and on soft feet, beside what stands, without traffic and without imposed
 * movements (EN 1990 6.4.3.4 and EN 1998-2 5.5, from memory). The fill does not hold the frame back. At rest it presses as
 * hard as active fill that is shaken by 0.2 g, three quarters of the acceleration added to its coefficient (Seed and Whitman
 * 1970, from memory): harder shaking adds nothing here, and a rule says so.
 */
function quakeCombinations(model: FrameModel, traffic: FrameTraffic, parasitic: Parasitic): Combination[] {
  const { quakeShare = 0 } = model.task;
  if (!(quakeShare > 0)) return [];
  return model.cases.map((one, k) => ({
    traffic: traffic.cases[k]!,
    braking: one.braking,
    shares: [],
    actions: [...standing(model, parasitic, k), eitherWay(one.weightAlong, quakeShare)],
  }));
}

const eitherWay = (effects: ChainEffects, factor: number): Action => [
  [effects, factor],
  [effects, -factor],
];

/**
 * All that a frame has to be strong for: the ultimate limit state, its walls struck, an earthquake.
 * @param parasitic restraint of the prestress on each kind of feet, or null
 */
export const strengthCombinations = (
  model: FrameModel,
  traffic: FrameTraffic,
  parasitic: Parasitic,
): Combination[] => [
  ...combinations(model, traffic, 'ultimate', parasitic),
  ...struckCombinations(model, traffic, parasitic),
  ...quakeCombinations(model, traffic, parasitic),
];
