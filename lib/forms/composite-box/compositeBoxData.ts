import { z } from '../../zod.ts';
import json from '../../../data/forms/composite-box.json';
import { cited } from '../common/cited.ts';

const source = z.string().min(1);
const number = z.number();

const schema = z.object({
  layout: z.object({ mostWidthPerBoxM: number, overhangOverSpacing: number, source }),
  web: z.object({ slope: number, bottomOverTop: number, source }),
  bottomPlate: z.object({ leastM: number, stiffenerPitchM: number, spanPitchM: number, source }),
  stiffener: z.object({
    heightsM: z.array(number).min(1),
    webSlenderness: number,
    webLeastM: number,
    flangeOverHeight: number,
    flangeSlenderness: number,
    flangeLeastM: number,
    aimReduction: number,
    sizedOnM: number,
    source,
  }),
  shearLag: z.object({ atSupport: number, source }),
  frames: z.object({
    spacingM: number,
    ringKgM: number,
    diagonalLeastKgM: number,
    diagonalStressShare: number,
    distortionShare: number,
    source,
  }),
  topBracing: z.object({ kgM: number, source }),
  diaphragm: z.object({
    plateM: number,
    endPlateM: number,
    openingM2: number,
    ribShare: number,
    source,
  }),
  bearings: z.object({ fromWebsM: number, source }),
  insidePaintM2PerT: cited,
});

/** Practical figures of composite boxes, `data/forms/composite-box.json`. */
export const compositeBoxData = schema.parse(json);
