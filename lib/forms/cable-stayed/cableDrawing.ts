import type { SectionCut, Shape, UnitTask } from '../../model/index.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { deckFace, soffitLine, upright } from '../common/elevation.ts';
import { floorSection, girderShape, rectangle } from '../floor/floorShapes.ts';
import { cableData } from './cableData.ts';
import type { SizedBridge } from './sizePlane.ts';
import type { SizedPylon } from './sizePylon.ts';
import { stepUp } from './stayLayout.ts';

/** Drawn thickness of a stay: its sheath, m. */
function sheathM(strands: number): number {
  return 0.025 * Math.sqrt(strands);
}

/** Pylons above and below the deck, stays of one plane, deck face with cross-girders. */
export function cableElevation(bridge: SizedBridge, task: UnitTask): Shape[] {
  const { layout, floor, stays } = bridge;
  const along = constantDepth(layout.lengthM, task.depthM);
  const slabM = floor.slab.midM;
  const shapes: Shape[] = layout.pylons.map((pylon, p) =>
    legShape(
      pylon.xM,
      bridge.pylons[p]!.lengthM,
      bridge.pylons[p]!.topLengthM,
      pylon.heightM,
      bridge.belowM[p]!,
    ),
  );
  const stepM = bridge.layout.pylons[0]!.spacingM;
  for (let x = 0; x <= layout.lengthM + 1e-6; x += stepM)
    shapes.push(upright('cross-girder', 'steel', along, Math.min(x, layout.lengthM), slabM, 0.3));
  shapes.push(
    deckFace('edge girder', 'steel', along, slabM),
    soffitLine('bottom flange', 'steel', along, bridge.girders[0]!.plates.bottomM),
    deckFace('slab', 'concrete', constantDepth(layout.lengthM, slabM)),
  );
  layout.stays.forEach((stay, i) => {
    const pylon = layout.pylons[stay.pylon]!;
    const each = stays[i]!.strands / stay.count;
    const step = stepUp(pylon.heightM, hungCount(bridge, stay.pylon));
    for (let k = 0; k < stay.count; k++) {
      const inward = stay.anchor ? (stay.count - 1 - k) * cableData.anchorStays.deckSpacingM : 0;
      const rise = stay.anchor ? pylon.heightM - (stay.count - 1 - k) * step : stay.riseM;
      shapes.push({
        part: stay.anchor ? 'anchor stay' : 'stay',
        material: 'stay',
        kind: 'line',
        points: [
          [stay.deckM - stay.side * inward, 0],
          [pylon.xM, rise],
        ],
        thicknessM: sheathM(each),
      });
    }
  });
  return shapes;
}

/** Stays on the busier side of a pylon. */
function hungCount(bridge: SizedBridge, pylon: number): number {
  const on = (side: number): number =>
    bridge.layout.stays.filter((stay) => stay.pylon === pylon && stay.side === side && !stay.anchor).length;
  return Math.max(on(-1), on(1));
}

/** A leg as a tapering upright polygon, from its foot under the deck to its head over the highest stay. */
function legShape(atM: number, footM: number, topM: number, aboveM: number, belowM: number): Shape {
  const head = aboveM + cableData.pylonHeight.headM;
  return {
    part: 'pylon',
    material: 'concrete',
    kind: 'polygon',
    points: [
      [atM - footM / 2, -belowM],
      [atM + footM / 2, -belowM],
      [atM + topM / 2, head],
      [atM - topM / 2, head],
    ],
  };
}

/** Sections at midspan and, as a front view of the legs, at the first pylon. */
export function cableSections(bridge: SizedBridge, task: UnitTask): SectionCut[] {
  const { layout, planesM, floor } = bridge;
  const [first, second] = layout.pylons;
  const longestSide =
    first!.xM >= layout.lengthM - first!.xM ? first!.xM / 2 : (first!.xM + layout.lengthM) / 2;
  const midspanM = second ? (first!.xM + second.xM) / 2 : longestSide;
  const girder = bridge.girders[bridge.girders.length - 1]!;
  const deckShapes = (): Shape[] => [
    ...floorSection(floor, task.deck, planesM / 2),
    ...[-planesM / 2, planesM / 2].map((y) => girderShape('edge girder', y, -floor.slab.midM, girder.plates)),
  ];
  return [
    { at: 'midspan', xM: midspanM, shapes: deckShapes() },
    { at: 'pylon', xM: first!.xM, shapes: [...frontView(bridge, task, bridge.pylons[0]!), ...deckShapes()] },
  ];
}

/** Legs stand clear of the deck and lean in to the stay planes above it. */
function frontView(bridge: SizedBridge, task: UnitTask, pylon: SizedPylon): Shape[] {
  const aboveM = bridge.layout.pylons[0]!.heightM;
  const belowM = bridge.belowM[0]!;
  const head = aboveM + cableData.pylonHeight.headM;
  const share = belowM / (belowM + head);
  const deckWidthM = pylon.widthM + (pylon.topWidthM - pylon.widthM) * share;
  const atDeck = task.deck.widthM / 2 + 0.5 + deckWidthM / 2;
  const atTop = bridge.planesM / 2;
  const shapes: Shape[] = pylon.crossbeamLevelsM.map((level) => {
    const reach = level > 0 ? atDeck + ((atTop - atDeck) * level) / head : atDeck;
    const depth = cableData.pylon.crossbeamDepthOverLeg * pylon.lengthM;
    const top = level > 0 ? level + depth / 2 : Math.min(level, -task.depthM - 0.3);
    return rectangle('crossbeam', 'concrete', -reach, reach, top - depth, top);
  });
  for (const side of [-1, 1]) {
    const points: [number, number][] = [
      [side * (atDeck - pylon.widthM / 2), -belowM],
      [side * (atDeck + pylon.widthM / 2), -belowM],
      [side * (atDeck + deckWidthM / 2), 0],
      [side * (atTop + pylon.topWidthM / 2), head],
      [side * (atTop - pylon.topWidthM / 2), head],
      [side * (atDeck - deckWidthM / 2), 0],
    ];
    shapes.push({ part: 'pylon', material: 'concrete', kind: 'polygon', points });
  }
  return shapes;
}
