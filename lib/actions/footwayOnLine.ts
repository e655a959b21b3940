import type { DeckSpec } from '../model/index.ts';
import { crossPositiveArea, type CrossLine } from './crossLine.ts';
import { leftKerbM } from './trafficOnDeck.ts';

/** Adverse footway width x cross line, m. The footways lie outside the carriageway, shared by the width there is on each side. */
export function footwayOnLine(deck: DeckSpec, line: CrossLine): number {
  if (!(deck.footwayM > 0)) return 0;
  const left = leftKerbM(deck);
  const right = left + deck.carriagewayM;
  const leftRoom = Math.max(0, left + deck.widthM / 2);
  const rightRoom = Math.max(0, deck.widthM / 2 - right);
  const room = leftRoom + rightRoom;
  if (!(room > 0)) return 0;
  const leftWidth = (deck.footwayM * leftRoom) / room;
  const rightWidth = (deck.footwayM * rightRoom) / room;
  return (
    crossPositiveArea(line, -deck.widthM / 2, -deck.widthM / 2 + leftWidth) +
    crossPositiveArea(line, deck.widthM / 2 - rightWidth, deck.widthM / 2)
  );
}
