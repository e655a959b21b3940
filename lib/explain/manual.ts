import { factFigures } from '../appraise/factFigures.ts';
import { endFigures } from '../appraise/endFigures.ts';
import { headroomFigures } from '../appraise/headroomFigures.ts';
import { placeFigures } from '../appraise/placeFigures.ts';
import { hundredMmFigures } from '../appraise/hundredMmFigures.ts';
import { roadFigures } from '../appraise/roadFigures.ts';
import { rulingFigures } from '../appraise/rulingFigures.ts';
import { arrangementFigures } from '../arrange/figures.ts';
import { standingFigures } from '../decide/figures.ts';
import { adjacentFigures } from '../forms/adjacent-box/figures.ts';
import { cableFigures } from '../forms/cable-stayed/figures.ts';
import { cantileverFigures } from '../forms/cantilever-box/figures.ts';
import { compositeBoxFigures } from '../forms/composite-box/figures.ts';
import { compositeFigures } from '../forms/composite-i/figures.ts';
import { boxFigures } from '../forms/concrete-box/figures.ts';
import { designFigures } from '../forms/figures.ts';
import { floorPractice } from '../forms/floor/floorFigures.ts';
import { precastIFigures } from '../forms/precast-i/figures.ts';
import { halfThroughFigures } from '../forms/half-through/figures.ts';
import { troughFigures } from '../forms/precast-trough/figures.ts';
import { portalFigures } from '../forms/portal-frame/figures.ts';
import { slabBridgeFigures } from '../forms/slab/figures.ts';
import { steelBoxFigures } from '../forms/steel-box/figures.ts';
import { trussFigures } from '../forms/truss/figures.ts';
import { builtFigures } from '../bands/builtFigures.ts';
import type { Descriptor } from '../model/index.ts';
import { priceFigures } from '../price/figures.ts';
import { programmeFigures } from '../programme/figures.ts';
import { riverFigures } from '../river/figures.ts';
import { windowFigures } from '../rules/figures.ts';
import { deckFigures } from '../site/deckFigures.ts';
import { siteFigures } from '../site/figures.ts';
import { studyFigures } from '../study/figures.ts';
import { alongFigures } from '../substructure/alongFigures.ts';
import { articulationFigures } from '../substructure/articulationFigures.ts';
import { footLineFigures } from '../substructure/footLineFigures.ts';
import { foundationFigures } from '../substructure/foundationFigures.ts';
import { integralFigures } from '../substructure/integralFigures.ts';
import { frameFigures } from '../substructure/frameFigures.ts';
import { shaftFigures } from '../substructure/shaftFigures.ts';
import { supportFigures } from '../substructure/supportFigures.ts';
import { wallLineFigures } from '../substructure/wallLineFigures.ts';
import { lineFigures } from '../takeoff/lineFigures.ts';
import { quantityFigures } from '../takeoff/quantityFigures.ts';
import { dataFigures } from './dataFigures.ts';

/** Every descriptor of the tool, stage by stage from the brief to the standing. */
export const manual: readonly Descriptor[] = [
  ...studyFigures,
  ...siteFigures,
  ...deckFigures,
  ...windowFigures,
  ...arrangementFigures,
  // A form speaks for its own figures first.
  ...slabBridgeFigures,
  ...portalFigures,
  ...cantileverFigures,
  ...compositeFigures,
  ...compositeBoxFigures,
  ...boxFigures,
  ...precastIFigures,
  ...troughFigures,
  ...adjacentFigures,
  ...halfThroughFigures,
  ...steelBoxFigures,
  ...trussFigures,
  ...cableFigures,
  ...floorPractice,
  ...designFigures,
  ...roadFigures,
  ...hundredMmFigures,
  ...endFigures,
  ...headroomFigures,
  ...placeFigures,
  ...riverFigures,
  // A wall in one with the deck before abutments.
  ...integralFigures,
  // A shaft in one with the deck before other piers.
  ...frameFigures,
  ...supportFigures,
  ...articulationFigures,
  ...alongFigures,
  ...shaftFigures,
  ...foundationFigures,
  ...wallLineFigures,
  ...footLineFigures,
  ...lineFigures,
  ...quantityFigures,
  ...programmeFigures,
  ...priceFigures,
  ...factFigures,
  ...rulingFigures,
  ...standingFigures,
  ...builtFigures,
  ...dataFigures,
];
