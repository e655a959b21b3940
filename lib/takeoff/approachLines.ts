import type { MeasuredLine, Regrading, RoadProfile, Site } from '../model/index.ts';
import { roadEndsOf } from '../site/index.ts';
import { substructureData } from '../substructure/data.ts';
import { furnitureOver } from './furnitureLines.ts';

/**
 * Fill of the two approaches, m3, and where it stands between retaining walls their concrete and bars: as measured along
 * the road of the option over the ground. Walls are made like the wings of the abutments, by their face: a stem of mean
 * thickness and a footing as wide as a share of the height. Where an abutment stands inside the crossing, the road from
 * there to the end of the crossing has surfacing and edges on the fill as it would have on the deck, so that bridges of
 * any length are paid for over the same road. An existing road that is regraded behind a fixed end is filled or dug away,
 * held by walls where the approaches are, and surfaced and edged anew over its whole length (common practice, no source).
 */
export function approachLines(site: Site, profile: RoadProfile): MeasuredLine[] {
  const { road } = site;
  return (['start', 'end'] as const).flatMap((end) => {
    const { fillM3, wallM2, lengthM } = profile.approaches[end];
    const long = `${lengthM.toFixed(0)} m from the abutment to the ground`;
    const sides = road.approachSides === 'walls' ? 'between walls' : `sides ${road.fillSideSlope} to 1`;
    const fill: MeasuredLine = {
      part: 'approaches',
      item: 'fill',
      quantity: fillM3,
      what: `${end} approach`,
      how: `${long}, ${sides}`,
    };
    const lines = wallM2 > 0 ? [fill, ...wallLines(`${end} approach`, wallM2)] : [fill];
    const behind = profile.regrading?.[end];
    return [...lines, ...roadLines(site, end), ...(behind ? regradingLines(site, end, behind) : [])];
  });
}

/** Stems, footings and bars of retaining walls by their face, m2. */
function wallLines(where: string, faceM2: number): MeasuredLine[] {
  const { abutment, footing } = substructureData;
  const stemM3 = faceM2 * abutment.wingM;
  const footingM3 = faceM2 * abutment.wingFootingWidth * abutment.wingFootingM;
  const line = (item: string, quantity: number, what: string, how: string): MeasuredLine => ({
    part: 'approaches',
    item,
    quantity,
    what: `${where} ${what}`,
    how,
  });
  return [
    line('abutment-concrete', stemM3, 'walls', `${faceM2.toFixed(0)} m2 of face`),
    line('reinforcement', stemM3 * abutment.barsKgM3, 'walls', `${abutment.barsKgM3} kg/m3`),
    line('footing-concrete', footingM3, 'wall footings', 'by height'),
    line('reinforcement', footingM3 * footing.barsKgM3, 'wall footings', `${footing.barsKgM3} kg/m3`),
  ];
}

/** What regrading the existing road behind a fixed end takes. */
function regradingLines(
  site: Site,
  end: 'start' | 'end',
  { lengthM, fillM3, cutM3, wallM2 }: Regrading,
): MeasuredLine[] {
  if (!(lengthM > 0)) return [];
  const what = `${end} regrading`;
  const how = `${lengthM.toFixed(0)} m of the existing road, against its line`;
  const earth = (item: string, quantity: number): MeasuredLine[] =>
    quantity > 0 ? [{ part: 'approaches', item, quantity, what, how }] : [];
  return [
    ...earth('fill', fillM3),
    ...earth('excavation', cutM3),
    ...(wallM2 > 0 ? wallLines(what, wallM2) : []),
    ...furnitureOver(lengthM, site.deck.widthM).map((line): MeasuredLine => ({
      ...line,
      part: 'approaches',
      what: `${what}, ${line.what}`,
    })),
  ];
}

/** Surfacing and edges of the road between an abutment and the end of the crossing. */
function roadLines(site: Site, end: 'start' | 'end'): MeasuredLine[] {
  const { startM, endM } = roadEndsOf(site);
  const lengthM = end === 'start' ? site.startM - startM : endM - site.endM;
  if (!(lengthM > 0)) return [];
  return furnitureOver(lengthM, site.deck.widthM).map((line) => ({
    ...line,
    part: 'approaches',
    what: `${end} approach road, ${line.what}`,
  }));
}
