import { parse } from "csv-parse/sync";
import { describe, expect, test } from "vitest";
import { expectClose } from "../support/expectClose.ts";
import { runCommand } from "./runCommand.ts";

const columns = "radius_km,enclosed_mass_earth,pressure_gpa,density_kg_m3,gravity_m_s2,layer,phase,temperature_k";

const readRows = (csv: string) =>
  parse<Record<string, string>, Record<string, string>>(csv, { columns: true, comment: "#" });

describe("profile of a composition", () => {
  test("goes from the centre to the surface, with both sides of every boundary", async () => {
    const { code, out, err } = await runCommand(["profile", "earth-like", "--mass", "1", "--points", "20"]);
    expect({ code, err }).toEqual({ code: 0, err: "" });
    expect(out.split("\n")).toContain(columns);
    const rows = readRows(out);
    expect(Number(rows[0].radius_km)).toBe(0);
    expect(Number(rows[rows.length - 1].enclosed_mass_earth)).toBe(1);
    const core = rows.findLastIndex(({ enclosed_mass_earth }) => Number(enclosed_mass_earth) === 0.325);
    const [below, above] = [rows[core - 1], rows[core]];
    expect(below.radius_km).toBe(above.radius_km);
    expect(below.layer).not.toBe(above.layer);
  });

  test("agrees with the curve at the surface and names extrapolated layers", async () => {
    const { out } = await runCommand(["profile", "water", "--mass", "10"]);
    const [point] = readRows((await runCommand(["curve", "water", "--masses", "10"])).out);
    const rows = readRows(out);
    expectClose(Number(rows[rows.length - 1].radius_km) * 1e3, Number(point.radius_m), {
      rel: 2e-9,
      because: "both are solved to about 1e-9",
    });
    expect(out).toContain(`# note: ${point.extrapolated_layers} is used beyond the data behind it`);
  });

  test("a mass the solver is not made for ends with 1 and its range", async () => {
    const { code, out, err } = await runCommand(["profile", "iron", "--mass", "1e5"]);
    expect({ code, out }).toEqual({ code: 1, out: "" });
    expect(err).toContain("0.001 to 1000 Earth masses");
  });
});

describe("temperature in a profile", () => {
  test("stands in the last column, with its mode in a note", async () => {
    const { out } = await runCommand(["profile", "earth", "--mass", "1", "--points", "5"]);
    expect(out).toContain(
      "# note: temperature of earth: adiabatic from 1600 K at the surface; core-earth begins at 4505 K",
    );
    const rows = readRows(out);
    expect(Number(rows[rows.length - 1].temperature_k)).toBe(1600);
    const coreTop = rows.findLast(({ layer }) => layer === "core-earth");
    expectClose(Number(coreTop?.temperature_k), 4505, { rel: 1e-6, because: "pressure there found by iteration" });
    const { rows: sameRows } = JSON.parse(
      (await runCommand(["profile", "earth", "--mass", "1", "--points", "5", "--format", "json"])).out,
    );
    expect(sameRows.map((row: Record<string, number>) => row.temperature_k)).toEqual(
      rows.map(({ temperature_k }) => Number(temperature_k)),
    );
  });

  test("is empty in a cold planet, and none in JSON", async () => {
    const args = ["profile", "earth-like", "--mass", "1", "--points", "3"];
    const { out } = await runCommand(args);
    expect(out).toContain("# note: earth-like is cold");
    expect(new Set(readRows(out).map(({ temperature_k }) => temperature_k))).toEqual(new Set([""]));
    const { rows } = JSON.parse((await runCommand([...args, "--format", "json"])).out);
    expect(rows[0].temperature_k).toBeNull();
  });
});

describe("profile of a planet with a gas envelope", () => {
  test("ends where the gas begins, and its notes tell of the whole", async () => {
    const { code, out } = await runCommand(["profile", "earth-like-gas-2", "--mass", "5", "--age-gyr", "1"]);
    expect(code).toBe(0);
    const rows = readRows(out);
    expectClose(Number(rows[rows.length - 1].enclosed_mass_earth), 0.98 * 5, { rel: 1e-11, because: "12 digits" });
    expect(out).toContain("# note: mass 5.00000000000 Earth masses, radius 3.");
    expect(out).toMatch(/# note: the gas begins at 1\.52\d+ Earth radii/);
    expect(out).not.toContain("I / (M R²)");
  });
});

describe("profile of a density table", () => {
  test("a uniform sphere has the central pressure of the closed form", async () => {
    const stdin = "radius_km,density_kg_m3\n0,5000\n3000,5000\n6000,5000\n";
    const { code, out } = await runCommand(["profile", "--density-table", "-"], { stdin });
    expect(code).toBe(0);
    // P_c = (2π/3) G ρ² R², G of CODATA 2022.
    const expected = ((2 * Math.PI) / 3) * 6.6743e-11 * 5000 ** 2 * 6e6 ** 2;
    expectClose(Number(readRows(out)[0].pressure_gpa), expected / 1e9, {
      rel: 1e-11,
      because: "12 digits are printed",
    });
    expect(out).toContain("I / (M R²) 0.400000000000");
  });

  test.each([
    ["a density of zero", "0,5000\n3000,0\n", "row 2"],
    ["radii that fall", "0,5000\n3000,5000\n2000,4000\n", "row 3"],
    ["one row", "0,5000\n", "two rows"],
  ])("%s ends with 1 and the row", async (_, rows, message) => {
    const { code, err } = await runCommand(["profile", "--density-table", "-"], {
      stdin: `radius_km,density_kg_m3\n${rows}`,
    });
    expect(code).toBe(1);
    expect(err).toContain(message);
  });
});
