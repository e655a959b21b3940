import type { ExampleName } from '../exampleNames.ts';

/** Text of the answer to a worked example that came with the pages, see `readAnswer`; null where none did. */
export async function comingAnswer(example: ExampleName): Promise<string | null> {
  const response = await fetch(`./worked/${example}.json`);
  return response.ok ? response.text() : null;
}
