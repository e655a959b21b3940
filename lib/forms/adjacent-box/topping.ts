import { materials } from '../../actions/index.ts';
import type { UnitTask } from '../../model/index.ts';
import type { BeamShape } from '../common/precast/beamShape.ts';
import { check } from '../common/checks.ts';
import { designSlab, type SlabDesign } from '../common/slab/designSlab.ts';
import { adjacentData } from './adjacentData.ts';

/**
 * Topping over box beams, with the top slab of a beam under it: together they span from web to web under wheels. Bars of that
 * strip and a mesh in the topping.
 */
export function topping(task: UnitTask, shape: BeamShape): SlabDesign {
  const thicknessM = adjacentData.topping[task.standard];
  const webM = shape.webM / 2;
  const strip = designSlab({
    standard: task.standard,
    deck: task.deck,
    direction: 'across',
    spacingM: shape.acrossM - webM,
    overhangM: 0,
    continuous: true,
    uniform: true,
  });
  const meshKgM2 = adjacentData.topping.meshRatio * thicknessM * materials.steelDensityKgM3;
  return {
    midM: thicknessM,
    rootM: thicknessM,
    edgeM: thicknessM,
    meanM: thicknessM,
    mainBarsKgM2: strip.mainBarsKgM2,
    crossBarsKgM2: meshKgM2,
    spanMomentKNm: strip.spanMomentKNm,
    rootMomentKNm: strip.rootMomentKNm,
    checks: [
      check(
        'top-slab',
        'top slab and topping under wheels between the webs',
        strip.midM,
        thicknessM + adjacentData.box[task.standard].topM,
        'm',
      ),
    ],
  };
}
