/** What somebody has in hand: one handle of a drawing, and how things stood when it was taken. */
export interface Hold {
  /** Key of the handle, e.g. 'pier/2'. */
  readonly key: string;
  /** Its value then, m. */
  readonly valueM: number;
  /** Chainages of all supports then, m. */
  readonly supportsM: readonly number[];
}
