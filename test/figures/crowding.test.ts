import { describe, expect, it } from "vitest";
import { markPlanets, type PlacedPlanet, singlePlanetLimit } from "../../src/figures/crowding.ts";

const axes = {
  mass: { title: "m", unit: "", range: [0.1, 100] },
  radius: { title: "r", unit: "", range: [0.5, 5] },
} as const;

/** Planets along a line, the error of each growing with its number. */
const line = (count: number): PlacedPlanet[] =>
  Array.from({ length: count }, (_, planet) => {
    const [mass, radius] = [0.1 * 1000 ** (planet / count), 0.5 * 10 ** (planet / count)];
    const error = (0.5 * planet) / count;
    return {
      planet,
      verdict: 0,
      mass: { value: mass, minus: mass * error, plus: mass * error },
      radius: { value: radius, minus: 0, plus: 0 },
    };
  });

describe("markPlanets", () => {
  it("draws a few planets in full, however large their errors", () => {
    const { marks, density } = markPlanets(line(60), axes);
    expect(marks.every(({ fade }) => fade === 0)).toBe(true);
    expect(density).toBeNull();
  });

  it("draws the less precise of many fainter", () => {
    const { marks } = markPlanets(line(100), axes);
    expect([30, 31, 70, 71].map((i) => marks[i]?.fade)).toEqual([0, 1, 1, 2]);
  });

  it("puts a planet without errors among the least precise", () => {
    const [first, ...rest] = line(100) as [PlacedPlanet, ...PlacedPlanet[]];
    const bare = { ...first, mass: { ...first.mass, minus: null, plus: null } };
    expect(markPlanets([bare, ...rest], axes).marks[0]?.fade).toBe(2);
  });

  it("counts the least precise of very many in cells, and loses none", () => {
    const { marks, density } = markPlanets(line(singlePlanetLimit + 500), axes);
    expect(marks.map(({ planet }) => planet)).toEqual([...Array(singlePlanetLimit).keys()]);
    expect(density?.total).toBe(500);
    expect(density?.counts.flat().reduce((a, b) => a + b)).toBe(500);
    // The line's last seventh fills the cells at the upper right corner only.
    expect(density?.counts[0]?.[0]).toBe(0);
    expect(density?.counts.at(-1)?.at(-1)).toBeGreaterThan(0);
    expect([density?.massEdges[0], density?.massEdges.at(-1)]).toEqual([0.1, 100]);
  });
});
