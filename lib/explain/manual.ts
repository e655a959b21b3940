import { factFigures, rulingFigures } from '../appraise/factFigures.ts';
import { roadFigures } from '../appraise/roadFigures.ts';
import { arrangementFigures } from '../arrange/figures.ts';
import { standingFigures } from '../decide/figures.ts';
import { compositeFigures } from '../forms/composite-i/figures.ts';
import { designFigures } from '../forms/figures.ts';
import { trussFigures } from '../forms/truss/figures.ts';
import type { Descriptor } from '../model/index.ts';
import { priceFigures } from '../price/figures.ts';
import { programmeFigures } from '../programme/figures.ts';
import { windowFigures } from '../rules/figures.ts';
import { siteFigures } from '../site/figures.ts';
import { studyFigures } from '../study/figures.ts';
import { articulationFigures } from '../substructure/articulationFigures.ts';
import { footLineFigures } from '../substructure/footLineFigures.ts';
import { foundationFigures } from '../substructure/foundationFigures.ts';
import { shaftFigures } from '../substructure/shaftFigures.ts';
import { supportFigures } from '../substructure/supportFigures.ts';
import { wallLineFigures } from '../substructure/wallLineFigures.ts';
import { takeOffFigures } from '../takeoff/figures.ts';
import { dataFigures } from './dataFigures.ts';

/** Every descriptor of the tool, stage by stage from the brief to the standing. */
export const manual: readonly Descriptor[] = [
  ...studyFigures,
  ...siteFigures,
  ...windowFigures,
  ...arrangementFigures,
  // A form speaks for its own figures first.
  ...compositeFigures,
  ...trussFigures,
  ...designFigures,
  ...roadFigures,
  ...supportFigures,
  ...articulationFigures,
  ...shaftFigures,
  ...foundationFigures,
  ...wallLineFigures,
  ...footLineFigures,
  ...takeOffFigures,
  ...programmeFigures,
  ...priceFigures,
  ...factFigures,
  ...rulingFigures,
  ...standingFigures,
  ...dataFigures,
];
