import type { SectionCut, Shape } from '../../model/index.ts';
import { constantDepth, type DepthAlong } from '../common/depthAlong.ts';
import { deckFace, soffitLine, upright } from '../common/elevation.ts';
import { deckFurniture } from '../common/furniture.ts';
import { bottomWidth } from './boxLayout.ts';
import { steelBoxData } from './steelBoxData.ts';
import type { SizedSteelBox } from './sizeSteelBox.ts';
import { elementsPerSpan, type SteelBoxModel } from './steelBoxModel.ts';

type Point = readonly [x: number, z: number];

/** Depth along the box; two points where it is constant. */
export function steelBoxDepth(model: SteelBoxModel): DepthAlong {
  if (model.pierDepthM === model.task.depthM) return constantDepth(model.lengthM, model.task.depthM);
  return { xM: Array.from(model.xM), depthM: Array.from(model.depthM) };
}

/** The unit from the side: face of the box, bottom plate, edge of the deck; diaphragms and braced frames faint. */
export function steelBoxElevation({ model, plates }: SizedSteelBox): Shape[] {
  const { task, supportsM, bays, lengthM } = model;
  const along = steelBoxDepth(model);
  const thickest = Math.max(...plates.bottomM);
  const shapes: Shape[] = [
    deckFace('box', 'steel', along),
    soffitLine('bottom plate', 'steel', along, thickest),
    soffitLine('edge of the deck', 'steel', constantDepth(lengthM, steelBoxData.crossbeam.tipM), 0.02),
  ];
  supportsM.forEach((x) => shapes.push(upright('diaphragm', 'steel', along, x, 0, 0.1)));
  const { bracedEvery } = steelBoxData.frame;
  task.spansM.forEach((spanM, span) => {
    const count = bays[span]!;
    for (let bay = bracedEvery; bay < count; bay += bracedEvery)
      shapes.push(upright('frame', 'steel', along, supportsM[span]! + (bay * spanM) / count, 0, 0.03));
  });
  return shapes;
}

/** Cross-sections in the middle of the longest span and, on continuous units, over an inner support beside it. */
export function steelBoxSections(box: SizedSteelBox): SectionCut[] {
  const { model } = box;
  const { spansM } = model.task;
  const longest = spansM.indexOf(Math.max(...spansM));
  const middle = longest * elementsPerSpan + elementsPerSpan / 2;
  const cuts = [cut(box, 'midspan', middle)];
  if (spansM.length > 1) cuts.push(cut(box, 'pier', (longest > 0 ? longest : 1) * elementsPerSpan));
  return cuts;
}

function cut({ model, plates }: SizedSteelBox, at: string, station: number): SectionCut {
  const { layout, task, cross } = model;
  const deckM = plates.deckM[station]!;
  const webM = plates.webM[station]!;
  const bottomM = plates.bottomM[station]!;
  const depthM = model.depthM[station]!;
  const half = task.deck.widthM / 2;
  const soffitHalf = bottomWidth(layout, depthM) / 2;
  const shapes: Shape[] = [
    plate('crossbeam', crossbeamOutline(model), true),
    plate('deck plate', rectangle(-half, half, -deckM, 0)),
    plate('bottom plate', rectangle(-soffitHalf, soffitHalf, -depthM, -depthM + bottomM)),
  ];
  layout.offsetsM.forEach((y, i) => {
    const outer = i === 0 ? -1 : i === layout.cells ? 1 : 0;
    const foot = y - outer * layout.slope * depthM;
    const lean = (webM * layout.slant) / 2;
    shapes.push(
      plate('web', [
        [foot - lean, -depthM + bottomM],
        [foot + lean, -depthM + bottomM],
        [y + lean, -deckM],
        [y - lean, -deckM],
      ]),
    );
  });
  shapes.push(
    ...deckRibs(model, deckM),
    ...bottomRibs(model, plates.pressed[station] === 1, depthM, bottomM),
  );
  if (cross.strutM > 0) {
    for (let cell = 0; cell < layout.cells; cell++) {
      const left = layout.offsetsM[cell]!;
      const right = layout.offsetsM[cell + 1]!;
      const lean = layout.slope * depthM;
      const feet = [left + (cell === 0 ? lean : 0), right - (cell === layout.cells - 1 ? lean : 0)];
      for (const foot of feet)
        shapes.push(
          line(
            'strut',
            [
              [foot, -depthM + bottomM],
              [(left + right) / 2, -cross.depthM],
            ],
            cross.strutM,
            true,
          ),
        );
    }
  }
  return { at, xM: model.xM[station]!, shapes: [...shapes, ...deckFurniture(task.deck)] };
}

function plate(part: string, points: readonly Point[], faint = false): Shape {
  return { part, material: 'steel', kind: 'polygon', points, ...(faint ? { faint } : {}) };
}

function line(part: string, points: readonly Point[], thicknessM: number, faint: boolean): Shape {
  return { part, material: 'steel', kind: 'line', points, thicknessM, ...(faint ? { faint } : {}) };
}

function rectangle(left: number, right: number, low: number, high: number): Point[] {
  return [
    [left, low],
    [right, low],
    [right, high],
    [left, high],
  ];
}

/** Crossbeam between the outer webs and brackets that taper to the edges. */
function crossbeamOutline({ layout, cross, task, deckM }: SteelBoxModel): Point[] {
  const half = task.deck.widthM / 2;
  const root = layout.topM / 2;
  const { tipM } = steelBoxData.crossbeam;
  return [
    [-half, -tipM],
    [-root, -cross.bracketDepthM],
    [-root, -cross.depthM],
    [root, -cross.depthM],
    [root, -cross.bracketDepthM],
    [half, -tipM],
    [half, -deckM],
    [-half, -deckM],
  ];
}

/** Closed ribs under the deck plate, none where a web stands. */
function deckRibs({ layout, task, rib }: SteelBoxModel, deckM: number): Shape[] {
  const { pitchM, topM, bottomM } = steelBoxData.rib;
  const count = Math.floor((task.deck.widthM - topM) / pitchM);
  return Array.from({ length: count }, (_, i) => (i - (count - 1) / 2) * pitchM)
    .filter((y) => layout.offsetsM.every((web) => Math.abs(web - y) > topM / 2))
    .map((y) =>
      line(
        'rib',
        [
          [y - topM / 2, -deckM],
          [y - bottomM / 2, -deckM - rib.heightM],
          [y + bottomM / 2, -deckM - rib.heightM],
          [y + topM / 2, -deckM],
        ],
        rib.thicknessM,
        false,
      ),
    );
}

/** Stiffeners along the bottom plate. */
function bottomRibs(model: SteelBoxModel, pressed: boolean, depthM: number, bottomM: number): Shape[] {
  const count = pressed ? model.pressedRibs : model.spanRibs;
  const heightM = pressed ? model.field.stiffener.heightM : steelBoxData.bottom.spanRibM;
  const widthM = bottomWidth(model.layout, depthM);
  const low = -depthM + bottomM;
  return Array.from({ length: count }, (_, i) => {
    const y = ((i + 1) / (count + 1) - 0.5) * widthM;
    return line(
      'stiffener',
      [
        [y, low],
        [y, low + heightM],
      ],
      0.012,
      false,
    );
  });
}
