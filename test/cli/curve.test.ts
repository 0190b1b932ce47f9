import { existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { parse } from "csv-parse/sync";
import { afterAll, describe, expect, test } from "vitest";
import { expectClose } from "../support/expectClose.ts";
import { runCommand } from "./runCommand.ts";

const folder = mkdtempSync(join(tmpdir(), "bulkwright-curve-"));
afterAll(() => rmSync(folder, { recursive: true }));

const columns =
  "composition,mass_earth,radius_earth,radius_m,bulk_density_kg_m3,surface_gravity_m_s2,central_pressure_gpa,inertia_factor,radius_relative_error,extrapolated_layers,note";

const readRows = (csv: string) =>
  parse<Record<string, string>, Record<string, string>>(csv, { columns: true, comment: "#" });

describe("curve", () => {
  test("writes the agreed columns, one row a mass, in the order of names and masses", async () => {
    const { code, out, err } = await runCommand(["curve", "iron", "earth-like", "--masses", "2,0.5"]);
    expect({ code, err }).toEqual({ code: 0, err: "" });
    expect(out.split("\n")).toContain(columns);
    expect(readRows(out).map((row) => `${row.composition} ${Number(row.mass_earth)}`)).toEqual([
      "iron 2",
      "iron 0.5",
      "earth-like 2",
      "earth-like 0.5",
    ]);
  });

  test("the columns of a row agree with each other", async () => {
    const { out } = await runCommand(["curve", "earth-like", "--masses", "3"]);
    const [row] = readRows(out);
    const radius = Number(row.radius_m);
    const rounding = { rel: 1e-11, because: "12 digits are printed" };
    expectClose(Number(row.radius_earth), radius / 6.3781e6, rounding);
    // IAU 2015 B3 nominal GM of the Earth; density 3M / (4πR³) with G of CODATA 2022.
    const massParameter = 3 * 3.986004e14;
    expectClose(Number(row.surface_gravity_m_s2), massParameter / radius ** 2, rounding);
    const density = massParameter / 6.6743e-11 / ((4 / 3) * Math.PI * radius ** 3);
    expectClose(Number(row.bulk_density_kg_m3), density, rounding);
  });

  test("a planet of constant density has the closed forms of a uniform sphere", async () => {
    mkdirSync(join(folder, "own", "materials"), { recursive: true });
    writeFileSync(
      join(folder, "own", "materials", "slag.json"),
      `{ "material": "slag", "title": "Slag", "phases": [ { "phase": "one", "calibratedToGPa": 10,
         "eos": { "form": "constant", "densityKgM3": 4000 }, "source": { "citation": "made up for a test" } } ] }`,
    );
    const { out } = await runCommand(["curve", "slag", "--masses", "2", "--library", join(folder, "own")]);
    const [row] = readRows(out);
    const mass = (2 * 3.986004e14) / 6.6743e-11;
    const radius = ((3 * mass) / (4 * Math.PI * 4000)) ** (1 / 3);
    const solved = { rel: 1e-8, because: "accuracy promised of the solver" };
    expectClose(Number(row.radius_m), radius, solved);
    // P_c = 3 G M² / (8π R⁴)
    expectClose(
      Number(row.central_pressure_gpa),
      (3 * 6.6743e-11 * mass ** 2) / (8 * Math.PI * radius ** 4) / 1e9,
      solved,
    );
    expectClose(Number(row.inertia_factor), 0.4, solved);
    expect(row.extrapolated_layers).toBe("slag");
  });

  test("60 masses from 0.1 to 20 unless told otherwise", async () => {
    const rows = readRows((await runCommand(["curve", "water"])).out);
    expect(rows).toHaveLength(60);
    expect([rows[0].mass_earth, rows[59].mass_earth].map(Number)).toEqual([0.1, 20]);
  });

  test("the head says what is needed to judge and repeat the result", async () => {
    const { out } = await runCommand(["--earth-radius-km", "mean", "curve", "earth-like", "--masses", "1"]);
    const head = out.split("\n").filter((line) => line.startsWith("# "));
    expect(head).toContain("# command: bulkwright --earth-radius-km mean curve earth-like --masses 1");
    expect(head.join("\n")).toMatch(/# unit: Earth radius 6371 km/);
    expect(head.join("\n")).toMatch(/# source: .*\(CODATA|# constant: G = 6\.6743e-11 /);
    expect(head.filter((line) => line.startsWith("# source: ")).length).toBeGreaterThan(1);
  });

  test("the Earth radius is a unit: the planet stays the same", async () => {
    const [nominal] = readRows((await runCommand(["curve", "earth-like", "--masses", "1"])).out);
    const [mean] = readRows(
      (await runCommand(["curve", "earth-like", "--masses", "1", "--earth-radius-km", "mean"])).out,
    );
    expect(mean.radius_m).toBe(nominal.radius_m);
    expectClose(Number(mean.radius_earth) / Number(nominal.radius_earth), 6378.1 / 6371, {
      rel: 1e-11,
      because: "12 digits are printed",
    });
  });

  test("a surface pressure makes the planet smaller", async () => {
    const radius = async (...more: string[]) =>
      Number(readRows((await runCommand(["curve", "water", "--masses", "1", ...more])).out)[0].radius_m);
    expect(await radius("--surface-pressure-pa", "1e9")).toBeLessThan(await radius());
  });

  test("a mass that cannot be solved is a row with its reason beside the others", async () => {
    const { code, out } = await runCommand(["curve", "earth-like", "--masses", "1,1e6"]);
    expect(code).toBe(0);
    const [solved, unsolved] = readRows(out);
    expect(solved.note).toBe("");
    expect(unsolved).toMatchObject({
      radius_earth: "",
      radius_m: "",
      note: expect.stringContaining("1000 Earth masses"),
    });
  });

  test("a run without a single solved planet ends with 1, its table written", async () => {
    const { code, out, err } = await runCommand(["curve", "earth-like", "--masses", "1e6"]);
    expect(code).toBe(1);
    expect(readRows(out)).toHaveLength(1);
    expect(err).toContain("None of the planets could be solved");
  });

  test("JSON holds the same rows", async () => {
    const csv = readRows((await runCommand(["curve", "earth-like", "--masses", "1,1e6"])).out);
    const { out } = await runCommand(["curve", "earth-like", "--masses", "1,1e6", "--format", "json"]);
    const { provenance, rows } = JSON.parse(out);
    expect(provenance.command).toBe("bulkwright curve earth-like --masses 1,1e6 --format json");
    expect(Object.keys(rows[0])).toEqual(columns.split(","));
    expect(rows[0].radius_m).toBe(Number(csv[0].radius_m));
    expect(rows[1].radius_m).toBeNull();
  });

  test("--observables, --period-days and --spread append columns and change none", async () => {
    const args = ["curve", "earth-like", "--masses", "1,1e6"];
    const plain = readRows((await runCommand(args)).out);
    const more = [
      ...["fluid_love_number", "core_radius_fraction", "escape_speed_m_s", "binding_energy_j"],
      ...["radius_earth_distorted_transit", "radius_earth_substellar"],
      ...["radius_earth_spread_low", "radius_earth_spread_high", "spread_low_materials", "spread_high_materials"],
    ];
    const { out } = await runCommand([...args, "--observables", "--period-days", "0.5", "--spread"]);
    expect(out.split("\n")).toContain([columns, ...more].join(","));
    const [row, unsolved] = readRows(out);
    expect(row).toMatchObject(plain[0]);
    expect(more.map((column) => unsolved[column]).join("")).toBe("");
    // A planet that yields to the tide: flattened as seen by the star's light, drawn out towards the star.
    const radius = Number(row.radius_earth);
    expect(Number(row.radius_earth_distorted_transit)).toBeLessThan(radius);
    expect(Number(row.radius_earth_substellar)).toBeGreaterThan(radius);
    // (7/6) / (7/12) = 2 to first order.
    const stretch = Number(row.radius_earth_substellar) / radius - 1;
    expectClose(stretch / (1 - Number(row.radius_earth_distorted_transit) / radius), 2, {
      rel: 0.01,
      because: "second order in a distortion of 0.05",
    });
  });

  test("a period at which the planet is torn apart leaves its columns empty and says why", async () => {
    const { code, out } = await runCommand(["curve", "earth-like", "--masses", "1", "--period-days", "0.2"]);
    expect(code).toBe(0);
    const [row] = readRows(out);
    expect(row.radius_earth_distorted_transit).toBe("");
    expect(row.note).toContain("h2 q");
  });

  test("the spread holds the curves of the alternative irons, and names the sets at its ends", async () => {
    const { out } = await runCommand(["curve", "earth-like", "--masses", "1,8", "--spread"]);
    const irons = ["iron-birch-2016", "iron-vinet-2007", "iron-vinet-2018"].map((iron) => `earth-like-${iron}`);
    const others = readRows((await runCommand(["curve", ...irons, "--masses", "1,8"])).out);
    for (const row of readRows(out)) {
      const [low, high] = [Number(row.radius_earth_spread_low), Number(row.radius_earth_spread_high)];
      const same = others.filter(({ mass_earth }) => mass_earth === row.mass_earth);
      for (const { radius_earth } of [row, ...same]) {
        expect(Number(radius_earth)).toBeGreaterThanOrEqual(low);
        expect(Number(radius_earth)).toBeLessThanOrEqual(high);
      }
      expect(row.spread_low_materials).toMatch(/^iron-[\w-]+;magnesium-silicate/);
    }
    expect(out).toContain("# note: spread of earth-like over 8 sets: iron-birch-2025 with magnesium-silicate; ");
    expect(out).toMatch(/# source: iron-vinet-2007, /);
  });

  test("there is no spread where the materials list no alternatives", async () => {
    const { out } = await runCommand(["curve", "iron-polytrope", "--masses", "1", "--spread"]);
    expect(readRows(out)[0].radius_earth_spread_low).toBe("");
    expect(out).toContain("# note: iron-polytrope: its materials list no alternatives");
  });

  test("a gas envelope appends its columns; outside the published grid are rows with the reason", async () => {
    const { code, out } = await runCommand(["curve", "earth-like-gas-2", "earth-like", "--masses", "0.5,5"]);
    expect(code).toBe(0);
    const gas = "envelope_mass_fraction,flux_earth,age_gyr,core_radius_earth,radius_earth_convective";
    expect(out.split("\n")).toContain(`${columns},${gas},escape_parameter,mass_loss_time_gyr`);
    const [tooLight, gaseous, , rocky] = readRows(out);
    expect(tooLight.note).toContain("Lopez & Fortney 2014 cover 1 to 20");
    expect(tooLight.radius_earth).toBe("");
    expect(Number(gaseous.radius_earth)).toBeGreaterThan(Number(gaseous.radius_earth_convective));
    // Lopez & Fortney 2014, equation 4, at solar opacity, where the factor of the age is 1.
    const thickness = 2.06 * 5 ** -0.21 * 0.4 ** 0.59 * 10 ** 0.044;
    expectClose(Number(gaseous.radius_earth_convective) - Number(gaseous.core_radius_earth), thickness, {
      rel: 1e-10,
      because: "12 digits are printed",
    });
    expect(gaseous.inertia_factor).toBe("");
    expect(rocky.envelope_mass_fraction).toBe("");
    expect(out).toContain("# note: the radius of earth-like-gas-2 (radius_earth) is that of a transit");
    expect(out).toMatch(/# source: earth-like-gas-2, gas envelope: Lopez & Fortney 2014/);
  });

  test("flux, age and transit pressure are the run's where given", async () => {
    const args = ["curve", "earth-like-gas-2", "--masses", "10"];
    const [own] = readRows((await runCommand([...args, "--transit-pressure-pa", "2000"])).out);
    expect(own.radius_earth_at_transit_pressure).toBe(own.radius_earth);
    const more = ["--flux-earth", "100", "--age-gyr", "1", "--transit-pressure-pa", "100"];
    const [given] = readRows((await runCommand([...args, ...more])).out);
    expect([given.flux_earth, given.age_gyr].map(Number)).toEqual([100, 1]);
    expect(Number(given.radius_earth)).toBeGreaterThan(Number(own.radius_earth));
    expect(Number(given.radius_earth_at_transit_pressure)).toBeGreaterThan(Number(given.radius_earth));
  });

  test("options for gas are refused where there is none", async () => {
    const { code, out, err } = await runCommand(["curve", "earth-like", "--masses", "1", "--flux-earth", "100"]);
    expect({ code, out }).toEqual({ code: 2, out: "" });
    expect(err).toContain("end in a gas envelope");
  });

  test("the same command gives the same bytes", async () => {
    const args = ["curve", "earth-like", "--masses", "0.5:5:7"];
    expect(await runCommand(args)).toEqual(await runCommand(args));
  });

  test("--out and --html write files and leave standard output alone", async () => {
    const [csv, html] = [join(folder, "c.csv"), join(folder, "c.html")];
    const { code, out } = await runCommand(["curve", "earth-like", "--masses", "1,2", "--out", csv, "--html", html]);
    expect({ code, out }).toEqual({ code: 0, out: "" });
    expect(readRows(readFileSync(csv, "utf8"))).toHaveLength(2);
    expect(readFileSync(html, "utf8")).toContain("Earth-like");
  });

  test("an unknown composition ends with 1 and the nearest name, and writes nothing", async () => {
    const csv = join(folder, "none.csv");
    const { code, out, err } = await runCommand(["curve", "earth-lik", "--out", csv]);
    expect({ code, out }).toEqual({ code: 1, out: "" });
    expect(err).toContain("earth-like");
    expect(existsSync(csv)).toBe(false);
  });
});
