import { InputError } from "../errors.ts";

/** No line of a real list comes near this; without a limit a file without line ends would fill the memory. */
export const LINE_LIMIT = 16 * 2 ** 20;

export interface Line {
  /** Counts from 1. */
  readonly number: number;
  readonly text: string;
  /** `\n`, `\r\n`, `\r`, or nothing at the end of the file. */
  readonly ending: string;
}

/** Text as lines, in batches of one per chunk; LF, CRLF and lone CR may be mixed. Throws `line-too-long`. */
export async function* splitLines(chunks: AsyncIterable<string>, file: string): AsyncGenerator<Line[]> {
  const lineEnd = /\r\n|\n|\r/g;
  let pieces: string[] = [];
  let pendingLength = 0;
  let number = 1;
  let heldReturn = "";
  for await (const received of chunks) {
    let chunk = heldReturn + received;
    // A chunk may end between CR and LF.
    heldReturn = chunk.endsWith("\r") ? "\r" : "";
    if (heldReturn !== "") chunk = chunk.slice(0, -1);
    const lines: Line[] = [];
    let start = 0;
    lineEnd.lastIndex = 0;
    for (let match = lineEnd.exec(chunk); match !== null; match = lineEnd.exec(chunk)) {
      const text = pieces.length === 0 ? chunk.slice(start, match.index) : joinPieces(chunk.slice(0, match.index));
      lines.push({ number: number++, text, ending: match[0] });
      start = lineEnd.lastIndex;
    }
    if (start < chunk.length) keep(chunk.slice(start));
    if (lines.length > 0) yield lines;
  }
  if (heldReturn !== "") yield [{ number, text: joinPieces(""), ending: "\r" }];
  else if (pieces.length > 0) yield [{ number, text: joinPieces(""), ending: "" }];

  function keep(piece: string): void {
    pieces.push(piece);
    pendingLength += piece.length;
    if (pendingLength > LINE_LIMIT) throw tooLong(file, number);
  }
  function joinPieces(last: string): string {
    const text = pieces.join("") + last;
    pieces = [];
    pendingLength = 0;
    return text;
  }
}

const tooLong = (file: string, line: number): InputError =>
  new InputError(
    "line-too-long",
    `${file}, line ${line}: longer than the limit of ${LINE_LIMIT} characters; this is no planet list, or its line ends were lost`,
    { file, line },
  );
