import type { Piece } from '../drawing/piece.ts';

/** Whether anything in a drawing has a value of an attribute. */
const uses = (piece: Piece, name: string, value: string): boolean =>
  piece.attrs[name] === value ||
  piece.children.some((child) => typeof child !== 'string' && uses(child, name, value));

/** The face rules that the page itself is lettered with, each with the sheet it stands in. */
const facesOfPage = (): { readonly face: CSSFontFaceRule; readonly base: string }[] =>
  Array.from(document.styleSheets).flatMap((sheet) =>
    Array.from(sheet.cssRules).flatMap((rule) =>
      rule instanceof CSSFontFaceRule ? { face: rule, base: sheet.href ?? document.baseURI } : [],
    ),
  );

async function asDataUrl(address: URL): Promise<string> {
  const blob = await (await fetch(address)).blob();
  return new Promise((resolve, reject) => {
    const reader = new FileReader();
    reader.addEventListener('load', () => resolve(reader.result as string));
    reader.addEventListener('error', () => reject(reader.error ?? new Error('the lettering cannot be read')));
    reader.readAsDataURL(blob);
  });
}

/** A face rule with its data in place of its address. */
async function withData({ face, base }: { face: CSSFontFaceRule; base: string }): Promise<string> {
  const [whole, address = ''] = /url\(["']?([^"')]+)["']?\)/u.exec(face.cssText) ?? [''];
  const data = await asDataUrl(new URL(address, base));
  return face.cssText.replace(whole, `url("${data}")`);
}

/**
 * Face rules that bring along the lettering of a drawing: upright, and italic where it has any, about 50 kB each. None where
 * it cannot be read any more, as when the notebook is no longer served: what stands in for it then is named in the drawing.
 */
export async function lettersInFile(drawing: Piece): Promise<string> {
  const styles = uses(drawing, 'font-style', 'italic') ? ['normal', 'italic'] : ['normal'];
  const family = drawing.attrs['font-family'] ?? '';
  try {
    const needed = facesOfPage().filter(
      ({ face: { style } }) =>
        styles.includes(style.getPropertyValue('font-style')) &&
        family.startsWith(`'${style.getPropertyValue('font-family').replace(/["']/gu, '')}'`),
    );
    return (await Promise.all(needed.map(withData))).join('');
  } catch {
    return '';
  }
}
