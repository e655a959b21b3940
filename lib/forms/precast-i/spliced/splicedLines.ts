import type { MeasuredLine } from '../../../model/index.ts';
import { barKg } from '../../common/bars.ts';
import { measured } from '../../common/measured.ts';
import { precastLines } from '../../common/precast/precastLines.ts';
import { slabData } from '../../common/slab/slabData.ts';
import { burstingBarsKg } from '../../concrete-box/boxBars.ts';
import { boxData } from '../../concrete-box/boxData.ts';
import { heightUnder } from '../../concrete-box/heightUnder.ts';
import { iBeams } from '../iBeams.ts';
import type { SizedSpliced } from './sizedSpliced.ts';
import type { SplicedModel } from './splicedModel.ts';
import { splicedData } from './splicedData.ts';

/** Splices of one line of beams. */
export function spliceCount({ plan }: SplicedModel): number {
  return plan.splices.reduce((sum, count) => sum + count, 0);
}

/** What the webs of the pieces over the piers have more than the beams beside them, all beams, m3. */
export function pierSolidM3({ layout, task, shape }: SplicedModel): number {
  const lengthM = 2 * splicedData.pierSolidOverDepth.value * shape.depthM * (task.spansM.length - 1);
  const wider = (shape.bottomWidthM - shape.webM) * (shape.depthM - 2 * shape.bottomFlangeM);
  return layout.count * lengthM * wider;
}

/** Measured lines: those of all beams, then tendons, splices, anchorages and towers. */
export function splicedLines(model: SplicedModel, all: SizedSpliced): MeasuredLine[] {
  const { layout, lengthM, task, plan, shape, composite } = model;
  const { tendons, straight } = all.sized;
  const { splices, towers } = splicedData;
  const beams = {
    strands: task.spansM.map(() => ({ plan: { count: straight.count } })),
    shears: all.shears,
    piers: all.piers,
  };
  const lines = precastLines(model, beams, iBeams.formworkM2(model));
  const count = spliceCount(model);
  const laps = slabData.lapAndDetail.value;
  const anchorKN = (tendons.strands / tendons.tendons) * model.tendonM2 * tendons.initialMPa * 1e3;
  const { soffitM } = heightUnder(task);
  const rows = plan.splices.map((n, span) => n * soffitM[span]!);
  const each = Math.ceil(layout.count / towers.beamsEach);
  const solidM3 = pierSolidM3(model);
  if (solidM3 > 0)
    lines.push(
      measured(
        'deck',
        'precast-concrete',
        solidM3,
        'solid webs at the piers',
        `${(shape.bottomWidthM * 1000).toFixed(0)} mm wide over one depth on each side of a pier`,
      ),
    );
  lines.push(
    measured(
      'deck',
      'prestress',
      layout.count * boxData.strandSlack.value * barKg(tendons.strands * model.tendonM2, lengthM),
      'tendons along the unit',
      `${tendons.tendons} tendons, ${tendons.strands} strands in each beam, ${tendons.first.toFixed(0)} of them before the slab`,
    ),
    measured(
      'deck',
      'reinforcement',
      laps * layout.count * count * splices.barsKgM3 * splices.lengthM * shape.areaM2,
      'bars of the splices',
      `${count} splices in each line of beams, ${splices.barsKgM3} kg/m3 over ${splices.lengthM} m`,
    ),
    measured(
      'deck',
      'reinforcement',
      layout.count * 2 * tendons.tendons * burstingBarsKg(anchorKN),
      'anchorages',
      'bursting behind anchorages',
    ),
    measured(
      'temporary-works',
      'temporary-tower',
      each * rows.reduce((sum, height) => sum + height, 0),
      'towers under the splices',
      `${each} towers in each of ${count} rows, composite depth ${composite.topM.toFixed(2)} m`,
    ),
  );
  return lines;
}
