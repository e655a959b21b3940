/** Colours, pens and lettering of the sheet. Lines and letters step by the square root of two, as drawing pens do. */
export const colours = {
  sheet: '#FFFFFF',
  ink: '#151A1E',
  second: '#475057',
  third: '#6B747B',
  rule: '#A7AFB5',
  grid: '#DFE3E6',
  wash: '#F4F5F6',
  accent: '#C82D14',
} as const;

/** Pen widths, px (0.18, 0.25, 0.35, 0.5, 0.7 mm at 96 px to the inch). */
export const pens = { fine: 0.7, thin: 0.95, medium: 1.35, thick: 1.9, heavy: 2.65 } as const;

/** Lettering sizes, px. */
export const letters = {
  drawing: 11,
  table: 12.8,
  prose: 15.2,
  answer: 18.1,
  section: 21.5,
  large: 25.6,
  title: 30.4,
} as const;

/** How a sheet is inked: in colour, or in black with hatches for printing without colour. */
export type Paper = 'colour' | 'black';
