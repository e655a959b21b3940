import type { Design, FormId, MeasuredLine, RoadProfile, Site, Unit } from '../../lib/model/index.ts';
import { proposedProfile } from '../../lib/site/index.ts';

/** An invented crossing of 200 m: level ground at 0, a river from 80 to 120 with its bed at -4 and water at -1. */
export const crossing: Site = {
  startM: 0,
  endM: 200,
  lengthM: 200,
  groundX: [0, 79, 80, 120, 121, 200],
  groundZ: [0, 0, -4, -4, 0, 0],
  zones: [],
  soffitLimits: [],
  waters: [{ name: 'Brook', fromM: 80, toM: 120, levelM: -1, floodLevelM: null }],
  groundStretches: [
    {
      fromM: 0,
      toM: 200,
      known: false,
      classes: [
        { ground: 'gravel', bearingLevelM: -2, odds: 0.6 },
        { ground: 'soft-clay', bearingLevelM: -12, odds: 0.4 },
      ],
    },
  ],
  road: {
    startLevelM: 10,
    endLevelM: 10,
    fixedEnd: 'none',
    mayRiseM: 2,
    maxGradient: 0.05,
    fillSideSlope: 2,
    designSpeedKmh: 'unknown',
    crestRadiusM: 'unknown',
    sagRadiusM: 'unknown',
    startTieIn: 'moves',
    endTieIn: 'moves',
    startApproachM: 'unknown',
    endApproachM: 'unknown',
    approachSides: 'slopes',
  },
  // Grades meet at an angle, so that volumes can be followed by hand.
  roadCurves: { crestRadiusM: 0, sagRadiusM: 0 },
  deck: {
    widthM: 12,
    carriagewayM: 9,
    carriagewayOffsetM: 0,
    lanes: 2,
    footwayM: 2,
    surfacingM: 0.09,
    superimposedKNm: 40,
  },
  standard: 'lm1',
  planRadiusM: Infinity,
  skewDeg: 0,
  mainOpening: null,
};

export const profile: RoadProfile = proposedProfile(crossing);

/** Loads of a deck in kN per m, spread over its supports by half-spans; enough to stand supports under it. */
export function plainDesign(spansM: readonly number[], more: Partial<Sized> = {}): Design {
  const form: FormId = more.form ?? 'composite-i';
  const permanent = more.permanentKNm ?? 130;
  const half = (i: number): number => ((spansM[i - 1] ?? 0) + (spansM[i] ?? 0)) / 2;
  const depth = more.depthM ?? 2.5;
  const length = spansM.reduce((sum, span) => sum + span, 0);
  const check = { id: 'bending', label: 'bending', demand: 1, capacity: 2, unit: 'MNm', utilisation: 0.5 };
  return {
    task: {
      form,
      spansM,
      deck: crossing.deck,
      standard: 'lm1',
      planRadiusM: Infinity,
      method: more.method ?? 'crane',
      depthM: depth,
    },
    depthM: { support: depth, midspan: depth },
    depthAlong: { xM: [0, length], depthM: [depth, depth] },
    elevation: [],
    sections: [],
    reactions: Array.from({ length: spansM.length + 1 }, (_, i) => ({
      permanentKN: permanent * half(i),
      trafficMaxKN: 50 * half(i) + 600,
      trafficMinKN: more.trafficMinKN ?? -50,
    })),
    checks: [check],
    limitingCheck: check,
    ownWeightShare: 0.5,
    lines: more.lines ?? [steelLine(180 * length * crossing.deck.widthM)],
    heaviestPiece: more.piece ?? { lengthM: 25, massT: 40 },
    warnings: [],
    figures: {},
  };
}

interface Sized {
  readonly form: FormId;
  readonly method: Design['task']['method'];
  readonly permanentKNm: number;
  readonly depthM: number;
  readonly trafficMinKN: number;
  readonly lines: readonly MeasuredLine[];
  readonly piece: Design['heaviestPiece'];
}

export const steelLine = (quantity: number): MeasuredLine => ({
  part: 'deck',
  item: 'plate-girder-steel',
  quantity,
  what: 'girders',
  how: 'given',
});

/** A unit of a form on supports at these chainages. */
export const unitOn = (supportsM: readonly number[], form: FormId = 'composite-i'): Unit => ({
  form,
  role: 'main',
  supportsM,
});
