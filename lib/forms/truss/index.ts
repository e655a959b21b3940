import { trafficOnDeck, trafficOnInfluence } from '../../actions/index.ts';
import type { Check, Design, MeasuredLine, SupportReaction, UnitTask } from '../../model/index.ts';
import { checkUnitTask } from '../common/checkUnitTask.ts';
import { check, limiting } from '../common/checks.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { evenTowers } from '../common/evenTowers.ts';
import { skewPlanesWarnings } from '../common/skewPlanes.ts';
import { supportPositions, totalLength } from '../common/supports.ts';
import { overLimit } from '../common/warnings.ts';
import type { FormModule } from '../formModule.ts';
import { trussData } from './trussData.ts';
import { trussElevation, trussSectionAt } from './trussDrawing.ts';
import { temporaryLines, towersUnder, trussLines } from './trussLines.ts';
import { longestTrussM, trussSpan, type TrussSpan } from './trussSpan.ts';
import type { MemberRole } from './trussGeometry.ts';

/**
 * Simple-span through truss: the road runs between two Warren trusses on cross-girders, stringers and a composite slab.
 *
 * `depthM` of the task is the depth of the floor, soffit of the cross-girders to top of the slab: it is what takes
 * clearance under the road. The height of the trusses themselves goes up and not down, is chosen here for least steel
 * and stands in the figures as `trussHeightM`. Several spans are simple spans in a row.
 * Spans from 20 m to `mostSpanM`: simple trusses, where the published band of trusses reaches to cantilever trusses.
 */
export const truss: FormModule = {
  id: 'truss',
  family: 'truss',
  name: 'Truss',
  pattern: { kind: 'simple-main', approach: 'composite-i' },
  methods: ['crane', 'float-in'],
  mostSpanM: longestTrussM(),
  temporaryTowersM: ({ spansM, method }) => evenTowers(spansM, (spanM) => towersUnder(spanM, method)),
  size,
};

function size(task: UnitTask): Design {
  checkTask(task);
  const spans = task.spansM.map((spanM) => trussSpan(spanM, task));
  const starts = supportPositions(task.spansM);
  const governing = spans.reduce((a, b) => (b.spanM > a.spanM ? b : a));
  const checks = checksOf(governing);
  const warnings = [
    ...warningsOf(task, checks),
    ...skewPlanesWarnings(task, governing.planesM, governing.deflectionM),
  ];
  const { heights, known } = heightsUnder(task);
  if (!known && task.method === 'crane') {
    warnings.push(
      `Height under the span is not given: temporary towers are measured ${trussData.assumedHeightM.value} m high.`,
    );
  }
  const lines: MeasuredLine[] = spans.flatMap((span, i) => [
    ...trussLines(span, task),
    ...temporaryLines(span, heights[i]!, task),
  ]);
  const lengthM = totalLength(task.spansM);
  return {
    task,
    depthM: { support: task.depthM, midspan: task.depthM },
    depthAlong: constantDepth(lengthM, task.depthM),
    elevation: spans.flatMap((span, i) => trussElevation(span, starts[i]!, task)),
    sections: [trussSectionAt(governing, starts[spans.indexOf(governing)]!, task)],
    reactions: reactionsOf(spans, task),
    checks,
    limitingCheck: limiting(checks),
    ownWeightShare: ownWeightShare(governing, task),
    lines,
    heaviestPiece: heaviestPiece(governing),
    warnings,
    figures: figuresOf(governing, lengthM * task.deck.widthM, spans),
  };
}

function checkTask(task: UnitTask): void {
  checkUnitTask(task);
  task.spansM.forEach((span, i) => {
    if (!(span >= 20 && span <= 400))
      throw new RangeError(
        `spansM[${i}]: expected 20 to 400 m for a truss, received ${span} m; choose another span or form`,
      );
  });
}

/** Height of the soffit above ground under each span, m. */
function heightsUnder(task: UnitTask): { heights: number[]; known: boolean } {
  const under = task.clearUnderM;
  const known = under !== undefined && under.length === task.spansM.length + 1;
  const heights = task.spansM.map((_, i) =>
    known ? (under[i]! + under[i + 1]!) / 2 : trussData.assumedHeightM.value,
  );
  return { heights, known };
}

const groups: readonly {
  readonly id: string;
  readonly label: string;
  readonly roles: readonly MemberRole[];
}[] = [
  { id: 'bottom-chord', label: 'bottom chord', roles: ['bottom-chord'] },
  { id: 'top-chord', label: 'top chord', roles: ['top-chord'] },
  { id: 'end-post', label: 'end post with portal bending', roles: ['end-post'] },
  { id: 'diagonal', label: 'diagonals', roles: ['diagonal'] },
  { id: 'hanger', label: 'hangers and posts', roles: ['hanger', 'post'] },
];

function checksOf(span: TrussSpan): Check[] {
  const checks: Check[] = [];
  for (const { id, label, roles } of groups) {
    const members = span.truss.members.filter(({ member }) => roles.includes(member.role));
    if (members.length === 0) continue;
    const worst = members.reduce((a, b) => (b.section.utilisation > a.section.utilisation ? b : a));
    const force = Math.max(worst.demand.tensionKN, worst.demand.compressionKN);
    const use = worst.section.utilisation;
    const capacity = use > 0 ? force / use : force;
    checks.push(check(id, `${label}, ${worst.section.governs.replace('-', ' ')}`, force, capacity, 'kN'));
  }
  checks.push(
    ...span.floor.checks,
    check('deflection', 'deflection of midspan under traffic', span.deflectionM, span.deflectionLimitM, 'm'),
  );
  return checks;
}

function warningsOf(task: UnitTask, checks: readonly Check[]): string[] {
  const warnings = overLimit(checks, 'plates');
  if (task.spansM.length > 1)
    warnings.push('Several spans are sized as simple spans; continuous trusses would be lighter.');
  if (Number.isFinite(task.planRadiusM)) {
    const [longest] = [...task.spansM].sort((a, b) => b - a);
    const middleM = longest! ** 2 / (8 * task.planRadiusM);
    if (middleM > 0.25)
      warnings.push(
        `The road moves ${middleM.toFixed(1)} m sideways along a straight truss on this curve; the floor is sized without that width.`,
      );
  }
  return warnings;
}

function reactionsOf(spans: readonly TrussSpan[], task: UnitTask): SupportReaction[] {
  const load = trafficOnDeck(task.standard, task.deck);
  const reactions = Array.from({ length: spans.length + 1 }, () => ({
    permanentKN: 0,
    trafficMaxKN: 0,
    trafficMinKN: 0,
  }));
  spans.forEach((span, i) => {
    const permanent = (permanentKNm(span, task) * span.spanM) / 2;
    const traffic = trafficOnInfluence(load, [0, span.spanM], [1, 0]).max;
    for (const at of [i, i + 1]) {
      const reaction = reactions[at]!;
      reaction.permanentKN += permanent;
      // Both spans beside a pier loaded at once: a little over one vehicle too many.
      reaction.trafficMaxKN += traffic;
    }
  });
  return reactions;
}

/** Characteristic permanent load of the whole deck, kN/m. */
function permanentKNm(span: TrussSpan, task: UnitTask): number {
  return span.floor.slabKNm + span.floor.steelKNm + 2 * span.truss.ownKNm + task.deck.superimposedKNm;
}

/** Self-weight part of the characteristic midspan moment of the worse truss. */
function ownWeightShare(span: TrussSpan, task: UnitTask): number {
  const eighth = span.spanM ** 2 / 8;
  const own = (permanentKNm(span, task) - task.deck.superimposedKNm) / 2;
  const triangle = [0, span.spanM / 4, 0];
  const traffic = trafficOnInfluence(span.traffic, [0, span.spanM / 2, span.spanM], triangle).max;
  return (own * eighth) / ((permanentKNm(span, task) / 2) * eighth + traffic);
}

/** Heaviest of a chord piece of about the usual length and a cross-girder. */
function heaviestPiece(span: TrussSpan): { lengthM: number; massT: number } {
  const { geometry, members } = span.truss;
  const pieceM = Math.min(trussData.pieceLengthM.value, 2 * geometry.panelM);
  const area = Math.max(...members.map(({ section }) => section.areaM2));
  const chordT = area * 7.85 * pieceM * (1 + trussData.connectionShare.value);
  const { crossGirder, crossM } = span.floor;
  const crossT = (crossGirder.massKgPerM * crossM) / 1000;
  return chordT >= crossT ? { lengthM: pieceM, massT: chordT } : { lengthM: crossM, massT: crossT };
}

function figuresOf(span: TrussSpan, deckAreaM2: number, spans: readonly TrussSpan[]): Record<string, number> {
  const { geometry, members, bracing } = span.truss;
  const largest = (role: MemberRole): number =>
    Math.max(0, ...members.filter(({ member }) => member.role === role).map(({ section }) => section.areaM2));
  const strongest = (role: MemberRole, key: 'tensionKN' | 'compressionKN'): number =>
    Math.max(0, ...members.filter(({ member }) => member.role === role).map(({ demand }) => demand[key]));
  const steelKg = spans.reduce((sum, one) => sum + one.steelKg, 0);
  return {
    trussHeightM: geometry.heightM,
    trussHeightOverSpan: geometry.heightM / span.spanM,
    panelM: geometry.panelM,
    panels: geometry.panels,
    hangers: geometry.hangers ? 1 : 0,
    planesM: span.planesM,
    memberWidthM: span.memberWidthM,
    bottomChordAreaM2: largest('bottom-chord'),
    topChordAreaM2: largest('top-chord'),
    bottomChordTensionKN: strongest('bottom-chord', 'tensionKN'),
    topChordCompressionKN: strongest('top-chord', 'compressionKN'),
    endPostCompressionKN: strongest('end-post', 'compressionKN'),
    trussOwnKNm: span.truss.ownKNm,
    floorSteelKgM2: (span.floor.steelKgPerM * totalLength(spans.map((one) => one.spanM))) / deckAreaM2,
    bracingKg: bracing.massKg,
    windTopKNm: bracing.windTopKNm,
    windBottomKNm: bracing.windBottomKNm,
    deflectionM: span.deflectionM,
    steelKgM2: steelKg / deckAreaM2,
    slabM: span.floor.slab.meanM,
    spanSteelT: span.steelKg / 1000,
  };
}
