import { fillGround, groundAt, type GroundOdds, type GroundStretch, type Study } from '../../../lib/index.ts';
import { putAt, type Path } from '../../page/place.ts';

const list: Path = ['brief', 'groundStretches'];

const put = (study: Study, stretches: readonly GroundStretch[]): Study => putAt(study, list, stretches);

const roundM = (metres: number): number => Number(metres.toFixed(1));

/** The study with the end of one stretch moved, and with it the start of the next: no gap opens between two. */
export function withBoundary(study: Study, boundary: number, chainageM: number): Study {
  return put(
    study,
    study.brief.groundStretches.map((stretch, i) => ({
      ...stretch,
      ...(i === boundary && { fromM: chainageM }),
      ...(i === boundary - 1 && { toM: chainageM }),
    })),
  );
}

/** Chainage of a boundary, m: 0 is the start of the first stretch. */
export const boundaryAt = ({ brief }: Study, boundary: number): number =>
  brief.groundStretches[boundary]?.fromM ?? brief.groundStretches[boundary - 1]!.toM;

/** A stretch made into two halves of the same ground. */
export function withSplit(study: Study, index: number): Study {
  return put(
    study,
    study.brief.groundStretches.flatMap((stretch, i) => {
      if (i !== index) return [stretch];
      const middleM = roundM((stretch.fromM + stretch.toM) / 2);
      return [
        { ...stretch, toM: middleM },
        { ...stretch, fromM: middleM },
      ];
    }),
  );
}

/** A stretch taken out: the one before it runs on over it, or the one after where it is the first. */
export function withoutStretch(study: Study, index: number): Study {
  const { groundStretches } = study.brief;
  const gone = groundStretches[index];
  if (gone === undefined || groundStretches.length < 2) return study;
  const kept = groundStretches.map((stretch, i) => ({
    ...stretch,
    ...(i === index - 1 && { toM: gone.toM }),
    ...(index === 0 && i === 1 && { fromM: gone.fromM }),
  }));
  return put(
    study,
    kept.filter((_, i) => i !== index),
  );
}

/** Odds that the classes of a stretch leave open, as a share: 0 when they add up, negative when they are too many. */
export const missingOdds = (classes: readonly GroundOdds[]): number =>
  Number((1 - classes.reduce((sum, { odds }) => sum + odds, 0)).toFixed(6));

/** The likeliest of some classes, the first of equals. */
export const likeliest = (classes: readonly GroundOdds[]): number =>
  classes.reduce((best, { odds }, i) => (odds > classes[best]!.odds ? i : best), 0);

/** How it is said where a class bears: at a level, or as deep below the ground, which it follows. */
export type BearingBy = 'level' | 'depth';

/** Which of the two a class says; undefined where there is no such class. */
export function bearingBy({ brief }: Study, index: number, c: number): BearingBy | undefined {
  const one = brief.groundStretches[index]?.classes[c];
  return one && (one.bearingDepthM === undefined ? 'level' : 'depth');
}

/** A class that says the other of the two, so that it bears as before in the middle of its stretch. */
export function withBearingBy(study: Study, index: number, c: number, by: BearingBy): Study {
  const { crossing, groundStretches } = study.brief;
  const stretch = groundStretches[index]!;
  const { bearingLevelM = 0, bearingDepthM, ...one } = stretch.classes[c]!;
  if ((bearingDepthM === undefined) === (by === 'level')) return study;
  const line = {
    groundX: crossing.ground.map(({ chainageM }) => chainageM),
    groundZ: crossing.ground.map(({ levelM }) => levelM),
  };
  const groundM = groundAt(line, (stretch.fromM + stretch.toM) / 2);
  const changed =
    by === 'depth'
      ? { ...one, bearingDepthM: Math.max(0, roundM(groundM - bearingLevelM)) }
      : { ...one, bearingLevelM: roundM(groundM - bearingDepthM!) };
  return putAt(study, [...list, index, 'classes', c], changed);
}

/** A stretch of which nothing is known: it takes the odds the tool gives to ground nobody has looked at. */
export function withUnknownGround(study: Study, index: number): Study {
  const stretch = study.brief.groundStretches[index];
  if (stretch === undefined) return study;
  const { fromM, toM } = stretch;
  const [filled] = fillGround([{ fromM, toM, classes: 'unknown' }], study.brief.crossing);
  return putAt(study, [...list, index], filled);
}
