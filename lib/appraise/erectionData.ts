import { z } from '../zod.ts';
import raw from '../../data/erection.json';

const number = z.number();
const source = z.string().min(1);
const nose = z.object({ noseOverSpan: number, noseOverDeckWeight: number });

/** What a method asks of the ground beside the bridge, from `data/erection.json`. */
export const erectionData = z
  .object({
    launch: z.object({ steel: nose, concrete: nose, tipping: number, leastBedM: number, source }),
    crane: z.object({ besideDeckM: number, afloatReachM: number, chartShare: number, source }),
    halves: z.object({ laneM: number, barrierM: number, source }),
  })
  .parse(raw);
