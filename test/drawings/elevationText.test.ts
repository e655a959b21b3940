import { describe, expect, it } from 'vitest';
import { crossing } from '../../notebooks/drawing/crossing.ts';
import { elevation } from '../../notebooks/drawing/elevation.ts';
import { elevationText } from '../../notebooks/drawing/elevationText.ts';
import type { Piece } from '../../notebooks/drawing/piece.ts';
import { stack } from '../../notebooks/drawing/stack.ts';
import { elements } from './golden.ts';
import { budget, crested, lowSite, obstacles, options, site, standing } from './fixture.ts';

const second = options[1]!;
const third = options[2]!;

/** What an element is described by, looked up as a reader of the page would. */
function describedBy(drawing: Piece, element: Piece): string {
  const id = element.attrs['aria-describedby'];
  const found = [...elements(drawing)].filter(({ attrs }) => attrs['id'] === id);
  expect(found, `one element of the id ${String(id)}`).toHaveLength(1);
  return found[0]!.children.filter((child) => typeof child === 'string').join('');
}

describe('elevationText(site, option)', () => {
  it('names every span, every support with chainage and founding, depths, road levels and spares', () => {
    const text = elevationText(site, second);
    // The fixture: 70 + 90 + 70 m from 1240; 2.30 m at midspan and 3.60 m at the piers; the road falls from 20.45 to 18.20.
    expect(text).toContain('230 m from chainage 1\u2009240 to 1\u2009470.');
    expect(text).toContain('Spans: A to P1 70 m, P1 to P2 90 m, P2 to B 70 m.');
    expect(text).toContain('A, abutment at chainage 1\u2009240,');
    expect(text).toContain('P2, pier at chainage 1\u2009400,');
    expect(text).toContain('2.30 m at midspan and 3.60 m at the supports');
    expect(text).toContain('Road level: 20.45 at A and 18.20 at B, straight between them.');
    // At the far end of the railway's envelope, as the data band says in bold.
    expect(text).toContain('lowest soffit allowed 17.10, 0.42 m to spare at chainage 1\u2009276.6');
    for (const { foundations } of second.supports) {
      const likely = foundations.toSorted((a, b) => b.odds - a.odds)[0]!;
      const toe = likely.piles?.toeLevelM ?? likely.footing.topLevelM - likely.footing.depthM;
      expect(text).toContain(`level ${toe.toFixed(2).replace('-', '−')}`);
    }
    expect(text).not.toMatch(/NaN|undefined|null/u);
  });

  it('says a crest with its radius, a pylon, and a soffit that is too low', () => {
    expect(elevationText(lowSite, crested(second))).toMatch(/over a crest of [\d\u2009]+ m radius/u);
    expect(elevationText(site, options[4]!)).toContain(', pylon at chainage');
    const sunk = {
      ...second,
      profile: {
        ...second.profile,
        pieces: second.profile.pieces.map((piece) => ({ ...piece, levelM: piece.levelM - 1 })),
      },
    };
    expect(elevationText(site, sunk)).toContain('0.58 m too low');
  });

  it('says that nothing has to be kept clear where nothing has', () => {
    expect(elevationText({ ...site, soffitLimits: [] }, third)).toContain('Nothing has to be kept clear.');
  });
});

describe('every elevation', () => {
  it.each([
    ['crossing', crossing({ site, option: second, obstacles, widthPx: 980 })],
    ['elevation', elevation({ site, option: second, widthPx: 980 })],
  ])('%s is described by its text', (_, drawing) => {
    expect(describedBy(drawing, drawing)).toBe(elevationText(site, second));
  });

  it.each([1224, 358])('in a stack %i px wide describes the button of its row', (widthPx) => {
    const drawing = stack({ site, options, standing, budget, currency: 'EUR', reference: 2, widthPx });
    const buttons = [...elements(drawing)].filter(({ attrs }) => attrs['class'] === 'frame');
    expect(buttons.map((button) => describedBy(drawing, button))).toEqual(
      options.map((option) => elevationText(site, option)),
    );
  });

  it('a bare crossing is described by nothing', () => {
    expect(crossing({ site, option: null, widthPx: 980 }).attrs).not.toHaveProperty('aria-describedby');
  });
});
