import type { At, Descriptor } from '../../../model/index.ts';
import type { formManual } from '../formManual.ts';

/** Checks of a deck slab, for the forms that have one; `thickness` names the figure of its thickness. */
export function slabCheckFigures(manual: ReturnType<typeof formManual>, thickness: string): Descriptor[] {
  const slab = (at: At): string[] => [`${at.unit}/figures/${thickness}`];
  const ratio = (): string[] => ['data/slab/steelRatioMost'];
  const demand =
    'As / d, As the greater of M / (z fyd) at ultimate and M / (z sigma) in service, per metre of slab';
  return [
    ...manual.check('slab-span', {
      demand,
      capacity: 'most bars that can be placed in one face',
      demandFrom: (at) => [...slab(at), 'data/slab/leverRatio', 'data/slab/barAxisM'],
      capacityFrom: ratio,
      sources: ['EN 1992-1-1 (from memory)'],
    }),
    ...manual.check('slab-root', {
      demand,
      capacity: 'most bars that can be placed in one face',
      demandFrom: (at) => [...slab(at), 'data/slab/leverRatio', 'data/slab/barAxisM'],
      capacityFrom: ratio,
      sources: ['EN 1992-1-1 (from memory)'],
    }),
    ...manual.check('slab-thickness', {
      demand: 'thickness that its moments ask for',
      capacity: 'thickest practical slab',
      demandFrom: slab,
      capacityFrom: () => ['data/slab/mostThicknessM'],
    }),
  ];
}
