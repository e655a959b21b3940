import type { Problem } from '../model/index.ts';
import { fileSentence } from '../messages/index.ts';

/** Bad input: why a command did nothing. */
export class Refusal extends Error {
  constructor(readonly problems: readonly Problem[]) {
    super(problems.map(fileSentence).join('\n'));
    this.name = 'Refusal';
  }
}

/** @throws Refusal always, with the problems of what was asked */
export function refuse(problems: readonly Problem[]): never {
  throw new Refusal(problems);
}
