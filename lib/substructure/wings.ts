import type { MeasuredLine, Site } from '../model/index.ts';
import { substructureData } from './data.ts';
import type { SupportAsk } from './supportAsk.ts';
import { line } from './supportLines.ts';

/** Two wing walls and their footings, m3. */
export interface Wings {
  readonly wallsM3: number;
  readonly footingsM3: number;
}

/** Two wings as long as the side slope of the fill, falling with it, for a retained height, m. */
export function wingsOf(site: Pick<Site, 'road'>, heightM: number): Wings {
  const { abutment } = substructureData;
  const lengthM = site.road.fillSideSlope * heightM;
  return {
    wallsM3: 2 * lengthM * abutment.wingMeanHeight * heightM * abutment.wingM,
    footingsM3: 2 * lengthM * abutment.wingFootingWidth * heightM * abutment.wingFootingM,
  };
}

/** Concrete of the wing walls. */
export function wingWallsLine(ask: SupportAsk, { wallsM3 }: Wings): MeasuredLine {
  return line(
    ask,
    'abutments',
    'abutment-concrete',
    wallsM3,
    `${ask.name} wing walls`,
    'two, as long as the side slope',
  );
}

/** Concrete and bars of their footings. */
export function wingFootingLines(ask: SupportAsk, { footingsM3 }: Wings): MeasuredLine[] {
  const { barsKgM3 } = substructureData.footing;
  return [
    line(ask, 'abutments', 'footing-concrete', footingsM3, `${ask.name} wing footings`, 'by height'),
    line(
      ask,
      'abutments',
      'reinforcement',
      footingsM3 * barsKgM3,
      `${ask.name} wing footings`,
      `${barsKgM3} kg/m3`,
    ),
  ];
}
