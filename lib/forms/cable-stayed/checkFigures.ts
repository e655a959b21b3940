import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';

const { check } = formManual('cable-stayed');

/** Limit states of a cable-stayed deck. */
export const cableCheckFigures: readonly Descriptor[] = [
  ...check(
    'stay-strength',
    [
      'force of the stay used most, permanent + traffic, characteristic',
      'permanentKNm',
      'staySpacingM',
      'pylonHeightM',
    ],
    [
      'area x share of the strength',
      'data/cable-stayed/stay/serviceShare',
      'data/materials/stay/ultimateMPa',
      'data/cable-stayed/stay/strandMm2',
    ],
  ),
  ...['stay-fatigue', 'back-stay-fatigue'].flatMap((id) =>
    check(
      id,
      ['range of the stress under the fatigue vehicle', 'mainSpanM', 'staySpacingM', 'pylonTopMovementM'],
      ['range of the strand / its factor', 'data/fatigue/:standard/rangeMPa/stay'],
      'EN 1993-1-11 (from memory)',
    ),
  ),
  ...check(
    'back-stay-slack',
    ['gamma Q x least traffic force of the back-stays', 'spans', 'pylonHeightM'],
    ['favourable gamma G x their lasting force', 'permanentKNm', 'spans'],
  ),
  ...check(
    'edge-girder',
    [
      'highest share used of bending, push and fatigue of the composite edge girder',
      'edgeGirderKgM2',
      'deckPushKN',
      './task/depthM',
      'staySpacingM',
    ],
    ['1 by definition'],
    'EN 1994-2 (from memory)',
  ),
  ...check(
    'slab-compression',
    [
      'stress of the slab under lasting push and bending / its limit',
      'deckPushKN',
      'slabM',
      'data/cable-stayed/slabStress',
    ],
    ['1 by definition'],
    'EN 1992-1-1 7.2(3) (from memory)',
  ),
  ...check(
    'deck-buckling',
    ['design push of the stays where it comes nearest to buckling', 'deckPushKN'],
    ['2 root(E I k / s), k spring of the stays, s their spacing', 'edgeGirderKgM2', 'staySpacingM'],
    'Engesser, strut on an elastic bed (from memory)',
  ),
  ...check(
    'pylon',
    [
      'highest share used of the leg: push of the stays, wind, bending, second order',
      'pylonLegLengthM',
      'pylonLegWidthM',
      'pylonHeightM',
      'deckPushKN',
    ],
    ['1 by definition'],
    'EN 1992-1-1 5.8, 6.1 (from memory)',
  ),
  ...check(
    'deflection',
    ['deflection of the middle of the main span', 'deflectionM'],
    ['share of the main span', 'mainSpanM', 'data/cable-stayed/deflectionOverSpan'],
  ),
];
