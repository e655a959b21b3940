import type { MeasuredLine, UnitTask } from '../../model/index.ts';
import { measured } from '../common/measured.ts';
import { trussData } from './trussData.ts';
import type { MemberRole } from './trussGeometry.ts';
import type { TrussSpan } from './trussSpan.ts';

const density = 7850;

const groups: readonly { readonly what: string; readonly roles: readonly MemberRole[] }[] = [
  { what: 'bottom chords', roles: ['bottom-chord'] },
  { what: 'top chords', roles: ['top-chord'] },
  { what: 'end posts and diagonals', roles: ['end-post', 'diagonal'] },
  { what: 'hangers and posts', roles: ['hanger', 'post'] },
];

/** Measured lines of one span: both trusses, bracing, floor, slab, paint. */
export function trussLines(span: TrussSpan, task: UnitTask): MeasuredLine[] {
  const { truss, floor, spanM } = span;
  const lines: MeasuredLine[] = [];
  let membersKg = 0;
  let membersPaintM2 = 0;
  for (const { what, roles } of groups) {
    let kg = 0;
    let pieces = 0;
    for (const { member, section } of truss.members) {
      if (!roles.includes(member.role)) continue;
      const lengthM = 2 * member.count * member.lengthM;
      kg += lengthM * section.areaM2 * density;
      membersPaintM2 += lengthM * section.perimeterM;
      pieces += 2 * member.count;
    }
    if (pieces === 0) continue;
    membersKg += kg;
    lines.push(measured('deck', 'truss-steel', kg, what, `two trusses, ${pieces} members, ${density} kg/m3`));
  }
  const share = trussData.connectionShare.value;
  lines.push(
    measured(
      'deck',
      'truss-steel',
      membersKg * share,
      'gussets, splices, diaphragms, bolts',
      `${100 * share} % of the members`,
    ),
    measured(
      'deck',
      'truss-steel',
      truss.bracing.massKg,
      'wind bracing and portals',
      'sized by wind and slenderness',
    ),
    measured(
      'deck',
      'plate-girder-steel',
      floor.crossGirder.massKgPerM * floor.crossM * (truss.geometry.panels + 1),
      'cross-girders',
      `${truss.geometry.panels + 1} of ${floor.crossM.toFixed(1)} m`,
    ),
    measured(
      'deck',
      'plate-girder-steel',
      (floor.stringer?.massKgPerM ?? 0) * floor.stringerOffsetsM.length * spanM,
      'stringers',
      `${floor.stringerOffsetsM.length} lines`,
    ),
  );
  const areaM2 = spanM * task.deck.widthM;
  lines.push(
    measured(
      'deck',
      'deck-concrete',
      floor.slab.meanM * areaM2,
      'slab',
      `${Math.round(1000 * floor.slab.meanM)} mm`,
    ),
    measured(
      'deck',
      'reinforcement',
      floor.barsKgM2 * areaM2,
      'bars of the slab',
      `${floor.barsKgM2.toFixed(0)} kg/m2`,
    ),
    measured('deck', 'slab-formwork', areaM2, 'formwork of the slab', 'deck area'),
    measured(
      'deck',
      'paint',
      membersPaintM2 + truss.bracing.paintM2 + floor.paintM2PerM * spanM,
      'trusses, bracing and floor',
      'outside surfaces',
    ),
  );
  return lines;
}

/** Towers under one truss of a span while it is put together by crane; none where it is floated in. */
export const towersUnder = (spanM: number, method: UnitTask['method']): number =>
  method === 'crane' ? Math.max(0, Math.ceil(spanM / trussData.temporaryTowers.freeSpanM - 1e-9) - 1) : 0;

/** Towers that hold a truss up while it is put together by crane; nothing for a span that is floated in. */
export function temporaryLines(span: TrussSpan, heightM: number, task: UnitTask): MeasuredLine[] {
  const towers = towersUnder(span.spanM, task.method);
  if (towers === 0) return [];
  const how = `2 x ${towers} towers of ${heightM.toFixed(1)} m, one about every ${trussData.temporaryTowers.freeSpanM} m under each truss`;
  return [
    measured('temporary-works', 'temporary-tower', 2 * towers * heightM, 'towers under the trusses', how),
  ];
}
