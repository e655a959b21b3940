import type { Check } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import { bearingPair } from './bearingsApart.ts';
import { boxUse, noBoxUse } from './boxUse.ts';
import { launchResistanceKN, shearReduction, webResistanceKN, webShearKN } from './sizePlates.ts';
import type { SizedSteelBox } from './sizeSteelBox.ts';
import { steelBoxData } from './steelBoxData.ts';

const use = noBoxUse();

/** Limit states of a steel box: girder, plates, deck, erection, bearings. */
export function steelBoxChecks(box: SizedSteelBox): Check[] {
  return [...girderChecks(box), ...deckChecks(box), deflection(box), uplift(box), room(box)];
}

/** Worst elements by bending, buckling of the bottom plate, shear, fatigue and erection. */
function girderChecks({ model, plates, effects }: SizedSteelBox): Check[] {
  const worst = { sag: 0, hog: 0, pressed: 0, shear: 0, both: 0, stage: 0, fatigue: 0 };
  let shearOf: [demand: number, capacity: number] = [0, 1];
  for (let e = 0; e < model.elementM.length; e++) {
    const webM = plates.webM[e]!;
    boxUse(use, model, effects, e, plates.deckM[e]!, webM, plates.bottomM[e]!, plates.pressed[e] === 1);
    worst.sag = Math.max(worst.sag, use.deckSag, use.bottomSag);
    worst.hog = Math.max(worst.hog, use.deckHog);
    worst.pressed = Math.max(worst.pressed, use.bottomHog);
    worst.stage = Math.max(worst.stage, use.deckStage, use.bottomStage);
    worst.fatigue = Math.max(worst.fatigue, use.fatigue);
    const demand = webShearKN(model, effects, e);
    const capacity = webResistanceKN(model, e, webM);
    if (demand / capacity > worst.shear) {
      worst.shear = demand / capacity;
      shearOf = [demand, capacity];
    }
    const bending = Math.max(use.deckSag, use.bottomSag, use.deckHog, use.bottomHog);
    worst.both = Math.max(worst.both, bending + use.webShare * shearReduction(demand / capacity));
  }
  const checks = [
    check('bending-spans', 'bending in the spans', worst.sag, 1, '1'),
    check('bending-piers', 'bending at the piers, tension of the deck', worst.hog, 1, '1'),
    check('bottom-buckling', 'buckling of the bottom plate', worst.pressed, 1, '1'),
    check('shear', 'shear of the webs', shearOf[0], shearOf[1], 'kN'),
    check('bending-shear', 'bending with shear', worst.both, 1, '1'),
    check('fatigue', 'fatigue of the bottom plate', worst.fatigue, 1, '1'),
    check('erection', 'bending while it is built', worst.stage, 1, '1'),
  ];
  if (effects.launchKN > 0)
    checks.push(
      check(
        'launch-bearing',
        'webs on the launching bearings',
        effects.launchKN / model.layout.webs,
        Math.min(
          ...Array.from(plates.webM, (webM, e) => launchResistanceKN(model, webM, plates.bottomM[e]!)),
        ),
        'kN',
      ),
    );
  return checks;
}

/** Deck between the webs: plate, ribs, crossbeams. */
function deckChecks({ model }: SizedSteelBox): Check[] {
  const { rib, cross, standard, id, task } = model;
  const checks = [
    check(
      'rib',
      'ribs under wheels',
      Math.max(rib.spanMPa, rib.crossbeamMPa),
      model.yieldMPa(rib.thicknessM) / standard.resistance.steel,
      'MPa',
    ),
    check('rib-fatigue', 'fatigue of the ribs', rib.rangeMPa, steelBoxData.deckFatigue.rangeMPa[id], 'MPa'),
    check(
      'rib-deflection',
      'deflection of the ribs over their span',
      rib.deflectionRatio,
      steelBoxData.rib.deflectionOverSpan,
      '1',
    ),
    check('crossbeam', 'crossbeams', cross.utilisation, 1, '1'),
  ];
  if (task.deckPlateM !== undefined)
    checks.push(
      check('deck-plate', 'thickness of the deck plate', 1000 * model.leastDeckM, 1000 * model.deckM, 'mm'),
    );
  if (cross.strutM > 0)
    checks.push(check('strut', 'struts under the crossbeams', cross.strutUtilisation, 1, '1'));
  return checks;
}

/** Deflection under traffic of the worst span. */
function deflection({ model, effects }: SizedSteelBox): Check {
  const { spansM } = model.task;
  const ratios = effects.deflections;
  const worst = ratios.indexOf(Math.max(...ratios));
  const limitM = spansM[worst]! / model.standard.deflection.limitRatio;
  return check('deflection', 'deflection under traffic', ratios[worst]! * limitM, limitM, 'm');
}

/** Two bearings at every support, far enough apart that neither lifts. */
function uplift({ model, effects, steel }: SizedSteelBox): Check {
  const checks = model.supportsM.map((_, j) => {
    const ownKN = effects.own.reactionKN[j]! + steel.atSupportKN[j]!;
    const { neededM, mostM } = bearingPair(model, effects, j, ownKN);
    return check('bearing-uplift', 'distance of two bearings of which none lifts', neededM, mostM, 'm');
  });
  return worstOf(checks);
}

/** Height to weld and inspect inside. */
function room({ model }: SizedSteelBox): Check {
  return check('box-depth', 'least depth of a box', steelBoxData.leastDepthM.value, model.task.depthM, 'm');
}

function worstOf(checks: readonly Check[]): Check {
  return checks.reduce((worst, next) => (next.utilisation > worst.utilisation ? next : worst));
}
