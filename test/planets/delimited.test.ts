import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import { cellsOf, fixture, readList, readRaw } from "./readText.ts";

const rows = [
  ["Aster b", "5.1", "1.7"],
  ["Brook c", "3", "1.2"],
];

describe("one table, however it is separated and ended", () => {
  test.each([
    ["commas", "name,mass_earth,radius_earth\nAster b,5.1,1.7\nBrook c,3,1.2\n", "comma-separated"],
    ["tabs", "name\tmass_earth\tradius_earth\nAster b\t5.1\t1.7\nBrook c\t3\t1.2\n", "tab-separated"],
    ["semicolons", "name;mass_earth;radius_earth\nAster b;5.1;1.7\nBrook c;3;1.2\n", "semicolon-separated"],
    ["bars", "name|mass_earth|radius_earth\nAster b|5.1|1.7\nBrook c|3|1.2\n", "bar-separated"],
    ["blanks", 'name  mass_earth  radius_earth\n"Aster b"  5.1  1.7\n"Brook c"  3    1.2\n', "blank-separated"],
    [
      "padded commas",
      "name    , mass_earth, radius_earth\nAster b , 5.1 , 1.7\nBrook c , 3   , 1.2 \n",
      "comma-separated",
    ],
    ["CRLF", "name,mass_earth,radius_earth\r\nAster b,5.1,1.7\r\nBrook c,3,1.2\r\n", "comma-separated"],
    ["CR", "name,mass_earth,radius_earth\rAster b,5.1,1.7\rBrook c,3,1.2\r", "comma-separated"],
    ["no final line end", "name,mass_earth,radius_earth\nAster b,5.1,1.7\nBrook c,3,1.2", "comma-separated"],
    ["blank lines", "\n\nname,mass_earth,radius_earth\n\nAster b,5.1,1.7\n\n  \nBrook c,3,1.2\n\n", "comma-separated"],
  ])("%s", async (_, text, format) => {
    for (const size of [1, 2, 7, 65536]) {
      const table = await readRaw(text, size);
      expect(table.format).toBe(format);
      expect(table.columns.map(({ name }) => name)).toEqual(["name", "mass_earth", "radius_earth"]);
      expect(table.records.map(({ cells }) => cells)).toEqual(rows);
    }
  });
});

describe("headers", () => {
  test.each([
    ["comments above", "# made by hand\n#\n# COLUMN name: Name\nname,mass_earth,radius_earth\n"],
    ["comments padded by a spreadsheet", "# made by hand,,\n#,,\nname,mass_earth,radius_earth\n"],
    ["quoted comments", '"# made, by hand",,\nname,mass_earth,radius_earth\n'],
    ["the header commented out", "# made by hand\n# name,mass_earth,radius_earth\n"],
    ["the header commented out and padded", "# name, mass_earth, radius_earth\n"],
    ["the header commented out, without a blank", "#name,mass_earth,radius_earth\n"],
    ["units below", "name,mass_earth,radius_earth\n,Mearth,Rearth\n"],
    ["units and dashes below", "name,mass_earth,radius_earth\n,Mearth,Rearth\n----,----,----\n"],
    ["dashes below", "name,mass_earth,radius_earth\n----,-----,----\n"],
  ])("%s", async (_, header) => {
    expect(await cellsOf(`${header}Aster b,5.1,1.7\n# a remark\nBrook c,3,1.2\n`)).toEqual(rows);
  });

  test("units come from the comments, the row below or the name", async () => {
    const commented = await readRaw("# COLUMN m: Mass [Jupiter mass] of it\nname,m\nA,1\n");
    expect(commented.columns[1]).toEqual({ name: "m", unit: "Jupiter mass", description: "Mass [Jupiter mass] of it" });
    expect((await readRaw("name,period\n,d\nA,1\n")).columns[1]?.unit).toBe("d");
  });

  test("of a commented header the blanks are no part of the names", async () => {
    const { columns } = await readRaw("# name, mass_earth, radius_earth\nAster b,5,1\n");
    expect(columns.map(({ name }) => name)).toEqual(["name", "mass_earth", "radius_earth"]);
  });

  test("a quoted name may go on in the next line", async () => {
    const text = 'name,"mass\n[M_earth]","radius\r\n[R_earth]"\nAster b,5±1,1.7\n';
    const { columns, rows } = await readList(text);
    expect(columns.map(({ name }) => name)).toEqual(["name", "mass [M_earth]", "radius [R_earth]"]);
    expect(rows).toMatchObject([{ line: 4, quantities: { mass: { kind: "measured" }, radius: { written: "1.7" } } }]);
  });

  test("names that JavaScript knows are names like any other", async () => {
    const list = await readList("name,mass_earth,__proto__,constructor,hasOwnProperty,toString\nA,1,2,3,4,5\n");
    expect(list.rows[0]?.cells).toEqual(["A", "1", "2", "3", "4", "5"]);
    expect(Object.keys(list.rows[0]?.quantities ?? {})).toEqual(["mass"]);
    expect(Object.getPrototypeOf(list.rows[0]?.texts)).toBe(Object.prototype);
  });
});

test.each([
  ["one row", "|---|---|---|", 1],
  ["several rows", "|------|------------|---|", 4],
  ["aligned columns", "| :--- | ---: | :-: |", 2],
])("a Markdown table of %s keeps them all", async (_, rule, count) => {
  const row = "| Aster b | 5.1±0.3 | 1.7 |\n";
  const { format, columns, rows } = await readList(
    `| name | mass_earth | radius_earth |\n${rule}\n${row.repeat(count)}`,
  );
  expect(format).toBe("bar-separated");
  expect(columns.map(({ name }) => name)).toEqual(["name", "mass_earth", "radius_earth"]);
  expect(rows.map(({ name, quantities }) => [name, quantities.mass?.kind])).toEqual(
    Array(count).fill(["Aster b", "measured"]),
  );
});

describe("lines beginning with # below the header", () => {
  const header = "name,mass_earth,radius_earth\n";

  test("are rows where they have a number and a cell for every column, and that is noted", async () => {
    const { rows, notes } = await readList(`${header}#1 Aster b,5,1.7\nBrook c,3,1.2\n`);
    expect(rows.map(({ name, line }) => [name, line])).toEqual([
      ["#1 Aster b", 2],
      ["Brook c", 3],
    ]);
    expect(notes).toEqual([expect.stringMatching(/^1 line below .* taken for rows.* line 2$/)]);
  });

  test.each(["# a remark", "# a remark, in, three", "# padded,,", "#"])(
    "%s is a comment, and counted",
    async (line) => {
      const { rows, notes } = await readList(`${header}Aster b,5,1.7\n${`${line}\n`.repeat(6)}Brook c,3,1.2\n`);
      expect(rows.map(({ name }) => name)).toEqual(["Aster b", "Brook c"]);
      expect(notes).toEqual([expect.stringMatching(/^6 lines .* taken for comments; see line 3, 4, 5, 6, 7, \.\.\.$/)]);
    },
  );
});

describe("quotes", () => {
  test("a quoted cell may hold delimiters, quotes and line ends, and lines are still counted right", async () => {
    const { records } = await readRaw('name,mass_earth\n"a, ""b""\r\nc",1\nd,2\n');
    expect(records).toEqual([
      { line: 2, cells: ['a, "b"\r\nc', "1"] },
      { line: 4, cells: ["d", "2"] },
    ]);
  });

  test("a stray quote costs nothing but itself", async () => {
    const text = 'name,note,mass_earth\nA,5" dish,1\nB,"quoted"tail,2\nC,"" "x,3\nD,,4\n';
    expect((await cellsOf(text)).map((cells) => cells.at(-1))).toEqual(["1", "2", "3", "4"]);
  });

  test("a quote that is never closed is an error with the line where it opens", async () => {
    await expect(cellsOf('name,mass_earth\nA,1\n"B,2\nC,3\n')).rejects.toMatchObject({
      code: "unclosed-quote",
      place: { file: "table", line: 3 },
    });
  });
});

describe("ragged rows", () => {
  const header = "name,mass_earth,mass_earth_err,radius_earth,radius_earth_err\n";

  test("a short row keeps the cells it has", async () => {
    const [row] = (await readList(`${header}A,5,1\n`)).rows;
    expect(row?.quantities.mass?.kind).toBe("measured");
    expect(row?.quantities.radius).toBeUndefined();
    expect(row?.issues).toMatchObject([{ code: "ragged-row", origin: { line: 2, column: "mass_earth_err" } }]);
  });

  test("the numbers of a long row may be shifted and are not used", async () => {
    const [row] = (await readList(`${header}A, the first,5,1,2,0.1\n`)).rows;
    expect(row).toMatchObject({ name: "A", quantities: {}, issues: [{ code: "ragged-row" }] });
  });

  test("empty extra cells are harmless", async () => {
    expect((await readList(`${header}A,5,1,2,0.1,,\n`)).rows[0]?.issues).toEqual([]);
  });
});

describe("blank-separated rows shifted by a blank in a name", () => {
  const header = "name period mass_earth mass_err radius_earth radius_err\n";

  test.each([
    ["as many cells as columns", "Aster b 6.3 5.0 0.2 1.70", "b"],
    ["fewer cells", "Aster-c 6.3 5.0 0.2 1.70", "1.70"],
    ["more cells", "Aster b 6.3 5.0 0.2 1.70 0.1", "1.70"],
  ])("%s: no number is used", async (_, row, found) => {
    const { rows } = await readList(
      `${header}Brook-b 6.3 4.7 0.2 1.61 0.03\n${row}\n${"Cedar-b 6 5 1 2 1\n".repeat(3)}`,
    );
    expect(rows[0]?.quantities.mass?.kind).toBe("measured");
    expect(rows[1]?.quantities).toEqual({});
    expect(rows[1]?.issues.find((issue) => issue.code === "ragged-row")).toMatchObject({ found });
  });
});

test.each(["\t", ";"])("a comma in the thousands is no decimal point (separated by %j)", async (mark) => {
  const text = "name,mass_earth,radius_earth\nAster b,1/234,11.2\nBrook c,318,11.2\n";
  const { rows } = await readList(text.replaceAll(",", mark).replace("/", ","));
  expect(rows[0]?.quantities.mass).toBeUndefined();
  expect(rows[0]?.issues).toMatchObject([{ code: "not-a-number", message: /1,234.*no mark between thousands/ }]);
});

test("points between the thousands of a list with decimal commas are explained", async () => {
  const { rows } = await readList("name;mass_earth;radius_earth\nAster b;1.234,5;11,2\n");
  expect(rows[0]?.quantities.radius?.written).toBe("11,2");
  expect(rows[0]?.issues).toMatchObject([{ code: "not-a-number", message: /no mark between thousands/ }]);
});

/** csv-spectrum 2.0.0, see test/fixtures/planets/README.md. */
describe("csv-spectrum", () => {
  const folder = new URL("../fixtures/planets/csv-spectrum/", import.meta.url);
  const names = readdirSync(folder).flatMap((file) => (file.endsWith(".csv") ? [file.replace(".csv", "")] : []));

  test("is here", () => expect(names).toHaveLength(12));

  test.each(names)("%s", async (name) => {
    const { columns, records } = await readRaw(fixture(`csv-spectrum/${name}.csv`));
    const objects = records.map(({ cells }) => Object.fromEntries(columns.map((column, i) => [column.name, cells[i]])));
    const expected: unknown = JSON.parse(readFileSync(new URL(`${name}.json`, folder), "utf8"));
    // Its JSON has another telephone number than its CSV, and a row that is not in a list.
    if (name === "location_coordinates")
      expect(objects).toEqual([{ ...(expected as object), "Contact Phone Number": "2095257564" }]);
    else expect(objects).toEqual(expected);
  });
});
