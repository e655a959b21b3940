import { distributed, type Effects } from '../../mechanics/index.ts';
import { weightAlong } from './boxConcrete.ts';
import { boxData } from './boxData.ts';
import type { BoxModel } from './boxModel.ts';
import type { BoxSection } from './boxSection.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import { underSlabM3M } from './underSlab.ts';

/** Own weight of the box. */
export interface OwnWeight {
  readonly effects: Effects;
  /** Weight along the spans at the stations, blisters and struts or ribs included, kN/m. */
  readonly loadKNm: Float64Array;
  /** Concrete along the spans without blisters and diaphragms, m3. */
  readonly boxM3: number;
  readonly blistersM3: number;
  /** Diaphragm over each support, m3. */
  readonly diaphragmM3: readonly number[];
}

/** Weight by the sections along the deck; diaphragms stand on their supports and bend nothing. */
export function ownWeight(model: BoxModel, sections: SectionsAlong): OwnWeight {
  const { beam } = model;
  const { share } = boxData.blisters;
  const gamma = weightAlong(model, beam.xM);
  const { layout, task, standard } = model;
  const underKNm = standard.unitWeights.concreteKNm3 * underSlabM3M(layout, task.depthM);
  const loadKNm = sections.areaM2.map((area, i) => gamma[i]! * (1 + share) * area + underKNm);
  let boxM3 = 0;
  for (let e = 0; e < loadKNm.length - 1; e++)
    boxM3 += ((sections.areaM2[e]! + sections.areaM2[e + 1]!) / 2) * (beam.xM[e + 1]! - beam.xM[e]!);
  return {
    effects: distributed(beam, loadKNm),
    loadKNm,
    boxM3,
    blistersM3: share * boxM3,
    diaphragmM3: model.supportsM.map((_, j) => diaphragm(model, sections, j)),
  };
}

function diaphragm(model: BoxModel, sections: SectionsAlong, support: number): number {
  const inner = support > 0 && support < model.supportsM.length - 1;
  return diaphragmM3(inner ? sections.pier : sections.span, inner);
}

/** Concrete that fills the cells of a section over a support, less an opening in each cell, m3. */
export function diaphragmM3({ outline, areaM2 }: BoxSection, inner: boolean): number {
  const { pierM, endM, openingM2 } = boxData.diaphragm;
  const solid = outline.cells.length === 0 ? 0 : outlineArea(outline.outer) - areaM2;
  const thicknessM = inner ? pierM : endM;
  const open = Math.min(solid * 0.3, openingM2 * outline.cells.length);
  return Math.max(0, solid - open) * thicknessM;
}

function outlineArea(points: readonly (readonly [number, number])[]): number {
  let twice = 0;
  points.forEach(([y, z], i) => {
    const [y2, z2] = points[(i + 1) % points.length]!;
    twice += y * z2 - y2 * z;
  });
  return Math.abs(twice) / 2;
}
