import { described, type At, type Descriptor, type FormId } from '../../../model/index.ts';
import { formManual, linesOf, spansOf } from '../formManual.ts';
import { precastCheckFigures } from './checkFigures.ts';
import { staticsFigures } from './staticsFigures.ts';

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);

/** Precast beams: layout, section, strands and quantities, their checks. Figures are of one beam unless named otherwise. */
export function precastManual(form: FormId): Descriptor[] {
  const { figure, sized, line } = formManual(form);
  const perM2 = (name: string, label: string, unit: string, formula: string, ...items: readonly string[]) =>
    figure(name, {
      label,
      unit,
      method: 'ratio',
      formula: `${formula} / (length x deck width)`,
      inputs: (at: At) => ({
        lines: at.design.lines.flatMap(({ item }, i) =>
          items.includes(item) ? [`${at.unit}/lines/${i}/quantity`] : [],
        ),
        spans: spansOf(at),
        width: `${at.unit}/task/deck/widthM`,
      }),
      compute: ({ lines, spans, width }) => sum(lines) / (sum(spans) * width),
    });
  const shape = (name: string, label: string, unit: string): Descriptor =>
    sized(name, label, unit, 'outline of the beam that was chosen', 'beamHeightM', './task/depthM');

  return [
    described({
      path: 'options/:option/designs/:unit/depthM/midspan',
      when: (at) => at.design.task.form === form,
      label: 'structural depth',
      unit: 'm',
      method: 'sum',
      formula: 'beam + fill + slab: the deepest beam of the market within the depth asked for',
      inputs: (at) => ({
        beam: `${at.unit}/figures/beamHeightM`,
        fill: `${at.unit}/figures/fillM`,
        slab: `${at.unit}/figures/slabM`,
      }),
      compute: ({ beam, fill, slab }) => beam + fill + slab,
    }),
    sized(
      'beamHeightM',
      'depth of the beam',
      'm',
      'deepest beam of the market that fits under slab and fill',
      './task/depthM',
      'slabM',
      'fillM',
    ),
    shape('beamAreaM2', 'area of the beam', 'm2'),
    shape('beamInertiaM4', 'inertia of the beam', 'm4'),
    shape('webM', 'web of the beam', 'm'),
    shape('topFlangeWidthM', 'top flange of the beam', 'm'),
    shape('bottomFlangeWidthM', 'bottom flange of the beam', 'm'),
    figure('fillM', {
      label: 'fill between beam and slab',
      unit: 'm',
      method: 'figure of practice',
      formula: 'taken as it is',
      inputs: () => ({ fill: 'data/pretensioned/haunchM' }),
      compute: ({ fill }) => fill,
    }),
    sized(
      'slabM',
      'slab',
      'm',
      'least thickness in steps at which its bars stay within a practical ratio',
      'spacingM',
      'overhangM',
      'data/slab/steelRatioMost',
      'data/slab/stepM',
    ),
    sized(
      'compositeInertiaM4',
      'inertia of beam and slab together, in concrete of the beam',
      'm4',
      'transformed section of beam, fill and slab',
      'beamInertiaM4',
      'beamAreaM2',
      'slabM',
      'spacingM',
    ),
    sized(
      'compositeCentroidM',
      'centroid of beam and slab together above the soffit',
      'm',
      'transformed section of beam, fill and slab',
      'beamAreaM2',
      'slabM',
      'spacingM',
    ),
    sized(
      'curvatureFactor',
      'what curvature in plan adds to the loads of the outer beam',
      '',
      '1 + n a e / sum a2, e a third of the sagitta L2 / 8R; 1 on a straight',
      './task/planRadiusM',
      'spans',
      'spacingM',
      'beamLines',
    ),
    sized(
      'laneVehicles',
      'vehicles of lane 1 on the beam that carries most',
      'no',
      'lanes placed across the deck, or distribution factors',
      'beamLines',
      'spacingM',
      'site/deck/carriagewayM',
      'brief/loading',
    ),
    sized(
      'trafficUniformKNm',
      'uniform traffic on the beam that carries most',
      'kN/m',
      'lanes placed across the deck, or distribution factors',
      'beamLines',
      'spacingM',
      'site/deck/carriagewayM',
      'brief/loading',
    ),
    figure('ownKNm', {
      label: 'weight of a beam',
      unit: 'kN/m',
      method: 'product',
      formula: 'area x unit weight of concrete',
      inputs: (at) => ({
        area: `${at.unit}/figures/beamAreaM2`,
        weight: `data/${at.design.task.standard}/unitWeights/concreteKNm3`,
      }),
      compute: ({ area, weight }) => area * weight,
    }),
    sized(
      'wetKNm',
      'weight of slab and fill on a beam',
      'kN/m',
      'unit weight x (slab over its part of the width + fill x top flange)',
      'slabM',
      'spacingM',
      'overhangM',
      'fillM',
      'topFlangeWidthM',
    ),
    figure('superimposedKNm', {
      label: 'superimposed load on a beam',
      unit: 'kN/m',
      method: 'ratio',
      formula: 'what curvature adds x superimposed load of the deck / lines',
      inputs: (at) => ({
        curve: `${at.unit}/figures/curvatureFactor`,
        deck: `${at.unit}/task/deck/superimposedKNm`,
        lines: `${at.unit}/figures/beamLines`,
      }),
      compute: ({ curve, deck, lines }) => (curve * deck) / lines,
    }),
    sized(
      'liftingSafety',
      'safety of the longest beam against cracking while it hangs',
      '',
      '1 / (z0 / yr + ti / yr / tmax), roll stability',
      'spans',
      'ownKNm',
      'topFlangeWidthM',
      'data/pretensioned/lifting/sweepOverLength',
      'data/pretensioned/lifting/overhangShare',
    ),
    perM2(
      'concreteM3M2',
      'concrete per m2 of deck',
      'm3/m2',
      'all concrete',
      'precast-concrete',
      'deck-concrete',
    ),
    perM2('strandKgM2', 'strand per m2 of deck', 'kg/m2', 'all strand', 'pretensioned-strand', 'prestress'),
    perM2('barsKgM2', 'bars per m2 of deck', 'kg/m2', 'all bars', 'reinforcement'),
    ...staticsFigures(form),
    line('bars along the beams', {
      label: 'bars along the beams',
      unit: 'kg',
      method: 'ratio',
      formula: 'kg per m3 x concrete of the beams',
      inputs: (at) => ({
        ratio: 'data/pretensioned/beamBars/alongKgM3',
        beams: linesOf(at, 'precast beams'),
      }),
      compute: ({ ratio, beams }) => ratio * sum(beams),
    }),
    line('bars of the diaphragms', {
      label: 'bars of the diaphragms',
      unit: 'kg',
      method: 'ratio',
      formula: 'kg per m3 x concrete of the diaphragms',
      inputs: (at) => ({ ratio: `data/${form}/diaphragm/barsKgM3`, concrete: linesOf(at, 'diaphragms') }),
      compute: ({ ratio, concrete }) => ratio * sum(concrete),
    }),
    ...precastCheckFigures(form),
  ];
}
