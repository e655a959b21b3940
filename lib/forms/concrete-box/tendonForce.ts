import { materials } from '../../actions/index.ts';
import { boxData } from './boxData.ts';
import type { BoxModel } from './boxModel.ts';

/** Stress of a draped tendon. MPa. */
export interface TendonStress {
  readonly jackMPa: number;
  /** After friction, draw-in and the shortening of the concrete. */
  readonly initialMPa: number;
  /** After shrinkage, creep and relaxation too. */
  readonly lastingMPa: number;
}

/** What losses ask to know of a deck. */
export type StressedDeck = Pick<BoxModel, 'standardId' | 'task' | 'lengthM' | 'concrete'>;

/**
 * Losses of draped tendons. In continuous decks every tendon covers two spans, is stressed from both ends and laps with
 * those of the next pair, so that the force along the deck is the mean over one span; in a simple span the middle decides.
 * @param sagM drape between low and high point of the longest span, m
 * @param axialMPa mean compression of the concrete, for the elastic loss of tendons stressed one after the other
 */
export function tendonStress(model: StressedDeck, sagM: number, axialMPa: number): TendonStress {
  const { frictionPerRad, wobbleRadPerM, seatingM, longTerm } = boxData.losses;
  const { eMPa, ultimateMPa } = materials.strand[model.standardId];
  const { spansM } = model.task;
  const span = Math.max(...spansM);
  const jackMPa = boxData.jacking[model.standardId] * ultimateMPa;
  const simple = spansM.length === 1;
  // Angle of parabolas: 16 f / L over a span with reverse curves, 4 f / L from an end to the middle without.
  const exponent = simple
    ? frictionPerRad * ((4 * sagM) / span + (wobbleRadPerM * span) / 2)
    : frictionPerRad * ((16 * sagM) / span + wobbleRadPerM * span);
  const kept = simple ? Math.exp(-exponent) : (1 - Math.exp(-exponent)) / exponent;
  const lengthM = simple ? span : Math.min(model.lengthM, 2 * span);
  const seating = (2 * seatingM * eMPa) / lengthM;
  const elastic = (0.5 * eMPa * axialMPa) / model.concrete.ecmMPa;
  const initialMPa = jackMPa * kept - (simple ? 0 : seating) - elastic;
  return { jackMPa, initialMPa, lastingMPa: (1 - longTerm) * initialMPa };
}

/** Stress of straight centred tendons stressed segment by segment: draw-in and shortening, no friction to speak of. */
export function straightStress(model: BoxModel): TendonStress {
  const { seatingM, longTerm } = boxData.losses;
  const { eMPa, ultimateMPa } = materials.strand[model.standardId];
  const jackMPa = boxData.jacking[model.standardId] * ultimateMPa;
  const initialMPa = jackMPa - (seatingM * eMPa) / Math.max(...model.task.spansM);
  return { jackMPa, initialMPa, lastingMPa: (1 - longTerm) * initialMPa };
}
