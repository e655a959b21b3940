import {
  atObtuseCorner,
  cellularCorner,
  spreadBoxCorner,
  trafficOnDeck,
  trafficOnGirder,
  type TrafficLoad,
} from '../../actions/index.ts';
import type { UnitTask } from '../../model/index.ts';
import { bays } from '../composite-i/bracing.ts';
import { modelOn, type GirderModel } from '../composite-i/girderModel.ts';
import { fatigueShare } from '../composite-i/fatigueRange.ts';
import { compositeBoxData } from './compositeBoxData.ts';
import { chooseStiffener, platePressedShare, supportShearLag, type PlateField } from './stiffenedPlate.ts';
import { enclosedArea, tubTorsion, type TubTorsion } from './tubTorsion.ts';
import { tubLayout, tubShape, type TubLayout, type TubShape } from './tubShape.ts';

/** Half a box as a girder, and what the box is besides. */
export interface BoxGirderModel extends GirderModel {
  readonly tubs: TubLayout;
  readonly shape: TubShape;
  readonly torsion: TubTorsion;
  /** Bottom plate where it is pressed. */
  readonly field: PlateField;
  readonly shearLag: number;
}

/**
 * Lays out the boxes and makes a girder of half of one: one web, one top flange, half of the bottom plate, half of what
 * the box carries. Torsion goes round the box and into the webs as shear.
 *
 * @param lean how far the webs lean, 0 upright, 1 as far as the bottom plate stays wide enough
 */
export function boxGirderModel(task: UnitTask, lean: number): BoxGirderModel {
  const tubs = tubLayout(task);
  const model = modelOn(task, tubs, 1, {
    stiff: true,
    even: tubs.boxes > 1,
    trafficOn: () => halfOf(worstBox(task, tubs)),
  });
  const shape = tubShape(tubs, model.girderM, lean);
  const braceAtM = frameLines(task, model.supportsM);
  const bracingM = bays(model.elementM, braceAtM);
  const moments = model.guessKNm.map((moment) => 2 * moment);
  const torsion = tubTorsion(task, model.standard, tubs, enclosedArea(shape, model.slab.meanM), moments);
  const stiffeners = Math.max(1, Math.ceil(shape.bottomM / compositeBoxData.bottomPlate.stiffenerPitchM) - 1);
  const pitchM = shape.bottomM / (stiffeners + 1);
  const frameM = Math.max(...bracingM);
  const { sizedOnM } = compositeBoxData.stiffener;
  const field: PlateField = {
    pitchM,
    frameM,
    stiffener: chooseStiffener(pitchM, frameM, model.yieldMPa(sizedOnM)),
  };
  const shearLag = lagOf(task, shape);
  const webM = shape.slant * (shape.heightM + model.slab.meanM / 2);
  const boxOffsetsM = boxMiddles(tubs);
  return {
    ...model,
    tubs,
    shape,
    torsion,
    field,
    shearLag,
    braceAtM,
    bracingM,
    plate: {
      widthM: shape.bottomM / 2,
      leastM: compositeBoxData.bottomPlate.leastM,
      slant: shape.slant,
      torsionKN: torsion.torqueKNm.map((torque) => (torque / (2 * torsion.enclosedM2)) * webM),
      lorryShare: tubs.boxes === 1 ? 0.5 : fatigueShare(task.deck, boxOffsetsM) / 2,
      pressedShare: (thicknessM) =>
        shearLag * platePressedShare(field, thicknessM, model.yieldMPa(thicknessM)),
    },
  };
}

/** Middles of the boxes from the middle of the deck, m. */
export function boxMiddles({ boxes, offsetsM }: TubLayout): number[] {
  return Array.from({ length: boxes }, (_, b) => (offsetsM[2 * b]! + offsetsM[2 * b + 1]!) / 2);
}

/**
 * Traffic of the box that carries most: the whole deck on one, else shared out like girders. Shears of a skew deck are those at
 * its obtuse corner, by the factors of concrete boxes, which are borrowed: of spread boxes, and of a cellular deck for one.
 */
function worstBox(task: UnitTask, tubs: TubLayout): TrafficLoad {
  const { standard, deck } = task;
  const { depthM, skewDeg = 0 } = task;
  const spanM = Math.max(...task.spansM);
  if (tubs.boxes === 1)
    return atObtuseCorner(trafficOnDeck(standard, deck), cellularCorner({ spanM, depthM }, skewDeg));
  const lines = boxMiddles(tubs);
  const spacingM = lines[1]! - lines[0]!;
  const worst = lines
    .map((_, i) => trafficOnGirder(standard, deck, lines, i))
    .reduce((most, next) => (next.vehicleFactor > most.vehicleFactor ? next : most));
  return atObtuseCorner(worst, spreadBoxCorner({ spanM, depthM, spacingM }, skewDeg));
}

function halfOf(load: TrafficLoad): TrafficLoad {
  return {
    ...load,
    vehicleFactor: load.vehicleFactor / 2,
    udlKNm: load.udlKNm / 2,
    footwayKNm: load.footwayKNm / 2,
  };
}

/** Frames at equal distances in every span, supports among them, m from the first support. */
function frameLines(task: UnitTask, supportsM: readonly number[]): number[] {
  const lines = [0];
  task.spansM.forEach((spanM, span) => {
    const bays = Math.max(2, Math.ceil(spanM / compositeBoxData.frames.spacingM - 1e-9));
    for (let b = 1; b <= bays; b++)
      lines.push(b === bays ? supportsM[span + 1]! : supportsM[span]! + (b * spanM) / bays);
  });
  return lines;
}

/** Least share over the inner supports; 1 on a single span. */
function lagOf({ spansM }: UnitTask, { bottomM }: TubShape): number {
  const { atSupport } = compositeBoxData.shearLag;
  return Math.min(
    1,
    ...spansM.slice(1).map((span, i) => supportShearLag(bottomM / 2, atSupport * (spansM[i]! + span))),
  );
}
