import { materials, type Concrete } from '../../actions/index.ts';
import type { StandardId } from '../../model/index.ts';
import { slabData } from '../common/slab/slabData.ts';
import { slabDeckData } from './slabDeckData.ts';

/** A metre of slab in bending, cracked, bars in its tension face. Lengths m. */
export interface CrackedStrip {
  readonly depthM: number;
  readonly effectiveM: number;
  readonly barM: number;
}

/** Depth of the compression zone, m, and inertia in terms of concrete, m4/m, of a cracked metre with bars `areaM2`. */
export function crackedZone(
  { effectiveM }: CrackedStrip,
  areaM2: number,
  modularRatio: number,
): { readonly zoneM: number; readonly inertiaM4: number } {
  const a = modularRatio * areaM2;
  const zoneM = -a + Math.sqrt(a * a + 2 * a * effectiveM);
  return { zoneM, inertiaM4: zoneM ** 3 / 3 + a * (effectiveM - zoneM) ** 2 };
}

/** Ratio of moduli of bars and concrete under loads of which part lasts. */
export function modularRatio(id: StandardId, { ecmMPa }: Concrete): number {
  return materials.reinforcement[id].eMPa / (slabDeckData.crack.longTermModulusShare * ecmMPa);
}

/**
 * Width of cracks, mm, under a moment: s (eps sm - eps cm) with s = 3.4 c + 0.17 phi / rho (EN 1992-1-1 7.3.4, from
 * memory), at least 0.6 of the bar strain.
 */
export function crackWidthMm(
  strip: CrackedStrip,
  areaM2: number,
  momentKNm: number,
  id: StandardId,
  concrete: Concrete,
): number {
  const { depthM, effectiveM, barM } = strip;
  const n = modularRatio(id, concrete);
  const { zoneM } = crackedZone(strip, areaM2, n);
  const sigmaMPa = momentKNm / (areaM2 * (effectiveM - zoneM / 3)) / 1e3;
  const tiedM = Math.min(2.5 * (depthM - effectiveM), (depthM - zoneM) / 3, depthM / 2);
  const rho = areaM2 / tiedM;
  const { eMPa } = materials.reinforcement[id];
  const stiffened =
    ((slabDeckData.crack.tensionStiffening * concrete.fctmMPa) / rho) * (1 + (eMPa / concrete.ecmMPa) * rho);
  const strain = Math.max(sigmaMPa - stiffened, 0.6 * sigmaMPa) / eMPa;
  return 1e3 * (3.4 * slabDeckData.bars.coverM + (0.17 * barM) / rho) * strain;
}

/** Bars, m2/m, that keep stress and cracks in service within their limits. Moments per metre, kNm. */
export function serviceBars(
  strip: CrackedStrip,
  moments: { readonly frequentKNm: number; readonly characteristicKNm: number },
  id: StandardId,
  concrete: Concrete,
): number {
  const { yieldMPa } = materials.reinforcement[id];
  const leverM = slabData.leverRatio.value * strip.effectiveM;
  const share = id === 'lm1' ? slabDeckData.crack.sigma : slabDeckData.serviceStressShare.value;
  const stressed = Math.max(0, moments.characteristicKNm) / (leverM * share * yieldMPa * 1e3);
  if (id !== 'lm1' || !(moments.frequentKNm > 0)) return stressed;
  const fits = (areaM2: number): boolean =>
    crackWidthMm(strip, areaM2, moments.frequentKNm, id, concrete) <= slabDeckData.crack.widthMm;
  // Wider bars than the ultimate limit could ever use are no answer.
  let high = strip.effectiveM * 0.04;
  let low = Math.max(stressed, 1e-5);
  if (fits(low)) return low;
  if (!fits(high)) return high;
  for (let i = 0; i < 16; i++) {
    const middle = (low + high) / 2;
    if (fits(middle)) high = middle;
    else low = middle;
  }
  return high;
}
