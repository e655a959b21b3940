import { materials } from '../../actions/index.ts';
import type { MeasuredLine, UnitTask } from '../../model/index.ts';
import { measured } from '../common/measured.ts';
import { cableData } from './cableData.ts';
import { skewEndKg } from './skewEnds.ts';
import type { SizedBridge } from './sizePlane.ts';
import { stayMassKg } from './sizeStays.ts';

/** Measured lines of a cable-stayed unit: deck, stays, pylons. Tie-downs, bearings and joints belong to the supports. */
export function cableLines(bridge: SizedBridge, task: UnitTask): MeasuredLine[] {
  const { layout, zones, girders, floor, stays, planesM } = bridge;
  const { widthM } = task.deck;
  const areaM2 = layout.lengthM * widthM;
  let edgeKg = 0;
  let edgePaintM2 = 0;
  let thickerM3 = 0;
  zones.forEach((zone, z) => {
    const girder = girders[z]!;
    edgeKg += 2 * zone.totalM * girder.massKgPerM;
    edgePaintM2 += 2 * zone.totalM * girder.paintM2PerM;
    thickerM3 += zone.totalM * widthM * (girder.slabM - floor.slab.midM);
  });
  const strands = stays.reduce((sum, stay) => sum + 2 * stay.strands, 0);
  const cross = floor.crossGirder.massKgPerM * planesM;
  const count = Math.round((floor.steelKgPerM * layout.lengthM) / cross) + 1;
  const lines = [
    measured(
      'deck',
      'plate-girder-steel',
      edgeKg,
      'edge girders',
      `two girders, ${zones.length} sections, ${cableData.edgeGirder.detailShare * 100} % details`,
    ),
    measured(
      'deck',
      'plate-girder-steel',
      cross * count,
      'cross-girders',
      `${count} of ${planesM.toFixed(1)} m`,
    ),
    measured(
      'deck',
      'deck-concrete',
      floor.slab.meanM * areaM2,
      'slab',
      `${Math.round(1000 * floor.slab.meanM)} mm`,
    ),
    measured(
      'deck',
      'reinforcement',
      floor.barsKgM2 * areaM2,
      'bars of the slab',
      `${floor.barsKgM2.toFixed(0)} kg/m2`,
    ),
    measured('deck', 'slab-formwork', areaM2, 'formwork of the slab', 'deck area'),
    measured(
      'deck',
      'paint',
      edgePaintM2 + floor.paintM2PerM * layout.lengthM,
      'edge girders and cross-girders',
      'outside surfaces',
    ),
    measured(
      'deck',
      'stay-cable',
      stayMassKg(layout, stays, 'hung'),
      'stays',
      `${strands} strands of ${cableData.stay.strandMm2} mm2 in all, anchor stays included`,
    ),
    measured(
      'deck',
      'stay-cable',
      stayMassKg(layout, stays, 'anchor'),
      'anchor stays',
      'to the anchor piers',
    ),
  ];
  const endsKg = skewEndKg(floor, bridge.endFloor);
  if (endsKg > 0)
    lines.push(
      measured(
        'deck',
        'plate-girder-steel',
        endsKg,
        'end cross-girders along the supports',
        `two of ${bridge.endFloor!.crossM.toFixed(1)} m, over square ones`,
      ),
    );
  if (thickerM3 > 0)
    lines.push(
      measured(
        'deck',
        'deck-concrete',
        thickerM3,
        'slab thickened towards the pylons',
        'by the push of the stays',
      ),
    );
  layout.pylons.forEach((place, p) => {
    const pylon = bridge.pylons[p]!;
    const size = `two hollow legs ${pylon.lengthM.toFixed(2)} x ${pylon.widthM.toFixed(2)} m at the foot, walls ${pylon.wallM.toFixed(2)} m`;
    const at = (quantity: number, item: string, what: string, how: string): MeasuredLine => ({
      ...measured('pylons', item, quantity, what, how),
      support: place.support,
    });
    lines.push(
      at(pylon.aboveM3, 'pylon-concrete', 'pylon legs above the deck', size),
      at(
        pylon.belowM3,
        'pylon-concrete',
        'pylon legs below the deck',
        `${size}, ${bridge.belowM[p]!.toFixed(1)} m`,
      ),
      at(
        pylon.crossbeamsM3,
        'pylon-concrete',
        'pylon crossbeams',
        `${pylon.crossbeamLevelsM.length} crossbeams`,
      ),
      at(
        pylon.barsKg,
        'reinforcement',
        'bars of the pylon',
        `${(100 * pylon.barRatio).toFixed(2)} % and ${100 * cableData.pylon.barDetailShare} % for links and laps, ${materials.steelDensityKgM3} kg/m3`,
      ),
    );
  });
  return lines;
}
