import {
  bredt,
  compactTorsion,
  polygonProperties,
  sectionProperties,
  type SectionPart,
  type SectionPoint,
} from '../../mechanics/index.ts';
import type { EvidenceCase } from '../caseInputs.ts';

/** A girder from its profile: pairs of height above the soffit and full width, straight lines between. Units of the inputs. */
export const profiledGirder: EvidenceCase = (inputs) => {
  const profile = inputs.table('profile');
  const section = polygonProperties(outline(profile));
  const height = profile[profile.length - 1]![0]!;
  return {
    area: section.areaM2,
    centroid: section.centroidM,
    centroidFromTop: height - section.centroidM,
    inertia: section.inertiaM4,
    inertiaY: section.inertiaYM4,
    compactTorsion: compactTorsion(section.areaM2, section.inertiaM4, section.inertiaYM4),
  };
};

/** The same girder under slab and haunch, rectangles [width, height] stacked on it and transformed by the modular ratio. */
export const girderWithSlab: EvidenceCase = (inputs) => {
  const girder = outline(inputs.table('profile'));
  let bottomM = Math.max(...girder.map(([, z]) => z));
  const above = inputs.table('stack').map(([widthM = 0, heightM = 0]): SectionPart => {
    const part: SectionPart = {
      kind: 'rect',
      widthM,
      heightM,
      bottomM,
      eRatio: inputs.number('modularRatio'),
    };
    bottomM += heightM;
    return part;
  });
  const section = sectionProperties([{ kind: 'polygon', points: girder }, ...above]);
  return {
    area: section.areaM2,
    centroid: section.centroidM,
    inertia: section.inertiaM4,
    modulusBottom: section.wBottomM3,
  };
};

/** Plates [width, height] stacked from the bottom up. */
export const stackedPlates: EvidenceCase = (inputs) => {
  let bottomM = 0;
  const parts = inputs.table('plates').map(([widthM = 0, heightM = 0]): SectionPart => {
    const part: SectionPart = { kind: 'rect', widthM, heightM, bottomM };
    bottomM += heightM;
    return part;
  });
  const section = sectionProperties(parts);
  return { area: section.areaM2, inertia: section.inertiaM4 };
};

/** A rolled I-section with or without its root radii, mm in, cm out. */
export const rolledSection: EvidenceCase = (inputs) => {
  const h = inputs.number('h') / 10;
  const b = inputs.number('b') / 10;
  const tw = inputs.number('tw') / 10;
  const tf = inputs.number('tf') / 10;
  const r = inputs.numberOr('r', 0) / 10;
  const quarter: SectionPoint[] = [
    [b / 2, h / 2],
    [b / 2, h / 2 - tf],
  ];
  if (r > 0) {
    // The root is a quarter circle about a point r from web and flange; 32 chords come within 0.01 % of its area.
    for (let i = 0; i <= 32; i++) {
      const angle = Math.PI / 2 + (i * Math.PI) / 64;
      quarter.push([tw / 2 + r + r * Math.cos(angle), h / 2 - tf - r + r * Math.sin(angle)]);
    }
  } else quarter.push([tw / 2, h / 2 - tf]);
  const turned = (sy: number, sz: number): SectionPoint[] => quarter.map(([y, z]) => [sy * y, sz * z]);
  const section = polygonProperties([
    ...quarter,
    ...turned(1, -1).reverse(),
    ...turned(-1, -1),
    ...turned(-1, 1).reverse(),
  ]);
  return { areaCm2: section.areaM2, inertiaCm4: section.inertiaM4, modulusCm3: section.inertiaM4 / (h / 2) };
};

/** A welded I of three plates in the units of the inputs. */
export const threePlates: EvidenceCase = (inputs) => {
  const d = inputs.number('depth');
  const b = inputs.number('width');
  const tw = inputs.number('web');
  const tf = inputs.number('flange');
  const half = b / 2;
  const section = polygonProperties([
    [-half, 0],
    [half, 0],
    [half, tf],
    [tw / 2, tf],
    [tw / 2, d - tf],
    [half, d - tf],
    [half, d],
    [-half, d],
    [-half, d - tf],
    [-tw / 2, d - tf],
    [-tw / 2, tf],
    [-half, tf],
  ]);
  return { area: section.areaM2, inertia: section.inertiaM4 };
};

/** A rectangular hollow section by Bredt on its middle line with sharp corners, mm in, cm4 out. */
export const hollowSection: EvidenceCase = (inputs) => {
  const b = (inputs.number('b') - inputs.number('t')) / 10;
  const h = (inputs.number('h') - inputs.number('t')) / 10;
  const thicknessM = inputs.number('t') / 10;
  const walls = [b, h, b, h].map((lengthM) => ({ lengthM, thicknessM }));
  return { torsionCm4: bredt(b * h, walls) };
};

/** Outline of a symmetrical profile of [height, full width] pairs. */
function outline(profile: readonly (readonly number[])[]): SectionPoint[] {
  const right = profile.map(([z = 0, width = 0]): SectionPoint => [width / 2, z]);
  const left = profile.map(([z = 0, width = 0]): SectionPoint => [-width / 2, z]).reverse();
  return [...right, ...left];
}
