/** What a line beam is made from. Lengths in metres, x from the first support. */
export interface BeamGeometry {
  /** Spans between rigid supports, m, each > 0. */
  readonly spansM: readonly number[];
  /** Bending stiffness at x, kNm2, > 0; 1 everywhere when absent (right for constant stiffness, deflections aside). */
  readonly eiKNm2?: (xM: number) => number;
  /** Equal elements each span is divided into before hinges and springs are added; 20 when absent. */
  readonly stationsPerSpan?: number;
  /** Where the beam is cut by a moment hinge, m. */
  readonly hingesM?: readonly number[];
  /** Stations wanted besides: changes of section or load, joints. */
  readonly extraStationsM?: readonly number[];
  /** Elastic supports besides the rigid ones. */
  readonly springs?: readonly { readonly xM: number; readonly kNPerM: number }[];
  /** Lengths that stick out beyond the first and last support, m; stations before the first support have x < 0. */
  readonly overhangsM?: { readonly start?: number; readonly end?: number };
  /** Ends built in against rotation. */
  readonly fixedEnds?: { readonly start?: boolean; readonly end?: boolean };
}

/** Stations of a beam: supports, hinges and springs are among them. */
export interface BeamMesh {
  readonly xM: Float64Array;
  readonly supportAt: readonly number[];
  readonly springAt: readonly number[];
  readonly hingeAt: readonly number[];
}

function overhangs({ overhangsM = {} }: BeamGeometry): [start: number, end: number] {
  const both: [number, number] = [overhangsM.start ?? 0, overhangsM.end ?? 0];
  for (const length of both) {
    if (!(length >= 0)) throw new RangeError(`overhangsM: expected 0 m or more, received ${length}`);
  }
  return both;
}

const meshes = new Map<string, BeamMesh>();

/**
 * Stations of a beam. Equal geometry gives the same mesh, so that placings of vehicles made for one stiffness serve the
 * next; the last 64 are kept.
 * @throws RangeError for an empty span list, spans that are not positive, or a hinge or spring off the beam
 */
export function beamMesh(geometry: BeamGeometry): BeamMesh {
  const { spansM, hingesM = [], springs = [], stationsPerSpan = 20 } = geometry;
  const key = [
    spansM.join(),
    stationsPerSpan,
    hingesM.join(),
    springs.map((spring) => spring.xM).join(),
    overhangs(geometry).join(),
    geometry.extraStationsM?.join(),
  ].join(';');
  const known = meshes.get(key);
  if (known) return known;
  const mesh = makeMesh(geometry);
  if (meshes.size >= 64) for (const [oldest] of [...meshes].slice(0, 32)) meshes.delete(oldest);
  meshes.set(key, mesh);
  return mesh;
}

/** @throws RangeError for an empty span list, spans that are not positive, or a hinge or spring off the beam. */
function makeMesh(geometry: BeamGeometry): BeamMesh {
  const { spansM, hingesM = [], springs = [] } = geometry;
  const parts = geometry.stationsPerSpan ?? 20;
  if (spansM.length === 0) throw new RangeError('spansM: expected at least one span, received none');
  spansM.forEach((span, i) => {
    if (!(span > 0)) throw new RangeError(`spansM[${i}]: expected more than 0 m, received ${span}`);
  });
  if (!(parts >= 2)) throw new RangeError(`stationsPerSpan: expected 2 or more, received ${parts}`);

  const [before, after] = overhangs(geometry);
  const x = before > 0 ? Array.from({ length: parts }, (_, i) => (before * i) / parts - before) : [];
  x.push(0);
  let start = 0;
  const supportsM = [0];
  for (const span of spansM) {
    for (let i = 1; i <= parts; i++) x.push(start + (span * i) / parts);
    start += span;
    x[x.length - 1] = start;
    supportsM.push(start);
  }
  for (let i = 1; i <= parts && after > 0; i++) x.push(start + (after * i) / parts);
  const extra = [...hingesM, ...springs.map((spring) => spring.xM), ...(geometry.extraStationsM ?? [])];
  const sameM = start * 1e-9;
  for (const at of extra) {
    if (!(at >= -before && at <= start + after))
      throw new RangeError(
        `hinge, spring or station: expected ${-before} to ${start + after} m, received ${at}`,
      );
    if (!x.some((known) => Math.abs(known - at) <= sameM)) x.push(at);
  }
  if (extra.length > 0) x.sort((a, b) => a - b);
  const xM = Float64Array.from(x);
  const stationOf = (at: number): number => xM.findIndex((known) => Math.abs(known - at) <= sameM);
  return {
    xM,
    supportAt: supportsM.map(stationOf),
    springAt: springs.map((spring) => stationOf(spring.xM)),
    hingeAt: hingesM.map(stationOf),
  };
}
