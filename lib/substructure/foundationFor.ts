import type { Foundation, MeasuredLine } from '../model/index.ts';
import { pilesOrNearest } from './boredPiles.ts';
import type { GroundFigures } from './data.ts';
import { substructureData } from './data.ts';
import type { FoundationTask } from './foot.ts';
import type { FootingSize } from './spreadFooting.ts';
import { spreadFooting } from './spreadFooting.ts';
import type { GroundHere } from './groundUnder.ts';
import { pitLines } from './pitLines.ts';

/**
 * The foundation of a support for one ground class the stretch may turn out to be.
 * Spread where the bearing stratum, least depth and scour allow a footing within 5 m of the ground, else bored piles.
 * Where neither carries the loads, the group that comes nearest with its overload: the rules put the option out for it.
 */
export function foundationFor(task: FoundationTask, odds: GroundHere): Foundation {
  const ground = substructureData.ground[odds.ground];
  const scouredLevelM = task.groundLevelM - (ground.scours ? task.scourM : 0);
  const spread = spreadWhere(task, ground, odds.bearingLevelM, scouredLevelM);
  if (spread !== null) return spreadFoundation(task, odds, spread);
  const capTopM = task.groundLevelM - substructureData.piles.capCoverM;
  const { group, overload } = pilesOrNearest(task, ground, {
    capTopM,
    bearingLevelM: odds.bearingLevelM,
    scouredLevelM,
  });
  const count = group.rowsAlong * group.rowsAcross;
  const { cap, diameterM, lengthM, toeLevelM } = group;
  const pileM3 = (count * lengthM * Math.PI * diameterM * diameterM) / 4;
  const undersideM = capTopM - cap.depthM;
  const base = {
    part: 'foundations' as const,
    ...(task.support === undefined ? {} : { support: task.support }),
  };
  const lines: MeasuredLine[] = [
    {
      ...base,
      item: 'bored-pile',
      quantity: pileM3,
      what: `${task.name} piles`,
      how: `${count} piles, ${diameterM} m, ${lengthM.toFixed(1)} m long`,
    },
    {
      ...base,
      item: 'reinforcement',
      quantity: pileM3 * substructureData.piles.barsKgM3,
      what: `${task.name} piles`,
      how: `${substructureData.piles.barsKgM3} kg/m3`,
    },
    ...blockLines(task, base, cap, 'pile cap'),
    ...pitLines(task, cap, undersideM, ground.scours),
  ];
  return {
    ground: odds.ground,
    odds: odds.odds,
    bearingLevelM: odds.bearingLevelM,
    kind: 'bored-piles',
    footing: { ...cap, topLevelM: capTopM },
    piles: { count, diameterM, lengthM, toeLevelM },
    ...(overload > 1 ? { overload } : {}),
    lines: [...lines, ...shaftBelow(task, base, capTopM)],
  };
}

interface SpreadPlace {
  readonly size: FootingSize;
  readonly undersideM: number;
  readonly scours: boolean;
}

function spreadWhere(
  task: FoundationTask,
  ground: GroundFigures,
  bearingM: number,
  scouredM: number,
): SpreadPlace | null {
  if (!(ground.allowableKPa > 0)) return null;
  const byScour = ground.scours && task.scourM > 0 ? scouredM - substructureData.scour.embedmentM : Infinity;
  const undersideM = Math.min(
    task.groundLevelM - ground.leastDepthM,
    bearingM - ground.intoStratumM,
    byScour,
  );
  if (task.groundLevelM - undersideM > substructureData.footing.deepestM) return null;
  const size = spreadFooting(task, ground, undersideM);
  return size === null ? null : { size, undersideM, scours: ground.scours };
}

function spreadFoundation(task: FoundationTask, odds: GroundHere, place: SpreadPlace): Foundation {
  const { size, undersideM } = place;
  const topLevelM = undersideM + size.depthM;
  const base = {
    part: 'foundations' as const,
    ...(task.support === undefined ? {} : { support: task.support }),
  };
  return {
    ground: odds.ground,
    odds: odds.odds,
    bearingLevelM: odds.bearingLevelM,
    kind: 'spread',
    footing: { ...size, topLevelM },
    piles: null,
    lines: [
      ...blockLines(task, base, size, 'footing'),
      ...pitLines(task, size, undersideM, place.scours),
      ...shaftBelow(task, base, topLevelM),
    ],
  };
}

type LineBase = Pick<MeasuredLine, 'part' | 'support'>;

function blockLines(task: FoundationTask, base: LineBase, size: FootingSize, word: string): MeasuredLine[] {
  const volume = size.lengthM * size.widthM * size.depthM;
  const bars = substructureData.footing.barsKgM3;
  const how = `${size.lengthM.toFixed(2)} x ${size.widthM.toFixed(2)} x ${size.depthM.toFixed(2)} m`;
  return [
    { ...base, item: 'footing-concrete', quantity: volume, what: `${task.name} ${word}`, how },
    {
      ...base,
      item: 'reinforcement',
      quantity: volume * bars,
      what: `${task.name} ${word}`,
      how: `${bars} kg/m3`,
    },
  ];
}

/**
 * Shaft between the level to which the support's own lines reach and the top of this foundation; less than none where the
 * foundation reaches up over that level, so that what stands on it is counted from its top.
 */
function shaftBelow(task: FoundationTask, base: LineBase, topLevelM: number): MeasuredLine[] {
  const volume = (task.shaftFootM - topLevelM) * task.shaftAreaM2;
  if (volume === 0) return [];
  const what = `${task.name} shaft below ground`;
  return [
    {
      ...base,
      item: task.shaftItem,
      quantity: volume,
      what,
      how: `${task.shaftAreaM2.toFixed(2)} m2 ${volume > 0 ? 'down to' : 'off for'} the foundation`,
    },
    {
      ...base,
      item: 'reinforcement',
      quantity: volume * task.shaftBarsKgM3,
      what,
      how: `${task.shaftBarsKgM3} kg/m3`,
    },
  ];
}
