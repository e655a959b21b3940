import { z } from '../../zod.ts';
import json from '../../../data/forms/cantilever-box.json';
import { cited } from '../common/cited.ts';

const source = z.string().min(1);
const number = z.number();
const ducts = {
  coverM: number,
  spacingM: number,
  layers: number,
  widthShare: number,
  turnRad: number,
  source,
};

const schema = z.object({
  haunchPower: cited,
  slabPower: cited,
  webZone: z.object({ overArm: number, source }),
  bottomSlab: z.object({ mostM: number, mostOverDepth: number, source }),
  endOnFalsework: z.object({ leastOverSpan: number, source }),
  pierTableM: cited,
  segment: z.object({ leastM: number, mostM: number, mostKN: number, source }),
  traveller: z.object({ overSegment: number, leastKN: number, mostKN: number, source }),
  travellers: z.object({ mostPairs: number, setupsPerPair: number, setupsPerMove: number, source }),
  creep: z.object({ factor: number, source }),
  imbalance: z.object({ ownShare: number, source }),
  holdDown: z.object({ overturning: number, holding: number, traveller: number, source }),
  topTendons: z.object({ ...ducts, overSegments: number }),
  bottomTendons: z.object({ ...ducts, anchorM: number, mostPerWeb: number }),
  stageTensionMPa: cited,
  strandWorth: z.object({ kgPerM3: number, source }),
  depthTrials: cited,
});

/** Practical figures of boxes cantilevered in place, `data/forms/cantilever-box.json`. */
export const cantileverData = schema.parse(json);
