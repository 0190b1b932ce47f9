import { describe, expect, test } from "vitest";
import { EARTH_MASS, EARTH_RADIUS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { readList } from "./readText.ts";

const rowOf = async (header: string, cells: string) => (await readList(`name,${header}\nAster b,${cells}\n`)).rows[0];

describe("radius from the radius ratio and the star", () => {
  const header = "radius_ratio,radius_ratio_err,star_radius_sun,star_radius_sun_err";

  test("the Earth before the Sun", async () => {
    // 6378.1 km / 695700 km, the nominal radii of IAU 2015 B3.
    const radius = (await rowOf(header, `${6378.1 / 695700},1e-5,1,0.01`))?.quantities.radius;
    expectClose(radius?.value ?? 0, EARTH_RADIUS, { rel: 1e-14, because: "a product" });
    expect(radius).toMatchObject({ kind: "measured", derivedFrom: "radius ratio and stellar radius" });
    const relative = Math.hypot(1e-5 / (6378.1 / 695700), 0.01);
    expectClose(radius?.plus ?? 0, relative * EARTH_RADIUS, { rel: 1e-12, because: "errors in quadrature" });
  });

  test.each([
    ["<0.02,,1,0.01", "upper-limit"],
    ["0.02,0.001,1,", "no-uncertainty"],
    ["<0.02,,>1,", "no-uncertainty"],
  ])("%s is %s", async (cells, kind) => {
    expect((await rowOf(header, cells))?.quantities.radius?.kind).toBe(kind);
  });

  test("a list that has a radius column keeps to it", async () => {
    expect((await rowOf(`radius_earth,${header}`, ",0.01,0.001,1,0.1"))?.quantities.radius).toBeUndefined();
  });
});

describe("mass from the velocity amplitude", () => {
  const header = "k,k_err,period_days,period_days_err,star_mass_sun,star_mass_sun_err,eccentricity,eccentricity_err";
  const jupiter = "12.5,0.1,4332.59,0.01,1,0.01,0.0489,0.001";

  test("Jupiter moves the Sun by 12.5 m/s", async () => {
    // 12.5 m/s: Wright & Gaudi 2013, Exoplanet Detection Methods, sect. 2.1 (from memory); 317.83 Earth masses.
    const row = await rowOf(`${header},inclination_deg,inclination_deg_err`, `${jupiter},90,0.1`);
    expectClose((row?.quantities.mass?.value ?? 0) / EARTH_MASS, 317.83, {
      rel: 4e-3,
      because: "12.5 has three digits",
    });
    expect(row?.quantities.mass?.kind).toBe("measured");
  });

  test("the Earth moves the Sun by 0.0895 m/s", async () => {
    // Lovis & Fischer 2010, table 1 lists 0.09 m/s; 0.0895 from memory of the same formula's usual evaluation.
    const row = await rowOf(header, "0.0895,0.001,365.256,0.001,1,0.01,0.0167,0.001");
    expectClose((row?.quantities.minimumMass?.value ?? 0) / EARTH_MASS, 1, { rel: 1e-3, because: "three digits" });
  });

  test("the relation holds backwards, with the planet's own mass", async () => {
    const mass = (await rowOf(header, jupiter))?.quantities.minimumMass?.value ?? 0;
    const [G, sun, period] = [6.6743e-11, 1.3271244e20 / 6.6743e-11, 4332.59 * 86400];
    const amplitude =
      (Math.cbrt((2 * Math.PI * G) / period) * mass) / Math.cbrt((sun + mass) ** 2) / Math.sqrt(1 - 0.0489 ** 2);
    expectClose(amplitude, 12.5, { rel: 1e-12, because: "converged to rounding" });
  });

  test("without an inclination it is a minimum mass", async () => {
    const row = await rowOf(header, jupiter);
    expect(row?.quantities.minimumMass?.kind).toBe("measured");
    expect(row?.quantities.mass?.kind).toBe("minimum");
  });

  test("an inclination without an error is trusted near edge-on only", async () => {
    const kindAt = async (inclination: number) =>
      (await rowOf(`${header},inclination_deg`, `${jupiter},${inclination}`))?.quantities.mass?.kind;
    expect(await kindAt(89.5)).toBe("measured");
    expect(await kindAt(60)).toBe("no-uncertainty");
  });

  test("the error of the inclination counts by its cotangent", async () => {
    const row = await rowOf(`${header},inclination_deg,inclination_deg_err`, `${jupiter},45,1`);
    const { mass, minimumMass } = row?.quantities ?? {};
    if (mass?.plus === undefined || minimumMass?.plus === undefined) throw new Error("no mass");
    const relative = Math.hypot(minimumMass.plus / minimumMass.value, Math.PI / 180);
    expectClose(mass.plus / mass.value, relative, { rel: 1e-12, because: "cot 45° = 1" });
  });
});

test("stellar density from the transit: the Sun's, from the Earth's orbit", async () => {
  // a/R = 1 au / 695700 km, P = 365.25636 d; 1410 kg/m³ is the Sun's mean density, 3 M / 4π R³ of the nominal values.
  const row = await rowOf("mass_earth,scaled_axis,period_days", `1,${149597870.7 / 695700},365.25636`);
  const mean = (3 * (1.3271244e20 / 6.6743e-11)) / (4 * Math.PI * 6.957e8 ** 3);
  expectClose(row?.quantities.starDensity?.value ?? 0, mean, {
    rel: 1e-4,
    because: "the Earth's mean axis is 1.000001 au",
  });
});
