import type { Descriptor } from '../../model/index.ts';
import type { formManual } from '../common/formManual.ts';

/** Struts under the wings of a concrete box, and their checks. */
export function strutFigures({ sized, check }: ReturnType<typeof formManual>): Descriptor[] {
  const load = ['strutsOutM', 'overhangM', 'webSpacingM', 'topSlabMidM', 'topSlabRootM'] as const;
  const road = ['./task/deck/superimposedKNm', 'site/deck/carriagewayM', 'brief/loading'] as const;
  return [
    sized(
      'strutsOutM',
      'strut heads beyond the axis of the outer web',
      'm',
      'as far as the next web would be, or as the least slope of a strut reaches from the foot of the web',
      './task/deck/widthM',
      './task/depthM',
      'cells',
      'data/concrete-box/struts/leastRiseOverRun',
      'data/concrete-box/webSlope/most',
    ),
    sized(
      'strutRiseM',
      'height of a strut',
      'm',
      'depth - foot above the soffit - head below the top',
      './task/depthM',
      'data/concrete-box/struts/footAboveSoffitM',
      'data/concrete-box/struts/headBelowTopM',
    ),
    sized(
      'strutLengthM',
      'length of a strut',
      'm',
      'root of (height2 + (heads beyond the web + lean of the web)2)',
      'strutRiseM',
      'strutsOutM',
    ),
    sized(
      'strutForceKN',
      'design force of a strut',
      'kN',
      'reaction of the slab continuous over heads and webs x spacing of the struts x length / height',
      ...load,
      'strutBeamM',
      'strutRiseM',
      'strutLengthM',
      'data/concrete-box/struts/spacingM',
      ...road,
    ),
    sized(
      'strutHangKNm',
      'design load that the struts hang into an outer web',
      'kN/m',
      'force x height / length / spacing of the struts',
      'strutForceKN',
      'strutRiseM',
      'strutLengthM',
      'data/concrete-box/struts/spacingM',
    ),
    sized(
      'strutTieKNm',
      'design pull of the struts across the top slab',
      'kN/m',
      'root of (force2 - (load hung into the web x spacing)2) / spacing of the struts',
      'strutForceKN',
      'strutHangKNm',
      'data/concrete-box/struts/spacingM',
    ),
    sized(
      'strutSideM',
      'side of a strut',
      'm',
      'least side in steps that carries its force as a slender strut of concrete off its middle by imperfection and own weight',
      'strutForceKN',
      'strutLengthM',
      'data/concrete-box/struts/bucklingOver',
      'data/concrete-box/struts/designShare',
      'data/concrete-box/struts/sideStepM',
    ),
    sized(
      'strutBeamM',
      'slab along the strut heads',
      'm',
      'least thickness in steps at which the bars that carry the slab from strut to strut stay within a practical ratio',
      ...load,
      'data/concrete-box/struts/beamWidthM',
      'data/concrete-box/struts/beamStepM',
      'data/concrete-box/struts/spacingM',
      'data/slab/steelRatioMost',
      ...road,
    ),
    ...check(
      'wing-struts',
      ['reaction of the slab on a strut x length / height', 'strutForceKN'],
      [
        'side2 x share of the design strength x pressed share of the section',
        'strutSideM',
        'strutLengthM',
        'data/concrete-box/struts/designShare',
      ],
      'EN 1992-1-1 12.6.5.2 (from memory)',
    ),
    ...check(
      'wing-beams',
      ['bars of one face / width and effective depth', 'strutBeamM', 'strutForceKN'],
      ['most bars that can be placed in one face', 'data/slab/steelRatioMost'],
      'EN 1992-1-1 (from memory)',
    ),
  ];
}
