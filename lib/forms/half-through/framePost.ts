import { sectionProperties, yieldRatio, type SectionPart } from '../../mechanics/index.ts';
import type { PostSection } from './halfThroughData.ts';

/** A post with the strip of girder web that acts with it. */
export interface FramePost {
  readonly section: PostSection;
  readonly inertiaM4: number;
  readonly modulusM3: number;
  /** Steel of the post alone, m2. */
  readonly areaM2: number;
}

/** Post on a web of thickness `webM`: 15 epsilon of web on either side act with it (EN 1993-1-5 9.1, from memory). */
export function framePost(section: PostSection, webM: number, fyMPa: number): FramePost {
  const flangeM = section.flangeMm / 1000;
  const stemM = section.depthM - flangeM;
  const parts: SectionPart[] = [
    {
      kind: 'rect',
      widthM: (30 * yieldRatio(fyMPa) + section.webMm / 1000 / webM) * webM,
      heightM: webM,
      bottomM: 0,
    },
    { kind: 'rect', widthM: section.webMm / 1000, heightM: stemM, bottomM: webM },
  ];
  if (flangeM > 0)
    parts.push({ kind: 'rect', widthM: section.flangeWidthM, heightM: flangeM, bottomM: webM + stemM });
  const { inertiaM4, wTopM3, wBottomM3 } = sectionProperties(parts);
  return {
    section,
    inertiaM4,
    modulusM3: Math.min(wTopM3, wBottomM3),
    areaM2: (stemM * section.webMm) / 1000 + section.flangeWidthM * flangeM,
  };
}
