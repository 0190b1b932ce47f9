import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { parseJson } from "../../src/library/parseJson.ts";

describe("JSON", () => {
  test("is read like JSON.parse reads it, with or without a byte order mark", () => {
    fc.assert(
      fc.property(fc.json(), (text) => {
        expect(parseJson("x.json", text)).toEqual(JSON.parse(text));
        expect(parseJson("x.json", `\uFEFF${text}`)).toEqual(JSON.parse(text));
      }),
      { seed: 7 },
    );
  });

  test.each<[string, number, number, string]>([
    ["", 1, 1, "a value"],
    ["  \n ", 2, 2, "a value"],
    ['{"a": [1,\n 2,]}', 2, 4, "a value"],
    ['{"a": 1,\n}', 2, 1, "a key in quotes"],
    ['{"a": 01}', 1, 8, '"," or "}"'],
    ['{"a": 1', 1, 8, '"," or "}"'],
    ['{"a" 1}', 1, 6, '":"'],
    ['{"a": }', 1, 7, "a value"],
    ["{a: 1}", 1, 2, 'a key in quotes or "}"'],
    ["{'a': 1}", 1, 2, 'a key in quotes or "}"'],
    ["[1 2]", 1, 4, '"," or "]"'],
    ["[1}", 1, 3, '"," or "]"'],
    ["[", 1, 2, 'a value or "]"'],
    ['{"a": tru}', 1, 7, "a value"],
    ['{"a": "x\ny"}', 1, 7, "a value"],
    ['{"a": "\\x"}', 1, 7, "a value"],
    ['{"a": 1}}', 1, 9, "the end"],
    ["1 // comment", 1, 3, "the end"],
    ["[+1]", 1, 2, 'a value or "]"'],
    ["[NaN]", 1, 2, 'a value or "]"'],
  ])("%j fails at line %i, column %i, where %s belongs", (text, line, column, wanted) => {
    expect(() => parseJson("f.json", text)).toThrowError(
      expect.objectContaining({
        code: "json-syntax",
        place: { file: "f.json", line, column },
        message: expect.stringContaining(`f.json:${line}:${column}: this is not JSON`),
      }),
    );
    expect(() => parseJson("f.json", text)).toThrowError(`but ${wanted} belongs here`);
  });

  test("whatever is cut out of it or put into it, a place is found", () => {
    const broken = fc
      .tuple(fc.json(), fc.nat(), fc.constantFrom("", ",", ":", "{", "}", "[", "]", '"', "1", "x", "\\", "\n"))
      .map(([text, at, put]) => text.slice(0, at % (text.length + 1)) + put + text.slice((at % (text.length + 1)) + 1));
    fc.assert(
      fc.property(broken, (text) => {
        if (parses(text)) return;
        expect(() => parseJson("f.json", text)).toThrowError(expect.objectContaining({ code: "json-syntax" }));
      }),
      { seed: 7, numRuns: 1000 },
    );
  });
});

function parses(text: string): boolean {
  try {
    JSON.parse(text);
    return true;
  } catch {
    return false;
  }
}
