/**
 * Widths of the bundled lettering, so that labels can be placed without a browser.
 * Advance widths of Overpass in thousandths of the size, measured from the bundled variable font at weights 400 and 600,
 * figures in their tabular form.
 */
const characters =
  '0123456789 !"#$%&\'()*+,-./:;<=>?@ABCDEFGHIJKLMNOPQRSTUVWXYZ[\\]^_abcdefghijklmnopqrstuvwxyz{|}~\u2009\u202f\u00a0\u2212×€£²³°±\u2013\u2019Ø½\u201c\u201dµ';
const regular =
  '612 612 612 612 612 612 612 612 612 612 235 273 403 683 588 870 677 214 343 343 533 645 225 399 225 490 225 225 645 645 645 514 809 679 656 647 682 599 562 688 700 283 546 660 559 804 708 730 630 730 665 599 583 689 652 840 603 641 650 376 490 376 645 490 526 562 500 562 538 333 563 563 254 254 531 262 847 563 558 565 563 389 469 378 563 512 715 517 529 505 372 272 372 645 161 118 235 645 645 619 597 362 364 409 645 510 225 730 726 434 434 568'
    .split(' ')
    .map(Number);
const bold =
  '612 612 612 612 612 612 612 612 612 612 245 291 430 696 599 858 700 235 363 363 546 639 241 410 237 512 237 237 639 639 639 512 826 704 679 642 701 616 571 684 714 292 554 692 564 808 715 725 636 725 682 609 596 704 672 845 653 670 643 387 512 387 639 494 547 572 528 572 551 352 573 582 273 273 550 281 866 582 564 574 573 408 485 388 582 543 737 557 555 531 380 291 380 639 162 123 245 639 639 630 602 369 363 414 639 504 241 725 748 467 467 587'
    .split(' ')
    .map(Number);

const table = (widths: readonly number[]): ReadonlyMap<string, number> =>
  new Map(Array.from(characters).map((character, index) => [character, widths[index] ?? 560]));
const regularWidth = table(regular);
const boldWidth = table(bold);

/** Width of a line of lettering, px. Characters outside the table count as an average letter. */
export function textWidth(text: string, size: number, weight: 400 | 600 = 400): number {
  const widths = weight === 600 ? boldWidth : regularWidth;
  let sum = 0;
  for (const character of text) sum += widths.get(character) ?? 560;
  return (sum * size) / 1000;
}

/** Breaks a text into lines no wider than `widthPx`; a word longer than that stays whole. */
export function wrapText(text: string, widthPx: number, size: number, weight: 400 | 600 = 400): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (line !== '' && textWidth(longer, size, weight) > widthPx) {
      lines.push(line);
      line = word;
    } else line = longer;
  }
  lines.push(line);
  return lines;
}
