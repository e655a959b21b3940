import type { Check, MeasuredLine } from '../../model/index.ts';
import { measured } from '../common/measured.ts';
import type { BoxLayout } from './boxLayout.ts';
import type { BoxModel } from './boxModel.ts';
import { strutsM3M } from './struts.ts';

/** Concrete of struts or ribs under the slab where the box is `depthM` deep, m3 per m of deck; 0 where it has none. */
export function underSlabM3M({ struts, ribs, slope }: BoxLayout, depthM: number): number {
  return ribs ? ribs.concreteM3M : strutsM3M(struts, depthM, slope);
}

/** Bars of struts and along their heads, or of ribs, kg; `concreteM3` is all of their concrete. */
export function underSlabBarsKg({ struts, ribs }: BoxLayout, concreteM3: number, lengthM: number): number {
  if (ribs) return ribs.barsKgM * lengthM;
  return struts ? struts.barsKgM3 * concreteM3 + struts.beamBarsKgM * lengthM : 0;
}

/** Checks of struts or ribs. */
export function underSlabChecks({ struts, ribs }: BoxLayout): readonly Check[] {
  return ribs?.checks ?? struts?.checks ?? [];
}

/** Measured lines of struts or ribs, `concreteM3` of them. */
export function underSlabLines(
  { layout, lengthM }: Pick<BoxModel, 'layout' | 'lengthM'>,
  concreteM3: number,
): MeasuredLine[] {
  const { struts, ribs } = layout;
  const bars = (kg: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'reinforcement', kg, what, how);
  if (ribs)
    return [
      measured(
        'deck',
        'box-concrete',
        concreteM3,
        'ribs under the slab',
        `every ${ribs.spacingM} m, ${mm(ribs.widthM)} mm wide, ${mm(ribs.edgeM)} to ${mm(ribs.rootM)} mm deep with the slab`,
      ),
      bars(ribs.barsKgM * lengthM, 'bars of the ribs', 'bending and shear across the deck'),
      measured('deck', 'box-formwork', ribs.formsM2M * lengthM, 'forms of the ribs', 'both faces'),
    ];
  if (!struts) return [];
  const { spacingM, sideM, barsKgM3, beamBarsKgM, beamM } = struts;
  return [
    measured(
      'deck',
      'wing-strut',
      concreteM3,
      'struts under the wings',
      `2 rows every ${spacingM} m, ${mm(sideM)} mm square`,
    ),
    bars(barsKgM3 * concreteM3, 'bars of the struts', '1 % of their section, laps included'),
    bars(
      beamBarsKgM * lengthM,
      'bars along the heads of the struts',
      `2 thickenings of the slab to ${mm(beamM)} mm, bending from strut to strut and shear`,
    ),
  ];
}

function mm(lengthM: number): string {
  return (lengthM * 1000).toFixed(0);
}
