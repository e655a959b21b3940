import { materials } from '../../actions/index.ts';
import type { WallLoad } from '../../model/index.ts';
import { boxData } from '../concrete-box/boxData.ts';
import { youngTensionMPa } from '../concrete-box/freshTension.ts';
import { tendonStress, type TendonStress } from '../concrete-box/tendonForce.ts';
import { slabDeckData } from '../slab/slabDeckData.ts';
import { combinations, worstMoment } from './combine.ts';
import { deckDesignNodes, type ChainEffects, type FrameModel } from './frameModel.ts';
import { spanAt } from './frameShape.ts';
import type { FrameTraffic } from './frameTraffic.ts';
import { portalData } from './portalData.ts';

/** Draped tendons of the deck, from the outer face of one wall to that of the other, side by side. */
export interface FrameTendons {
  readonly count: number;
  readonly strands: number;
  readonly mostStrands: number;
  readonly ductM: number;
  readonly areaM2: number;
  /** Axis below the top at the nodes; 0 in the walls. */
  readonly levelM: Float64Array;
  readonly stress: TendonStress;
  /** Force after all losses and before the lasting ones, and what service asks for, kN. */
  readonly forceKN: number;
  readonly initialKN: number;
  readonly needKN: number;
  /** Restraint of the lasting force by the walls, on stiff and on soft feet. */
  readonly parasitic: readonly ChainEffects[];
  /** Greatest compression in the characteristic combination and tension on the day of stressing, MPa, with their limits. */
  readonly compression: { readonly stressMPa: number; readonly limitMPa: number };
  readonly freshTension: { readonly stressMPa: number; readonly limitMPa: number };
}

/** Shares of the greatest drape that are tried where tendons run over a wall in the middle. */
const drapes: readonly number[] = [1, 0.85, 0.7, 0.55, 0.4, 0.25, 0.1];
/** Shares of the step to the drape beside at which more are tried where none of those holds. */
const between = [0.25, 0.5, 0.75] as const;

/**
 * Fewest strands with which the deck stays compressed (EN, frequent) or within its tension (AASHTO, Service III). In one
 * span they hang as low as they can; over a wall in the middle a drape that serves the spans bends the deck there, so that
 * of several drapes the one with the fewest strands is taken that stays within its stresses on the day of stressing too.
 * @param atLeast strands that something else asks for
 */
export function frameTendons(model: FrameModel, traffic: FrameTraffic, atLeast = 0): FrameTendons {
  if (model.task.spansM.length === 1) return tendonsAt(model, traffic, atLeast, 1);
  const tried = (drape: number) => {
    const tendons = tendonsAt(model, traffic, atLeast, drape);
    return { drape, tendons, over: overUsed(tendons) };
  };
  const better = (a: ReturnType<typeof tried>, b: typeof a): typeof a =>
    b.over < a.over || (b.over === a.over && b.tendons.strands < a.tendons.strands) ? b : a;
  const coarse = drapes.map(tried).reduce(better);
  if (coarse.over === 1) return coarse.tendons;
  // One that holds may lie between two that do not: too much of it on the day of stressing, too little in service.
  const i = drapes.indexOf(coarse.drape);
  const beside = [drapes[i - 1], drapes[i + 1]].filter((drape) => drape !== undefined);
  return beside
    .flatMap((other) => between.map((share) => tried(coarse.drape + share * (other - coarse.drape))))
    .reduce(better, coarse).tendons;
}

/** Greatest use of what a drape has to hold: force in service, compression, tension on the day of stressing; 1 where all do. */
function overUsed({ needKN, forceKN, compression, freshTension }: FrameTendons): number {
  const most = Math.max(
    needKN / forceKN,
    compression.stressMPa / compression.limitMPa,
    freshTension.stressMPa / freshTension.limitMPa,
  );
  // Strands are whole numbers of what is needed but for rounding.
  return most <= 1 + 1e-5 ? 1 : most;
}

function tendonsAt(model: FrameModel, traffic: FrameTraffic, atLeast: number, drape: number): FrameTendons {
  const { shape, standardId, task } = model;
  const { sections } = shape;
  const strandM2 = boxData.strandAreaMm2[standardId] * 1e-6;
  const soffitM = task.deck.widthM - 2 * shape.wingM;
  const { sizes } = boxData.tendons;
  const usual = Math.max(2, Math.floor(soffitM / slabDeckData.tendons.usualM));
  const mostCount = Math.max(2, Math.floor(soffitM / slabDeckData.tendons.closestM));
  const largest = sizes[sizes.length - 1]!;
  const mostStrands = mostCount * largest.strands;
  const levelM = tendonLevels(model, drape);
  const arm = (node: number): number => levelM[node]! - sections[node]!.outerM;
  const unit = model.cases.map(({ run }) => run(restrained(model, arm)));
  const frequent = combinations(model, traffic, 'frequent', null);
  const spread = boxData.prestressSpread[standardId];
  const tensionKPa = boxData.serviceTensionMPa[standardId] * 1e3;
  const sizeFor = (strands: number) => sizes.find((size) => size.strands * usual >= strands) ?? largest;
  const around = (ductM: number): number =>
    standardId === 'lm1' ? ductM / 2 + boxData.decompressedAroundDuctM.value : Infinity;

  const needFor = (ductM: number): number => {
    let most = 0;
    for (const node of deckDesignNodes(model.shape))
      frequent.forEach((combination, k) => {
        const { areaM2, inertiaM4, outerM, depthM } = sections[node]!;
        const e = arm(node);
        for (const sign of [1, -1] as const) {
          const far =
            sign > 0 ? Math.min(depthM - outerM, e + around(ductM)) : Math.min(outerM, around(ductM) - e);
          const { momentKNm, thrustKN } = worstMoment(combination, node, sign);
          const tension = (momentKNm * far) / inertiaM4 - thrustKN / areaM2 - tensionKPa;
          if (!(tension > 0)) continue;
          const pressed =
            (1 + unit[k]!.thrustKN[node]!) / areaM2 +
            (sign * (e - unit[k]!.momentKNm[node]!) * far) / inertiaM4;
          most = Math.max(most, pressed > 0 ? tension / (spread * pressed) : Infinity);
        }
      });
    return most;
  };

  let strands = Math.max(atLeast, Math.round(mostStrands / 3));
  for (let pass = 1; ; pass++) {
    const { ductM } = sizeFor(strands);
    const jackMPa = boxData.jacking[standardId] * materials.strand[standardId].ultimateMPa;
    const axialMPa = (strands * strandM2 * jackMPa) / sections[shape.middles[0]!]!.areaM2;
    // From hogging to sagging within half the span the tendon turns twice as much as one that only sags; of more spans the
    // losses count that already.
    const turns = task.spansM.length === 1 ? 2 : 1;
    const sagM =
      turns * drape * (shape.midspanM - portalData.tendons.lowFromSoffitM - portalData.tendons.kneeTopM);
    const stress = tendonStress(
      { standardId, task, lengthM: shape.lengthM, concrete: model.concrete },
      Math.max(0.05, sagM),
      Math.min(axialMPa, model.concrete.fckMPa / 2),
    );
    const perStrandKN = stress.lastingMPa * strandM2 * 1e3;
    const needKN = needFor(ductM);
    const wanted = Math.ceil(needKN / perStrandKN - 1e-6);
    const next = Math.min(mostStrands, Math.max(2 * sizes[0]!.strands, atLeast, wanted));
    if (pass < 3 && Math.abs(next - strands) > 0.01 * next) {
      strands = next;
      continue;
    }
    const forceKN = next * perStrandKN;
    const initialKN = next * strandM2 * stress.initialMPa * 1e3;
    const size = sizeFor(next);
    return {
      count: size.strands * usual >= next ? usual : Math.min(mostCount, Math.ceil(next / size.strands)),
      strands: next,
      mostStrands,
      ductM: size.ductM,
      areaM2: next * strandM2,
      levelM,
      stress,
      forceKN,
      initialKN,
      needKN,
      parasitic: unit.map((one) => scaled(one, forceKN)),
      ...stressesOf(model, traffic, unit, arm, forceKN, initialKN),
    };
  }
}

/** Axis of the tendons below the top: high at the walls, low at midspan, two parabolas that meet at the inflection. */
function tendonLevels({ shape }: FrameModel, drape: number): Float64Array {
  const { nodes, knees, supportsM, midspanM } = shape;
  const { kneeTopM, lowFromSoffitM, inflection } = portalData.tendons;
  const drop = drape * Math.max(0.01, midspanM - lowFromSoffitM - kneeTopM);
  const levels = new Float64Array(nodes.length);
  for (let i = knees[0]; i <= knees[1]; i++) {
    const x = nodes[i]![0];
    const span = spanAt(supportsM, x);
    const [from, to] = [supportsM[span]!, supportsM[span + 1]!];
    const u = Math.min(1, (2 * Math.min(x - from, to - x)) / (to - from));
    levels[i] =
      kneeTopM + drop * (u < inflection ? u ** 2 / inflection : 1 - (1 - u) ** 2 / (1 - inflection));
  }
  return levels;
}

/** What a tendon force of 1 kN would do to the deck if nothing held it. */
function restrained(
  { shape, concrete: { ecmMPa } }: FrameModel,
  arm: (node: number) => number,
): { readonly strain: Float64Array; readonly curvature1PerM: Float64Array } {
  const { nodes, knees, sections } = shape;
  const strain = new Float64Array(nodes.length - 1);
  const curvature1PerM = new Float64Array(nodes.length - 1);
  for (let e = knees[0]; e < knees[1]; e++) {
    const a = sections[e]!;
    const b = sections[e + 1]!;
    strain[e] = -2 / (a.areaM2 + b.areaM2) / (ecmMPa * 1e3);
    curvature1PerM[e] = -(arm(e) + arm(e + 1)) / (a.inertiaM4 + b.inertiaM4) / (ecmMPa * 1e3);
  }
  return { strain, curvature1PerM };
}

function scaled(effects: ChainEffects, factor: number): ChainEffects {
  const foot = ({ verticalKN, alongKN, momentKNm }: WallLoad): WallLoad => ({
    verticalKN: factor * verticalKN,
    alongKN: factor * alongKN,
    momentKNm: factor * momentKNm,
  });
  const times = (values: Float64Array): Float64Array => values.map((value) => factor * value);
  return {
    momentKNm: times(effects.momentKNm),
    thrustKN: times(effects.thrustKN),
    shearKN: times(effects.shearKN),
    feet: effects.feet.map(foot),
    middlesM: effects.middlesM.map((value) => factor * value),
  };
}

function stressesOf(
  model: FrameModel,
  traffic: FrameTraffic,
  unit: readonly ChainEffects[],
  arm: (node: number) => number,
  forceKN: number,
  initialKN: number,
): Pick<FrameTendons, 'compression' | 'freshTension'> {
  const { fckMPa } = model.concrete;
  const { total, transfer, strengthAtTransfer } = boxData.compression;
  const young = youngTensionMPa(model);
  const all = combinations(model, traffic, 'characteristic', null);
  let compression = { stressMPa: 0, limitMPa: total * fckMPa };
  let freshTension = { stressMPa: 0, limitMPa: young };
  const note = (stressMPa: number, limitMPa: number): void => {
    if (stressMPa / limitMPa > compression.stressMPa / compression.limitMPa)
      compression = { stressMPa, limitMPa };
  };
  for (const node of deckDesignNodes(model.shape)) {
    const { areaM2, inertiaM4, outerM, depthM } = model.shape.sections[node]!;
    model.cases.forEach((one, k) => {
      const axial = (1 + unit[k]!.thrustKN[node]!) / areaM2;
      const bent = unit[k]!.momentKNm[node]! - arm(node);
      for (const sign of [1, -1] as const) {
        // The face opposite to the one that the combination pulls.
        const far = sign > 0 ? outerM : depthM - outerM;
        const { momentKNm, thrustKN } = worstMoment(all[k]!, node, sign);
        const kPa =
          thrustKN / areaM2 + forceKN * axial + ((momentKNm + sign * forceKN * bent) * far) / inertiaM4;
        note(kPa / 1e3, total * fckMPa);
        const g = one.own.momentKNm[node]! + initialKN * bent;
        const fresh =
          (initialKN * axial + one.own.thrustKN[node]! / areaM2 + (sign * g * far) / inertiaM4) / 1e3;
        note(fresh, transfer * strengthAtTransfer * fckMPa);
        if (-fresh > freshTension.stressMPa) freshTension = { stressMPa: -fresh, limitMPa: young };
      }
    });
  }
  return { compression, freshTension };
}
