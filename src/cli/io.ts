/** All that a command may touch of the outside world besides named files; tests hand in their own. */
export interface Io {
  readonly stdin: AsyncIterable<Uint8Array>;
  /** Results, and nothing else. */
  out(text: string): void;
  /** Errors, notes and progress. */
  err(text: string): void;
  /** Whether `err` is read by a person at a terminal. */
  readonly isTerminal: boolean;
  readonly useColor: boolean;
}
