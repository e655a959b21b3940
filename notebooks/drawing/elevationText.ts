import { chainage, fixed, length, level, radiusText } from '../format.ts';
import type { AppraisedOption, Site, Support } from '../model.ts';
import { siteOf } from '../model.ts';
import { roadLevel, spansOf, supportChainages, supportName } from './alongOption.ts';
import { optionTitle } from './optionWords.ts';
import { roadNeeds } from './roadNeeds.ts';
import { likeliest, toeLevel, toeSpread } from './substructure.ts';

const kinds: Readonly<Record<Support['kind'], string>> = {
  abutment: 'abutment',
  pier: 'pier',
  pylon: 'pylon',
  'anchor-pier': 'anchor pier',
};

/** What stands under a support on its likeliest ground, and how far other ground would move it. */
function foundingWords(support: Support): string {
  const foundation = likeliest(support);
  if (foundation === null) return 'foundation not known';
  const spread = toeSpread(support);
  const apart = spread > 0.05 ? ` give or take ${fixed(spread, spread < 5 ? 1 : 0)}` : '';
  const at = `level ${level(toeLevel(foundation))}${apart}`;
  const { piles } = foundation;
  return piles === null
    ? `spread footing founded at ${at}`
    : `${fixed(piles.count, 0)} bored piles of ${level(piles.diameterM)} m with toes at ${at}`;
}

function write(site: Site, option: AppraisedOption): string {
  const own = siteOf(site, option.units);
  const at = supportChainages(option);
  const name = (index: number): string => supportName(index, at.length);
  const spans = spansOf(option).map((span, i) => `${name(i)} to ${name(i + 1)} ${length(span)} m`);
  const supports = option.supports.map((support) => {
    const index = at.findIndex((one) => Math.abs(one - support.chainageM) < 0.06);
    return `${name(index)}, ${kinds[support.kind]} at chainage ${chainage(support.chainageM)}, ${foundingWords(support)}`;
  });
  const { support, midspan } = option.depthM;
  const depth =
    Math.abs(support - midspan) < 0.005
      ? `${level(midspan)} m throughout the main unit`
      : `${level(midspan)} m at midspan and ${level(support)} m at the supports of the main unit`;
  const { crestRadiusM } = option.profile;
  const road = `${level(roadLevel(option, own.startM))} at A and ${level(roadLevel(option, own.endM))} at B, ${
    crestRadiusM === null ? 'straight between them' : `over a crest of ${radiusText(crestRadiusM)} m radius`
  }`;
  const clear = roadNeeds(site, option).map(({ limit, spareM, atM }) => {
    const { reason, levelM } = site.soffitLimits[limit]!;
    const left = spareM < -0.005 ? `${level(-spareM)} m too low` : `${level(spareM)} m to spare`;
    return `${reason}, lowest soffit allowed ${level(levelM)}, ${left} at chainage ${chainage(atM)}`;
  });
  return [
    `${optionTitle(option)}, ${length(own.lengthM)} m from chainage ${chainage(own.startM)} to ${chainage(own.endM)}.`,
    `Spans: ${spans.join(', ')}.`,
    `Supports: ${supports.join('; ')}.`,
    `Depth of the structure: ${depth}.`,
    `Road level: ${road}.`,
    clear.length === 0 ? 'Nothing has to be kept clear.' : `Kept clear: ${clear.join('; ')}.`,
  ].join(' ');
}

const written = new WeakMap<AppraisedOption, { readonly site: Site; readonly words: string }>();

/**
 * An elevation in words, for those who cannot see it: spans one by one, supports with chainage, kind and founding, depths,
 * road levels, and what is spare over everything that is kept clear. From the figures the drawing is made of.
 */
export function elevationText(site: Site, option: AppraisedOption): string {
  const known = written.get(option);
  if (known?.site === site) return known.words;
  const words = write(site, option);
  written.set(option, { site, words });
  return words;
}
