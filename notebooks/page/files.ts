import { h } from '../html.ts';

/** Largest file that is read at all; a study is a few hundred kilobytes at most. */
const MOST_BYTES = 20_000_000;

/** Lets a person choose one file and gives its text, or null when none was chosen. Rejects a file beyond all measure. */
export function openFile(accept = '.json,application/json'): Promise<string | null> {
  return new Promise((resolve, reject) => {
    const chooser = h('input', { type: 'file', accept });
    chooser.addEventListener('cancel', () => resolve(null));
    chooser.addEventListener('change', () => {
      const file = chooser.files?.[0];
      if (file === undefined) resolve(null);
      else textOf(file).then(resolve, reject);
    });
    chooser.click();
  });
}

/** The text of a file, e.g. of one dropped on the page. Rejects a file beyond all measure. */
export async function textOf(file: File): Promise<string> {
  if (!(file.size <= MOST_BYTES)) {
    const megabytes = Math.round(file.size / 1e6);
    throw new Error(
      `file '${file.name}': expected at most ${MOST_BYTES / 1e6} MB, received ${megabytes} MB; choose a study file`,
    );
  }
  return file.text();
}

/** Hands a file to the person, under the name given. */
export function saveFile(name: string, content: BlobPart, type = 'application/json'): void {
  const address = URL.createObjectURL(new Blob([content], { type }));
  h('a', { href: address, download: name }).click();
  // The browser reads the address after the click has been dealt with.
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}

/** Words as the name of a file; of what is `unfinished`, which is not '', the name says that it is so far. */
export const fileNameOf = (words: string, unfinished: string): string =>
  `${words}${unfinished === '' ? '' : ' so far'}`.toLowerCase().replace(/[^a-z0-9]+/gu, '-');
