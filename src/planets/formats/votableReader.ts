import { SaxesParser } from "saxes";
import type { RawRecord } from "./rawTable.ts";
import { BinaryRows } from "./votableBinary.ts";
import { externalData, malformed, textTooLong, unreadable } from "./votableErrors.ts";
import { parseField, readCellText, readTypedBase64, type VotableField } from "./votableField.ts";

type Attributes = Readonly<Record<string, string>>;

/** Characters between two tags; more than any cell needs. */
const TEXT_LIMIT = 16 * 2 ** 20;

/** Takes the text of a VOTable piece by piece; fields and records come out as they are complete. */
export class VotableReader {
  readonly fields: VotableField[] = [];
  readonly notes: string[] = [];
  /** The table's fields are all known: its data have begun, or it has ended. */
  hasFields = false;
  /** What the archive says went wrong, if it says so. */
  failure: string | undefined;
  private readonly file: string;
  private readonly xml = new SaxesParser();
  /** Where the text between tags goes: to the XML parser, or straight to `binary`. */
  private mode: "markup" | "rows" | "stream" = "markup";
  private charactersSinceTag = 0;
  private isTable = false;
  private isDone = false;
  private openField: VotableField | undefined;
  private readonly missingById = new Map<string, string>();
  private cells: string[] | undefined;
  private rowLine = 1;
  /** Text of the open TD or INFO. */
  private openText: string | undefined;
  private cellIsBase64 = false;
  private binary: BinaryRows | undefined;
  private records: RawRecord[] = [];

  constructor(file: string) {
    this.file = file;
    this.xml.on("error", (error) => {
      throw malformed(file, this.xml.line, error);
    });
    this.xml.on("opentag", ({ name, attributes }) => {
      this.charactersSinceTag = 0;
      this.opening.get(localName(name))?.(attributes);
    });
    this.xml.on("closetag", ({ name }) => {
      this.charactersSinceTag = 0;
      this.closing.get(localName(name))?.();
    });
    this.xml.on("text", (text) => this.addText(text));
    this.xml.on("cdata", (text) => this.addText(text));
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
        this.addText(end === -1 ? rest : rest.slice(0, end));
        if (end === -1) return;
        rest = rest.slice(end);
      }
      const cut = this.mode === "rows" ? rest.length : rest.indexOf(">") + 1 || rest.length;
      this.charactersSinceTag += cut;
      this.xml.write(rest.slice(0, cut));
      if (this.charactersSinceTag > TEXT_LIMIT) throw textTooLong(this.file, this.xml.line, TEXT_LIMIT);
      rest = rest.slice(cut);
    }
  }

  /** Throws if the XML is not complete. */
  end(): void {
    this.xml.close();
  }

  private readonly opening = new Map<string, (attributes: Attributes) => void>([
    ["INFO", (attributes) => this.openInfo(attributes)],
    ["TABLE", () => this.openTable()],
    ["FIELD", (attributes) => this.openFieldTag(attributes)],
    ["VALUES", (attributes) => this.readValues(attributes)],
    ["DATA", () => this.openData()],
    ["TABLEDATA", () => this.switchTo("rows")],
    ["TR", () => this.openRow()],
    ["TD", (attributes) => this.openCell(attributes)],
    ["BINARY", () => this.openBinary(false)],
    ["BINARY2", () => this.openBinary(true)],
    ["STREAM", (attributes) => this.openStream(attributes)],
    ["FITS", () => this.refuseExternal("its data are in FITS")],
    ["PARQUET", () => this.refuseExternal("its data are in Parquet")],
  ]);

  private readonly closing = new Map<string, () => void>([
    ["INFO", () => this.closeInfo()],
    ["FIELD", () => this.closeField()],
    ["TD", () => this.closeCell()],
    ["TR", () => this.closeRow()],
    ["TABLEDATA", () => this.switchTo("markup")],
    ["STREAM", () => this.closeStream()],
    ["TABLE", () => this.closeTable()],
  ]);

  /** Data before any field, or of a further table, are passed over. */
  private get isReading(): boolean {
    return this.hasFields && !this.isDone;
  }

  private switchTo(mode: "markup" | "rows"): void {
    if (this.isReading) this.mode = mode;
  }

  private addText(text: string): void {
    if (this.openText !== undefined) this.openText += text;
    else if (this.mode === "stream") this.decoded("data", () => this.addBinary(text));
  }

  private addBinary(text: string): void {
    for (const cells of this.binary?.write(text) ?? []) this.records.push({ line: this.rowLine, cells });
  }

  private openInfo({ name = "", value = "" }: Attributes): void {
    if (name === "QUERY_STATUS" && value === "OVERFLOW") {
      this.notes.push("the archive cut the table off at its limit: rows are missing");
    }
    if ((name === "QUERY_STATUS" && value === "ERROR") || name.toUpperCase() === "ERROR") this.openText = `${value} `;
  }

  private closeInfo(): void {
    if (this.openText === undefined) return;
    this.failure = this.openText.replace(/^ERROR/, "").trim();
    this.openText = undefined;
  }

  private openTable(): void {
    if (this.isDone) this.notes.push("the file holds a further table, which is not read");
    this.isTable = !this.isDone;
  }

  private openFieldTag(attributes: Attributes): void {
    if (this.isTable) this.openField = this.decoded("field", () => parseField(attributes, this.fields.length + 1));
  }

  private readValues(attributes: Attributes): void {
    const missing = attributes.null ?? this.missingById.get(attributes.ref ?? "");
    if (this.openField === undefined || missing === undefined) return;
    if (attributes.ID !== undefined) this.missingById.set(attributes.ID, missing);
    this.openField = { ...this.openField, missing };
  }

  private closeField(): void {
    if (this.openField !== undefined) this.fields.push(this.openField);
    this.openField = undefined;
  }

  private openData(): void {
    if (this.fields.length > 0) this.hasFields = true;
  }

  private openRow(): void {
    if (!this.isReading) return;
    this.cells = [];
    this.rowLine = this.xml.line;
  }

  private openCell({ encoding }: Attributes): void {
    if (this.cells === undefined) return;
    this.openText = "";
    this.cellIsBase64 = encoding === "base64";
  }

  private closeCell(): void {
    if (this.cells === undefined || this.openText === undefined) return;
    const field = this.fields[this.cells.length];
    const text = this.openText;
    this.openText = undefined;
    if (field === undefined) this.cells.push(text);
    else if (this.cellIsBase64) this.cells.push(this.decoded("data", () => readTypedBase64(text, field)));
    else this.cells.push(readCellText(text, field));
  }

  private closeRow(): void {
    if (this.cells !== undefined) this.records.push({ line: this.rowLine, cells: this.cells });
    this.cells = undefined;
  }

  private openBinary(hasFlags: boolean): void {
    if (this.isReading) this.binary = new BinaryRows(this.fields, hasFlags);
  }

  private openStream({ href, encoding = "base64" }: Attributes): void {
    if (!this.isReading) return;
    if (href !== undefined) this.refuseExternal(`its data are at ${href}`);
    if (encoding !== "base64") this.refuseExternal(`its data are encoded as ${encoding}`);
    this.rowLine = this.xml.line;
    this.mode = "stream";
  }

  private closeStream(): void {
    if (this.mode !== "stream") return;
    this.mode = "markup";
    this.decoded("data", () => this.binary?.end());
  }

  private closeTable(): void {
    this.isTable = false;
    if (this.fields.length === 0) return;
    this.hasFields = true;
    this.isDone = true;
  }

  private refuseExternal(what: string): void {
    if (this.isReading) throw externalData(this.file, this.xml.line, what);
  }

  /** What `decode` returns; where it cannot, an error with the place. */
  private decoded<T>(what: "field" | "data", decode: () => T): T {
    try {
      return decode();
    } catch (cause) {
      throw unreadable(this.file, this.xml.line, what, cause);
    }
  }
}

/** Tags may carry a namespace prefix. */
const localName = (name: string): string => name.slice(name.indexOf(":") + 1);
