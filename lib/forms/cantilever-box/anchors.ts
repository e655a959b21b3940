import { lineBeam, pointLoads, type Effects, type LineBeam } from '../../mechanics/index.ts';
import { supportPositions } from '../common/supports.ts';
import type { Arm } from './arms.ts';

/** The joined spans beside a pier that hold its longer arm down until that is joined in its turn. */
export interface Anchor {
  /** The longer arm, and the one that is joined before it: places among the arms. */
  readonly longer: number;
  readonly shorter: number;
  /** Support of both, and on which side of it the spans lie. */
  readonly support: number;
  readonly side: -1 | 1;
  readonly firstSpan: number;
  readonly lastSpan: number;
  /** These spans alone, and the station of the whole deck at which they begin. */
  readonly beam: LineBeam;
  readonly fromStation: number;
  /** What a couple of 1 kNm over the pier brings about that hogs these spans. */
  readonly hogged: Pick<Effects, 'momentKNm' | 'shearLeftKN' | 'shearRightKN' | 'reactionKN'>;
}

/** What the beams of the joined spans are made with: as the whole deck, `eiKNm2` from its first support. */
interface Whole {
  readonly spansM: readonly number[];
  readonly eiKNm2: (xM: number) => number;
  readonly stationsPerSpan: number;
  readonly extraStationsM: readonly number[];
  readonly beam: LineBeam;
}

/**
 * Anchors in the order in which they are called upon. Spans are joined from the shortest arms to the longest, so that a
 * longer arm is held by all spans beyond its pier whose arms are shorter. Equal arms balance each other, save that
 * lightweight concrete may make one of them lighter: the end span is then joined first.
 */
export function anchorsOf(arms: readonly Arm[], isLight: boolean, whole: Whole): Anchor[] {
  const last = whole.spansM.length - 1;
  const isEnd = (span: number): boolean => span === 0 || span === last;
  const lengthIn = whole.spansM.map((_, span) =>
    Math.max(0, ...arms.filter((arm) => arm.span === span).map(({ armM }) => armM)),
  );
  const anchors: Anchor[] = [];
  for (let k = 0; k < arms.length; k += 2) {
    const [left, right] = [arms[k]!, arms[k + 1]!];
    const moreM = right.armM - left.armM;
    const alike = Math.abs(moreM) < 1e-9;
    if (alike && !(isLight && isEnd(left.span) !== isEnd(right.span))) continue;
    const leftFirst = alike ? isEnd(left.span) : moreM > 0;
    const [shorter, longer] = leftFirst ? [k, k + 1] : [k + 1, k];
    const { span: near, side } = arms[shorter]!;
    let far = near;
    while (whole.spansM[far + side] !== undefined && lengthIn[far + side]! < arms[longer]!.armM - 1e-9)
      far += side;
    const [firstSpan, lastSpan] = [Math.min(near, far), Math.max(near, far)];
    const { support } = left;
    anchors.push({
      longer,
      shorter,
      support,
      side,
      firstSpan,
      lastSpan,
      ...joined(whole, firstSpan, lastSpan, side),
    });
  }
  return anchors.sort((a, b) => arms[a.longer]!.armM - arms[b.longer]!.armM);
}

function joined(
  { spansM, eiKNm2, stationsPerSpan, extraStationsM, beam }: Whole,
  firstSpan: number,
  lastSpan: number,
  side: -1 | 1,
): Pick<Anchor, 'beam' | 'fromStation' | 'hogged'> {
  const supportsM = supportPositions(spansM);
  const fromM = supportsM[firstSpan]!;
  const toM = supportsM[lastSpan + 1]!;
  const geometry = {
    spansM: spansM.slice(firstSpan, lastSpan + 1),
    eiKNm2: (xM: number) => eiKNm2(Math.min(toM, Math.max(fromM, fromM + xM))),
    stationsPerSpan,
    extraStationsM: extraStationsM.filter((xM) => xM > fromM && xM < toM).map((xM) => xM - fromM),
  };
  // The pier is at the end where the shorter arm reaches away from it: 1 kN on 1 m beyond it is the couple.
  const atEnd = side < 0;
  const beyond = lineBeam({ ...geometry, overhangsM: atEnd ? { end: 1 } : { start: 1 } });
  const effects = pointLoads(beyond, [{ xM: atEnd ? toM - fromM + 1 : -1, loadKN: 1 }]);
  const { supportAt } = beyond;
  const cut = (values: Float64Array): Float64Array =>
    values.slice(supportAt[0], supportAt[supportAt.length - 1]! + 1);
  const reactionKN = effects.reactionKN.slice();
  // A couple has no weight.
  reactionKN[atEnd ? reactionKN.length - 1 : 0]! -= 1;
  return {
    beam: lineBeam(geometry),
    fromStation: beam.supportAt[firstSpan]!,
    hogged: {
      momentKNm: cut(effects.momentKNm),
      shearLeftKN: cut(effects.shearLeftKN),
      shearRightKN: cut(effects.shearRightKN),
      reactionKN,
    },
  };
}
