import { describe, expect, it } from 'vitest';
import { CROSSFALL } from '../../lib/index.ts';
import { deckStrips } from '../../notebooks/drawing/deckStrips.ts';
import { toText } from '../../notebooks/drawing/toText.ts';
import { workedStudy } from './study.ts';

const { deck, surfacingM } = workedStudy().brief;
const draw = (strips: typeof deck, scale: 100 | 200) =>
  deckStrips({ strips, surfacingM, crossfall: CROSSFALL, scale, marginPx: 24 });

describe('deckStrips', () => {
  it('draws the deck true to scale at 96 px to the inch and says what it is made of', () => {
    const piece = draw(deck, 100);
    // 12.5 m at 1:100 are 125 mm, 472.44 px at 96 px to 25.4 mm.
    expect(Number(piece.attrs['width'])).toBeCloseTo(472.44 + 48, 1);
    expect(Number(draw(deck, 200).attrs['width'])).toBeCloseTo(236.22 + 48, 1);
    expect(piece.attrs['aria-label']).toBe(
      'Deck, 12.50 m wide: barrier 0.50, shoulder 1.00, lane 3.50, lane 3.50, shoulder 1.00, barrier 0.50, footway 2.00, parapet 0.50',
    );
  });

  it('writes the crossfall over both halves of the carriageway, and not where there is no room', () => {
    const text = toText(draw(deck, 100));
    expect(text.match(/2\.5 %/gu)).toHaveLength(2);
    expect(toText(draw([{ kind: 'lane', widthM: 2, ultimateWidthM: 2 }], 100))).not.toContain('%');
  });
});
