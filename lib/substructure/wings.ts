import type { MeasuredLine, Site } from '../model/index.ts';
import { cosineOfSkew } from '../site/index.ts';
import { substructureData } from './data.ts';
import type { SupportAsk } from './supportAsk.ts';
import { line } from './supportLines.ts';

/** Two wing walls and their footings, m3. */
export interface Wings {
  readonly wallsM3: number;
  readonly footingsM3: number;
}

/**
 * Two wings as long as the side slope of the fill, falling with it, for a retained height, m. On a skew they are longer:
 * in line with the wall they run aslant down the slope beside the road, along the road down the one before the wall.
 */
export function wingsOf(site: Pick<Site, 'road' | 'skewDeg'>, heightM: number): Wings {
  const { abutment } = substructureData;
  const lengthM = (site.road.fillSideSlope * heightM) / cosineOfSkew(site.skewDeg);
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
