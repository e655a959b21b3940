import type { Descriptor } from '../../model/index.ts';
import type { formManual } from '../common/formManual.ts';

/** Wings that struts or ribs carry, ribs across the deck of a concrete box, and their checks. */
export function ribFigures({ sized, check }: ReturnType<typeof formManual>): Descriptor[] {
  const load = [
    'webSpacingM',
    'overhangM',
    'topSlabMidM',
    'data/concrete-box/ribs/spacingM',
    './task/deck/superimposedKNm',
    'site/deck/carriagewayM',
    'brief/loading',
  ] as const;
  return [
    ...(
      [
        [
          'workingWidthM',
          'width of the deck that works in bending in the spans',
          '0.85 of an end span or 0.7 of an inner one',
        ],
        [
          'workingWidthAtPiersM',
          'width of the deck that works in bending over the piers',
          '0.15 of both spans',
        ],
      ] as const
    ).map(([name, label, zeros]) =>
      sized(
        name,
        label,
        'm',
        `on either side of every web 0.2 b + 0.1 l0, at most 0.2 l0 and b: b a wing or half of a cell, l0 = ${zeros} (EN 1992-1-1 5.3.2.1, from memory)`,
        './task/deck/widthM',
        'webSpacingM',
        'cells',
        'overhangM',
        'spans',
      ),
    ),
    sized(
      'ribDepthM',
      'depth of the ribs at the webs and inside, with the slab',
      'm',
      'least depth in steps at which the bars of one face and the stirrups stay within what fits',
      ...load,
      'data/concrete-box/ribs/widthM',
      'data/concrete-box/ribs/depthStepM',
      'data/slab/steelRatioMost',
    ),
    sized(
      'ribRootKNm',
      'design moment of a rib at an outer web',
      'kNm',
      'gamma G (slab and rib) + gamma G surfacing and edge + gamma Q lanes and axles on the wing, over the spacing of the ribs',
      ...load,
      'ribDepthM',
    ),
    sized(
      'ribInsideKNm',
      'design moment of a rib between webs',
      'kNm',
      'moment of a simple span under the same loads x share for continuity',
      ...load,
      'ribDepthM',
      'data/slab/continuity',
    ),
    sized(
      'ribShearKN',
      'design shear of a rib beside an outer web',
      'kN',
      'load of the wing, or of half a cell',
      ...load,
      'ribDepthM',
    ),
    ...check(
      'rib-bars',
      ['bars of one face / width and effective depth', 'ribDepthM', 'ribRootKNm', 'ribInsideKNm'],
      ['most bars that can be placed in one face', 'data/slab/steelRatioMost'],
      'EN 1992-1-1 (from memory)',
    ),
    ...check(
      'rib-shear',
      ['shear beside an outer web', 'ribShearKN'],
      [
        'struts of the rib, or stirrups that fit',
        'ribDepthM',
        'data/concrete-box/ribs/widthM',
        'data/concrete-box/stirrupRatioMost',
      ],
      'EN 1992-1-1 6.2.3 (from memory)',
    ),
    ...check(
      'rib-room',
      ['least height for striking the forms', 'data/concrete-box/leastInnerM'],
      ['depth - rib - bottom slab', './task/depthM', 'ribDepthM', 'data/concrete-box/bottomSlab/leastM'],
    ),
  ];
}
