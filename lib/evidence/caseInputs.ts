import type { EvidenceRow } from './evidenceRow.ts';

/** Typed access to the inputs of a row; every miss names the row's key and what was expected. */
export interface CaseInputs {
  number(key: string): number;
  /** The value, or `otherwise` when the key is absent. */
  numberOr(key: string, otherwise: number): number;
  text(key: string): string;
  textOr(key: string, otherwise: string): string;
  numbers(key: string): number[];
  /** A list of lists of numbers. */
  table(key: string): number[][];
  has(key: string): boolean;
}

/** @throws RangeError from its readers when an input is missing or of another type */
export function caseInputs(inputs: EvidenceRow['inputs']): CaseInputs {
  const wrong = (key: string, expected: string): never => {
    throw new RangeError(`${key}: expected ${expected}, received ${JSON.stringify(inputs[key])}`);
  };
  const number = (key: string): number => {
    const value = inputs[key];
    return typeof value === 'number' ? value : wrong(key, 'a number');
  };
  const text = (key: string): string => {
    const value = inputs[key];
    return typeof value === 'string' ? value : wrong(key, 'a text');
  };
  const isNumbers = (value: unknown): value is number[] =>
    Array.isArray(value) && value.every((entry) => typeof entry === 'number');
  return {
    number,
    text,
    numberOr: (key, otherwise) => (key in inputs ? number(key) : otherwise),
    textOr: (key, otherwise) => (key in inputs ? text(key) : otherwise),
    numbers: (key) => {
      const value: unknown = inputs[key];
      return isNumbers(value) ? value : wrong(key, 'a list of numbers');
    },
    table: (key) => {
      const value: unknown = inputs[key];
      return Array.isArray(value) && value.every(isNumbers)
        ? value
        : wrong(key, 'a list of lists of numbers');
    },
    has: (key) => key in inputs,
  };
}

/** A calculation that evidence rows can ask for: figures by name. */
export type EvidenceCase = (inputs: CaseInputs) => Readonly<Record<string, number>>;
