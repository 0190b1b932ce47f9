import {
  linkSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  symlinkSync,
  writeFileSync,
} from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, expect, test } from "vitest";
import { checkDestinations, writeOutputFile } from "../../src/cli/outputFile.ts";

let folder: string;
let input: string;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "bulkwright-"));
  input = join(folder, "list.csv");
  writeFileSync(input, "name\n");
});

afterEach(() => rmSync(folder, { recursive: true }));

test.each([
  ["the same path", () => input],
  ["a longer path", () => join(folder, ".", "x", "..", "list.csv")],
  ["a symbolic link", () => link(symlinkSync)],
  ["a hard link", () => link(linkSync)],
])("an input is never overwritten by %s", async (_, destination) => {
  await expect(checkDestinations([destination()], [input])).rejects.toMatchObject({ code: "would-overwrite-input" });
});

test("two outputs need two files", async () => {
  const path = join(folder, "out.csv");
  await expect(checkDestinations([path, path], [])).rejects.toMatchObject({ code: "would-overwrite-input" });
});

test.each([
  ["a folder", () => folder],
  ["a file in a folder that does not exist", () => join(folder, "no", "out.csv")],
  ["a file below a file", () => join(input, "out.csv")],
])("%s cannot be written", async (_, destination) => {
  await expect(checkDestinations([destination()], [])).rejects.toMatchObject({ code: "unwritable" });
  await expect(writeOutputFile(destination(), "x")).rejects.toMatchObject({ code: "unwritable" });
});

test("a file is written whole and nothing else is left", async () => {
  const path = join(folder, "out.csv");
  await checkDestinations([path], [input]);
  await writeOutputFile(path, "text\n");
  expect(readFileSync(path, "utf8")).toBe("text\n");
  expect(readdirSync(folder).sort()).toEqual(["list.csv", "out.csv"]);
});

test("a device stays a device", async () => {
  await writeOutputFile("/dev/null", "text");
  expect(statSync("/dev/null").isCharacterDevice()).toBe(true);
});

function link(make: (target: string, path: string) => void): string {
  const path = join(folder, "other.csv");
  make(input, path);
  return path;
}
