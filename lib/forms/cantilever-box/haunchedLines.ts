import type { MeasuredLine } from '../../model/index.ts';
import { measured } from '../common/measured.ts';
import { acrossLines, diaphragmForms, strandKg } from '../concrete-box/boxLines.ts';
import { lightM3, madeLines } from '../concrete-box/boxConcrete.ts';
import { boxData } from '../concrete-box/boxData.ts';
import { heightUnder } from '../concrete-box/heightUnder.ts';
import { underSlabLines, underSlabM3M } from '../concrete-box/underSlab.ts';
import { cantileverData } from './cantileverData.ts';
import type { CantileverModel } from './cantileverModel.ts';
import { haunchedBars } from './haunchedBars.ts';
import { formsAlong } from './sectionsAlong.ts';
import type { SizedHaunched } from './sizeHaunched.ts';

/** Values at the stations summed along the deck. */
export function along(model: CantileverModel, values: Float64Array): number {
  const { xM } = model.beam;
  let sum = 0;
  for (let i = 1; i < xM.length; i++) sum += ((values[i - 1]! + values[i]!) / 2) * (xM[i]! - xM[i - 1]!);
  return sum;
}

/** Strand of one family along the deck, kg. */
function familyKg(model: CantileverModel, strands: Float64Array): number {
  return strandKg(model, along(model, strands) / model.lengthM);
}

/** All strand, kg. */
export function strandTotalKg(model: CantileverModel, { found }: SizedHaunched): number {
  return familyKg(model, found.top) + familyKg(model, found.bottom);
}

/** Concrete of struts or ribs under the slab, m3. */
export function underSlabTotalM3(model: CantileverModel): number {
  return along(
    model,
    model.depthM.map((depth) => underSlabM3M(model.layout, depth)),
  );
}

/** Pairs of travellers, and how often one is moved to another pier. */
export function travellersOf(model: CantileverModel): { readonly pairs: number; readonly tables: number } {
  const tables = model.depthsM.size;
  return { pairs: Math.min(tables, cantileverData.travellers.mostPairs), tables };
}

/** Length of end spans cast on falsework, m by span. */
export function onFalseworkM(model: CantileverModel): number[] {
  return model.task.spansM.map((spanM, span) =>
    Math.max(0, spanM - model.arms.reduce((sum, arm) => sum + (arm.span === span ? arm.armM : 0), 0)),
  );
}

/** Measured lines of the superstructure: concrete, bars, strand, forms, travellers, and falsework under the ends. */
export function haunchedLines(model: CantileverModel, box: SizedHaunched): MeasuredLine[] {
  const { layout, task, supportsM } = model;
  const { weight, thicknesses: t, found } = box;
  const bars = haunchedBars(model, box);
  const diaphragmM3 = weight.diaphragmM3.reduce((sum, m3) => sum + m3, 0);
  const concrete = (m3: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'box-concrete', m3, what, how);
  const steel = (kg: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'reinforcement', kg, what, how);
  const strand = (strands: Float64Array, what: string, how: string): MeasuredLine =>
    measured('deck', 'prestress', familyKg(model, strands), what, how);
  const lines = [
    concrete(
      weight.boxM3 - lightM3(model, model.beam.xM, box.sections.areaM2),
      'box',
      `${layout.cells} ${layout.cells === 1 ? 'cell' : 'cells'}, ${task.depthM.toFixed(2)} to ${model.pierDepthM.toFixed(2)} m deep, webs ${mm(t.webM)} to ${mm(t.supportWebM)}, bottom slab ${mm(t.bottomM)} to ${mm(t.pierBottomM)} mm`,
    ),
    ...madeLines(model, model.beam.xM, box.sections.areaM2),
    concrete(
      weight.blistersM3,
      'blisters and joints',
      `${(100 * boxData.blisters.share).toFixed(0)} % of the box`,
    ),
    concrete(diaphragmM3, 'diaphragms', `${supportsM.length} supports`),
    steel(bars.topAcrossKg, 'top slab across', 'wheels, weight and edges across the deck, laps included'),
    steel(bars.topAlongKg, 'top slab along', 'distribution and surface bars'),
    steel(bars.bottomKg, 'bottom slab', 'surface bars of both faces, both ways'),
    steel(bars.stirrupsKg, 'stirrups', `${layout.webs} webs, shear, torsion and bending across`),
    steel(bars.webAlongKg, 'webs along', 'surface bars of both faces'),
    steel(bars.diaphragmKg, 'diaphragms', `${boxData.diaphragm.barsKgM3} kg/m3`),
    steel(bars.blisterKg, 'blisters and anchorages', 'bursting behind anchorages and blisters'),
    strand(
      found.top,
      'tendons of the arms',
      `up to ${Math.max(...found.top)} strands in the top slab over a pier, ending segment by segment`,
    ),
    strand(
      found.bottom,
      'tendons of the spans',
      `up to ${Math.max(...found.bottom)} strands in the bottom slab, ending towards the supports`,
    ),
    ...acrossLines(model),
    ...underSlabLines(model, underSlabTotalM3(model)),
    measured(
      'deck',
      'box-formwork',
      along(model, formsAlong(model, box.sections)) +
        diaphragmForms(weight.diaphragmM3, (j) => model.depthsM.has(j)),
      'forms of the box',
      'outside without the top of the deck, cells without their floor, both faces of diaphragms',
    ),
  ].filter(({ quantity }) => quantity > 0);
  const { pairs, tables } = travellersOf(model);
  const { setupsPerPair, setupsPerMove } = cantileverData.travellers;
  if (pairs > 0)
    lines.push(
      measured(
        'temporary-works',
        'method-setup',
        pairs * setupsPerPair + tables * setupsPerMove,
        'form travellers and pier tables',
        `${pairs} ${pairs === 1 ? 'pair' : 'pairs'} of travellers of ${(box.weight.travellerKN / 9.81).toFixed(0)} t, ${tables} pier ${tables === 1 ? 'table' : 'tables'}`,
      ),
    );
  const { soffitM, known } = heightUnder(task);
  const widthM = task.deck.widthM;
  const castM = onFalseworkM(model);
  const volume = castM.reduce((sum, lengthM, i) => sum + lengthM * soffitM[i]! * widthM, 0);
  if (volume > 0)
    lines.push(
      measured(
        'temporary-works',
        'falsework',
        volume,
        'falsework beyond the arms',
        `${castM.reduce((sum, lengthM) => sum + lengthM, 0).toFixed(1)} m of deck, ${widthM} m wide${known ? '' : ', height assumed'}`,
      ),
    );
  return lines;
}

function mm(lengthM: number): string {
  return (lengthM * 1000).toFixed(0);
}
