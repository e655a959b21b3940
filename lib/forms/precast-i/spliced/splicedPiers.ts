import { materials } from '../../../actions/index.ts';
import type { SectionPoint } from '../../../mechanics/index.ts';
import { barDesignMPa } from '../../common/bars.ts';
import { elementsPerSpan } from '../../common/precast/precastModel.ts';
import { pretensioned } from '../../common/precast/pretensioned.ts';
import type { PierContinuity } from '../../common/precast/pierBars.ts';
import type { SplicedModel } from './splicedModel.ts';
import { splicedData } from './splicedData.ts';
import type { SizedTendons } from './sizeTendons.ts';

/**
 * Hogging over inner support `pier` (1 is the first) at ultimate: tendons near the top and bars of the slab against the bottom
 * flange, with a solid web right at the pier and the beam itself beside it; the bars are what tendons leave, a share of the slab at least.
 */
export function splicedPier(model: SplicedModel, sized: SizedTendons, pier: number): PierContinuity {
  const { composite, shape, beam, task } = model;
  const i = beam.supportAt[pier]!;
  const wide = shape.bottomWidthM;
  const solid: readonly SectionPoint[] = [
    [wide / 2, 0],
    [wide / 2, shape.depthM],
    [-wide / 2, shape.depthM],
    [-wide / 2, 0],
  ];
  const over = hogging(model, sized, i, 0, solid);
  const solidM = splicedData.pierSolidOverDepth.value * shape.depthM;
  const beside = [
    hogging(model, sized, i - 1, 1 - share(solidM, task.spansM[pier - 1]!), shape.points),
    hogging(model, sized, i, share(solidM, task.spansM[pier]!), shape.points),
  ];
  const barsM2 = Math.max(over.barsM2, ...beside.map((one) => one.barsM2));
  return {
    hogDesignKNm: over.designKNm,
    topBarsM2: barsM2,
    bottomBarsM2: 0,
    ratio: barsM2 / (composite.effectiveWidthM * composite.slabM),
    pressed: Math.max(over.pressed, ...beside.map((one) => one.pressed)),
  };
}

/** Distance from a pier as part of the way to the next station. */
const share = (distanceM: number, spanM: number): number =>
  Math.min(1, (distanceM * elementsPerSpan) / spanM);

/** Hogging at ultimate `t` of the way from station `i` to the next: moment, bars, depth of the block over the deepest allowed. */
function hogging(
  model: SplicedModel,
  { tendons, moments }: SizedTendons,
  i: number,
  t: number,
  points: readonly SectionPoint[],
): { readonly designKNm: number; readonly barsM2: number; readonly pressed: number } {
  const { composite, beamConcrete, standard, standardId, most, superimposed } = model;
  const { uls } = standard.factors;
  const first = tendons.first * model.tendonM2;
  const second = (tendons.strands - tendons.first) * model.tendonM2;
  const at = (values: Float64Array): number =>
    t === 0 ? values[i]! : values[i]! + t * (values[i + 1]! - values[i]!);
  const parasitic =
    1e3 * tendons.lastingMPa * (first * at(moments.bareParasitic) + second * at(moments.wholeParasitic));
  const designKNm = Math.max(
    0,
    -(
      uls.permanent * (at(model.ownKNmAt) + at(model.wetKNmAt)) +
      uls.superimposed * at(superimposed.momentKNm) +
      uls.traffic * at(most.momentMinKNm) +
      parasitic
    ),
  );
  const tendonKN =
    ((first + second) * materials.strand[standardId].proofMPa * 1e3) / standard.resistance.prestress;
  const fy = barDesignMPa(standardId) * 1e3;
  const barD = composite.topM - pretensioned.continuity.barAxisM;
  const leastM2 = splicedData.pierBarsRatio.value * composite.effectiveWidthM * composite.slabM;
  // The pull at the level of tendons and least bars together.
  const d = (tendonKN * at(moments.zM) + leastM2 * fy * barD) / (tendonKN + leastM2 * fy);
  const { forceKN, blockM } = pressedFromSoffit(points, beamConcrete.fcdMPa, d, designKNm);
  const missingKN = forceKN - tendonKN - leastM2 * fy;
  return {
    designKNm,
    barsM2: leastM2 + Math.max(0, missingKN) / fy,
    pressed: blockM / (pretensioned.ultimate.deepestBlock * d),
  };
}

/**
 * Force of the stress block in the lower part of a beam, kN, and its depth, m, for a moment about a pull at `d` above the
 * soffit; the whole depth where the beam cannot give it.
 */
function pressedFromSoffit(
  points: readonly SectionPoint[],
  fcdMPa: number,
  d: number,
  momentKNm: number,
): { readonly forceKN: number; readonly blockM: number } {
  const step = 0.01;
  let forceKN = 0;
  let resistedKNm = 0;
  for (let z = step / 2; z < d; z += step) {
    const slice = fcdMPa * 1e3 * widthAt(points, z) * step;
    const gained = slice * (d - z);
    if (resistedKNm + gained >= momentKNm) {
      const part = (momentKNm - resistedKNm) / gained;
      return { forceKN: forceKN + part * slice, blockM: z - step / 2 + part * step };
    }
    forceKN += slice;
    resistedKNm += gained;
  }
  return { forceKN, blockM: d };
}

/** Width of a symmetrical outline without holes at a height, m. */
function widthAt(points: readonly SectionPoint[], z: number): number {
  let half = 0;
  for (let i = 0; i < points.length; i++) {
    const [y0, z0] = points[i]!;
    const [y1, z1] = points[(i + 1) % points.length]!;
    if (z0 > z !== z1 > z) half = Math.max(half, y0 + ((z - z0) / (z1 - z0)) * (y1 - y0));
  }
  return 2 * half;
}
