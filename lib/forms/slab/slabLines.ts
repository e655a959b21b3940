import { materials } from '../../actions/index.ts';
import type { MeasuredLine } from '../../model/index.ts';
import { measured } from '../common/measured.ts';
import { boxData } from '../concrete-box/boxData.ts';
import { heightUnder } from '../concrete-box/heightUnder.ts';
import type { SizedSlab } from './sizeSlab.ts';
import type { SlabModel } from './slabModel.ts';

const mm = (lengthM: number): string => (1000 * lengthM).toFixed(0);

/** Measured lines of a slab deck: concrete, bars by element, strand, forms, voids and falsework. */
export function slabLines(model: SlabModel, slab: SizedSlab): MeasuredLine[] {
  const { lengthM, outline, task, voidedM } = model;
  const { barsKg, tendons, low, high } = slab;
  const steel = (kg: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'reinforcement', kg, what, how);
  const voids = outline.voids.length;
  const lines = [
    measured(
      'deck',
      'deck-concrete',
      model.concreteM3,
      'slab',
      voids > 0
        ? `${mm(task.depthM)} mm, ${voids} voids of ${mm(outline.voidDiameterM)} mm over ${voidedM.toFixed(1)} m`
        : `${mm(task.depthM)} mm, solid`,
    ),
    steel(barsKg.low, 'soffit along', `${mm(low.barM)} mm bars, curtailed by halves`),
    steel(barsKg.high, 'top along', `${mm(high.barM)} mm bars, curtailed by halves`),
    steel(barsKg.across, 'across', 'wheels and distribution, both faces, wings'),
  ];
  if (barsKg.links > 0)
    lines.push(
      steel(barsKg.links, 'links', `shear over ${slab.shear.linkedM.toFixed(1)} m of deck, punching`),
    );
  if (barsKg.corners > 0)
    lines.push(steel(barsKg.corners, 'top at the obtuse corners', 'both ways at two corners, by the skew'));
  lines.push(steel(barsKg.details, 'chairs and details', 'chairs, edges, trimming'));
  if (tendons)
    lines.push(
      measured(
        'deck',
        'prestress',
        strandKg(model, slab),
        'tendons',
        `${tendons.count} tendons of ${(tendons.strands / tendons.count).toFixed(1)} strands side by side`,
      ),
    );
  lines.push(
    measured(
      'deck',
      'slab-formwork',
      formedM(model) * lengthM + 2 * model.solid.areaM2,
      'forms of the soffit and the edges',
      'soffit, wings, sides and both ends',
    ),
  );
  if (voids > 0)
    lines.push(
      measured(
        'deck',
        'slab-formwork',
        voids * Math.PI * outline.voidDiameterM * voidedM,
        'void formers',
        `${voids} of ${mm(outline.voidDiameterM)} mm, surface`,
      ),
    );
  return [...lines, falsework(model)];
}

/** Strand of the deck with its slack, kg. */
export function strandKg({ lengthM }: SlabModel, { tendons }: SizedSlab): number {
  if (!tendons) return 0;
  return (
    tendons.areaM2 * tendons.meanShare * lengthM * boxData.strandSlack.value * materials.steelDensityKgM3
  );
}

/** Formed faces per m: all of the outline but its top. */
function formedM({ outline }: SlabModel): number {
  let sum = 0;
  outline.outer.forEach(([y, z], i) => {
    const [y2, z2] = outline.outer[(i + 1) % outline.outer.length]!;
    if (z !== 0 || z2 !== 0) sum += Math.hypot(y2 - y, z2 - z);
  });
  return sum;
}

function falsework({ task, lengthM }: SlabModel): MeasuredLine {
  const { soffitM, known } = heightUnder(task);
  const { widthM } = task.deck;
  const volume = task.spansM.reduce((sum, span, i) => sum + span * soffitM[i]! * widthM, 0);
  return measured(
    'temporary-works',
    'falsework',
    volume,
    'falsework under the deck',
    `${(volume / (widthM * lengthM)).toFixed(1)} m high${known ? '' : ' (assumed)'}, ${widthM} m wide, ${lengthM.toFixed(1)} m long`,
  );
}
