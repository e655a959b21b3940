import type { Check } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import { crackedZone } from './crackedSection.ts';
import { materials } from '../../actions/index.ts';
import type { FaceNeed } from './barNeeds.ts';
import { slabDeckData } from './slabDeckData.ts';
import type { SlabModel } from './slabModel.ts';

/**
 * Deflection in the middle of the worst span: under traffic, and of reinforced slabs under lasting loads with creep.
 * @param low bars of the soffit as placed, m2 at the stations
 */
export function deflectionChecks(model: SlabModel, need: FaceNeed, low: Float64Array): Check[] {
  const { spansM } = model.task;
  const { limitRatio } = model.standard.deflection;
  const worst = (make: (span: number) => Check): Check =>
    spansM.map((_, span) => make(span)).reduce((a, b) => (b.utilisation > a.utilisation ? b : a));
  const { overSpan, creep } = slabDeckData.lastingDeflection;
  const traffic = worst((span) =>
    check(
      'deflection',
      'deflection under traffic',
      model.traffic.deflection[span]! / stiffness(model, need, low, span, 0),
      spansM[span]! / limitRatio,
      'm',
    ),
  );
  if (model.prestressed) return [traffic];
  const lasting = worst((span) => {
    const at = middle(model, span);
    const elastic = model.own.effects.deflectionM[at]! + model.superimposed.deflectionM[at]!;
    return check(
      'deflection-lasting',
      'deflection under lasting loads with creep',
      elastic / stiffness(model, need, low, span, creep),
      spansM[span]! / overSpan,
      'm',
    );
  });
  return [traffic, lasting];
}

function middle({ beam }: SlabModel, span: number): number {
  return (beam.supportAt[span]! + beam.supportAt[span + 1]!) >> 1;
}

/** Stiffness of the deck, kNm2: uncracked with prestress; else between cracked and uncracked curvature, EN 1992-1-1 7.4.3 (from memory). */
function stiffness(model: SlabModel, need: FaceNeed, low: Float64Array, span: number, creep: number): number {
  const { ecmMPa, fctmMPa } = model.concrete;
  const eKNm2 = (ecmMPa * 1e3) / (1 + creep);
  const gross = model.span.inertiaM4;
  if (model.prestressed) return eKNm2 * gross;
  const at = middle(model, span);
  const moment =
    model.own.effects.momentKNm[at]! +
    model.superimposed.momentKNm[at]! +
    model.traffic.evenShare * model.traffic.most.momentMaxKNm[at]!;
  const cracking = (fctmMPa * 1e3 * gross) / model.span.lowM;
  const share = moment > cracking ? 1 - 0.5 * (cracking / moment) ** 2 : 0;
  const n = (materials.reinforcement[model.standardId].eMPa * 1e3) / eKNm2;
  const strip = { depthM: model.task.depthM, effectiveM: need.effectiveM, barM: need.barM };
  const cracked = need.widthM * crackedZone(strip, low[at]! / need.widthM, n).inertiaM4;
  return eKNm2 / (share / cracked + (1 - share) / gross);
}
