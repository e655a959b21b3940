import { remembered } from '../kept.ts';
import type { Arrangement, Unit } from '../model/index.ts';
import { constructionDepth, roadLevelAt, type DepthAlong } from '../site/index.ts';
import { expectedLines, placeText, standOneSupport, trialAsk } from '../substructure/index.ts';
import { approachLines, furnitureLines } from '../takeoff/index.ts';
import { profileOrNearest } from './profileOrNearest.ts';
import { PIER_PERMANENT } from './trialPiers.ts';
import type { FormAndMethod } from './trialRows.ts';
import type { Workbench } from './workbench.ts';
import { spansOf } from './askedTask.ts';

/**
 * What the cost table leaves out because it is the same for every bridge between two abutments, money at mean rates: the
 * abutments on their ground, deck furniture, and the approaches of the road that clears what it crosses, measured from the
 * abutments outward. Depths and loads are those of the table. `bench` is that of the abutments.
 */
export function endsCost(bench: Workbench, asked: FormAndMethod, { units }: Arrangement): number {
  const { site, costOf, tables } = bench;
  const table = tables.tableFor(asked);
  const longest = (unit: Unit): number => Math.max(...spansOf(unit));
  const depthsM = units.map((unit) => table.depthM(unit.form, longest(unit)));
  const along: DepthAlong = {
    xM: units.flatMap(({ supportsM }) => [supportsM[0]!, supportsM.at(-1)!]),
    depthM: depthsM.flatMap((depthM) => [
      constructionDepth(site.deck, depthM),
      constructionDepth(site.deck, depthM),
    ]),
  };
  const road = profileOrNearest(site, along);
  const abutment = (unit: Unit, depthM: number, chainageM: number, spanM: number): number => {
    const loadKNm = tables.loadKNm(asked, unit.form, longest(unit));
    const ask = trialAsk(
      site,
      { permanentKNm: PIER_PERMANENT * loadKNm, trafficKNm: (1 - PIER_PERMANENT) * loadKNm, depthM },
      { kind: 'abutment', chainageM, roadLevelM: roadLevelAt(road, chainageM), lengthM: spanM / 2 },
    );
    const key = `${placeText(site, chainageM)} ${JSON.stringify(ask)} ${bench.booksKey}`;
    return costOf(
      expectedLines(remembered(bench.kept.supports, key, () => standOneSupport(site, ask, costOf))),
    );
  };
  const last = units.length - 1;
  return (
    abutment(units[0]!, depthsM[0]!, site.startM, spansOf(units[0]!)[0]!) +
    abutment(units[last]!, depthsM[last]!, site.endM, spansOf(units[last]!).at(-1)!) +
    costOf([...approachLines(site, road), ...furnitureLines(site)])
  );
}
