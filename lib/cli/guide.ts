import process from 'node:process';
import { guide } from '../guide.ts';
import { sentences } from '../messages/index.ts';
import type { Problem } from '../model/index.ts';
import { numberFlags } from './numberFlags.ts';

/** `guide --span 120 [--width 12] [--length 400] [--radius 300]`: forms for a clear opening, as JSON. */
function refuse(problems: readonly Problem[]): void {
  process.stderr.write(`${sentences(problems).join('\n')}\n`);
  process.exitCode = 2;
}

const read = numberFlags(process.argv.slice(2), {
  span: { unit: 'm', required: true },
  width: { unit: 'm', required: false },
  length: { unit: 'm', required: false },
  radius: { unit: 'm', required: false },
});

if (!read.ok) refuse(read.problems);
else {
  const { span: spanM = NaN, width: widthM, length: lengthM, radius: radiusM } = read.value;
  if (lengthM !== undefined && lengthM < spanM)
    refuse([
      {
        code: 'too-small',
        path: ['--length'],
        expected: `at least the span of ${spanM}`,
        received: String(lengthM),
        unit: 'm',
        remedy: 'Enter the length between abutments, or leave it out',
      },
    ]);
  else {
    const answer = guide({
      spanM,
      ...(widthM === undefined ? {} : { widthM }),
      ...(lengthM === undefined ? {} : { lengthM }),
      ...(radiusM === undefined ? {} : { radiusM }),
    });
    process.stdout.write(`${JSON.stringify(answer, null, 2)}\n`);
  }
}
