import { InputError } from "../../errors.ts";
import type { Line } from "../splitLines.ts";

/** More lines than any list has before its data. */
const PREAMBLE_LIMIT = 100_000;

/** Lines that can be looked at before they are consumed, for readers that must see the head of a file first. */
export class LineReader {
  private readonly file: string;
  private readonly source: AsyncIterator<Line[]>;
  private buffered: Line[] = [];
  private ended = false;

  constructor(lines: AsyncIterable<Line[]>, file: string) {
    this.file = file;
    this.source = lines[Symbol.asyncIterator]();
  }

  /** The next `count` lines, fewer at the end of the file; they stay unread. */
  async peek(count: number): Promise<readonly Line[]> {
    while (this.buffered.length < count && !this.ended) {
      const next = await this.source.next();
      if (next.done) this.ended = true;
      else this.buffered = this.buffered.concat(next.value);
    }
    return this.buffered.slice(0, count);
  }

  async next(): Promise<Line | undefined> {
    await this.peek(1);
    return this.buffered.shift();
  }

  /** Leading lines that satisfy `test`, consumed. Throws `no-data` if they do not end. */
  async takeWhile(test: (line: Line) => boolean): Promise<Line[]> {
    const taken: Line[] = [];
    for (;;) {
      await this.peek(1);
      const end = this.buffered.findIndex((line) => !test(line));
      taken.push(...this.buffered.splice(0, end === -1 ? this.buffered.length : end));
      if (end !== -1 || this.ended) return taken;
      if (taken.length > PREAMBLE_LIMIT) throw endlessPreamble(this.file);
    }
  }

  /** Everything not yet consumed, in batches. */
  async *rest(): AsyncGenerator<Line[]> {
    if (this.buffered.length > 0) yield this.buffered;
    this.buffered = [];
    yield* { [Symbol.asyncIterator]: () => this.source };
  }
}

const endlessPreamble = (file: string): InputError =>
  new InputError(
    "no-data",
    `${file}: the first ${PREAMBLE_LIMIT} lines, the limit, are comments or blank; a header and data must follow sooner`,
    { file },
  );
