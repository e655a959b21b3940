import { sizeableForms } from '../forms/index.ts';
import type { FormId } from '../model/index.ts';
import type { EvidenceLine } from './runEvidence.ts';

/** Forms that the tool sizes without a designed example or a built bridge to hold their quantities against. */
export function formsWithoutCase(lines: readonly EvidenceLine[]): FormId[] {
  const held = new Set(
    lines.filter(({ kind }) => kind === 'designed' || kind === 'built').map(({ subject }) => subject),
  );
  return sizeableForms.filter((form) => !held.has(form));
}
