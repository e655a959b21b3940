import { columnSlenderness, effectiveWidthRatio, plateSlenderness } from '../../mechanics/index.ts';
import { compositeBoxData } from './compositeBoxData.ts';

/** T-shaped stiffener: web and flange. */
export interface Stiffener {
  readonly heightM: number;
  readonly areaM2: number;
}

/** T-stiffener of a height, plates in fixed proportions. */
export function stiffenerOf(heightM: number): Stiffener {
  const { webM, flangeM, flangeWidthM } = platesOf(heightM);
  return { heightM, areaM2: heightM * webM + flangeWidthM * flangeM };
}

function platesOf(heightM: number): { webM: number; flangeM: number; flangeWidthM: number } {
  const d = compositeBoxData.stiffener;
  return {
    webM: Math.max(d.webLeastM, heightM / d.webSlenderness),
    flangeM: Math.max(d.flangeLeastM, heightM / d.flangeSlenderness),
    flangeWidthM: d.flangeOverHeight * heightM,
  };
}

/** Bottom plate between its stiffeners and the frames across. */
export interface PlateField {
  readonly pitchM: number;
  readonly frameM: number;
  readonly stiffener: Stiffener;
}

/**
 * Share of yield that a stiffened plate keeps in even compression: panels between stiffeners (EN 1993-1-5 4.4) times the
 * stiffener with its panel as a strut between frames (4.5.3, curve c raised for the eccentricity; from memory). What a
 * plate does across its width is left out.
 */
export function platePressedShare(field: PlateField, thicknessM: number, fyMPa: number): number {
  const panel = effectiveWidthRatio(plateSlenderness(field.pitchM / thicknessM, fyMPa, 4), 1);
  return panel * strutShare(field, thicknessM, fyMPa);
}

/** Reduction of the stiffener with its panel as a strut. */
export function strutShare(
  { pitchM, frameM, stiffener }: PlateField,
  thicknessM: number,
  fyMPa: number,
): number {
  const h = stiffener.heightM;
  const { webM, flangeM, flangeWidthM } = platesOf(h);
  // Plate, web and flange of the T; heights from the middle of the plate.
  const parts = [
    { area: pitchM * thicknessM, z: 0, own: (pitchM * thicknessM ** 3) / 12 },
    { area: h * webM, z: (thicknessM + h) / 2, own: (webM * h ** 3) / 12 },
    {
      area: flangeWidthM * flangeM,
      z: thicknessM / 2 + h + flangeM / 2,
      own: (flangeWidthM * flangeM ** 3) / 12,
    },
  ];
  const area = parts.reduce((sum, part) => sum + part.area, 0);
  const axis = parts.reduce((sum, part) => sum + part.area * part.z, 0) / area;
  const inertia = parts.reduce((sum, part) => sum + part.own + part.area * (part.z - axis) ** 2, 0);
  const gyration = Math.sqrt(inertia / area);
  const lambda = columnSlenderness(frameM, gyration, fyMPa);
  if (lambda <= 0.2) return 1;
  const [, web, flange] = parts;
  const tee = (web!.area * web!.z + flange!.area * flange!.z) / (web!.area + flange!.area);
  const imperfection = 0.49 + (0.09 * Math.max(axis, tee - axis)) / gyration;
  const phi = 0.5 * (1 + imperfection * (lambda - 0.2) + lambda ** 2);
  return Math.min(1, 1 / (phi + Math.sqrt(phi ** 2 - lambda ** 2)));
}

/** Lowest stiffener with which the strut keeps the share of its strength that is aimed at; the highest where none does. */
export function chooseStiffener(pitchM: number, frameM: number, fyMPa: number): Stiffener {
  const { heightsM, aimReduction, sizedOnM } = compositeBoxData.stiffener;
  const found = heightsM.find(
    (heightM) =>
      strutShare({ pitchM, frameM, stiffener: stiffenerOf(heightM) }, sizedOnM, fyMPa) >= aimReduction,
  );
  return stiffenerOf(found ?? heightsM[heightsM.length - 1]!);
}

/**
 * Share of a wide flange that acts at an inner support at the ultimate limit: beta 2 to the power kappa
 * (EN 1993-1-5 table 3.1 and 3.3(1) note 3, from memory).
 * @param halfM half of the width between the webs, m; `lengthM` effective length, m
 */
export function supportShearLag(halfM: number, lengthM: number): number {
  const kappa = halfM / lengthM;
  if (kappa <= 0.02) return 1;
  const beta =
    kappa <= 0.7 ? 1 / (1 + 6 * (kappa - 1 / (2500 * kappa)) + 1.6 * kappa ** 2) : 1 / (8.6 * kappa);
  return beta ** kappa;
}
