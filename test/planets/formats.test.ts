import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { cellsOf, fixture, readList, readRaw } from "./readText.ts";

interface Expected {
  readonly names?: readonly string[];
  readonly columns?: Readonly<Record<string, readonly (string | null)[]>>;
  readonly error?: string;
}
const expectedUrl = new URL("../fixtures/planets/astropy/expected.json", import.meta.url);
const expected = JSON.parse(readFileSync(expectedUrl, "utf8")) as Record<string, Expected>;

/** Cells compare as numbers where both are, single precision where that is all the file holds, else as trimmed text. */
function isSame(cell: string, reference: string | null): boolean {
  const text = cell.trim();
  if (reference === null) return text === "" || /^(nan|null|-|-9|-999)$/i.test(text);
  // Of an empty integer cell astropy makes 0 (its warning W49); for us it is missing.
  if (text === "" && reference === "0") return true;
  if (/^(true|false)$/i.test(reference)) return (/^[t1]/i.test(text) ? "true" : "false") === reference.toLowerCase();
  const [own, other] = [toNumber(text), toNumber(reference)];
  if (Number.isNaN(other) || reference === "") return text === reference.trim();
  return own === other || Math.fround(own) === Math.fround(other);
}

function toNumber(text: string): number {
  const infinite = /^([+-]?)inf$/i.exec(text);
  if (infinite) return infinite[1] === "-" ? -Infinity : Infinity;
  return text === "" ? Number.NaN : Number(text);
}

/** Files that astropy ships as samples and reads, see test/fixtures/planets/README.md. */
describe("astropy's sample files read as astropy reads them", () => {
  // The first is an empty table, which we take for a description without its data; the second checks time systems.
  const different = ["no_data_cds.dat", "timesys_errors.xml", "no_field_not_empty_table.xml"];
  const readable = Object.entries(expected).filter(
    ([name, { error }]) => error === undefined && !different.includes(name),
  );

  test("are here", () => expect(readable.length).toBeGreaterThanOrEqual(15));

  test.each(readable)("%s", async (name, { names = [], columns = {} }) => {
    for (const size of [7, 65536]) {
      const table = await readRaw(fixture(`astropy/${name}`), size);
      expect(table.columns.map((column) => column.name)).toEqual(names);
      for (const [column, references] of Object.entries(columns)) {
        const index = names.indexOf(column);
        const cells = table.records.map((record) => record.cells[index] ?? "");
        const wrong = references.flatMap((reference, i) =>
          isSame(cells[i] ?? "", reference) ? [] : [[column, i, cells[i], reference]],
        );
        expect(wrong).toEqual([]);
        expect(cells).toHaveLength(references.length);
      }
    }
  });
});

describe("astropy's broken files are errors with place and reason", () => {
  test.each([
    ["custom_datatype.xml", "votable-field", /line 8.*bar/],
    ["irsa-nph-error.xml", "votable-query-failed", /coordinate\/object name/],
    ["no_field_not_empty_table.xml", "votable-no-table", /no VOTable table/],
    ["no_resource.xml", "votable-no-table", /no VOTable table/],
    ["resource_groups.xml", "votable-no-table", /no VOTable table/],
    ["cds_malformed.dat", "cds-no-data", /description/],
    ["no_data_cds.dat", "cds-no-data", /description/],
  ])("%s", async (name, code, message) => {
    const read = readRaw(fixture(`astropy/${name}`));
    await expect(read).rejects.toMatchObject({ code, place: { file: "table" } });
    await expect(read).rejects.toThrow(message);
  });

  test("too_many_columns.xml.gz has more cells than fields, which is an issue of that row", async () => {
    const { columns, records } = await readRaw(fixture("astropy/too_many_columns.xml.gz"));
    expect(records[0]?.cells.length).toBeGreaterThan(columns.length);
  });
});

describe("one table in every format gives the same planets", () => {
  const files = [
    "planets-comma.ecsv",
    "planets.tabledata.vot",
    "planets.binary.vot",
    "planets.binary2.vot",
    "planets.ipac",
    "planets.mrt",
  ];

  test.each(files)("%s", async (name) => {
    const strip = async (file: string, chunkSize?: number) =>
      (await readList(fixture(`invented/${file}`), {}, chunkSize)).rows.map(({ row, name: planet, quantities }) => ({
        row,
        name: planet.replace("é", "e"),
        quantities: Object.entries(quantities).map(([key, { value, minus, plus, kind }]) => ({
          key,
          value,
          minus,
          plus,
          kind,
        })),
      }));
    const reference = await strip("planets.ecsv");
    expect(reference).toMatchObject([
      { name: "Aster b" },
      { name: "Brook c" },
      { name: "Cedar d" },
      { name: "Delta e" },
    ]);
    expect(reference.map(({ quantities }) => quantities.map(({ key }) => key).join())).toEqual([
      "mass,radius,period",
      "radius,period",
      "mass,period",
      "mass,radius",
    ]);
    for (const size of [1, 65536]) expect(await strip(name, size)).toEqual(reference);
  });
});

const votable = (
  data: string,
  fields = '<FIELD name="name" datatype="char" arraysize="*"/><FIELD name="mass_earth" datatype="double"/>',
): string =>
  `<?xml version="1.0"?><VOTABLE version="1.4"><RESOURCE><TABLE>${fields}<DATA>${data}</DATA></TABLE></RESOURCE></VOTABLE>`;

describe("VOTable", () => {
  test("entities of one's own are refused, so nothing can be blown up or fetched", async () => {
    const bomb = '<!DOCTYPE VOTABLE [<!ENTITY a "aaaa"><!ENTITY b "&a;&a;"><!ENTITY c SYSTEM "file:///etc/passwd">]>';
    for (const entity of ["b", "c"]) {
      const text = votable(`<TABLEDATA><TR><TD>&${entity};</TD><TD>1</TD></TR></TABLEDATA>`).replace("?>", `?>${bomb}`);
      await expect(cellsOf(text)).rejects.toMatchObject({ code: "xml-malformed", place: { line: 1 } });
    }
  });

  test("XML's own entities and CDATA are text", async () => {
    const text = votable(
      "<TABLEDATA><TR><TD>a &lt;b&gt; &amp;#945; &#945;</TD><TD><![CDATA[5]]></TD></TR></TABLEDATA>",
    );
    expect(await cellsOf(text)).toEqual([["a <b> &#945; α", "5"]]);
  });

  test("prefixed tags are the same tags", async () => {
    const text = votable("<TABLEDATA><TR><TD>A</TD><TD>1</TD></TR></TABLEDATA>").replace(/<(\/?)([A-Z])/g, "<$1vot:$2");
    expect(await cellsOf(text)).toEqual([["A", "1"]]);
  });

  test.each([
    ["cut off", votable("<TABLEDATA><TR><TD>A</TD>").slice(0, -60), "xml-malformed"],
    ["not closed properly", "<?xml version='1.0'?><VOTABLE><RESOURCE></VOTABLE>", "xml-malformed"],
    [
      "with its data elsewhere",
      votable('<BINARY><STREAM href="http://example.org/data"/></BINARY>'),
      "votable-external-data",
    ],
    ["with data in FITS", votable("<FITS></FITS>"), "votable-external-data"],
    ["with base64 that is none", votable('<BINARY><STREAM encoding="base64">!!!!</STREAM></BINARY>'), "votable-data"],
    ["with half a row", votable('<BINARY><STREAM encoding="base64">AAAA</STREAM></BINARY>'), "votable-data"],
    ["with a cell of 4 GB", votable('<BINARY><STREAM encoding="base64">/////w==</STREAM></BINARY>'), "votable-data"],
    [
      "with a failed query",
      '<VOTABLE><RESOURCE><INFO name="QUERY_STATUS" value="ERROR">no</INFO></RESOURCE></VOTABLE>',
      "votable-query-failed",
    ],
  ])("%s", async (_, text, code) => {
    await expect(cellsOf(text)).rejects.toMatchObject({ code, place: { file: "table" } });
  });

  test("a declared unit wins over the one in the name", async () => {
    const fields = '<FIELD name="mass_earth" datatype="double" unit="jupiterMass"/>';
    const list = await readList(votable("<TABLEDATA><TR><TD>1</TD></TR></TABLEDATA>", fields));
    expect(list.plan.quantities.get("mass")?.[0]).toMatchObject({ unit: { id: "jupiter" }, unitSource: "file" });
  });
});

describe("ECSV", () => {
  const header =
    "# %ECSV 1.0\n# ---\n# datatype:\n# - {name: name, datatype: string}\n# - {name: mass, unit: earthMass, datatype: float64}\n";

  test.each([
    ["another version", header.replace("1.0", "2.0"), "ecsv-version"],
    ["a broken header", header.replace("{name: name,", "{name: name"), "ecsv-header"],
    ["no columns", "# %ECSV 1.0\n# ---\n# datatype: []\n", "ecsv-header"],
    ["other names below", `${header}name radius\n`, "ecsv-header"],
    ["no names below", header, "ecsv-header"],
  ])("%s", async (_, text, code) => {
    await expect(readRaw(text)).rejects.toMatchObject({ code });
  });
});

describe("CDS and IPAC", () => {
  const rule = `${"-".repeat(80)}\n`;
  const description = (rows: string): string =>
    `Byte-by-byte Description of file: t.dat\n${rule} Bytes Format Units Label Explanations\n${rule}${rows}${rule}`;

  test("marks of missing values, limits and bracketed logarithms", async () => {
    const columns = ` 1- 7 A7 --- Name Name\n 9 A1 --- l_Mass Limit flag on Mass\n10-14 F5.1 Mjup Mass ?=-9.9 Mass\n16-18 F3.1 [cm/s2] logg ? Star\n`;
    const list = await readList(`${description(columns)}Aster b <  1.5 4.4\nBrook c  -9.9\n`);
    expect(list.rows[0]?.quantities.mass).toMatchObject({ kind: "upper-limit", limitCoding: "flag" });
    expect(list.rows[1]?.quantities.mass).toBeUndefined();
    expect(list.plan.quantities.get("starSurfaceGravity")?.[0]?.unit.id).toBe("log-cgs");
  });

  test.each([
    ["a description that describes nothing", description(""), "cds-description"],
    ["bytes that go backwards", description(" 9- 3 F5.1 Mjup Mass Mass\n"), "cds-description"],
    ["a second table", `${description(" 1- 3 F3.1 Mjup Mass Mass\n")}1.0\n${description("")}`, "several-tables"],
    ["five header lines", "|a |\n|b |\n|c |\n|d |\n|e |\n 1\n", "missing-columns"],
  ])("%s", async (_, text, code) => {
    await expect(readList(text)).rejects.toMatchObject({ code });
  });
});
