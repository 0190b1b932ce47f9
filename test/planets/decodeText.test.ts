import { gzipSync } from "node:zlib";
import { describe, expect, test } from "vitest";
import { decodeText } from "../../src/planets/decodeText.ts";
import { inChunks, readRaw } from "./readText.ts";

const text = "name,mass_earth\nÉtoile ⊕ b,5\n";
const latin = "name,mass_earth\nÉtoile b,5\n";

async function decode(bytes: Uint8Array, chunkSize: number): Promise<string> {
  let decoded = "";
  for await (const piece of decodeText(inChunks(bytes, chunkSize), "list")) decoded += piece;
  return decoded;
}

function utf16(order: "le" | "be", mark: boolean): Uint8Array {
  const bytes = new Uint8Array(Buffer.from((mark ? "\ufeff" : "") + text, "utf16le"));
  if (order === "be") for (let i = 0; i < bytes.length; i += 2) bytes.subarray(i, i + 2).reverse();
  return bytes;
}

describe("every encoding gives the same text, however it is cut", () => {
  const utf8 = new TextEncoder().encode(text);
  test.each([
    ["UTF-8", utf8],
    ["UTF-8 with a byte-order mark", new TextEncoder().encode(`\ufeff${text}`)],
    ["UTF-16 little-endian", utf16("le", true)],
    ["UTF-16 big-endian", utf16("be", true)],
    ["UTF-16 without a mark", utf16("le", false)],
    ["UTF-16 big-endian without a mark", utf16("be", false)],
    ["gzip", new Uint8Array(gzipSync(utf8))],
    ["gzip of UTF-16", new Uint8Array(gzipSync(utf16("le", true)))],
  ])("%s", async (_, bytes) => {
    for (const size of [1, 3, 1000]) expect(await decode(bytes, size)).toBe(text);
  });

  test("Latin-1", async () => {
    for (const size of [1, 3, 1000])
      expect(await decode(new Uint8Array(Buffer.from(latin, "latin1")), size)).toBe(latin);
  });
});

describe("limits", () => {
  test("a damaged gzip file is an error", async () => {
    const zipped = new Uint8Array(gzipSync(text));
    await expect(decode(zipped.subarray(0, zipped.length - 9), 1000)).rejects.toMatchObject({ code: "gzip-damaged" });
  });

  test("a gzip bomb is stopped", async () => {
    const bomb = new Uint8Array(gzipSync(new Uint8Array(8e7)));
    const drain = async (): Promise<void> => {
      for await (const _ of decodeText(inChunks(bomb), "list"));
    };
    await expect(drain()).rejects.toMatchObject({ code: "gzip-too-large" });
  });

  test("a line without end is stopped", async () => {
    async function* endless(): AsyncGenerator<Uint8Array> {
      for (;;) yield new Uint8Array(2 ** 20).fill(0x61);
    }
    const pieces = decodeText(endless(), "list");
    const { splitLines } = await import("../../src/planets/splitLines.ts");
    await expect(splitLines(pieces, "list").next()).rejects.toMatchObject({
      code: "line-too-long",
      place: { line: 1 },
    });
  });

  test("endless blank lines are stopped", async () => {
    await expect(readRaw("\n".repeat(300_000))).rejects.toMatchObject({ code: "no-data" });
  });
});
