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

/** A strip of plate with its T-stiffener: area, axis above the middle of the plate, inertia about it, centroid of the T alone. */
export interface StiffenedStrip {
  readonly areaM2: number;
  readonly axisM: number;
  readonly inertiaM4: number;
  readonly teeM: number;
}

/** Strip of `widthM` of a plate with a T-stiffener `heightM` high. */
export function stiffenedStrip(widthM: number, thicknessM: number, heightM: number): StiffenedStrip {
  const { webM, flangeM, flangeWidthM } = platesOf(heightM);
  const h = heightM;
  const plate = widthM * thicknessM;
  const web = h * webM;
  const flange = flangeWidthM * flangeM;
  // Heights from the middle of the plate.
  const webZ = (thicknessM + h) / 2;
  const flangeZ = thicknessM / 2 + h + flangeM / 2;
  const areaM2 = plate + web + flange;
  const axisM = (web * webZ + flange * flangeZ) / areaM2;
  const own = (plate * thicknessM ** 2 + web * h ** 2 + flange * flangeM ** 2) / 12;
  const away = plate * axisM ** 2 + web * (webZ - axisM) ** 2 + flange * (flangeZ - axisM) ** 2;
  return { areaM2, axisM, inertiaM4: own + away, teeM: (web * webZ + flange * flangeZ) / (web + flange) };
}

/** Reduction of the stiffener with its panel as a strut. */
export function strutShare(
  { pitchM, frameM, stiffener }: PlateField,
  thicknessM: number,
  fyMPa: number,
): number {
  const { areaM2, axisM, inertiaM4, teeM } = stiffenedStrip(pitchM, thicknessM, stiffener.heightM);
  const gyration = Math.sqrt(inertiaM4 / areaM2);
  const lambda = columnSlenderness(frameM, gyration, fyMPa);
  if (lambda <= 0.2) return 1;
  const imperfection = 0.49 + (0.09 * Math.max(axisM, teeM - axisM)) / gyration;
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
