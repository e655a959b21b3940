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
