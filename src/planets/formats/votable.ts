import { SaxesParser, type SaxesTagPlain } from "saxes";
import { InputError } from "../../errors.ts";
import type { RawRecord, RawTable } from "./rawTable.ts";
import { BinaryRows } from "./votableBinary.ts";
import { parseField, readCellText, readTypedBase64, type VotableField } from "./votableField.ts";

export const isVotable = (head: string): boolean =>
  /^\s*(?:<\?xml|<!DOCTYPE\s+VOTABLE|<(?:\w+:)?VOTABLE|<!--)/.test(head);

/** Characters between two tags; more than any cell needs. */
const TEXT_LIMIT = 16 * 2 ** 20;

/**
 * VOTable 1.1 to 1.5 with TABLEDATA, BINARY or BINARY2 data: the first table with fields is read, as a stream.
 * Entities other than XML's own five are errors and nothing outside the file is ever fetched.
 * Source  IVOA Recommendation VOTable 1.5, https://www.ivoa.net/documents/VOTable/
 * Throws  `xml-malformed`, `votable-no-table`, `votable-query-failed`, `votable-external-data`, `votable-field`,
 *         `votable-data`
 */
export async function readVotable(text: AsyncIterable<string>, file: string): Promise<RawTable> {
  const reader = new VotableReader(file);
  const chunks = text[Symbol.asyncIterator]();
  while (!reader.hasFields) {
    const next = await chunks.next();
    if (next.done) break;
    reader.write(next.value);
  }
  if (!reader.hasFields) reader.end();
  if (reader.fields.length === 0)
    throw reader.failure === undefined ? noTable(file) : failedQuery(file, reader.failure);
  async function* batches(): AsyncGenerator<RawRecord[]> {
    yield reader.takeRecords();
    for (let next = await chunks.next(); !next.done; next = await chunks.next()) {
      reader.write(next.value);
      yield reader.takeRecords();
    }
    reader.end();
    yield reader.takeRecords();
  }
  return { format: "votable", columns: reader.fields, batches: batches() };
}

/** Takes the text of a VOTable piece by piece; fields and records come out as they are complete. */
class VotableReader {
  readonly fields: VotableField[] = [];
  /** The table's fields are all known: its data have begun, or it has ended. */
  hasFields = false;
  /** What the archive says went wrong, if it says so. */
  failure: string | undefined;
  private readonly file: string;
  private readonly xml = new SaxesParser();
  private mode: "markup" | "rows" | "stream" = "markup";
  private isDone = false;
  private isTable = false;
  private charactersSinceTag = 0;
  private readonly missingById = new Map<string, string>();
  private openField: VotableField | undefined;
  private cells: string[] | undefined;
  private rowLine = 1;
  private cellText: string | undefined;
  private cellIsBase64 = false;
  private infoText: string | undefined;
  private binary: BinaryRows | undefined;
  private records: RawRecord[] = [];

  constructor(file: string) {
    this.file = file;
    this.xml.on("error", (error) => {
      throw malformed(file, this.xml.line, error);
    });
    this.xml.on("opentag", (tag) => this.open(tag));
    this.xml.on("closetag", (tag) => this.close(localName(tag.name)));
    this.xml.on("text", (text) => this.text(text));
    this.xml.on("cdata", (text) => this.text(text));
  }

  takeRecords(): RawRecord[] {
    const taken = this.records;
    this.records = [];
    return taken;
  }

  /**
   * Markup goes to the XML parser tag by tag, because the parser would hold the whole text of a base64 stream until its
   * end; that text is decoded here as it comes.
   */
  write(piece: string): void {
    let rest = piece;
    while (rest !== "") {
      if (this.mode === "stream") {
        const end = rest.indexOf("<");
        this.binaryText(end === -1 ? rest : rest.slice(0, end));
        if (end === -1) return;
        rest = rest.slice(end);
      }
      const cut = this.mode === "rows" ? rest.length : rest.indexOf(">") + 1 || rest.length;
      this.charactersSinceTag += cut;
      this.xml.write(rest.slice(0, cut));
      if (this.charactersSinceTag > TEXT_LIMIT) throw textTooLong(this.file, this.xml.line);
      rest = rest.slice(cut);
    }
  }

  end(): void {
    this.xml.close();
  }

  private open(tag: SaxesTagPlain): void {
    this.charactersSinceTag = 0;
    const name = localName(tag.name);
    const { attributes } = tag;
    if (name === "INFO") this.openInfo(attributes);
    if (this.isDone) return;
    if (name === "TABLE") this.isTable = true;
    else if (name === "FIELD" && this.isTable) {
      this.openField = this.decoded("field", () => parseField(attributes, this.fields.length + 1));
    } else if (name === "VALUES" && this.openField !== undefined) this.readValues(attributes);
    else if (name === "DATA" && this.fields.length > 0) this.hasFields = true;
    else if (!this.hasFields) return;
    else if (name === "TABLEDATA") this.mode = "rows";
    else if (name === "TR") this.openRow();
    else if (name === "TD" && this.cells !== undefined) this.openCell(attributes);
    else if (name === "BINARY" || name === "BINARY2") this.binary = new BinaryRows(this.fields, name === "BINARY2");
    else if (name === "STREAM") this.openStream(attributes);
    else if (name === "FITS" || name === "PARQUET") throw external(this.file, this.xml.line, `its data are in ${name}`);
  }

  private close(name: string): void {
    this.charactersSinceTag = 0;
    if (name === "INFO") this.closeInfo();
    if (this.isDone) return;
    if (name === "FIELD" && this.openField !== undefined) {
      this.fields.push(this.openField);
      this.openField = undefined;
    } else if (name === "TD" && this.cells !== undefined) this.closeCell(this.cells);
    else if (name === "TR" && this.cells !== undefined) {
      this.records.push({ line: this.rowLine, cells: this.cells });
      this.cells = undefined;
    } else if (name === "TABLEDATA") this.mode = "markup";
    else if (name === "STREAM") this.closeStream();
    else if (name === "TABLE") this.closeTable();
  }

  private text(text: string): void {
    if (this.cellText !== undefined) this.cellText += text;
    else if (this.infoText !== undefined) this.infoText += text;
    else if (this.mode === "stream") this.binaryText(text);
  }

  private readValues(attributes: Readonly<Record<string, string>>): void {
    const missing = attributes.null ?? this.missingById.get(attributes.ref ?? "");
    if (missing !== undefined && attributes.ID !== undefined) this.missingById.set(attributes.ID, missing);
    if (this.openField !== undefined && missing !== undefined) this.openField = { ...this.openField, missing };
  }

  private openRow(): void {
    this.cells = [];
    this.rowLine = this.xml.line;
  }

  private openCell(attributes: Readonly<Record<string, string>>): void {
    this.cellText = "";
    this.cellIsBase64 = attributes.encoding === "base64";
  }

  private closeCell(cells: string[]): void {
    const field = this.fields[cells.length];
    const text = this.cellText ?? "";
    this.cellText = undefined;
    if (field === undefined) cells.push(text);
    else if (this.cellIsBase64) cells.push(this.decoded("data", () => readTypedBase64(text, field)));
    else cells.push(readCellText(text, field));
  }

  private openStream(attributes: Readonly<Record<string, string>>): void {
    if (attributes.href !== undefined) throw external(this.file, this.xml.line, `its data are at ${attributes.href}`);
    const encoding = attributes.encoding ?? "base64";
    if (encoding !== "base64") throw external(this.file, this.xml.line, `its stream is encoded as ${encoding}`);
    this.rowLine = this.xml.line;
    this.mode = "stream";
  }

  private binaryText(text: string): void {
    const rows = this.decoded("data", () => this.binary?.write(text) ?? []);
    for (const cells of rows) this.records.push({ line: this.rowLine, cells });
  }

  /** What `decode` returns; where it cannot be read, an error with the place. */
  private decoded<T>(what: "field" | "data", decode: () => T): T {
    try {
      return decode();
    } catch (cause) {
      const reason = cause instanceof Error ? cause.message : "";
      const message = `${this.file}, line ${this.xml.line}: the ${what} cannot be read: ${reason}`;
      throw new InputError(`votable-${what}`, message, { file: this.file, line: this.xml.line }, { cause });
    }
  }

  private closeStream(): void {
    this.mode = "markup";
    const left = this.binary?.end() ?? 0;
    if (left > 0) throw cutOff(this.file, this.xml.line, left);
  }

  private closeTable(): void {
    this.isTable = false;
    if (this.fields.length === 0) return;
    this.hasFields = true;
    this.isDone = true;
  }

  /** Archives answer a failed query with a well-formed VOTable that says so in an INFO. */
  private openInfo({ name = "", value = "" }: Readonly<Record<string, string>>): void {
    if ((name === "QUERY_STATUS" && value === "ERROR") || name.toUpperCase() === "ERROR") this.infoText = `${value} `;
  }

  private closeInfo(): void {
    if (this.infoText === undefined) return;
    this.failure = this.infoText.replace(/^ERROR/, "").trim();
    this.infoText = undefined;
  }
}

const localName = (name: string): string => name.slice(name.indexOf(":") + 1);

const malformed = (file: string, line: number, cause: Error): InputError =>
  new InputError(
    "xml-malformed",
    `${file}, line ${line}: not well-formed XML: ${cause.message.replace(/^\d+:\d+: /, "")}`,
    { file, line },
    { cause },
  );

const noTable = (file: string): InputError =>
  new InputError("votable-no-table", `${file}: this XML file holds no VOTable table with fields`, { file });

const failedQuery = (file: string, found: string): InputError =>
  new InputError("votable-query-failed", `${file}: the archive answered with an error instead of a table: ${found}`, {
    file,
    found,
  });

const external = (file: string, line: number, what: string): InputError =>
  new InputError(
    "votable-external-data",
    `${file}, line ${line}: ${what}, which is not read; save the table as TABLEDATA`,
    {
      file,
      line,
    },
  );

const cutOff = (file: string, line: number, bytes: number): InputError =>
  new InputError("votable-data", `${file}, line ${line}: the binary data end within a row (${bytes} bytes left over)`, {
    file,
    line,
  });

const textTooLong = (file: string, line: number): InputError =>
  new InputError(
    "line-too-long",
    `${file}, line ${line}: a cell is longer than the limit of ${TEXT_LIMIT} characters`,
    {
      file,
      line,
    },
  );
