import { z } from '../../zod.ts';
import json from '../../../data/girders/aashto-pci.json';
import type { SectionPoint } from '../../mechanics/index.ts';
import type { StandardId } from '../../model/index.ts';
import { beamShape, deepestWithin, type BeamShape } from '../common/precast/beamShape.ts';
import { precastData } from './precastData.ts';
import { splicedData } from './spliced/splicedData.ts';

const point = z.tuple([z.number(), z.number()]);
const girder = z.object({
  name: z.string(),
  profileIn: z.array(point).min(4),
  published: z.object({
    areaIn2: z.number(),
    bottomIn: z.number(),
    inertiaIn4: z.number(),
    inertiaYIn4: z.number().optional(),
  }),
});

/** Published I-girders with their published properties, in inches; `data/girders/aashto-pci.json`. */
export const catalogue = z.object({ girders: z.array(girder).min(1) }).parse(json).girders;

const inch = 0.0254;

/** Beam of a profile of [height, full width] pairs from the soffit up, m. */
function profiled(
  name: string,
  profile: readonly (readonly [number, number])[],
  standard: StandardId,
): BeamShape {
  const right = profile.map(([z, width]): SectionPoint => [width / 2, z]);
  const left = [...profile].reverse().map(([z, width]): SectionPoint => [-width / 2, z]);
  const [depthM, topWidthM] = profile[profile.length - 1]!;
  return beamShape(
    {
      name,
      depthM,
      webM: Math.min(...profile.map(([, width]) => width)),
      topWidthM,
      seats: [[-topWidthM / 2, topWidthM / 2]],
      acrossM: topWidthM,
      bottomWidthM: profile[0]![1],
      bottomFlangeM: profile[1]![0],
      points: [...right, ...left],
      holes: [],
    },
    standard,
  );
}

/** The published girder of that name. @throws RangeError for a name that is not in the catalogue */
export function catalogueBeam(name: string): BeamShape {
  const found = catalogue.find((one) => one.name === name);
  if (!found)
    throw new RangeError(
      `girder: expected one of ${catalogue.map((one) => one.name).join(', ')}, received ${name}`,
    );
  return profiled(
    name,
    found.profileIn.map(([z, width]) => [z * inch, width * inch] as const),
    'hl93',
  );
}

/** Metric bulb-tee of a depth and web, m: web constant, flanges growing with depth and wider by what the web is thicker. */
export function bulbTee(depthM: number, standard: StandardId, webM = precastData.bulbTee.webM): BeamShape {
  const d = precastData.bulbTee;
  const more = webM - d.webM;
  const bottom = more + d.bottomWidthM.base + d.bottomWidthM.perDepth * depthM;
  const top = more + d.topWidthM.base + d.topWidthM.perDepth * depthM;
  const taper = (d.bottomTaper * (bottom - webM)) / 2;
  return profiled(
    `bulb-tee ${(depthM * 1000).toFixed(0)}`,
    [
      [0, bottom],
      [d.bottomM, bottom],
      [d.bottomM + taper, webM],
      [depthM - d.topM - d.topTaperM, webM],
      [depthM - d.topM, top],
      [depthM, top],
    ],
    standard,
  );
}

const shapes = new Map<StandardId, readonly BeamShape[]>();

/**
 * Beams of a market, shallowest first: the published girders under AASHTO with metric bulb-tees where they end, metric
 * bulb-tees elsewhere.
 */
export function beamShapes(standard: StandardId): readonly BeamShape[] {
  const known = shapes.get(standard);
  if (known) return known;
  const { leastDepthM, mostDepthM, stepM } = precastData.bulbTee;
  const published = standard === 'hl93' ? catalogue.map(({ name }) => catalogueBeam(name)) : [];
  const from = Math.max(leastDepthM - stepM / 2, ...published.map((one) => one.depthM));
  const steps = Math.round((mostDepthM - leastDepthM) / stepM);
  const metric = Array.from({ length: steps + 1 }, (_, i) => leastDepthM + i * stepM)
    .filter((depthM) => depthM > from)
    .map((depthM) => bulbTee(depthM, standard));
  const made = [...published, ...metric].sort((a, b) => a.depthM - b.depthM);
  shapes.set(standard, made);
  return made;
}

/** The deepest beams no deeper than `mostM`; the shallowest there is where none fits. */
export function beamsFor(standard: StandardId, mostM: number): readonly BeamShape[] {
  return deepestWithin(beamShapes(standard), mostM);
}

const spliced = new Map<StandardId, readonly BeamShape[]>();

/** Bulb-tees with webs for ducts, for beams in pieces: the deepest no deeper than `mostM`; the shallowest where none fits. */
export function splicedBeams(standard: StandardId, mostM: number): readonly BeamShape[] {
  const { leastDepthM, stepM } = precastData.bulbTee;
  const { webM, mostDepthM } = splicedData.beam;
  let shapesThere = spliced.get(standard);
  if (!shapesThere) {
    const steps = Math.round((mostDepthM - leastDepthM) / stepM);
    shapesThere = Array.from({ length: steps + 1 }, (_, i) =>
      bulbTee(leastDepthM + i * stepM, standard, webM),
    );
    spliced.set(standard, shapesThere);
  }
  return deepestWithin(shapesThere, mostM);
}
