import { describe, expect, test } from "vitest";
import { type ByteCache, solvedFamily } from "../../src/curve/cachedFamily.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { EARTH_MASS } from "../../src/units/constants.ts";
import { composition, constantPhase, json, layer, material } from "../library/files.ts";

const range = { lightest: EARTH_MASS, heaviest: 4 * EARTH_MASS };
const lattice = { angleSteps: 6 };

/** An invented library; `density` and `share` are what a test changes. */
function familyWith({ density = 3000, share = 0.5, title = "Layers" } = {}) {
  const library = loadLibrary([
    material("heavy", [constantPhase("solid", 8000)]),
    material("light", [constantPhase("solid", density)]),
    composition("mixed", [layer("heavy", share), layer("light", 1 - share)]),
    json("mine/families/pair.json", {
      family: "pair",
      title,
      components: [
        { name: "inner", composition: "mixed" },
        { name: "outer", material: "light" },
      ],
    }),
  ]);
  return library.family("pair");
}

/** A cache in memory that counts. */
function memoryCache() {
  const entries = new Map<string, Uint8Array>();
  const counts = { hits: 0, misses: 0 };
  const cache: ByteCache = {
    read: async (key) => {
      const bytes = entries.get(key);
      counts[bytes ? "hits" : "misses"] += 1;
      return bytes;
    },
    write: async (key, bytes) => void entries.set(key, bytes),
  };
  return { cache, entries, counts };
}

describe("a cached family", () => {
  test("is the same to the last bit when it is read again", async () => {
    const { cache, counts } = memoryCache();
    const first = await solvedFamily(familyWith(), range, { cache, ...lattice });
    const second = await solvedFamily(familyWith(), range, { cache, ...lattice });
    expect(counts).toEqual({ hits: 1, misses: 1 });
    expect(second).toEqual(first);
    expect(await solvedFamily(familyWith(), range, lattice)).toEqual(first);
  });

  test.each([
    ["a material", familyWith({ density: 3000.0000001 }), range, lattice],
    ["a recipe", familyWith({ share: 0.5000001 }), range, lattice],
    ["the range", familyWith(), { ...range, heaviest: 5 * EARTH_MASS }, lattice],
    ["the lattice", familyWith(), range, { angleSteps: 8 }],
  ])("is solved anew for another %s", async (_, family, masses, options) => {
    const { cache, counts, entries } = memoryCache();
    await solvedFamily(familyWith(), range, { cache, ...lattice });
    await solvedFamily(family, masses, { cache, ...options });
    expect(counts.hits).toBe(0);
    expect(entries.size).toBe(2);
  });

  test("does not care for titles", async () => {
    const { cache, counts } = memoryCache();
    await solvedFamily(familyWith(), range, { cache, ...lattice });
    await solvedFamily(familyWith({ title: "Other words" }), range, { cache, ...lattice });
    expect(counts.hits).toBe(1);
  });

  test.each([
    ["cut short", (bytes: Uint8Array) => bytes.subarray(0, bytes.length - 9)],
    ["empty", () => new Uint8Array(0)],
    [
      "with a flipped bit in the radii",
      (bytes: Uint8Array) => bytes.map((b, i) => (i === bytes.length - 3 ? b ^ 1 : b)),
    ],
    ["with a flipped bit in the heading", (bytes: Uint8Array) => bytes.map((b, i) => (i === 40 ? b ^ 4 : b))],
    [
      "of something else",
      () => new TextEncoder().encode("not what was written here, but quite long enough to hold it"),
    ],
  ])("%s is noted, solved again and mended", async (_, spoil) => {
    const { cache, entries } = memoryCache();
    const sound = await solvedFamily(familyWith(), range, { cache, ...lattice });
    const [[key, bytes]] = entries;
    entries.set(key, spoil(bytes));
    const notes: string[] = [];
    const options = { cache, note: (text: string) => void notes.push(text), ...lattice };
    expect(await solvedFamily(familyWith(), range, options)).toEqual(sound);
    expect(notes).toEqual([expect.stringContaining("damaged")]);
    expect(entries.get(key)).toEqual(bytes);
  });
});
