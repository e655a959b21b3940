import { z } from '../zod.ts';
import raw from '../../data/road.json';
import { standardIds, type Road, type RoadCurves, type StandardId } from '../model/index.ts';

const table = z.strictObject({
  about: z.string(),
  unit: z.string(),
  source: z.string().min(1),
  speeds: z
    .array(
      z.strictObject({
        id: z.string().min(1),
        speedKmh: z.number().positive(),
        crestCurve: z.number().positive(),
        sagCurve: z.number().positive(),
      }),
    )
    .min(1)
    .refine((rows) => rows.every((row, i) => i === 0 || row.speedKmh > rows[i - 1]!.speedKmh), 'rising'),
});

const data = z
  .strictObject({
    about: z.string(),
    unknownSpeedKmh: z.strictObject({
      value: z.number().positive(),
      unit: z.string(),
      source: z.string().min(1),
    }),
    ...(Object.fromEntries(standardIds.map((id) => [id, table])) as Record<StandardId, typeof table>),
  })
  .parse(raw);

/** Row of the table of curves that serves a road: the first at its design speed or above, or the last. */
export interface CurveRow {
  readonly id: string;
  readonly crestCurve: number;
  readonly sagCurve: number;
}

/** Least curves for a design speed, km/h (unknown takes the preset), by the road design manual that goes with a standard. */
export function curveRow(speedKmh: Road['designSpeedKmh'], standard: StandardId): CurveRow {
  const speed = speedKmh === 'unknown' ? data.unknownSpeedKmh.value : speedKmh;
  const { speeds } = data[standard];
  return speeds.find((row) => row.speedKmh >= speed - 1e-9) ?? speeds.at(-1)!;
}

/**
 * Least radii of crest and sag, m: as the brief gives them, or 100 K for the design speed. Sources of K: data/road.json.
 */
export function roadCurves(road: Road, standard: StandardId): RoadCurves {
  const row = curveRow(road.designSpeedKmh, standard);
  return {
    crestRadiusM: road.crestRadiusM === 'unknown' ? 100 * row.crestCurve : road.crestRadiusM,
    sagRadiusM: road.sagRadiusM === 'unknown' ? 100 * row.sagCurve : road.sagRadiusM,
  };
}
