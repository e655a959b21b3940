import type { AbutmentWall, MeasuredLine, Site } from '../model/index.ts';
import { alongSupportsM } from '../site/index.ts';
import { substructureData } from './data.ts';
import { frontFill } from './frontSlope.ts';
import type { SupportAsk } from './supportAsk.ts';
import { line } from './supportLines.ts';
import { wingFootingLines, wingsOf, wingWallsLine, type Wings } from './wings.ts';

/** Levels an abutment is built between, m. */
export interface WallLevels {
  readonly seatM: number;
  readonly footM: number;
  readonly groundM: number;
}

/** Walls or columns of an abutment, m and m3. */
export interface Walls {
  readonly kind: AbutmentWall;
  /** Thickness of the stem or side of a column, and how many columns; one wall counts as one. */
  readonly stemLengthM: number;
  readonly columns: number;
  readonly stemM3: number;
  readonly backWallM3: number;
  readonly wings: Wings;
  readonly frontFillM3: number;
  readonly barsKgM3: number;
  /** Width of fill that presses on it, as wide as would press the same all the way down, m. */
  readonly pressedM: number;
}

/** Bars of an abutment, kg/m3, by its kind and whether the deck is cast in (published ratios, see the data file). */
function abutmentBars(kind: AbutmentWall, integral: boolean): number {
  const { abutment } = substructureData;
  if (kind === 'spill-through')
    return integral ? abutment.spillThroughIntegralBarsKgM3 : abutment.spillThroughBarsKgM3;
  if (!integral) return abutment.barsKgM3;
  return kind === 'bank seat' ? abutment.bankSeatIntegralBarsKgM3 : abutment.fullHeightIntegralBarsKgM3;
}

/** Columns under the beam of a spill-through abutment. */
const spillColumns = (beamM: number): number =>
  Math.max(2, Math.ceil(beamM / substructureData.abutment.columnSpacingM));

/** Walls of an abutment of a kind between its levels; stem thickness and columns are by height (common practice). */
export function wallsOf(site: Site, ask: SupportAsk, levels: WallLevels, kind: AbutmentWall): Walls {
  const { abutment } = substructureData;
  const { seatM, footM, groundM } = levels;
  const width = alongSupportsM(site);
  const height = Math.max(0, ask.roadLevelM - footM);
  const barsKgM3 = abutmentBars(kind, ask.castIn === true);
  const backWallM3 = Math.max(0, ask.roadLevelM - seatM) * abutment.backWallM * width;
  if (kind === 'spill-through') {
    const beamFootM = seatM - abutment.seatBeamM;
    const side = Math.max(abutment.leastColumnM, abutment.columnPerHeight * height);
    const columns = spillColumns(width);
    const above = Math.max(0, ask.roadLevelM - beamFootM);
    const pressedBelow = Math.min(width, columns * abutment.columnPressureWidths * side);
    const share = height > 0 ? (above / height) ** 2 : 1;
    return {
      kind,
      stemLengthM: side,
      columns,
      stemM3:
        columns * side * side * Math.max(0, beamFootM - footM) +
        width * abutment.leastStemM * abutment.seatBeamM,
      backWallM3,
      wings: { ...wingsOf(site, above), footingsM3: 0 },
      frontFillM3: frontFill(site, beamFootM, groundM),
      barsKgM3,
      pressedM: width * share + pressedBelow * (1 - share),
    };
  }
  const footThickness = Math.max(abutment.leastStemM, abutment.stemPerHeight * height);
  const stemLengthM = kind === 'bank seat' ? abutment.leastStemM : (abutment.leastStemM + footThickness) / 2;
  return {
    kind,
    stemLengthM,
    columns: 1,
    stemM3: stemLengthM * Math.max(0, seatM - footM) * width,
    backWallM3,
    wings: wingsOf(site, height),
    frontFillM3: 0,
    barsKgM3,
    pressedM: width,
  };
}

/** Measured lines of the walls: spill-through abutments have no wing footings, the others no fill in front of them. */
export function wallLines(ask: SupportAsk, walls: Walls): MeasuredLine[] {
  const { name } = ask;
  const wall = walls.stemM3 + walls.backWallM3;
  const bars = (wall + walls.wings.wallsM3) * walls.barsKgM3;
  const spills = walls.kind === 'spill-through';
  const cast = ask.castIn === true ? ', deck cast in' : '';
  const how = spills
    ? `${walls.columns} columns ${walls.stemLengthM.toFixed(2)} m square, beam, back wall${cast}`
    : `stem ${walls.stemLengthM.toFixed(2)} m thick, back wall${cast}`;
  const slope = 'prism under the slope and a piece of a cone at each side';
  return [
    line(ask, 'abutments', 'abutment-concrete', wall, `${name} ${walls.kind}`, how),
    wingWallsLine(ask, walls.wings),
    line(ask, 'abutments', 'reinforcement', bars, `${name} walls`, `${walls.barsKgM3} kg/m3`),
    ...(spills
      ? [line(ask, 'abutments', 'fill', walls.frontFillM3, `${name} front slope`, slope)]
      : wingFootingLines(ask, walls.wings)),
  ];
}
