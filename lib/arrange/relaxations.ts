import type { CostTable, Site } from '../model/index.ts';
import { widestBarred } from '../site/index.ts';
import type { ArrangeRequest, Relaxation, Windows } from './request.ts';

/** Whether anything at all can be laid out. */
export type Fits = (request: ArrangeRequest, site: Site) => boolean;

/** Cost plays no part in whether something fits; short governing spans come first, as they are looked through sooner. */
export const flatTable: CostTable = {
  deckPerM: (_, __, governingM) => governingM,
  depthM: () => 1,
  unitFixed: () => 0,
  support: () => 1,
};

/** Value nearest to `from`, between `from` and `limit`, for which `fits` holds, to a 200th of the way or 0.1; or null. */
function nearest(
  from: number,
  limit: number,
  finest: number,
  fits: (value: number) => boolean,
): number | null {
  if (!fits(limit)) return null;
  let bad = from;
  let good = limit;
  while (Math.abs(good - bad) > finest) {
    const middle = (good + bad) / 2;
    if (fits(middle)) good = middle;
    else bad = middle;
  }
  return Math.round(good * 1000) / 1000;
}

function withWindows(request: ArrangeRequest, change: Partial<Windows>): ArrangeRequest {
  return { ...request, windows: { ...request.windows, ...change } };
}

function narrowed(site: Site, index: number, widthM: number): Site {
  const zones = site.zones.map((zone, i) => {
    if (i !== index) return zone;
    const middle = (zone.fromM + zone.toM) / 2;
    return { ...zone, fromM: middle - widthM / 2, toM: middle + widthM / 2, hard: widthM > 0 };
  });
  return { ...site, zones, mainOpening: widestBarred(zones, site.startM, site.endM) };
}

/**
 * The smallest single changes with which an arrangement would fit, smallest share of the present figure first: a barred
 * stretch narrowed about its middle, a longer or shorter span allowed, an end span outside its window.
 */
export function relaxationsOf(request: ArrangeRequest, site: Site, fits: Fits): Relaxation[] {
  const { windows, form } = request;
  const found: Relaxation[] = [];
  const add = (
    what: Relaxation['what'],
    name: string,
    from: number,
    to: number | null,
    unit: 'm' | '-',
  ): void => {
    if (to !== null && to !== from) found.push({ what, name, from, to, unit });
  };
  site.zones.forEach(({ hard, fromM, toM, name }, i) => {
    if (!hard) return;
    const widthM = toM - fromM;
    add(
      'zone',
      name,
      widthM,
      nearest(widthM, 0, 0.1, (to) => fits(request, narrowed(site, i, Math.max(to, 0)))),
      'm',
    );
  });
  const { minSpanM, maxSpanM, endRatio } = windows;
  if (maxSpanM < site.lengthM) {
    const to = nearest(maxSpanM, site.lengthM, 0.1, (span) =>
      fits(withWindows(request, { maxSpanM: span }), site),
    );
    add('longest-span', form, maxSpanM, to, 'm');
  }
  const shorter = nearest(minSpanM, minSpanM / 20, 0.1, (span) =>
    fits(withWindows(request, { minSpanM: span }), site),
  );
  add('shortest-span', form, minSpanM, shorter, 'm');
  if (endRatio !== undefined) {
    const [least, most] = endRatio;
    const fitsWith = (ratios: readonly [number, number]): boolean =>
      fits(withWindows(request, { endRatio: ratios }), site);
    add(
      'end-ratio',
      form,
      least,
      nearest(least, least / 20, 0.005, (r) => fitsWith([r, most])),
      '-',
    );
    add(
      'end-ratio',
      form,
      most,
      nearest(most, most * 4, 0.005, (r) => fitsWith([least, r])),
      '-',
    );
  }
  const share = ({ from, to }: Relaxation): number => Math.abs(to - from) / from;
  return found.sort((a, b) => share(a) - share(b));
}
