import { kept, remembered } from '../../kept.ts';

/** What a truss member is for: it decides section, buckling curve and take-off. */
export type MemberRole = 'bottom-chord' | 'top-chord' | 'end-post' | 'diagonal' | 'hanger' | 'post';

/** One member of the left half of a symmetrical truss; `count` of it stand in one plane. */
export interface TrussMember {
  readonly role: MemberRole;
  /** Ends, m: x from the left bearing, z above the bottom chord axis. */
  readonly from: readonly [x: number, z: number];
  readonly to: readonly [x: number, z: number];
  readonly lengthM: number;
  /** 2 for a member with a mirror image, 1 on the axis of symmetry. */
  readonly count: number;
  /** Axial force for a unit load at each floor node, tension positive (kN per kN); nodes as in `TrussGeometry.nodesM`. */
  readonly influence: Float64Array;
}

/** A simple-span Warren truss with parallel chords, loaded at its floor nodes. */
export interface TrussGeometry {
  readonly spanM: number;
  readonly heightM: number;
  /** Distance between floor nodes (cross-girders), m. */
  readonly panelM: number;
  readonly panels: number;
  /** True where hangers halve the Warren panels, so that a main panel is two floor panels long. */
  readonly hangers: boolean;
  /** x of the floor nodes, m. */
  readonly nodesM: Float64Array;
  readonly members: readonly TrussMember[];
}

/**
 * Lays out a Warren truss and its member influence lines by the method of sections.
 *
 * Plain: floor nodes on the bottom chord, top nodes half-way between them. With hangers: a top node over every second
 * floor node, carried by a hanger, posts over the others. Parallel chords, determinate, loads at floor nodes only, so a
 * chord force is the bending moment about the opposite node over the height, a diagonal force the panel shear over the
 * sine of its slope.
 *
 * @param spanM m, > 0
 * @param heightM between chord axes, m, > 0
 * @param panels floor panels; at least 3, even with hangers
 * @throws RangeError when one of them is outside its range
 */
export function trussGeometry(
  spanM: number,
  heightM: number,
  panels: number,
  hangers: boolean,
): TrussGeometry {
  if (!(spanM > 0) || !(heightM > 0))
    throw new RangeError(
      `truss: span and height must be more than 0 m, received ${spanM} m and ${heightM} m`,
    );
  if (!(panels >= (hangers ? 4 : 3)) || !Number.isInteger(panels) || (hangers && panels % 2 !== 0))
    throw new RangeError(
      `truss: expected ${hangers ? 'an even number of panels, at least 4' : 'at least 3 panels'}, received ${panels}`,
    );
  return remembered(known, `${spanM} ${heightM} ${panels} ${hangers}`, () =>
    laidOut(spanM, heightM, panels, hangers),
  );
}

/** Trial depths of the floor ask for the same trusses again. */
const known = kept<TrussGeometry>(500);

function laidOut(spanM: number, heightM: number, panels: number, hangers: boolean): TrussGeometry {
  const panelM = spanM / panels;
  const nodesM = Float64Array.from({ length: panels + 1 }, (_, j) => j * panelM);
  const members = hangers ? hangerMembers(spanM, heightM, panels) : plainMembers(spanM, heightM, panels);
  return { spanM, heightM, panelM, panels, hangers, nodesM, members };
}

/** Bending moment at x = c of a simple span under a unit load at each floor node. */
function momentLine(spanM: number, panels: number, c: number): Float64Array {
  const line = new Float64Array(panels + 1);
  for (let j = 1; j < panels; j++) {
    const x = (j * spanM) / panels;
    line[j] = x <= c ? (x * (spanM - c)) / spanM : (c * (spanM - x)) / spanM;
  }
  return line;
}

/** Shear in floor panel k of a simple span under a unit load at each floor node. */
function shearLine(panels: number, k: number): Float64Array {
  const line = new Float64Array(panels + 1);
  for (let j = 1; j < panels; j++) line[j] = 1 - j / panels - (j <= k ? 1 : 0);
  return line;
}

function scaled(line: Float64Array, factor: number): Float64Array {
  return line.map((v) => v * factor);
}

function plainMembers(spanM: number, heightM: number, panels: number): TrussMember[] {
  const p = spanM / panels;
  const diagonalM = Math.hypot(p / 2, heightM);
  const sine = heightM / diagonalM;
  const members: TrussMember[] = [];
  const half = panels / 2;
  for (let k = 0; k < half; k++) {
    const x = k * p;
    const centre = panels % 2 === 1 && k === (panels - 1) / 2;
    const bottom = scaled(momentLine(spanM, panels, x + p / 2), 1 / heightM);
    members.push(member('bottom-chord', [x, 0], [x + p, 0], centre ? 1 : 2, bottom));
    if (k > 0) {
      const top = scaled(momentLine(spanM, panels, x), -1 / heightM);
      members.push(member('top-chord', [x - p / 2, heightM], [x + p / 2, heightM], 2, top));
    }
    const shear = shearLine(panels, k);
    const rising = scaled(shear, -1 / sine);
    const peak: readonly [number, number] = [x + p / 2, heightM];
    members.push(member(k === 0 ? 'end-post' : 'diagonal', [x, 0], peak, 2, rising));
    if (!centre) members.push(member('diagonal', peak, [x + p, 0], 2, scaled(shear, 1 / sine)));
  }
  if (panels % 2 === 0) {
    const top = scaled(momentLine(spanM, panels, spanM / 2), -1 / heightM);
    members.push(member('top-chord', [(spanM - p) / 2, heightM], [(spanM + p) / 2, heightM], 1, top));
  }
  return members;
}

function hangerMembers(spanM: number, heightM: number, panels: number): TrussMember[] {
  const s = spanM / panels;
  const sine = heightM / Math.hypot(s, heightM);
  const members: TrussMember[] = [];
  // Top nodes stand over the odd floor nodes; main panel k runs from floor node 2k to 2k + 2.
  const mainPanels = panels / 2;
  for (let k = 0; 2 * k < mainPanels; k++) {
    const left = 2 * k * s;
    const peak: readonly [number, number] = [left + s, heightM];
    const centre = mainPanels % 2 === 1 && k === (mainPanels - 1) / 2;
    const bottom = scaled(momentLine(spanM, panels, left + s), 1 / heightM);
    members.push(member('bottom-chord', [left, 0], [left + s, 0], 2, bottom));
    if (!centre) members.push(member('bottom-chord', [left + s, 0], [left + 2 * s, 0], 2, bottom));
    if (k > 0) {
      const top = scaled(momentLine(spanM, panels, left), -1 / heightM);
      members.push(member('top-chord', [left - s, heightM], [left + s, heightM], 2, top));
      members.push(member('post', [left, 0], [left, heightM], 2, new Float64Array(panels + 1)));
    }
    const rising = scaled(shearLine(panels, 2 * k), -1 / sine);
    members.push(member(k === 0 ? 'end-post' : 'diagonal', [left, 0], peak, 2, rising));
    if (!centre) {
      const falling = scaled(shearLine(panels, 2 * k + 1), 1 / sine);
      members.push(member('diagonal', peak, [left + 2 * s, 0], 2, falling));
    }
    const hanger = new Float64Array(panels + 1);
    hanger[2 * k + 1] = 1;
    members.push(member('hanger', [left + s, 0], peak, centre ? 1 : 2, hanger));
  }
  if (mainPanels % 2 === 0) {
    const middle = spanM / 2;
    const top = scaled(momentLine(spanM, panels, middle), -1 / heightM);
    members.push(member('top-chord', [middle - s, heightM], [middle + s, heightM], 1, top));
    members.push(member('post', [middle, 0], [middle, heightM], 1, new Float64Array(panels + 1)));
  }
  return members;
}

function member(
  role: MemberRole,
  from: readonly [number, number],
  to: readonly [number, number],
  count: number,
  influence: Float64Array,
): TrussMember {
  return { role, from, to, lengthM: Math.hypot(to[0] - from[0], to[1] - from[1]), count, influence };
}
