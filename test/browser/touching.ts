/** Brings every cell on the screen once, so that all are drawn for the width the page has now; to be run in the page. */
export async function lookThrough(): Promise<void> {
  const frame = (): Promise<unknown> => new Promise((resolve) => requestAnimationFrame(resolve));
  for (const cell of document.querySelectorAll('.cell')) {
    cell.scrollIntoView();
    for (let i = 0; i < 3; i += 1) await frame();
  }
  scrollTo(0, 0);
}

/**
 * Lettering of the drawings on the page that touches other lettering or leaves its sheet, in words; to be run in the page.
 * Letters are taken from their foot up to the height of capitals: what hangs below or stands out above may come close.
 */
export function touching(): string[] {
  const found: string[] = [];
  const isSeen = (element: Element): boolean =>
    element.checkVisibility({ opacityProperty: true, visibilityProperty: true });
  for (const svg of document.querySelectorAll('svg.drawing')) {
    const sheet = svg.getBoundingClientRect();
    const cell = svg.closest('.cell')?.id ?? '';
    const boxes: { words: string; left: number; right: number; top: number; bottom: number }[] = [];
    for (const text of svg.querySelectorAll('text')) {
      const words = text.textContent;
      if (words.trim() === '' || !isSeen(text)) continue;
      const { x, width } = text.getBBox();
      const foot = Number(text.getAttribute('y'));
      const size = Number.parseFloat(getComputedStyle(text).fontSize);
      const { a, b, c, d, e, f } = text.getScreenCTM()!;
      const corners = [x, x + width].flatMap((px) =>
        [foot - 0.7 * size, foot].map((py) => [a * px + c * py + e, b * px + d * py + f] as const),
      );
      const [across, down] = [corners.map(([px]) => px), corners.map(([, py]) => py)];
      boxes.push({
        words,
        left: Math.min(...across),
        right: Math.max(...across),
        top: Math.min(...down),
        bottom: Math.max(...down),
      });
    }
    for (const [i, { words, left, right, top, bottom }] of boxes.entries()) {
      const isOver =
        left < sheet.left - 1 || right > sheet.right + 1 || top < sheet.top - 1 || bottom > sheet.bottom + 1;
      if (isOver) found.push(`${cell}: '${words}' leaves its sheet`);
      for (const other of boxes.slice(i + 1)) {
        const across = Math.min(right, other.right) - Math.max(left, other.left);
        const down = Math.min(bottom, other.bottom) - Math.max(top, other.top);
        if (across > 1 && down > 1) found.push(`${cell}: '${words}' touches '${other.words}'`);
      }
    }
  }
  return found;
}
