import { concrete, type LoadStandard } from '../../actions/index.ts';
import { barDesignMPa } from '../common/bars.ts';
import { cableData } from './cableData.ts';
import { legArea, legInertia, legMoment, type HollowLeg } from './hollowLeg.ts';

/** What one leg of a pylon carries; characteristic, one plane of stays. */
export interface PylonDemand {
  readonly standard: LoadStandard;
  /** Highest anchorage above the deck and road above ground, m. */
  readonly aboveM: number;
  readonly belowM: number;
  /** Between the two legs, m. */
  readonly planesM: number;
  /** Vertical pull of the stays, kN. */
  readonly permanentKN: number;
  readonly trafficKN: number;
  /** Greatest movement of the top under traffic, m. */
  readonly topMovementM: number;
  /** Wind on the stays of one plane that reaches the pylon, kN. */
  readonly stayWindKN: number;
}

export interface SizedPylon {
  /** Along and across the road at the foot, m. */
  readonly lengthM: number;
  readonly widthM: number;
  readonly wallM: number;
  readonly topLengthM: number;
  readonly topWidthM: number;
  readonly barRatio: number;
  /** Concrete of both legs above and below the deck, and of crossbeams, m3. */
  readonly aboveM3: number;
  readonly belowM3: number;
  readonly crossbeamsM3: number;
  readonly crossbeamLevelsM: readonly number[];
  readonly barsKg: number;
  /** Horizontal stiffness of one leg at its top, kN/m. */
  readonly stiffnessKNPerM: number;
  readonly utilisation: number;
  readonly governs: 'traffic' | 'wind' | 'free-standing' | 'lasting stress';
  readonly lastingStressMPa: number;
  readonly baseMomentKNm: number;
}

const gravityKNm3 = 25;
const windFactor = 1.5;
const windWithTraffic = 0.6;

/**
 * Slenderest pair of hollow legs that holds stays, traffic and wind with a practical share of bars. Legs are fixed at the
 * foot and held along the road at the top by the stays; across it they form a frame with crossbeams. Second order by
 * 1 / (1 - N / Ncr) with an effective length of 0.7 of the height along and once the height across.
 */
export function sizePylon(demand: PylonDemand): SizedPylon {
  const p = cableData.pylon;
  const heightM = demand.aboveM + demand.belowM;
  const least = Math.max(p.leastLengthM, p.lengthOverHeight.least * heightM);
  const most = Math.max(least, p.lengthOverHeight.most * heightM);
  const ratios = [p.barRatioLeast, 0.5 * (p.barRatioLeast + p.barRatioMost), p.barRatioMost];
  let best: SizedPylon | null = null;
  for (let lengthM = Math.ceil(least / p.stepM) * p.stepM; lengthM <= most + 1e-9; lengthM += p.stepM) {
    for (const barRatio of ratios) {
      const trial = tryLegs(demand, lengthM, barRatio);
      if (best === null || trial.utilisation < best.utilisation) best = trial;
      if (trial.utilisation <= 1) return trial;
    }
  }
  return best!;
}

function tryLegs(demand: PylonDemand, lengthM: number, barRatio: number): SizedPylon {
  const p = cableData.pylon;
  const { standard } = demand;
  const { uls } = standard.factors;
  const heightM = demand.aboveM + demand.belowM;
  const widthM = Math.max(p.leastTopM * 0.9, p.widthOverLength * lengthM);
  const wallM = Math.max(p.leastWallM, p.wallOverLength * lengthM);
  const topLengthM = Math.max(Math.min(lengthM, p.leastTopM), p.topOverBase * lengthM);
  const topWidthM = Math.max(Math.min(widthM, p.leastTopM * 0.9), p.topOverBase * widthM);
  const concreteOf = concrete(standard.id, p.fckMPa);
  const eMPa = concreteOf.ecmMPa * p.crackedStiffness;
  const fyd = barDesignMPa(standard.id);
  const along: HollowLeg = { depthM: lengthM, widthM, wallM, barRatio };
  const across: HollowLeg = { depthM: widthM, widthM: lengthM, wallM, barRatio };

  const areaTop = legArea({ depthM: topLengthM, widthM: topWidthM, wallM });
  const areaFoot = legArea(along);
  const headM = cableData.pylonHeight.headM;
  const deckShare = demand.belowM / heightM;
  const areaDeck = areaFoot + (areaTop - areaFoot) * deckShare;
  const aboveLegM3 = ((areaDeck + areaTop) / 2) * demand.aboveM + topLengthM * topWidthM * headM * 0.7;
  const belowLegM3 = ((areaFoot + areaDeck) / 2) * demand.belowM;
  const levels = crossbeamLevels(demand);
  const crossbeamM3 = p.crossbeamDepthOverLeg * lengthM * widthM * 0.55 * demand.planesM;
  const crossbeamsM3 = levels.length * crossbeamM3;
  const ownKN = (aboveLegM3 + belowLegM3 + crossbeamsM3 / 2) * gravityKNm3;

  const eiAlong = eMPa * 1000 * legInertia(along);
  const eiAcross = eMPa * 1000 * legInertia(across);
  // A leg tapered to 0.7 is about as stiff at its top as a uniform one of 0.85 of the foot.
  const stiffnessKNPerM = (3 * eiAlong * 0.85 ** 3) / heightM ** 3;
  const eulerAlong = (Math.PI ** 2 * eiAlong * 0.85 ** 3) / (0.7 * heightM) ** 2;
  const eulerAcross = (Math.PI ** 2 * eiAcross * 0.85 ** 3) / heightM ** 2;
  const amplify = (n: number, euler: number): number => (n < 0.95 * euler ? 1 / (1 - n / euler) : 20);

  const windAcrossKNm = p.windPressureKNm2 * p.windDrag * 0.85 * lengthM;
  const windAlongKNm = p.windPressureKNm2 * p.windDrag * 0.85 * widthM;
  const shearKN = windAcrossKNm * heightM + demand.stayWindKN;
  const spacing = Math.max(
    ...levels.map((level, i) => level - (levels[i - 1] ?? -demand.belowM)),
    demand.aboveM - levels.at(-1)!,
  );
  const frameMoment = (shearKN * spacing) / 2;
  const pushPullKN =
    (windAcrossKNm * heightM ** 2 + 2 * demand.stayWindKN * (demand.belowM + 0.8 * demand.aboveM)) /
    demand.planesM;

  const use = (n: number, mAlong: number, mAcross: number): number => {
    const capAlong = legMoment(along, n, concreteOf.fcdMPa, fyd);
    const capAcross = legMoment(across, n, concreteOf.fcdMPa, fyd);
    if (!(capAlong > 0 && capAcross > 0)) return 10 + n / (areaFoot * concreteOf.fcdMPa * 1000);
    return (mAlong * amplify(n, eulerAlong)) / capAlong + (mAcross * amplify(n, eulerAcross)) / capAcross;
  };
  const lean = p.outOfPlumb * heightM * 0.5;
  const nTraffic =
    uls.permanent * (demand.permanentKN + ownKN) +
    uls.traffic * demand.trafficKN +
    windFactor * windWithTraffic * pushPullKN;
  const topKN = stiffnessKNPerM * demand.topMovementM;
  const mTraffic = uls.traffic * topKN * heightM + nTraffic * lean;
  const nWind = uls.permanent * (demand.permanentKN + ownKN) + windFactor * pushPullKN;
  const nFree = uls.permanentFavourable * ownKN;
  const cases: [SizedPylon['governs'], number][] = [
    ['traffic', use(nTraffic, mTraffic, windFactor * windWithTraffic * frameMoment)],
    ['wind', use(nWind, nWind * lean, windFactor * frameMoment)],
    ['free-standing', use(nFree, (windFactor * windAlongKNm * heightM ** 2) / 2, 0)],
  ];
  const lastingStressMPa = (demand.permanentKN + ownKN) / areaFoot / 1000;
  cases.push(['lasting stress', lastingStressMPa / (cableData.slabStress.value * p.fckMPa)]);
  let worst = cases[0]!;
  for (const one of cases) if (one[1] > worst[1]) worst = one;
  const volume = 2 * (aboveLegM3 + belowLegM3) + crossbeamsM3;
  return {
    lengthM,
    widthM,
    wallM,
    topLengthM,
    topWidthM,
    barRatio,
    aboveM3: 2 * aboveLegM3,
    belowM3: 2 * belowLegM3,
    crossbeamsM3,
    crossbeamLevelsM: levels,
    barsKg: volume * barRatio * 7850 * (1 + p.barDetailShare),
    stiffnessKNPerM,
    utilisation: worst[1],
    governs: worst[0],
    lastingStressMPa,
    baseMomentKNm: mTraffic,
  };
}

/** Levels of crossbeams above the deck, m: under the deck, one in the free height above it, more in tall legs below. */
function crossbeamLevels({ aboveM, belowM }: PylonDemand): number[] {
  const levels: number[] = [];
  const below = Math.floor(belowM / 60);
  for (let i = below; i > 0; i--) levels.push(-(belowM * i) / (below + 1));
  levels.push(-2);
  const above = Math.max(1, Math.floor(aboveM / 45));
  for (let i = 1; i <= above; i++) levels.push((aboveM * i) / (above + 0.5));
  return levels;
}
