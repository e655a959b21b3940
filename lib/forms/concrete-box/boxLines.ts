import { materials } from '../../actions/index.ts';
import type { MeasuredLine } from '../../model/index.ts';
import { measured } from '../common/measured.ts';
import { boxBars } from './boxBars.ts';
import { lightM3, madeLines } from './boxConcrete.ts';
import { boxData } from './boxData.ts';
import type { BoxModel } from './boxModel.ts';
import type { Outline } from './boxOutline.ts';
import { heightUnder } from './heightUnder.ts';
import type { SizedBox } from './sizeBox.ts';
import { underSlabLines, underSlabM3M } from './underSlab.ts';

/** Measured lines of the superstructure: concrete, bars, strand, formwork and, where cast in place, falsework. */
export function boxLines(model: BoxModel, box: SizedBox): MeasuredLine[] {
  const { lengthM, layout, task } = model;
  const { own, sections, tendons, thicknesses: t } = box;
  const bars = boxBars(model, box);
  const diaphragmM3 = own.diaphragmM3.reduce((sum, m3) => sum + m3, 0);
  const concrete = (m3: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'box-concrete', m3, what, how);
  const steel = (kg: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'reinforcement', kg, what, how);
  const { group } = tendons;
  const draped = tendons.strandsPerWeb * layout.webs;
  const lines = [
    concrete(
      own.boxM3 - lightM3(model, model.beam.xM, sections.areaM2),
      'box',
      `${layout.cells} ${layout.cells === 1 ? 'cell' : 'cells'}, webs ${mm(t.webM)} to ${mm(t.supportWebM)}, bottom slab ${mm(t.bottomM)} to ${mm(t.pierBottomM)}, top slab ${mm(layout.slab.midM)} to ${mm(layout.slab.rootM)} mm`,
    ),
    ...madeLines(model, model.beam.xM, sections.areaM2),
    concrete(
      own.blistersM3,
      'blisters and joints',
      `${(100 * boxData.blisters.share).toFixed(0)} % of the box`,
    ),
    concrete(diaphragmM3, 'diaphragms', `${model.supportsM.length} supports`),
    steel(bars.topAcrossKg, 'top slab across', 'wheels, weight and edges across the deck, laps included'),
    steel(bars.topAlongKg, 'top slab along', 'distribution and surface bars'),
    steel(bars.bottomKg, 'bottom slab', 'surface bars of both faces, both ways'),
    steel(bars.stirrupsKg, 'stirrups', `${layout.webs} webs, shear, torsion and bending across`),
    steel(bars.webAlongKg, 'webs along', 'surface bars of both faces'),
    steel(bars.diaphragmKg, 'diaphragms', `${boxData.diaphragm.barsKgM3} kg/m3`),
    steel(bars.blisterKg, 'blisters and anchorages', 'bursting behind anchorages and blisters'),
    measured(
      'deck',
      'prestress',
      strandKg(model, draped * tendons.meanShare),
      'draped tendons',
      `${layout.webs} webs, ${group.tendonsPerWeb} tendons of ${group.strandsPerTendon.toFixed(1)} strands each${tendons.meanShare < 1 ? `, ${(100 * tendons.meanShare).toFixed(0)} % of them along the mean of the deck` : ''}`,
    ),
  ];
  lines.push(...acrossLines(model), ...underSlabLines(model, underSlabM3M(layout, task.depthM) * lengthM));
  if (tendons.straightStrands > 0)
    lines.push(
      measured(
        'deck',
        'prestress',
        strandKg(model, tendons.straightStrands),
        'centred tendons for launching',
        `${tendons.straightStrands} strands in top and bottom slab`,
      ),
    );
  lines.push(
    measured(
      'deck',
      'box-formwork',
      formworkPerM(sections.span.outline) * lengthM +
        diaphragmForms(own.diaphragmM3, (j) => j > 0 && j < model.supportsM.length - 1),
      'forms of the box',
      'outside without the top of the deck, cells without their floor, both faces of diaphragms',
    ),
  );
  if (task.method !== 'launch') lines.push(falsework(model));
  return lines.filter(({ quantity }) => quantity > 0);
}

/** Tendons across the top slab, where it has them. */
export function acrossLines({
  layout: { across },
  lengthM,
  task,
}: Pick<BoxModel, 'layout' | 'lengthM' | 'task'>): MeasuredLine[] {
  if (!across) return [];
  return [
    measured(
      'deck',
      'prestress',
      across.strandKgM2 * lengthM * task.deck.widthM,
      'tendons across the top slab',
      `${across.forceKNm.toFixed(0)} kN per m of deck after losses, ${across.strandKgM2.toFixed(1)} kg/m2`,
    ),
  ];
}

/** Strand along the deck, kg. */
export function strandKg(model: Pick<BoxModel, 'strandM2' | 'lengthM'>, strands: number): number {
  return strands * model.strandM2 * materials.steelDensityKgM3 * model.lengthM * boxData.strandSlack.value;
}

function falsework(model: BoxModel): MeasuredLine {
  const { soffitM, known } = heightUnder(model.task);
  const widthM = model.task.deck.widthM;
  const volume = model.task.spansM.reduce((sum, span, i) => sum + span * soffitM[i]! * widthM, 0);
  const mean = volume / (widthM * model.lengthM);
  return measured(
    'temporary-works',
    'falsework',
    volume,
    'falsework under the deck',
    `${mean.toFixed(1)} m high${known ? '' : ' (assumed)'}, ${widthM} m wide, ${model.lengthM.toFixed(1)} m long`,
  );
}

/** Formed faces per m of deck: all but level faces that look up (top of the deck, floors of the cells). */
export function formworkPerM({ outer, cells }: Outline): number {
  const formed = (points: readonly (readonly [number, number])[], looksUp: number): number => {
    let sum = 0;
    points.forEach(([y, z], i) => {
      const [y2, z2] = points[(i + 1) % points.length]!;
      if (z === z2 && z === looksUp) return;
      sum += Math.hypot(y2 - y, z2 - z);
    });
    return sum;
  };
  return (
    formed(outer, 0) + cells.reduce((sum, cell) => sum + formed(cell, Math.min(...cell.map(([, z]) => z))), 0)
  );
}

/** Both faces of the diaphragms, m2. */
export function diaphragmForms(
  diaphragmM3: readonly number[],
  isInner: (support: number) => boolean,
): number {
  const { pierM, endM } = boxData.diaphragm;
  return diaphragmM3.reduce((sum, m3, j) => sum + (2 * m3) / (isInner(j) ? pierM : endM), 0);
}

function mm(lengthM: number): string {
  return (lengthM * 1000).toFixed(0);
}
