import type { ShaftInFrame } from '../model/index.ts';
import { pushedBy, turnedBy, type FrameAsk, type FramedShaft } from './framedShaft.ts';
import type { AlongUse } from './sizeShaft.ts';

/** What bends a shaft in one with the deck, characteristic, and how it stands. */
export function framedReport(ask: FrameAsk, shaft: FramedShaft, use: AlongUse): ShaftInFrame {
  return {
    eiKNm2: shaft.eiKNm2,
    stillM: ask.stillM,
    pushMm: 1000 * ask.pushM,
    cooledMm: 1000 * ask.cooledM,
    pushedKNm: pushedBy(shaft, ask.pushM).footKNm,
    turnedKNm: turnedBy(shaft, ask.laidKNm + ask.trafficKNm).topKNm,
    ...use,
  };
}
