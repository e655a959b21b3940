import { takeHold, type CellHost, type HandDesk } from '../page/index.ts';

/** Makes the handles in the drawing of a cell answer, and says under it why something cannot be had. */
export function handsOn({ element }: CellHost, desk: HandDesk): void {
  const body = element.querySelector(':scope > .body')!;
  body.after(takeHold(body, desk));
}
