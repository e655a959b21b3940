import {
  concrete,
  materials,
  trafficOnCrossLine,
  trafficOnInfluence,
  type CrossLine,
  type LoadStandard,
} from '../../actions/index.ts';
import type { StandardId, UnitTask } from '../../model/index.ts';
import type { SlabDesign } from '../common/slab/designSlab.ts';
import type { FloorBeam } from '../floor/floorBeam.ts';
import { sizeStringer } from '../floor/sizeFloor.ts';
import { gussetKg, strutKgPerM } from './bracingMember.ts';
import { compositeData } from './compositeData.ts';
import type { GirderLayout } from './girderLayout.ts';

/** One line of beams midway between each two girders, simple spans from cross-frame to cross-frame. */
export interface Substringers {
  readonly beam: FloorBeam;
  readonly lines: number;
  /** Design load that a cross-frame takes from one line, kN. */
  readonly onFrameKN: number;
}

/** Sizes the substringers of a deck and what they put on the cross-frames. `bayM` between cross-frames, m. */
export function substringers(
  task: UnitTask,
  standard: LoadStandard,
  layout: GirderLayout,
  slab: SlabDesign,
  bayM: number,
  yieldMPa: (thicknessM: number) => number,
): Substringers {
  const pitchM = layout.spacingM / 2;
  const offsetsM = layout.offsetsM.slice(1).map((y) => y - pitchM);
  const ecm = concrete(task.standard, materials.concreteDefaultMPa[task.standard].slab).ecmMPa;
  const beam = sizeStringer(
    { standard: task.standard, deck: task.deck, crossSpacingM: bayM, depthM: task.depthM },
    standard,
    slab,
    pitchM,
    offsetsM,
    (mm) => yieldMPa(mm / 1000),
    ecm,
  );
  const { uls } = standard.factors;
  const wetKNm2 =
    slab.meanM * standard.unitWeights.concreteKNm3 + compositeData.stayInPlaceForms[task.standard];
  const dead = wetKNm2 * pitchM + (beam.massKgPerM * 9.81) / 1000;
  const laid = (task.deck.superimposedKNm / task.deck.widthM) * pitchM;
  const traffic = Math.max(
    ...offsetsM.map((y) => {
      const line: CrossLine = { yM: [-1e3, y - pitchM, y, y + pitchM, 1e3], value: [0, 0, 1, 0, 0] };
      const load = trafficOnCrossLine(task.standard, task.deck, line, 1000 / (2 * bayM));
      return trafficOnInfluence(load, [0, bayM, 2 * bayM], [0, 1, 0]).max;
    }),
  );
  return {
    beam,
    lines: offsetsM.length,
    onFrameKN: (uls.permanent * dead + uls.superimposed * laid) * bayM + uls.traffic * traffic,
  };
}

/** What a cross-frame is laid out in. */
export interface FrameBay {
  readonly standardId: StandardId;
  readonly layout: Pick<GirderLayout, 'spacingM'>;
  readonly girderM: number;
  readonly yieldMPa: (thicknessM: number) => number;
}

/**
 * Mass of one bay of a cross-frame that carries a substringer at its middle, kg: chords for R s / 4 over its depth,
 * diagonals for R / 2, as struts; the top chord is held at its middle, the bottom chord is not. Never less than an ordinary
 * frame.
 */
export function carryingFrameKg(
  { onFrameKN }: Pick<Substringers, 'onFrameKN'>,
  { standardId, layout: { spacingM }, girderM, yieldMPa }: FrameBay,
  leastKgPerM: number,
): number {
  const { frameDepthOverGirder, strutShare } = compositeData.substringers;
  const depthM = frameDepthOverGirder * girderM;
  const diagonalM = Math.hypot(depthM, spacingM / 2);
  const stress = strutShare * yieldMPa(0.03) * 1000;
  const perM = (forceKN: number, lengthM: number): number =>
    Math.max(leastKgPerM, (materials.steelDensityKgM3 * forceKN) / stress, strutKgPerM(lengthM, standardId));
  const chordKN = (onFrameKN * spacingM) / 4 / depthM;
  const diagonal = perM(((onFrameKN / 2) * diagonalM) / depthM, diagonalM);
  const chord = perM(chordKN, spacingM);
  return (
    spacingM * (perM(chordKN, spacingM / 2) + chord) +
    2 * diagonalM * diagonal +
    compositeData.gusset.perFrame * gussetKg(Math.max(chord, diagonal))
  );
}
