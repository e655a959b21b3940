import { materials } from '../../actions/index.ts';
import { compositeData } from './compositeData.ts';
import type { GirderModel } from './girderModel.ts';

/** Whether a web of this height has a stiffener along it: deep webs of I-girders; boxes keep thicker ones. */
export function hasAlong(model: Pick<GirderModel, 'plate'>, webHeightM: number): boolean {
  return model.plate === undefined && webHeightM > compositeData.web.along.fromM;
}

/** Most height over thickness of a web: without stiffeners along it, or with one (AASHTO LRFD 6.10.2.1, from memory). */
export function mostWebSlenderness(model: Pick<GirderModel, 'plate'>, webHeightM: number): number {
  const { mostHeightOverThickness, along } = compositeData.web;
  return hasAlong(model, webHeightM) ? along.mostHeightOverThickness : mostHeightOverThickness.value;
}

/** Stiffeners along the webs of one girder, kg: flats a share of the height wide where the web is deep. */
export function alongKg(model: Pick<GirderModel, 'plate' | 'elementM'>, heightM: Float64Array): number {
  const { widthOverHeight, slenderness } = compositeData.web.along;
  return heightM.reduce((sum, height, e) => {
    if (!hasAlong(model, height)) return sum;
    const widthM = widthOverHeight * height;
    return sum + (materials.steelDensityKgM3 * model.elementM[e]! * widthM * widthM) / slenderness;
  }, 0);
}

/** Transverse stiffeners of one girder between its braces, where the web has one along it and the standard limits the panels. */
export function stiffenersBetween(
  model: Pick<GirderModel, 'plate' | 'braceAtM' | 'girderM' | 'standardId'>,
): number {
  const most = compositeData.web.along.mostPanelOverHeight[model.standardId];
  const { braceAtM, girderM } = model;
  if (!(most > 0) || !hasAlong(model, girderM)) return 0;
  let count = 0;
  for (let b = 1; b < braceAtM.length; b++)
    count += Math.ceil((braceAtM[b]! - braceAtM[b - 1]!) / (most * girderM) - 1e-9) - 1;
  return count;
}
