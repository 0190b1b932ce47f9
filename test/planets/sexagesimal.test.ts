import { describe, expect, test } from "vitest";
import { readSexagesimal } from "../../src/planets/sexagesimal.ts";
import { readList } from "./readText.ts";

describe("positions in sixtieths", () => {
  // By hand: 18 h 30 min is 277.5 degrees; 49° 18' 18" is 49.305 degrees.
  test.each([
    ["18h30m00s", true, 277.5],
    ["18:30:00.0", true, 277.5],
    ["18 30 00", true, 277.5],
    ["+49d18m18s", false, 49.305],
    ["-49:18:18", false, -49.305],
    ["-00 30 00", false, -0.5],
    ["49°18'18\"", false, 49.305],
  ])("%s", (text, isHours, degrees) => {
    expect(readSexagesimal(text, isHours)).toBeCloseTo(degrees, 12);
  });

  test.each(["", "277.5", "18h30", "a:b:c", "18:30:00:00"])("%j is none", (text) => {
    expect(readSexagesimal(text, true)).toBeUndefined();
  });

  test("columns may hold either, and what is neither is no issue", async () => {
    const { rows } = await readList("name,mass_earth,ra,dec\nA,1,18h30m00s,-0.5\nB,1,unknown,x\n");
    expect(rows[0]?.quantities.rightAscension?.value).toBeCloseTo((277.5 * Math.PI) / 180, 12);
    expect(rows[0]?.quantities.declination?.value).toBeCloseTo((-0.5 * Math.PI) / 180, 12);
    expect(rows[1]?.issues).toEqual([]);
  });
});
