/** Something an author has to correct, with its place. The words are ready to print. */
export interface Mistake {
  readonly file: string;
  readonly line: number;
  readonly column: number;
  /** JSON pointer; empty for the whole document. */
  readonly pointer: string;
  readonly expected: string;
  readonly received: string;
  /** What to do: a sentence, or nothing. */
  readonly advice: string;
}
