/** What a command has to say. */
export interface Said {
  /** For standard output. */
  readonly out: string;
  /** Lines for standard error. */
  readonly notes?: readonly string[];
  /** Exit code, 0 when left out. */
  readonly code?: number;
}

/** Text of a result as JSON. */
export function jsonText(value: unknown): string {
  return `${JSON.stringify(value, null, 2)}\n`;
}
