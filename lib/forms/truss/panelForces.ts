import { trafficOnInfluence, type TrafficLoad } from '../../actions/index.ts';
import { kept, remembered } from '../../kept.ts';
import { loadTrack } from '../../mechanics/index.ts';
import { fatigueRange } from '../floor/fatigue.ts';
import { trussGeometry, type MemberRole, type TrussGeometry } from './trussGeometry.ts';

/** Axial forces of one member, kN, tension positive, characteristic. */
interface MemberForces {
  /** For a load of 1 kN at every inner floor node. */
  readonly perNode: number;
  readonly trafficMax: number;
  readonly trafficMin: number;
  readonly fatigueRange: number;
}

/** Forces of all members of a panel layout at a height of 1 m, ready to be scaled to any height. */
export interface PanelForces {
  readonly spanM: number;
  readonly panels: number;
  readonly hangers: boolean;
  readonly members: readonly MemberForces[];
}

/** Height at which the panel forces are kept. */
const referenceM = 1;

/**
 * Places traffic on the influence line of every member once for a layout of panels. Bending moments and panel shears do
 * not depend on the height of the truss, so every height can be tried from this.
 * @param fatigueShare share of a lorry in the worst lane that this plane takes
 */
export function panelForces(
  spanM: number,
  panels: number,
  hangers: boolean,
  traffic: TrafficLoad,
  fatigueShare: number,
): PanelForces {
  const key = JSON.stringify([spanM, panels, hangers, traffic, fatigueShare]);
  return remembered(known, key, () => placed(spanM, panels, hangers, traffic, fatigueShare));
}

/** Trial depths of the floor ask for the same panels again. */
const known = kept<PanelForces>(200);

function placed(
  spanM: number,
  panels: number,
  hangers: boolean,
  traffic: TrafficLoad,
  fatigueShare: number,
): PanelForces {
  const geometry = trussGeometry(spanM, referenceM, panels, hangers);
  const track = loadTrack(geometry.nodesM);
  const members = geometry.members.map(({ role, influence }) => {
    const perNode = influence.reduce((sum, v) => sum + v, 0);
    const moving = trafficOnInfluence(traffic, track, influence);
    const range =
      fatigueShare * fatigueRange(traffic.standard, track, influence, fatigueLengthM(role, geometry));
    return { perNode, trafficMax: moving.max, trafficMin: moving.min, fatigueRange: range };
  });
  return { spanM, panels, hangers, members };
}

/** Length the damage factor goes by: chords as beams in bending, diagonals as beams in shear, hangers by their two panels. */
function fatigueLengthM(role: MemberRole, geometry: TrussGeometry): number {
  if (role === 'hanger') return 2 * geometry.panelM;
  return role === 'bottom-chord' || role === 'top-chord' ? geometry.spanM : 0.4 * geometry.spanM;
}

/** What a force at the reference height is multiplied by for a truss of this geometry. */
export function heightFactor(role: MemberRole, geometry: TrussGeometry): number {
  switch (role) {
    case 'bottom-chord':
    case 'top-chord':
      return referenceM / geometry.heightM;
    case 'end-post':
    case 'diagonal': {
      const reach = geometry.hangers ? geometry.panelM : geometry.panelM / 2;
      const sine = (h: number): number => h / Math.hypot(reach, h);
      return sine(referenceM) / sine(geometry.heightM);
    }
    case 'hanger':
    case 'post':
      return 1;
  }
}
