import { dateWords } from './days.ts';

/** Class of the root while the page is printed on sheets held upright. */
const UPRIGHT = 'upright';

export const isUpright = (): boolean => document.documentElement.classList.contains(UPRIGHT);

/** Prints the page on sheets held upright, notes under their cells; the print of the browser lays them across. */
export function printUpright(): void {
  const { classList } = document.documentElement;
  classList.add(UPRIGHT);
  addEventListener('afterprint', () => classList.remove(UPRIGHT), { once: true });
  print();
}

/** Words as a string of a style sheet. */
const quoted = (words: string): string =>
  `"${words.replaceAll(/["\\\p{Cc}]/gu, (sign) => `\\${sign.codePointAt(0)!.toString(16)} `)}"`;

/**
 * Keeps words and the date of the day at the foot of every printed sheet, so that a loose one can be told. What stands
 * there beside them, the caution and the number of the sheet, is of the style sheet.
 * @param words asked for before each print; what is empty is left out
 * @returns ends it
 */
export function runningFoot(words: () => readonly string[]): () => void {
  const style = new CSSStyleSheet();
  const write = (): void => {
    const said = [...words(), `printed ${dateWords(new Date())}`].filter((one) => one !== '');
    style.replaceSync(`@page { @bottom-left { content: ${quoted(said.join('; '))} } }`);
  };
  document.adoptedStyleSheets.push(style);
  addEventListener('beforeprint', write);
  return () => {
    removeEventListener('beforeprint', write);
    document.adoptedStyleSheets = document.adoptedStyleSheets.filter((one) => one !== style);
  };
}
