import { guide } from '../guide.ts';
import type { Problem } from '../model/index.ts';
import { NARROWEST_DECK_M, WIDEST_DECK_M } from './deckWidths.ts';
import { needFlags, readFlags } from './flags.ts';
import { numberFlag } from './numberFlag.ts';
import { refuse } from './refusal.ts';
import { jsonText, type Said } from './said.ts';

/** `guide --span 120 [--width 12] [--length 400] [--radius 300]`: forms for a clear opening, as JSON. A deck carries a lane between its barriers. */
export function guideCommand(argv: readonly string[]): Said {
  const problems: Problem[] = [];
  const flags = readFlags(['span', 'width', 'length', 'radius'], argv);
  const metres = (name: string): number | undefined =>
    numberFlag(flags, name, { above: 0, unit: 'm' }, problems);
  needFlags(flags, ['span'], problems);
  const spanM = metres('span') ?? NaN;
  const widthM = numberFlag(
    flags,
    'width',
    { least: NARROWEST_DECK_M, most: WIDEST_DECK_M, unit: 'm' },
    problems,
  );
  const lengthM = metres('length');
  const radiusM = metres('radius');
  if (lengthM !== undefined && lengthM < spanM) {
    problems.push({
      code: 'too-small',
      path: ['--length'],
      expected: `at least the span of ${spanM}`,
      received: String(lengthM),
      unit: 'm',
      remedy: 'Enter the length between abutments, or leave it out',
    });
  }
  if (problems.length > 0) return refuse(problems);
  return {
    out: jsonText(
      guide({
        spanM,
        ...(widthM === undefined ? {} : { widthM }),
        ...(lengthM === undefined ? {} : { lengthM }),
        ...(radiusM === undefined ? {} : { radiusM }),
      }),
    ),
  };
}
