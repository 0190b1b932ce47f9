import { decodeBase64 } from "./base64.ts";
import { elementBytes, readElements, type VotableField } from "./votableField.ts";

/** Bytes of one cell; a larger size is a damaged file, and waiting for the bytes would fill the memory. */
const CELL_LIMIT = 16 * 2 ** 20;

/** Rows of a BINARY or BINARY2 stream, decoded from base64 as it comes. Throws RangeError for impossible sizes. */
export class BinaryRows {
  private readonly fields: readonly VotableField[];
  /** BINARY2 begins every row with one bit per field that says whether the value is missing. */
  private readonly flagBytes: number;
  private text = "";
  private bytes: Uint8Array = new Uint8Array(0);

  constructor(fields: readonly VotableField[], hasFlags: boolean) {
    this.fields = fields;
    this.flagBytes = hasFlags ? Math.ceil(fields.length / 8) : 0;
  }

  /** The rows that are complete with this piece of base64 text. */
  write(piece: string): string[][] {
    this.text += piece.replace(/\s+/g, "");
    const whole = this.text.length - (this.text.length % 4);
    const decoded = decodeBase64(this.text.slice(0, whole));
    this.text = this.text.slice(whole);
    const joined = new Uint8Array(this.bytes.length + decoded.length);
    joined.set(this.bytes);
    joined.set(decoded, this.bytes.length);
    const view = new DataView(joined.buffer);
    const rows: string[][] = [];
    let at = 0;
    for (;;) {
      const row = this.readRow(view, at);
      if (row === undefined) break;
      rows.push(row.cells);
      at = row.end;
    }
    this.bytes = joined.subarray(at).slice();
    return rows;
  }

  /** Bytes that belong to no complete row. */
  end(): number {
    return this.bytes.length + this.text.length;
  }

  private readRow(view: DataView, start: number): { cells: string[]; end: number } | undefined {
    let at = start + this.flagBytes;
    if (at >= view.byteLength) return undefined;
    const cells: string[] = [];
    for (const [index, field] of this.fields.entries()) {
      let count = field.elements;
      if (field.isVariable) {
        if (at + 4 > view.byteLength) return undefined;
        count *= view.getUint32(at);
        at += 4;
      }
      const size = Math.ceil(count * elementBytes(field));
      if (size > CELL_LIMIT) throw new RangeError(`a cell of column "${field.name}" claims ${size} bytes`);
      if (at + size > view.byteLength) return undefined;
      const isMissing = this.flagBytes > 0 && ((view.getUint8(start + (index >> 3)) >> (7 - (index & 7))) & 1) === 1;
      const cell = isMissing ? "" : readElements(view, at, field, count);
      cells.push(cell === field.missing ? "" : cell);
      at += size;
    }
    return { cells, end: at };
  }
}
