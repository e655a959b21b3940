import type { Design, Facts, Ruling } from '../model/index.ts';
import { evaluate, rulesFor, rulingOf, wholeCondition, withRatios } from '../rules/index.ts';

/**
 * What the rules say of a unit whose depths lie outside a published band: the depth, the band and its sources. Empty inside
 * all bands; a band of something that the form has no figure for says nothing.
 */
export function depthRulings({
  task,
  depthM,
  figures,
}: Pick<Design, 'task' | 'depthM' | 'figures'>): Ruling[] {
  const { form, spansM, deck, method } = task;
  const { edgeGirderM, trussHeightM } = figures;
  const facts: Facts = withRatios({
    mainSpanM: Math.max(...spansM),
    deckWidthM: deck.widthM,
    continuity: spansM.length > 1 ? 'continuous' : 'simple',
    method,
    midspanDepthM: depthM.midspan,
    supportDepthM: depthM.support,
    haunched: depthM.support !== depthM.midspan,
    ...(edgeGirderM === undefined ? {} : { edgeGirderM }),
    ...(trussHeightM === undefined ? {} : { trussHeightM }),
  });
  return rulesFor(form, ['option'])
    .filter(({ subject, otherwise }) => subject === 'depth' && otherwise !== undefined)
    .filter((rule) => evaluate(wholeCondition(rule), facts).missing.size === 0)
    .flatMap((rule) => rulingOf(rule, facts) ?? [])
    .filter(({ effect }) => effect !== 'in favour');
}
