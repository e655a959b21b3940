import slab from '../../data/rules/slab.json';
import portalFrame from '../../data/rules/portal-frame.json';
import precastI from '../../data/rules/precast-i.json';
import precastTrough from '../../data/rules/precast-trough.json';
import adjacentBox from '../../data/rules/adjacent-box.json';
import halfThrough from '../../data/rules/half-through.json';
import compositeI from '../../data/rules/composite-i.json';
import compositeBox from '../../data/rules/composite-box.json';
import concreteBox from '../../data/rules/concrete-box.json';
import cantileverBox from '../../data/rules/cantilever-box.json';
import steelBox from '../../data/rules/steel-box.json';
import truss from '../../data/rules/truss.json';
import tiedArch from '../../data/rules/tied-arch.json';
import deckArch from '../../data/rules/deck-arch.json';
import extradosed from '../../data/rules/extradosed.json';
import cableStayed from '../../data/rules/cable-stayed.json';
import suspension from '../../data/rules/suspension.json';

/** The rules that belong to one form each, one file a form. */
export const formRuleFiles: readonly unknown[] = [
  slab,
  portalFrame,
  precastI,
  precastTrough,
  adjacentBox,
  halfThrough,
  compositeI,
  compositeBox,
  concreteBox,
  cantileverBox,
  steelBox,
  truss,
  tiedArch,
  deckArch,
  extradosed,
  cableStayed,
  suspension,
];
