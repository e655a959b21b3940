import { fileNameOf, saveFile } from './files.ts';

/** Cells of a table as they are read, row by row, heads first. */
function rowsOf(table: HTMLTableElement): string[][] {
  return [...table.rows].map((row) => [...row.cells].map((cell) => cell.textContent.trim()));
}

/** Figures as a spreadsheet reads them: no thin spaces, a plain minus. */
const plain = (text: string): string =>
  /^[\u2212-]?[\d\u2009 .]+$/u.test(text) ? text.replace(/[\u2009 ]/gu, '').replace('\u2212', '-') : text;

/** The table as comma-separated text, heads in the first line. Columns without a head or of one name are numbered. */
async function csvOf(table: HTMLTableElement): Promise<string> {
  const [head = [], ...rows] = rowsOf(table);
  // Loaded when the first table is saved: nobody waits for it who saves none.
  const { table: columns } = await import('arquero');
  const names = head.map((name, i) =>
    name === '' || head.indexOf(name) !== i ? `${name} ${i + 1}`.trim() : name,
  );
  return columns(
    names.map((name, i): [string, string[]] => [name, rows.map((row) => plain(row[i] ?? ''))]),
  ).toCSV();
}

/**
 * Makes the action 'Save as CSV' under the tables of a page hand over the table it stands under.
 * @param unfinished what is said before everything on the page is there; the name of the file says that it is so
 */
export function saveTables(page: HTMLElement, unfinished: () => string): void {
  page.addEventListener('click', (event) => {
    const action = event.target instanceof Element ? event.target.closest('button.csv') : null;
    const table = action?.parentElement?.querySelector('table');
    if (!table) return;
    const name = fileNameOf(table.caption?.textContent ?? 'table', unfinished());
    void csvOf(table).then((text) => saveFile(`${name}.csv`, text, 'text/csv'));
  });
}
