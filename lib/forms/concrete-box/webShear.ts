import { materials } from '../../actions/index.ts';
import { barDesignMPa } from '../common/bars.ts';
import { boxData } from './boxData.ts';
import type { Strengths } from './bendingCapacity.ts';

/** Shear of one web at one place, design values. */
export interface WebDemand {
  /** Along the web, after the relief of inclined tendons, kN. */
  readonly shearKN: number;
  /** Bending that goes with it, of one web, kNm, and area of its tendons, m2. */
  readonly momentKNm: number;
  readonly strandM2: number;
  /** Bars in the tension face that go with one web, m2. */
  readonly barM2: number;
  /** Mean compression of the section, MPa. */
  readonly axialMPa: number;
  /** Effective depth, m. */
  readonly effectiveM: number;
  /** Bending of the web across the deck, kNm per m. */
  readonly acrossKNm: number;
  /** Load that struts bring to its foot, to be hung up in it, kN per m of deck; none when absent. */
  readonly hangKNm?: number;
}

/** What a web of given thickness makes of it. */
export interface WebUse {
  /** Stirrups of both faces, m2 per m of deck. */
  readonly stirrupsM2PerM: number;
  /** Compression of the struts over their strength. */
  readonly crushing: number;
  /** Stirrups over what fits. */
  readonly crowding: number;
}

/**
 * Variable struts (EN 1992-1-1 6.2.3) or the sectional model (AASHTO LRFD 5.7.3), both from memory. Stirrups carry the
 * bending across the web too: half of one with the whole of the other, whichever is more; what struts bring to its foot hangs
 * in them besides.
 */
export function webShear(model: Strengths, webM: number, ductM: number, demand: WebDemand): WebUse {
  const clear = webM - (ductM > webM / 8 ? boxData.shear.ductShare[model.standardId] : 0) * ductM;
  const lever = boxData.shear.leverRatio * demand.effectiveM;
  const fy = barDesignMPa(model.standardId) * 1e3;
  const {
    shear: upright,
    crushing,
    least,
  } = model.standardId === 'hl93'
    ? sectional(model, clear, webM, lever, fy, demand)
    : variableStruts(model, clear, webM, lever, fy, demand);
  const acrossDepth = Math.max(0.05, webM - 0.07);
  const bendingFace = demand.acrossKNm / (0.9 * acrossDepth * fy);
  const shear = upright + (demand.hangKNm ?? 0) / fy;
  const face = Math.max(shear / 2 + bendingFace / 2, shear / 4 + bendingFace, least / 2);
  return {
    stirrupsM2PerM: 2 * face,
    crushing,
    crowding: (2 * face) / (boxData.stirrupRatioMost.value * webM),
  };
}

interface ShearNeed {
  readonly shear: number;
  readonly crushing: number;
  readonly least: number;
}

/** EN: struts as flat as their strength allows, cot between 1 and 2.5. */
function variableStruts(
  model: Strengths,
  clear: number,
  webM: number,
  lever: number,
  fy: number,
  { shearKN, axialMPa }: WebDemand,
): ShearNeed {
  const { fckMPa, fcdMPa, shearShare = 1 } = model.concrete;
  const pressed = Math.max(0, axialMPa) / fcdMPa;
  const alpha = pressed <= 0.25 ? 1 + pressed : pressed <= 0.5 ? 1.25 : Math.max(0, 2.5 * (1 - pressed));
  const strut = alpha * clear * lever * 0.6 * shearShare * (1 - fckMPa / 250) * fcdMPa * 1e3;
  const crushing = strut > 0 ? (2 * shearKN) / strut : Infinity;
  const half = crushing > 0 ? 1 / crushing : Infinity;
  const cot = Math.min(
    boxData.shear.flattestCot,
    Math.max(1, half + Math.sqrt(Math.max(0, half * half - 1))),
  );
  return {
    shear: shearKN / (lever * fy * cot),
    crushing,
    least: ((0.08 * Math.sqrt(fckMPa)) / materials.reinforcement.lm1.yieldMPa) * webM,
  };
}

/** AASHTO: concrete and stirrups together, angle and share of the concrete by the strain of the tension chord. */
function sectional(
  model: Strengths,
  clear: number,
  webM: number,
  lever: number,
  fy: number,
  { shearKN, momentKNm, strandM2, barM2 }: WebDemand,
): ShearNeed {
  const { fckMPa, shearShare = 1 } = model.concrete;
  const { ultimateMPa, eMPa } = materials.strand.hl93;
  const stiffKN = (eMPa * strandM2 + materials.reinforcement.hl93.eMPa * barM2) * 1e3;
  const chordKN = Math.abs(momentKNm) / lever + shearKN - 0.7 * ultimateMPa * 1e3 * strandM2;
  const strain = Math.min(0.006, Math.max(0, chordKN / stiffKN));
  const beta = 4.8 / (1 + 750 * strain);
  const cot = 1 / Math.tan(((29 + 3500 * strain) * Math.PI) / 180);
  const phi = 0.9;
  const concreteKN = phi * 0.083 * shearShare * beta * Math.sqrt(fckMPa) * clear * lever * 1e3;
  const most = phi * 0.25 * fckMPa * clear * lever * 1e3;
  return {
    shear: Math.max(0, shearKN - concreteKN) / (lever * fy * cot),
    crushing: most > 0 ? shearKN / most : Infinity,
    least: ((0.083 * Math.sqrt(fckMPa)) / materials.reinforcement.hl93.yieldMPa) * webM,
  };
}

/**
 * Web thickness, m, at which the struts stand at the angle webs are sized for and the stirrups fit.
 */
export function webNeeded(model: Strengths, webM: number, ductM: number, demand: WebDemand): number {
  const { crushing, crowding } = webShear(model, webM, ductM, demand);
  const cot = boxData.shear.designCot;
  const strutUse = model.standardId === 'lm1' ? (crushing * (cot + 1 / cot)) / 2 : crushing;
  const duct = boxData.shear.ductShare[model.standardId] * ductM;
  const struts = duct + (webM - duct) * strutUse;
  return Math.max(struts, webM * crowding);
}
