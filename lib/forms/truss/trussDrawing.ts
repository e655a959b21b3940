import type { SectionCut, Shape, UnitTask } from '../../model/index.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { deckFace, upright } from '../common/elevation.ts';
import { floorSection } from '../floor/floorShapes.ts';
import type { SizedMember } from './sizeTruss.ts';
import type { TrussSpan } from './trussSpan.ts';

/** Height of the bottom chord axis over the top of the slab, m (negative): the deepest of the chord lies with its foot in the soffit. */
function chordAxisZ(span: TrussSpan, depthM: number): number {
  const chords = span.truss.members.filter(({ member }) => member.role === 'bottom-chord');
  return -depthM + Math.max(...chords.map(({ section }) => section.depthM)) / 2;
}

/** Members, slab and cross-girders of one span in elevation, moved by `startM` along the unit. */
export function trussElevation(span: TrussSpan, startM: number, task: UnitTask): Shape[] {
  const { geometry, members } = span.truss;
  const z0 = chordAxisZ(span, task.depthM);
  const slabM = span.floor.slab.midM;
  const along = constantDepth(span.spanM, task.depthM);
  const shifted = (shape: Shape): Shape => ({
    ...shape,
    points: shape.points.map(([x, z]) => [x + startM, z]),
  });
  const shapes: Shape[] = [deckFace('slab', 'concrete', constantDepth(span.spanM, slabM))];
  for (const x of geometry.nodesM) shapes.push(upright('cross-girder', 'steel', along, x, slabM, 0.3));
  for (const one of members) {
    shapes.push(memberLine(one, z0, (x) => x));
    if (one.member.count === 2) shapes.push(memberLine(one, z0, (x) => span.spanM - x));
  }
  return shapes.map(shifted);
}

function memberLine({ member, section }: SizedMember, z0: number, place: (x: number) => number): Shape {
  return {
    part: member.role.replace('-', ' '),
    material: 'steel',
    kind: 'line',
    points: [
      [place(member.from[0]), z0 + member.from[1]],
      [place(member.to[0]), z0 + member.to[1]],
    ],
    thicknessM: section.depthM,
  };
}

/** Cross-section at midspan of a span that starts at `startM`: floor, both trusses cut, strut overhead. */
export function trussSectionAt(span: TrussSpan, startM: number, task: UnitTask): SectionCut {
  const { truss, planesM } = span;
  const z0 = chordAxisZ(span, task.depthM);
  const top = z0 + truss.geometry.heightM;
  const nearest = (role: SizedMember['member']['role']): SizedMember | undefined =>
    truss.members.filter(({ member }) => member.role === role).at(-1);
  const shapes: Shape[] = [...floorSection(span.floor, task.deck, planesM / 2)];
  shapes.push({
    part: 'top strut',
    material: 'steel',
    kind: 'line',
    points: [
      [-planesM / 2, top],
      [planesM / 2, top],
    ],
    thicknessM: 0.3,
    faint: true,
  });
  for (const y of [-planesM / 2, planesM / 2]) {
    const web = nearest('diagonal')!;
    shapes.push({
      part: 'diagonal',
      material: 'steel',
      kind: 'line',
      points: [
        [y, z0],
        [y, top],
      ],
      thicknessM: web.section.widthM,
      faint: true,
    });
    shapes.push(
      chordBox(nearest('bottom-chord')!, 'bottom chord', y, z0),
      chordBox(nearest('top-chord')!, 'top chord', y, top),
    );
  }
  return { at: 'midspan', xM: startM + span.spanM / 2, shapes };
}

function chordBox({ section }: SizedMember, part: string, y: number, z: number): Shape {
  const t = section.thicknessMm / 1000;
  const ring = (inset: number): [number, number][] => {
    const w = section.widthM / 2 - inset;
    const d = section.depthM / 2 - inset;
    return [
      [y - w, z - d],
      [y + w, z - d],
      [y + w, z + d],
      [y - w, z + d],
    ];
  };
  return { part, material: 'steel', kind: 'polygon', points: ring(0), holes: [ring(t)] };
}
