import { launchStages } from '../../mechanics/index.ts';
import { boxData } from './boxData.ts';
import type { BoxModel } from './boxModel.ts';
import type { OwnWeight } from './boxLoads.ts';
import type { SectionsAlong } from './sectionsAlong.ts';

/** A deck on its way over the piers. */
export interface LaunchedDeck {
  readonly sagKNm: number;
  readonly hogKNm: number;
  /** Concentric force that keeps the tension within what a passing stage may have, kN. */
  readonly forceKN: number;
  /** Greatest compression on the way, MPa. */
  readonly compressionMPa: number;
}

interface Shares {
  readonly sag: number;
  readonly hog: number;
}

const kept = new Map<string, Shares>();

/**
 * Moments of launching with a nose and the centred force they ask for: every section passes every place, so that top and
 * bottom both meet the greatest hogging and sagging moment.
 */
export function launchedDeck(model: BoxModel, sections: SectionsAlong, own: OwnWeight): LaunchedDeck {
  const { spansM } = model.task;
  const longest = Math.max(...spansM);
  const { tensionMPa } = boxData.launching;
  const weightKNm = own.loadKNm[(own.loadKNm.length - 1) >> 1]!;
  const { sag, hog } = momentShares(spansM);
  const sagKNm = sag * weightKNm * longest ** 2;
  const hogKNm = hog * weightKNm * longest ** 2;
  const { areaM2, inertiaM4, topM, lowM } = sections.span;
  const worst = Math.max((-hogKNm * topM) / inertiaM4, (sagKNm * lowM) / inertiaM4);
  const press = Math.max((-hogKNm * lowM) / inertiaM4, (sagKNm * topM) / inertiaM4);
  const forceKN = Math.max(0, areaM2 * (worst - tensionMPa * 1e3));
  return { sagKNm, hogKNm, forceKN, compressionMPa: (forceKN / areaM2 + press) / 1e3 };
}

/** Greatest moments over w L2 of the longest span; they depend on the proportions of the spans alone. */
function momentShares(spansM: readonly number[]): Shares {
  const longest = Math.max(...spansM);
  // The longest span and what has passed before it decide; more spans behind change nothing that matters.
  const at = spansM.indexOf(longest);
  const some = spansM.slice(Math.max(0, at - 2), at + 2).map((span) => span / longest);
  const key = some.map((span) => span.toFixed(4)).join();
  const known = kept.get(key);
  if (known) return known;
  const { noseOverSpan, noseOverDeckWeight, noseOverDeckStiffness, yardOverSpan } = boxData.launching;
  const { sagKNm, hogKNm } = launchStages({
    spansM: some,
    weightKNm: 1,
    noseM: noseOverSpan,
    noseKNm: noseOverDeckWeight,
    noseStiffness: noseOverDeckStiffness,
    yardSpansM: [yardOverSpan, yardOverSpan],
    steps: 5,
  });
  const made = { sag: sagKNm, hog: hogKNm };
  if (kept.size >= 64) kept.clear();
  kept.set(key, made);
  return made;
}
