import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import type { Study } from '../model/index.ts';
import { askedOf } from './asked.ts';
import { inOrder } from './assumed.ts';

/** Canonical JSON of plain data: keys in code unit order, no white space, absent values left out. */
function canonical(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonical).join(',')}]`;
  if (typeof value === 'object' && value !== null) {
    const entries = Object.entries(value)
      .filter(([, entry]) => entry !== undefined)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([key, entry]) => `${JSON.stringify(key)}:${canonical(entry)}`);
    return `{${entries.join(',')}}`;
  }
  return JSON.stringify(value);
}

/** The study as canonical JSON: the same study always gives the same text, and reading it gives the same study. */
export function writeStudy(study: Study): string {
  // A study without start values is written as it was before a study could list them: its fingerprint stays.
  const assumed = study.assumed.length === 0 ? undefined : inOrder(study.assumed);
  return canonical({ ...study, assumed });
}

/**
 * SHA-256 of the canonical JSON in UTF-8, 64 hexadecimal figures, of what the study asks: its register remembers the
 * numbers that options have been given, its notes and its decision tell of the answer, a start value that is confirmed is
 * the same value, and none of them changes it. So a
 * study that is changed and changed back, and one that a note is written to, keeps its fingerprint.
 */
export function fingerprint(study: Study): string {
  return bytesToHex(sha256(utf8ToBytes(writeStudy(askedOf(study)))));
}
