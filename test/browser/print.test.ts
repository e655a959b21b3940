import { describe, expect, it } from 'vitest';
import { oneStudyPage } from './studyPage.ts';

describe('the option study on paper', () => {
  const at = oneStudyPage();

  const beforePrint = () => at.page.evaluate(() => dispatchEvent(new Event('beforeprint')));
  const afterPrint = () => at.page.evaluate(() => dispatchEvent(new Event('afterprint')));
  const styleOf = (selector: string, property: string): Promise<string[]> =>
    at.page.evaluate(
      ([what, which]) => [
        ...new Set(
          Array.from(document.querySelectorAll(what!), (one) =>
            getComputedStyle(one).getPropertyValue(which!),
          ),
        ),
      ],
      [selector, property],
    );

  it('cuts no cell that fits a sheet, no drawing and no row of a table', async () => {
    await at.page.emulateMedia({ media: 'print' });
    expect(await styleOf('.cell:not(.long)', 'break-inside')).toEqual(['avoid']);
    expect(await styleOf('.cell', 'break-after')).toEqual(['auto']);
    expect(await styleOf('svg.drawing', 'break-inside')).toEqual(['avoid']);
    expect(await styleOf('.ranking tr', 'break-inside')).toEqual(['avoid']);
    expect(await styleOf('.section > h2', 'break-after')).toEqual(['avoid']);
  });

  it('says at the foot of every sheet which study it is of, at which prices and when it was printed', async () => {
    await beforePrint();
    const foot = await at.page.evaluate(() =>
      document.adoptedStyleSheets
        .flatMap((sheet) => Array.from(sheet.cssRules, (rule) => rule.cssText))
        .join(),
    );
    await afterPrint();
    const fingerprint = await at.page.locator('.block tr:last-child td').textContent();
    expect(foot).toContain(
      `River Wend crossing at Low Ferry; WEN 07; ${fingerprint ?? ''}; prices 2026 Q1, EUR, demo rates`,
    );
    expect(foot).toContain(`printed ${String(new Date().getDate())} `);
  });

  it('what can span it and the forms asked for, as a sentence, stand on one sheet', async () => {
    // A3 across: 297 mm less 24 mm of margins high, 420 mm less 30 mm wide.
    const [sheetPx, widthPx] = [(273 * 96) / 25.4, Math.floor((390 * 96) / 25.4)];
    await at.page.setViewportSize({ width: widthPx, height: 900 });
    await at.page.emulateMedia({ media: 'print' });
    await beforePrint();
    const asked = at.page.locator('[id="2+020"]');
    const said = await asked.innerText();
    const highPx = await at.page.locator('#s2').evaluate((section) => section.getBoundingClientRect().height);
    const tables = await asked.locator('table').count();
    await afterPrint();
    await at.page.setViewportSize({ width: 1440, height: 900 });
    expect(said).toContain(
      'Asked for: composite I, concrete box, truss and cable-stayed. Not asked for: slab,',
    );
    expect(tables).toBe(0);
    expect(highPx).toBeLessThan(sheetPx);
    expect(highPx).toBeGreaterThan(sheetPx / 2);
  });

  it('prints what puts options out and what asks for caution, each reason once', async () => {
    await beforePrint();
    const rows = at.page.locator('[id="10+020"] .warnings tbody tr');
    const reasons = await rows.locator('td:nth-child(3)').allTextContents();
    await afterPrint();
    expect(reasons.length).toBeGreaterThan(2);
    expect(new Set(reasons).size).toBe(reasons.length);
    expect(reasons.join()).toContain('falsework');
    await rows.first().waitFor({ state: 'detached' });
  });

  it('is laid out for A3 across, and upright with its notes under their cells where that is asked', async () => {
    const widest = () =>
      at.page.evaluate(() =>
        Number(document.querySelector('[id="7+010"] svg.drawing')!.getAttribute('width')),
      );
    await beforePrint();
    expect(await widest()).toBe(1224);
    await afterPrint();
    await at.page.evaluate(() => {
      const seen: string[] = [];
      Object.assign(window, {
        seen,
        print() {
          dispatchEvent(new Event('beforeprint'));
          seen.push(document.querySelector('[id="7+010"] svg.drawing')!.getAttribute('width')!);
          dispatchEvent(new Event('afterprint'));
        },
      });
    });
    await at.page.getByRole('button', { name: 'Print upright' }).click();
    expect(await at.page.evaluate(() => (window as unknown as { seen: string[] }).seen)).toEqual(['980']);
    expect(await at.page.locator('html.upright').count()).toBe(0);
  });
});
