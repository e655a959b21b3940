import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import type { Study } from '../model/index.ts';

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
  return canonical(study);
}

/**
 * SHA-256 of the canonical JSON in UTF-8, 64 hexadecimal figures. The register is left out: it remembers the numbers that
 * options have been given and asks nothing, so a study that is changed and changed back is the same study.
 */
export function fingerprint(study: Study): string {
  const asked = { ...study, options: { ...study.options, register: [] } };
  return bytesToHex(sha256(utf8ToBytes(writeStudy(asked))));
}
