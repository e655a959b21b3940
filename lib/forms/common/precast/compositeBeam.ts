import { sectionProperties } from '../../../mechanics/index.ts';
import type { UnitTask } from '../../../model/index.ts';
import { pretensioned } from './pretensioned.ts';
import type { BeamChoice } from './beamChoice.ts';

/** Beam with its part of the slab, transformed to the concrete of the beam. Heights m above the soffit. */
export interface CompositeBeam {
  readonly areaM2: number;
  readonly centroidM: number;
  readonly inertiaM4: number;
  readonly wBottomM3: number;
  /** At the top of the beam, m3. */
  readonly wBeamTopM3: number;
  /** Modulus of the slab over that of the beam. */
  readonly slabRatio: number;
  readonly effectiveWidthM: number;
  /** Slab that counts, wear left out, m. */
  readonly slabM: number;
  /** Top of the slab that counts, m. */
  readonly topM: number;
}

/**
 * Composite section. Effective width: the spacing under AASHTO LRFD 4.6.2.6; the top of the beam and 0.2 b + 0.1 l0 on each side, at most
 * b each, under EN 1992-1-1 5.3.2.1 (both from memory), l0 = 0.7 of the shortest span where continuous.
 */
export function compositeBeam(task: UnitTask, choice: BeamChoice, slabRatio: number): CompositeBeam {
  const { layout, shape, slab } = choice;
  const slabM = slab.midM - pretensioned.wearingM[task.standard];
  const haunchM = choice.haunchM;
  const shortest = Math.min(...task.spansM);
  const zeroM = task.spansM.length > 1 ? 0.7 * shortest : shortest;
  const side = (layout.spacingM - shape.acrossM) / 2;
  const effectiveWidthM =
    task.standard === 'hl93'
      ? layout.spacingM
      : shape.acrossM + 2 * Math.max(0, Math.min(side, 0.2 * side + 0.1 * zeroM, 0.2 * zeroM));
  const { depthM } = shape;
  const bottomM = depthM + haunchM;
  const { areaM2, centroidM, inertiaM4 } = sectionProperties([
    { kind: 'polygon', points: shape.points, holes: shape.holes },
    { kind: 'rect', widthM: shape.topWidthM, heightM: haunchM, bottomM: depthM, eRatio: slabRatio },
    { kind: 'rect', widthM: effectiveWidthM, heightM: slabM, bottomM, eRatio: slabRatio },
  ]);
  return {
    areaM2,
    centroidM,
    inertiaM4,
    wBottomM3: inertiaM4 / centroidM,
    wBeamTopM3: inertiaM4 / (depthM - centroidM),
    slabRatio,
    effectiveWidthM,
    slabM,
    topM: bottomM + slabM,
  };
}
