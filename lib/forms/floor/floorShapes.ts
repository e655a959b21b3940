import type { DeckSpec, Shape } from '../../model/index.ts';
import { deckFurniture } from '../common/furniture.ts';
import type { GirderPlates } from '../composite-i/girderSection.ts';
import type { Floor } from './sizeFloor.ts';

type Point = readonly [x: number, z: number];

/**
 * Floor in cross-section: slab, stringers, the cross-girder behind them and what stands on the deck. x from the middle
 * of the deck, z from the top of the slab, m. `reachM` is half the length of the cross-girder.
 */
export function floorSection(floor: Floor, deck: DeckSpec, reachM: number): Shape[] {
  const half = deck.widthM / 2;
  const slabM = floor.slab.midM;
  const girder = floor.crossGirder.plates;
  const foot = slabM + girder.heightM;
  return [
    rectangle('cross-girder', 'steel', -reachM, reachM, -foot, -slabM, true),
    rectangle('cross-girder flange', 'steel', -reachM, reachM, -foot, -foot + girder.bottomM),
    ...floor.stringerOffsetsM.map((y) => girderShape('stringer', y, -slabM, floor.stringer!.plates)),
    rectangle('slab', 'concrete', -half, half, -slabM, 0),
    ...deckFurniture(deck),
  ];
}

/** Outline of an I-girder cut across, its top at `topZ`. */
export function girderShape(part: string, atM: number, topZ: number, plates: GirderPlates): Shape {
  const { heightM: h, topM, bottomM, webM } = plates;
  const top = plates.topWidthM / 2;
  const bottom = plates.bottomWidthM / 2;
  const web = webM / 2;
  const z = (down: number): number => topZ - down;
  const points: Point[] = [
    [atM - top, z(0)],
    [atM + top, z(0)],
    [atM + top, z(topM)],
    [atM + web, z(topM)],
    [atM + web, z(h - bottomM)],
    [atM + bottom, z(h - bottomM)],
    [atM + bottom, z(h)],
    [atM - bottom, z(h)],
    [atM - bottom, z(h - bottomM)],
    [atM - web, z(h - bottomM)],
    [atM - web, z(topM)],
    [atM - top, z(topM)],
  ];
  return { part, material: 'steel', kind: 'polygon', points };
}

/** Rectangle between two x and two z, m. */
export function rectangle(
  part: string,
  material: Shape['material'],
  x1: number,
  x2: number,
  z1: number,
  z2: number,
  faint = false,
): Shape {
  const points: Point[] = [
    [x1, z1],
    [x2, z1],
    [x2, z2],
    [x1, z2],
  ];
  return faint
    ? { part, material, kind: 'polygon', points, faint }
    : { part, material, kind: 'polygon', points };
}
