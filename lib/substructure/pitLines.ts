import type { MeasuredLine } from '../model/index.ts';
import { substructureData } from './data.ts';
import type { FoundationTask } from './foot.ts';
import type { FootingSize } from './spreadFooting.ts';

/**
 * Excavation of a foundation down to `undersideM`: open cut with slopes on dry land; sheets, a concrete seal and digging
 * between them where water reaches the pit; stone round a pier where a flood passes over ground that scours.
 */
export function pitLines(
  task: FoundationTask,
  size: FootingSize,
  undersideM: number,
  scours: boolean,
): MeasuredLine[] {
  const { workingSpaceM, slope, freeboardM, toeShare, sealShare, protectionM, protectionReach } =
    substructureData.pit;
  const support = task.support === undefined ? {} : { support: task.support };
  const length = size.lengthM + 2 * workingSpaceM;
  const width = size.widthM + 2 * workingSpaceM;
  const depth = Math.max(0, task.groundLevelM - undersideM);
  const lines: MeasuredLine[] = [];
  const head = task.waterLevelM === null ? 0 : task.waterLevelM - undersideM;
  if (head > freeboardM) {
    const seal = sealShare * head;
    const top = Math.max(task.waterLevelM! + freeboardM, task.groundLevelM);
    const retained = top - undersideM + seal;
    const what = `${task.name} pit`;
    lines.push(
      {
        part: 'river-works',
        item: 'cofferdam',
        quantity: 2 * (length + width) * retained * (1 + toeShare),
        what: `${task.name} cofferdam`,
        how: `${length.toFixed(1)} x ${width.toFixed(1)} m, ${(retained * (1 + toeShare)).toFixed(1)} m sheets`,
        ...support,
      },
      {
        part: 'foundations',
        item: 'footing-concrete',
        quantity: length * width * seal,
        what: `${task.name} seal`,
        how: `${seal.toFixed(2)} m under ${head.toFixed(1)} m of water`,
        ...support,
      },
      {
        part: 'foundations',
        item: 'excavation',
        quantity: length * width * (depth + seal),
        what,
        how: 'between sheets',
        ...support,
      },
    );
  } else {
    const s = slope * depth;
    const volume = depth * (length * width + s * (length + width) + (4 / 3) * s * s);
    lines.push({
      part: 'foundations',
      item: 'excavation',
      quantity: volume,
      what: `${task.name} pit`,
      how: `${depth.toFixed(1)} m deep, sides ${slope} to 1`,
      ...support,
    });
  }
  if (scours && task.scourM > 0) {
    const reach = protectionReach * task.shaftLengthM;
    const area =
      (task.shaftLengthM + 2 * reach) * (task.shaftWidthM + 2 * reach) - task.shaftLengthM * task.shaftWidthM;
    lines.push({
      part: 'river-works',
      item: 'scour-protection',
      quantity: area * protectionM,
      what: `${task.name} stone`,
      how: `${reach.toFixed(1)} m round the shaft, ${protectionM} m deep`,
      ...support,
    });
  }
  return lines;
}
