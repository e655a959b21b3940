import type { ScaleMark } from './figureScale.ts';
import type { Figure, FigureRules } from './figureText.ts';

/** Where a figure comes from: typed here, preset and to be confirmed, or taken at the start because nobody has said it. */
export type Origin = 'typed' | 'preset' | 'assumed';

/** What an origin is, for those who do not see the underline; nothing of what is typed. */
export const originWords: Readonly<Record<Origin, readonly string[]>> = {
  typed: [],
  preset: ['preset, to be confirmed'],
  assumed: ['start value, not confirmed'],
};

/** A figure in a sentence or table. Limits, places and steps are in the unit shown. */
export interface FigureSpec extends FigureRules {
  /** What it is, for those who do not see the sentence: 'clear opening'. */
  readonly label: string;
  /** In the unit of the study. */
  readonly value: Figure;
  readonly origin?: Origin;
  /** The shown figure is the value times this, e.g. 100 for a ratio shown in per cent; 1 unless given. */
  readonly per?: number;
  /** Worth of one step of the arrow keys and of the scale; 1 unless given. */
  readonly step?: number;
  /** Where stepping starts from when the value is unknown; the lower limit or 0 unless given. */
  readonly from?: number;
  /** Tells a field from others of its cell across drawings of it anew; the label unless given. */
  readonly key?: string;
  /** Values, in the unit shown, at which something happens; asked once a drag. */
  readonly marks?: () => readonly ScaleMark[];
  /** Every new value of a drag, of arrow keys, or of typing that pauses. */
  readonly input?: (value: Figure) => void;
  /** Once at the end of each go that was told by `input`, also when it came back to where it began. */
  readonly change?: (value: Figure) => void;
  /** Takes back whatever `input` has told in this go, where more hangs on a value than the value itself. */
  readonly drop?: () => void;
  /** Enter on a preset or start value that was left as it is; a start value offers it in words too. */
  readonly confirm?: () => void;
}
