import { parse } from "csv-parse/sync";
import fc from "fast-check";
import { expect, test } from "vitest";
import { csvRecord } from "../../src/cli/csv.ts";
import { formatTable } from "../../src/cli/table.ts";

const provenance = {
  bulkwright: "0.0.0",
  command: "bulkwright curve x",
  unit: [],
  constant: [],
  source: ['a "quoted" source, with\nline break'],
  note: [],
};

test("computed numbers have 12 significant digits, whole ones those they need", () => {
  expect(csvRecord([12n])).toBe("12\n");
  expect(csvRecord([1, Math.PI * 1e6, 1.5e-10, undefined])).toBe("1.00000000000,3141592.65359,1.50000000000e-10,\n");
});

test("fields are quoted as RFC 4180 asks, and where they hold #", () => {
  expect(csvRecord(["a,b", 'say "x"', "two\nlines", "K #2", "plain"])).toBe(
    '"a,b","say ""x""","two\nlines","K #2",plain\n',
  );
});

test("a name that looks like a formula stays verbatim", () => {
  expect(csvRecord(["=1+1", "@x", "+1"])).toBe("=1+1,@x,+1\n");
});

test("any text survives the way through a reader that skips # comments", () => {
  fc.assert(
    fc.property(fc.array(fc.tuple(fc.string({ unit: "grapheme" }), fc.string()), { minLength: 1 }), (rows) => {
      const text = formatTable({ columns: ["one", "two"], rows }, provenance, "csv");
      const read = parse(text, { comment: "#", skip_empty_lines: false });
      expect(read).toEqual([["one", "two"], ...rows]);
    }),
    { seed: 3 },
  );
});

test("provenance stays in its comment lines whatever its text", () => {
  const text = formatTable({ columns: ["one"], rows: [] }, provenance, "csv");
  expect(text).toBe(
    '# bulkwright: 0.0.0\n# command: bulkwright curve x\n# source: a "quoted" source, with\\u000aline break\none\n',
  );
});

test("JSON has null for what is missing and numbers of 12 digits", () => {
  const text = formatTable({ columns: ["name", "x", "y"], rows: [["a", 1 / 3, undefined]] }, provenance, "json");
  expect(JSON.parse(text)).toEqual({ provenance, rows: [{ name: "a", x: 0.333333333333, y: null }] });
});
