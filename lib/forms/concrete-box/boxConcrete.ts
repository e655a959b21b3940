import {
  concrete,
  lightConcrete,
  loadStandard,
  materials,
  type Concrete,
  type LightConcrete,
} from '../../actions/index.ts';
import type { LineBeam } from '../../mechanics/index.ts';
import type { MeasuredLine, UnitTask } from '../../model/index.ts';
import { measured } from '../common/measured.ts';
import { supportPositions } from '../common/supports.ts';
import { boxData } from './boxData.ts';

/** What a box is made of: ordinary concrete, and lightweight concrete about the middles of some spans or in all of it. */
export interface BoxConcrete {
  readonly concrete: Concrete;
  readonly light: LightConcrete | null;
  /** Share of a stretch from one place to another, m, that is lightweight. */
  readonly lightShare: (fromM: number, toM: number) => number;
}

/** A model that has the concrete of its box. */
type Made = BoxConcrete & { readonly task: UnitTask };

/** The concrete that a task asks for; what it asks is checked before, see `boxFaults`. */
export function boxConcrete({
  standard,
  spansM,
  strengthMPa = materials.concreteDefaultMPa[standard].box,
  light,
}: UnitTask): BoxConcrete {
  const ordinary = concrete(standard, strengthMPa);
  if (!light) return { concrete: ordinary, light: null, lightShare: () => 0 };
  const supportsM = supportPositions(spansM);
  const stretches = (light.middleM ?? spansM).map((lengthM, span) => {
    const middleM = supportsM[span]! + spansM[span]! / 2;
    return [middleM - lengthM / 2, middleM + lengthM / 2] as const;
  });
  return {
    concrete: ordinary,
    light: lightConcrete(standard, strengthMPa, light.densityKgM3),
    lightShare(fromM, toM) {
      let sum = 0;
      for (const [a, b] of stretches) sum += Math.max(0, Math.min(b, toM) - Math.max(a, fromM));
      return sum / (toM - fromM);
    },
  };
}

/** Weight of the concrete of a stretch, kN/m3. */
export function weightOver({ task, light, lightShare }: Made, fromM: number, toM: number): number {
  const ordinary = loadStandard(task.standard).unitWeights.concreteKNm3;
  return light ? ordinary + lightShare(fromM, toM) * (light.unitWeightKNm3 - ordinary) : ordinary;
}

/** Weight of the concrete about the stations of a beam, half way to the next ones, kN/m3. */
export function weightAlong(made: Made, xM: Float64Array): Float64Array {
  return xM.map((x, i) => weightOver(made, (x + (xM[i - 1] ?? x)) / 2, (x + (xM[i + 1] ?? x)) / 2));
}

/** Modulus at a place over that of the ordinary concrete. */
export function stiffnessAt({ concrete: ordinary, light, lightShare }: BoxConcrete, xM: number): number {
  return light && lightShare(xM - nearM, xM + nearM) > 0.5 ? light.ecmMPa / ordinary.ecmMPa : 1;
}

/** Half of what a place reaches to, m. */
const nearM = 1e-3;

/** A model as an element of its beam sees it: of lightweight concrete wherever there is any of it. */
export function ofElement<T extends BoxConcrete & { readonly beam: LineBeam }>(model: T, e: number): T {
  const { light, lightShare, beam } = model;
  return light && lightShare(beam.xM[e]!, beam.xM[e + 1]!) > 0 ? { ...model, concrete: light } : model;
}

/** Lightweight concrete of a deck, m3, from its area at the stations. */
export function lightM3({ lightShare }: BoxConcrete, xM: Float64Array, areaM2: Float64Array): number {
  let sum = 0;
  for (let e = 0; e < xM.length - 1; e++) {
    const lengthM = xM[e + 1]! - xM[e]!;
    sum += lightShare(xM[e]!, xM[e + 1]!) * ((areaM2[e]! + areaM2[e + 1]!) / 2) * lengthM;
  }
  return sum;
}

/** What is laid on the joined deck, kN/m: on all of it, or by span where there is ballast. */
export function laidKNm({ deck, spansM, ballastKNm }: UnitTask): number | number[] {
  return ballastKNm
    ? spansM.map((_, span) => deck.superimposedKNm + ballastKNm[span]!)
    : deck.superimposedKNm;
}

/** Ballast of a deck, kN. */
const ballastKN = ({ spansM, ballastKNm }: UnitTask): number =>
  ballastKNm ? spansM.reduce((sum, spanM, span) => sum + spanM * ballastKNm[span]!, 0) : 0;

/** Measured lines of what a box has besides ordinary concrete. */
export function madeLines(made: Made, xM: Float64Array, areaM2: Float64Array): MeasuredLine[] {
  const { task, light } = made;
  const lines: MeasuredLine[] = [];
  if (light)
    lines.push(
      measured(
        'deck',
        'light-concrete',
        lightM3(made, xM, areaM2),
        'box of lightweight concrete',
        `${task.light!.densityKgM3} kg/m3 oven-dry${task.light!.middleM ? ' about the middles of spans' : ''}, placed`,
      ),
    );
  const kN = ballastKN(task);
  if (kN > 0)
    lines.push(
      measured(
        'deck',
        'fill',
        kN / boxData.ballast.weightKNm3,
        'ballast in the cells',
        `${kN.toFixed(0)} kN of gravel at ${boxData.ballast.weightKNm3} kN/m3`,
      ),
    );
  return lines;
}

/** Named figures of the same; none for a box of the usual concrete. */
export function madeFigures(made: Made, xM: Float64Array, areaM2: Float64Array): Record<string, number> {
  const { task, concrete: ordinary, light } = made;
  const kN = ballastKN(task);
  return {
    ...(task.strengthMPa === undefined ? {} : { concreteStrengthMPa: ordinary.fckMPa }),
    ...(light
      ? {
          lightM3: lightM3(made, xM, areaM2),
          lightWeightKNm3: light.unitWeightKNm3,
          lightModulusMPa: light.ecmMPa,
          lightShearShare: light.shearShare,
        }
      : {}),
    ...(kN > 0 ? { ballastKN: kN } : {}),
  };
}
