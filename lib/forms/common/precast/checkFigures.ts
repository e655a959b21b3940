import type { Descriptor, FormId } from '../../../model/index.ts';
import { formManual } from '../formManual.ts';
import { slabCheckFigures } from '../slab/slabFigures.ts';

/** Both sides of the checks of precast beams and of the slab on them. */
export function precastCheckFigures(form: FormId): Descriptor[] {
  const manual = formManual(form);
  const { check } = manual;
  return [
    ...check(
      'service-tension',
      [
        'M1 / Wb of the beam + M2 / Wb of beam and slab, service share of traffic',
        'span*SimpleKNm',
        'span*TrafficKNm',
      ],
      [
        'P (1 / A + e / Wb) after losses + tension allowed',
        'span*Strands',
        'span*LossesMPa',
        'data/pretensioned/service/tensionMPa/:standard',
      ],
      'EN 1992-2, AASHTO LRFD 5.9.2.3 (from memory)',
    ),
    ...check(
      'service-compression',
      ['stress of the top of the beam under everything, characteristic', 'span*SimpleKNm', 'span*Strands'],
      ['share of the cylinder strength', 'data/pretensioned/service/compression/:standard'],
    ),
    ...check(
      'bending',
      ['greatest design moment against its resistance', 'span*DesignKNm'],
      ['strands at their design strength against a stress block in the slab', 'span*Strands', 'slabM'],
      'EN 1992-1-1 6.1, AASHTO LRFD 5.6.3 (from memory)',
    ),
    ...check(
      'release-top',
      ['P (e / Wt - 1 / A) - M / Wt at release', 'span*Strands', 'span*TopStrands'],
      [
        'tension with bars, by the root of the strength at release',
        'data/pretensioned/release/tensionRootMPa/:standard',
      ],
    ),
    ...check(
      'release-bottom',
      ['P (1 / A + e / Wb) - M / Wb at release', 'span*Strands', 'span*RelievedStrands'],
      ['share of the strength at release', 'data/pretensioned/release/compression/:standard'],
    ),
    ...check(
      'web-struts',
      ['shear over the strength of the struts', 'span*ShearDesignKN', 'webM'],
      ['all of it'],
    ),
    ...check(
      'web-links',
      ['links asked for over those that fit', 'span*ShearDesignKN', 'webM'],
      ['all of them'],
    ),
    ...check(
      'deflection',
      ['deflection of the longest span under traffic on the continuous beam', 'compositeInertiaM4', 'spans'],
      ['span over the limit of the standard', 'spans', 'data/:standard/deflection/limitRatio'],
    ),
    ...check(
      'lifting',
      ['least safety', 'data/pretensioned/lifting/leastSafety'],
      ['safety of the longest beam while it hangs', 'liftingSafety'],
      'Mast, PCI Journal 1989 and 1993 (from memory)',
    ),
    ...check(
      'hauled-length',
      ['longest beam', 'spans'],
      ['longest that is hauled', 'data/pretensioned/haul/lengthM'],
    ),
    ...check(
      'hauled-mass',
      ['weight of a beam x its length', 'ownKNm', 'spans'],
      ['heaviest that is hauled', 'data/pretensioned/haul/massT'],
    ),
    ...check(
      'pier-bars',
      ['bars over the area of the slab that acts with a beam', 'pier*BarsM2', 'slabM', 'spacingM'],
      ['most bars that can be placed', 'data/pretensioned/continuity/mostRatio'],
    ),
    ...check(
      'pier-compression',
      ['depth of the stress block at the soffit over one and a half bottom flanges', 'pier*HogDesignKNm'],
      ['all of it'],
    ),
    ...slabCheckFigures(manual, 'slabM'),
  ];
}
