/** Steel plates of one I-girder, m. The girder is `heightM` high over both flanges. */
export interface GirderPlates {
  readonly heightM: number;
  readonly topWidthM: number;
  readonly topM: number;
  readonly bottomWidthM: number;
  readonly bottomM: number;
  readonly webM: number;
}

/** What stands above the girder and acts with it. Heights are above the top of the girder, m. */
export interface GirderTop {
  /** Slab area and own inertia that act with one girder, already divided by the ratio of moduli. */
  readonly slabAreaM2: number;
  readonly slabInertiaM4: number;
  readonly slabAboveM: number;
  /** Bars that act with the girder where the slab is cracked; 0 where it is not. */
  readonly barAreaM2: number;
  readonly barAboveM: number;
}

/** No slab and no bars: the steel girder alone. */
export const bareGirder: GirderTop = {
  slabAreaM2: 0,
  slabInertiaM4: 0,
  slabAboveM: 0,
  barAreaM2: 0,
  barAboveM: 0,
};

/** Area m2, centroid above the soffit m, inertia about it m4. Reused: `girderFigures` writes into it. */
export interface GirderFigures {
  areaM2: number;
  centroidM: number;
  inertiaM4: number;
}

/**
 * Elastic figures of an I-girder with what acts above it, in steel units, written into `out`.
 * `lostAreaM2` (web buckled in bending) lies with its middle at `lostAxisM` over `lostHeightM`; 0 by default.
 * A kernel for inner loops: it allocates nothing. `test/forms` holds it against `sectionProperties`.
 */
export function girderFigures(
  out: GirderFigures,
  plates: GirderPlates,
  top: GirderTop = bareGirder,
  lostAreaM2 = 0,
  lostAxisM = 0,
  lostHeightM = 0,
): GirderFigures {
  const { heightM: h, topM: tt, bottomM: tb, webM: tw } = plates;
  const webHeight = h - tt - tb;
  const topArea = plates.topWidthM * tt;
  const bottomArea = plates.bottomWidthM * tb;
  const webArea = webHeight * tw;
  const topAxis = h - tt / 2;
  const webAxis = tb + webHeight / 2;
  const slabAxis = h + top.slabAboveM;
  const barAxis = h + top.barAboveM;
  const area = topArea + bottomArea + webArea + top.slabAreaM2 + top.barAreaM2 - lostAreaM2;
  const first =
    topArea * topAxis +
    (bottomArea * tb) / 2 +
    webArea * webAxis +
    top.slabAreaM2 * slabAxis +
    top.barAreaM2 * barAxis -
    lostAreaM2 * lostAxisM;
  const z = first / area;
  out.areaM2 = area;
  out.centroidM = z;
  out.inertiaM4 =
    topArea * ((topAxis - z) ** 2 + (tt * tt) / 12) +
    bottomArea * ((tb / 2 - z) ** 2 + (tb * tb) / 12) +
    webArea * ((webAxis - z) ** 2 + (webHeight * webHeight) / 12) +
    top.slabAreaM2 * (slabAxis - z) ** 2 +
    top.slabInertiaM4 +
    top.barAreaM2 * (barAxis - z) ** 2 -
    lostAreaM2 * ((lostAxisM - z) ** 2 + (lostHeightM * lostHeightM) / 12);
  return out;
}

/** Steel area of the plates, m2. */
export function steelArea(plates: GirderPlates): number {
  return (
    plates.topWidthM * plates.topM +
    plates.bottomWidthM * plates.bottomM +
    (plates.heightM - plates.topM - plates.bottomM) * plates.webM
  );
}
