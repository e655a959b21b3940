import { memberSection, type MemberDemand, type MemberSection } from './memberSection.ts';
import { heightFactor, type PanelForces } from './panelForces.ts';
import { sizeBracing, type Bracing } from './sizeBracing.ts';
import type { TrussCase } from './trussCase.ts';
import { trussData } from './trussData.ts';
import type { TrussGeometry, TrussMember } from './trussGeometry.ts';

export interface SizedMember {
  readonly member: TrussMember;
  readonly section: MemberSection;
  /** Design axial forces, kN. */
  readonly demand: MemberDemand;
}

/** One truss plane with its share of bracing. */
export interface SizedTruss {
  readonly geometry: TrussGeometry;
  readonly members: readonly SizedMember[];
  readonly bracing: Bracing;
  /** Members and connections of one plane, kg. */
  readonly planeKg: number;
  /** Own weight of one plane with half the bracing, kN/m. */
  readonly ownKNm: number;
  readonly worst: SizedMember;
}

const density = 7850;

/**
 * Sizes all members of one truss plane for the forces of its panels; own weight and wind are found by repeating until
 * the own weight moves by less than 0.5 %; `startKNm` is the first guess of it. Chord sections run over whole pieces.
 */
export function sizeTruss(
  geometry: TrussGeometry,
  forces: PanelForces,
  c: TrussCase,
  startKNm = 0.35 * (c.loads.floorKNm + c.loads.superimposedKNm),
): SizedTruss {
  const { members, spanM } = geometry;
  let ownKNm = startKNm;
  let bracing = sizeBracing(geometry, c, 0.5 * geometry.heightM);
  let sized: SizedMember[] = [];
  let planeKg = 0;
  for (let pass = 0; pass < 12; pass++) {
    const demands = memberDemands(geometry, forces, c, ownKNm, bracing);
    sized = members.map((member, i) => ({
      member,
      demand: demands[i]!,
      section: sectionFor(member, demands[i]!, c),
    }));
    alikeInPieces(sized, 'bottom-chord');
    alikeInPieces(sized, 'top-chord');
    planeKg = 0;
    let faceM2 = 0;
    for (const { member, section } of sized) {
      planeKg += member.count * member.lengthM * section.areaM2 * density;
      faceM2 += member.count * member.lengthM * section.depthM;
    }
    planeKg *= 1 + trussData.connectionShare.value;
    bracing = sizeBracing(geometry, c, faceM2 / spanM);
    const next = ((planeKg + bracing.massKg / 2) * 9.81) / 1000 / spanM;
    const settled = Math.abs(next - ownKNm) <= 0.005 * next;
    ownKNm = next;
    if (settled) break;
  }
  let worst = sized[0]!;
  for (const one of sized) if (one.section.utilisation > worst.section.utilisation) worst = one;
  return { geometry, members: sized, bracing, planeKg, ownKNm, worst };
}

function memberDemands(
  geometry: TrussGeometry,
  forces: PanelForces,
  c: TrussCase,
  ownKNm: number,
  bracing: Bracing,
): MemberDemand[] {
  const { uls } = c.standard.factors;
  const permanentMost =
    (uls.permanent * (c.loads.floorKNm + ownKNm) + uls.superimposed * c.loads.superimposedKNm) *
    geometry.panelM;
  const permanentLeast =
    (uls.permanentFavourable * (c.loads.floorKNm + ownKNm) +
      uls.superimposedFavourable * c.loads.superimposedKNm) *
    geometry.panelM;
  return geometry.members.map((member, i) => {
    const f = forces.members[i]!;
    const factor = heightFactor(member.role, geometry);
    const perNode = f.perNode * factor;
    const wind = windForce(member, geometry, bracing);
    const most =
      (perNode > 0 ? permanentMost : permanentLeast) * perNode + uls.traffic * f.trafficMax * factor;
    const least =
      (perNode > 0 ? permanentLeast : permanentMost) * perNode + uls.traffic * f.trafficMin * factor;
    const strut = member.role === 'post' ? postKN(geometry, c, ownKNm) : 0;
    return {
      tensionKN: Math.max(0, most + wind),
      compressionKN: Math.max(0, -least + wind, strut),
      momentKNm: member.role === 'end-post' ? bracing.portalMomentKNm : 0,
      rangeKN: f.fatigueRange * factor,
      lengthM: member.lengthM,
    };
  });
}

/** Posts only hold the top chord up half-way between its nodes; they are given the own weight of one floor panel. */
function postKN(geometry: TrussGeometry, c: TrussCase, ownKNm: number): number {
  return c.standard.factors.uls.permanent * ownKNm * geometry.panelM;
}

/** Axial force of a chord as the flange of the wind truss, design value with traffic, kN (either sign). */
function windForce(member: TrussMember, geometry: TrussGeometry, bracing: Bracing): number {
  const isBottom = member.role === 'bottom-chord';
  if (!isBottom && member.role !== 'top-chord') return 0;
  const x = (member.from[0] + member.to[0]) / 2;
  const { spanM } = geometry;
  const share = (4 * x * (spanM - x)) / spanM ** 2;
  return (isBottom ? bracing.bottomChordKN : bracing.topChordKN) * share;
}

/** Chords, end posts and struts are boxes; ties are H. */
function sectionFor(member: TrussMember, demand: MemberDemand, c: TrussCase): MemberSection {
  const tie =
    member.role === 'hanger' ||
    member.role === 'post' ||
    (member.role === 'diagonal' && demand.tensionKN > 2 * demand.compressionKN);
  const mostDepthM = member.role === 'bottom-chord' ? c.floorDepthM : Infinity;
  return memberSection(tie ? 'H' : 'box', c.memberWidthM, demand, c.rules, mostDepthM);
}

/** Neighbouring chord members made in one piece take the heaviest section among them. */
function alikeInPieces(sized: SizedMember[], role: TrussMember['role']): void {
  const at = sized.flatMap((one, i) => (one.member.role === role ? [i] : []));
  if (at.length === 0) return;
  const perPiece = Math.max(
    1,
    Math.floor(trussData.pieceLengthM.value / sized[at[0]!]!.member.lengthM + 1e-9),
  );
  for (let start = 0; start < at.length; start += perPiece) {
    const piece = at.slice(start, start + perPiece);
    const heaviest = piece.reduce((a, b) => (sized[b]!.section.areaM2 > sized[a]!.section.areaM2 ? b : a));
    const { section, demand } = sized[heaviest]!;
    for (const i of piece) {
      const one = sized[i]!;
      const utilisation = Math.min(
        section.utilisation,
        section.utilisation * (force(one.demand) / Math.max(1e-9, force(demand))),
      );
      sized[i] = { ...one, section: { ...section, utilisation } };
    }
  }
}

function force(demand: MemberDemand): number {
  return Math.max(demand.tensionKN, demand.compressionKN);
}
