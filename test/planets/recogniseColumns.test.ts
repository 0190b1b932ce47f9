import { describe, expect, test } from "vitest";
import type { QuantityName } from "../../src/planets/quantity.ts";
import { explainPlanetList } from "../../src/planets/readPlanetList.ts";
import { EARTH_MASS, EARTH_RADIUS, JUPITER_MASS, JUPITER_RADIUS, SUN_MASS } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import { inChunks, readList } from "./readText.ts";

const oneFactor = { rel: 1e-14, because: "one factor, a few roundings" };

async function quantityOf(header: string, cell: string, name: QuantityName): Promise<number> {
  const list = await readList(`name,mass_kg,${header}\nAster b,1e25,${cell}\n`);
  return list.rows[0]?.quantities[name]?.value ?? Number.NaN;
}

describe("names and the units in them", () => {
  test.each<[string, QuantityName, number]>([
    ["radius_earth", "radius", EARTH_RADIUS],
    ["radius_jupiter", "radius", JUPITER_RADIUS],
    ["Radius [R_jup]", "radius", JUPITER_RADIUS],
    ["R_p (R_⊕)", "radius", EARTH_RADIUS],
    ['"Radius, R_Earth"', "radius", EARTH_RADIUS],
    ["planetRadiusEarth", "radius", EARTH_RADIUS],
    ["radius_km", "radius", 1000],
    ["pl_rade", "radius", EARTH_RADIUS],
    ["pl_radj", "radius", JUPITER_RADIUS],
    ["koi_prad", "radius", EARTH_RADIUS],
    ["minimum_mass_jupiter", "minimumMass", JUPITER_MASS],
    ["pl_msinie", "minimumMass", EARTH_MASS],
    ["density_g_cm3", "density", 1000],
    ["rho [kg/m3]", "density", 1],
    ["pl_dens", "density", 1000],
    ["period_days", "period", 86400],
    ["Period (h)", "period", 3600],
    ["pl_orbper", "period", 86400],
    ["a(AU)", "semiMajorAxis", 149597870700],
    ["semi_major_axis", "semiMajorAxis", 149597870700],
    ["ecc", "eccentricity", 1],
    ["inclination", "inclination", Math.PI / 180],
    ["T_eq", "equilibriumTemperature", 1],
    ["pl_insol", "insolation", 1361],
    ["insolation_w_m2", "insolation", 1],
    ["surface_gravity_m_s2", "surfaceGravity", 1],
    ["Rp/R*", "radiusRatio", 1],
    ["a/R*", "scaledAxis", 1],
    ["k", "velocityAmplitude", 1],
    ["K [km/s]", "velocityAmplitude", 1000],
    ["st_mass", "starMass", SUN_MASS],
    ["M_star", "starMass", SUN_MASS],
    ["M_*", "starMass", SUN_MASS],
    ["Teff", "starTemperature", 1],
    ["st_teff", "starTemperature", 1],
    ["star_teff", "starTemperature", 1],
    ["[Fe/H]", "starMetallicity", 1],
    ["st_age", "starAge", 1e9 * 365.25 * 86400],
    ["ra", "rightAscension", Math.PI / 180],
  ])("%s is %s", async (header, name, factor) => {
    const value = await quantityOf(header, "0.5", name);
    expectClose(value, 0.5 * factor, oneFactor);
  });

  test("a logarithm is undone, its errors too", async () => {
    const list = await readList("name,mass_kg,st_logg,st_loggerr1,st_loggerr2\nAster b,1e25,4.5,0.1,-0.2\n");
    const gravity = list.rows[0]?.quantities.starSurfaceGravity;
    expectClose(gravity?.value ?? 0, 0.01 * 10 ** 4.5, oneFactor);
    expectClose(gravity?.plus ?? 0, 0.01 * (10 ** 4.6 - 10 ** 4.5), { rel: 1e-13, because: "a difference" });
    expectClose(gravity?.minus ?? 0, 0.01 * (10 ** 4.5 - 10 ** 4.3), { rel: 1e-13, because: "a difference" });
  });

  test.each(["crossing_radius", "massive", "radius_of_curvature", "", "42", "periodicity"])(
    "%j means nothing",
    async (header) => {
      const { columns } = await explainPlanetList(inChunks(`name,mass_kg,${header}\nA,1,2\n`), {
        file: "list",
        earthRadius: EARTH_RADIUS,
      });
      expect(columns[2]).toMatchObject({ role: "not used" });
    },
  );
});

describe("error and flag columns", () => {
  test.each([
    ["_minus and _plus", "mass_earth,mass_earth_minus,mass_earth_plus", "5,1,2"],
    ["err1 and err2", "pl_bmasse,pl_bmasseerr1,pl_bmasseerr2", "5,2,-1"],
    ["_error_min and _error_max", "mass_earth,mass_error_min,mass_error_max", "5,1,2"],
    ["of any order", "mass_error_max,mass_earth,mass_error_min", "2,5,1"],
    ["with the unit of the value left out", "mass_earth,mass_err_lower,mass_err_upper", "5,1,2"],
    ["with a bracketed unit", "Mass [Mearth],Mass_minus [Mearth],Mass_plus [Mearth]", "5,1,2"],
    ["by place", "mass_earth,errup,errdn", "5,2,1"],
    ["by place, with one name", "mass_earth,err,err", "5,2,1"],
    ["by place, numbered by a program", "mass_earth,err,err.1", "5,2,1"],
    ["by place, as signs", "mass_earth,+,-", "5,2,1"],
    ["of the CDS, both sides", "mass_earth,E_mass_earth,e_mass_earth", "5,2,1"],
    ["of the CDS, the other way round", "mass_earth,e_mass_earth,E_mass_earth", "5,1,2"],
  ])("%s", async (_, header, row) => {
    const mass = (await readList(`name,${header}\nAster b,${row}\n`)).rows[0]?.quantities.mass;
    expectClose(mass?.minus ?? 0, EARTH_MASS, oneFactor);
    expectClose(mass?.plus ?? 0, 2 * EARTH_MASS, oneFactor);
  });

  test("repeated names belong to the value before them", async () => {
    const text = "name,mass_earth,err,radius_earth,err,colour,err\nA,5,1,2,0.1,red,9\n";
    const { mass, radius } = (await readList(text)).rows[0]?.quantities ?? {};
    expectClose(mass?.plus ?? 0, EARTH_MASS, oneFactor);
    expectClose(radius?.plus ?? 0, 0.1 * EARTH_RADIUS, oneFactor);
  });

  const bounds = Array.from({ length: 6 }, (_, i) => `A,${i + 3},${i + 2},${i + 5}\n`).join("");

  test("the ends of the interval are told from errors by the values", async () => {
    const mass = (await readList(`name,mass_earth,mass_lower,mass_upper\n${bounds}`)).rows[0]?.quantities.mass;
    expectClose(mass?.minus ?? 0, EARTH_MASS, oneFactor);
    expectClose(mass?.plus ?? 0, 2 * EARTH_MASS, oneFactor);
    const errors = (await readList("name,mass_earth,mass_lower,mass_upper\nA,5,1,2\n")).rows[0]?.quantities.mass;
    expectClose(errors?.plus ?? 0, 2 * EARTH_MASS, oneFactor);
  });

  test("ends that do not enclose the value are an issue and give no errors", async () => {
    const columnChoices = { mass_earth_lower_bound: "mass_lower", mass_earth_upper_bound: "mass_upper" };
    const text = "name,mass_earth,mass_lower,mass_upper\nA,5,6,8\n";
    const [row] = (await readList(text, { columnChoices })).rows;
    expect(row?.quantities.mass).toMatchObject({ kind: "no-uncertainty", minus: undefined, plus: undefined });
    expect(row?.issues).toMatchObject([{ code: "value-outside-bounds" }]);
  });

  test("and where the values cannot tell, the user must", async () => {
    const text = `name,mass_earth,mass_lower,mass_upper\n${bounds}B,5,1,2\n`;
    await expect(readList(text)).rejects.toMatchObject({ code: "ambiguous-column", found: "mass_earth,mass_upper" });
    const columnChoices = { mass_earth_lower_bound: "mass_lower", mass_earth_upper_bound: "mass_upper" };
    const mass = (await readList(text, { columnChoices })).rows[0]?.quantities.mass;
    expectClose(mass?.plus ?? 0, 2 * EARTH_MASS, oneFactor);
  });
});

describe("twin columns", () => {
  const header = "name,pl_bmassj,pl_bmassjerr1,pl_bmassjerr2,pl_bmasse,pl_bmasseerr1,pl_bmasseerr2\n";

  test("the one in Earth units is used and the other kept for comparison", async () => {
    const [row] = (await readList(`${header}A,0.016,0.001,-0.001,5,1,-1\n`)).rows;
    expect(row?.quantities.mass?.origin.column).toBe("pl_bmasse");
    expect(row?.twins?.mass?.map(({ origin }) => origin.column)).toEqual(["pl_bmassj"]);
  });

  test("where that is empty the other is used", async () => {
    const [row] = (await readList(`${header}A,0.016,0.001,-0.001,,,\n`)).rows;
    expect(row?.quantities.mass?.origin.column).toBe("pl_bmassj");
    expect(row?.twins?.mass).toBeUndefined();
  });

  test("of an archive's several masses the first of its ranking is used", async () => {
    const [row] = (await readList("pl_name,pl_masse,pl_bmasse,pl_cmasse\nA,4,5,6\n")).rows;
    expect(row?.quantities.mass?.origin.column).toBe("pl_bmasse");
  });
});

describe("what could be read in two ways stops with the readings and their options", () => {
  const rows = "\nA,1,1.1\nB,2,1.2\nC,0.5,0.9\n";

  test("units", async () => {
    await expect(readList(`name,mass,radius${rows}`)).rejects.toMatchObject({
      code: "ambiguous-column",
      found: "mass,radius",
      remedy: "--unit mass=earth\n--unit mass=jupiter\n--unit radius=earth\n--unit radius=jupiter",
    });
    const [row] = (await readList(`name,mass,radius${rows}`, { unitChoices: { mass: "earth", radius: "jupiter" } }))
      .rows;
    expectClose(row?.quantities.mass?.value ?? 0, EARTH_MASS, oneFactor);
    expectClose(row?.quantities.radius?.value ?? 0, 1.1 * JUPITER_RADIUS, oneFactor);
  });

  test("two columns for one quantity", async () => {
    const text = `name,mass_earth,pl_bmasse${rows}`;
    await expect(readList(text)).rejects.toMatchObject({
      code: "ambiguous-column",
      remedy: "--column mass_earth=mass_earth\n--column mass_earth=pl_bmasse",
    });
    const list = await readList(text, { columnChoices: { mass_earth: "pl_bmasse" } });
    expect(list.rows[0]?.quantities.mass?.origin.column).toBe("pl_bmasse");
  });

  test("one name twice", async () => {
    const text = `name,mass_earth,mass_earth${rows}`;
    await expect(readList(text)).rejects.toMatchObject({ remedy: "--column mass_earth=#2\n--column mass_earth=#3" });
    const list = await readList(text, { columnChoices: { mass_earth: "#3" } });
    expect(list.rows[0]?.quantities.mass?.written).toBe("1.1");
  });

  test("a name that fits star and planet", async () => {
    await expect(readList(`name,M,radius_earth${rows}`, { unitChoices: { mass: "earth" } })).rejects.toMatchObject({
      code: "ambiguous-column",
      remedy: "--column mass_earth=M\n--column star_mass_sun=M",
    });
    const list = await readList(`name,M,star_mass${rows}`, { unitChoices: { mass: "earth" } });
    expect(list.rows[0]?.quantities.mass?.written).toBe("1");
  });

  test("values decide only where no list could have them in the other unit", async () => {
    const many = (values: readonly number[]): string =>
      `name,radius\n${values.map((value) => `A,${value}\n`).join("")}`;
    const unitOf = async (values: readonly number[]) =>
      (await readList(many(values))).plan.quantities.get("radius")?.[0]?.unit.id;
    expect(await unitOf([4, 8, 11, 12, 13])).toBe("earth");
    await expect(unitOf([1, 1.2, 1.5, 2, 2.2])).rejects.toMatchObject({ code: "ambiguous-column" });
    await expect(unitOf([4, 8])).rejects.toMatchObject({ code: "ambiguous-column" });
  });

  test("the columns of a known list tell its units, unless its values deny them", async () => {
    const header =
      "name,mass,mass_error_min,mass_error_max,radius,orbital_period,semi_major_axis,star_name,star_mass\n";
    const list = (radius: number): string => header + `A,1,0.1,0.1,${radius},3,0.05,Aster,1\n`.repeat(6);
    expect((await readList(list(1.2))).plan.quantities.get("radius")?.[0]).toMatchObject({
      unit: { id: "jupiter" },
      unitSource: "known list",
    });
    expect((await readList(list(9))).plan.quantities.get("radius")?.[0]?.unit.id).toBe("earth");
  });
});

describe("choices that cannot be followed", () => {
  test.each([
    ["a column that is not there", { columnChoices: { mass_earth: "mas" } }, "column-not-found"],
    ["a name that is not ours", { columnChoices: { mess_earth: "mass" } }, "unknown-column-choice"],
    ["a unit that does not exist", { unitChoices: { mass: "saturn" } }, "unknown-unit"],
  ])("%s", async (_, choices, code) => {
    await expect(readList("name,mass,radius_earth\nA,1,2\n", choices)).rejects.toMatchObject({ code });
  });
});

describe("lists that cannot be used", () => {
  test.each([
    ["empty", "", "empty-file"],
    ["blank", "\n \n", "empty-file"],
    ["comments only", "# nothing\n# here\n", "empty-file"],
    ["without a header", "Aster b,5,1\nBrook c,6,2\n", "no-header"],
    ["a header only", "name,mass_earth,radius_earth\n", "no-data"],
    ["a Markdown header only", "| name | mass_earth |\n|---|---|\n", "no-data"],
    ["without mass and radius", "name,colour\nAster b,red\n", "missing-columns"],
    ["a web page", "<!DOCTYPE html><html><body>Error</body></html>", "unsupported-format"],
    ["JSON", '[{"name": "A"}]', "unsupported-format"],
    ["a spreadsheet", "PK\u0003\u0004\u0000", "unsupported-format"],
    ["binary", "name,mass\u0000\u0001", "unsupported-format"],
  ])("%s", async (_, text, code) => {
    await expect(readList(text)).rejects.toMatchObject({ code, place: { file: "list" } });
  });

  test("missing columns are named, and those found listed", async () => {
    await expect(readList("name,colour\nA,red\n")).rejects.toThrow(/name, colour.*mass_earth.*radius_earth/s);
  });

  test("numbers that lost their decimal points are refused with the evidence", async () => {
    const row = (i: number): string => `A${i},1${i}34,5${i}23,98${i},23\n`;
    const text = `name,radius_earth,mass_earth,star_mass,e\n${[1, 2, 3, 4, 5].map(row).join("")}`;
    await expect(readList(text)).rejects.toMatchObject({
      code: "lost-decimal-points",
      found: /radius_earth.*star_mass/,
    });
  });

  const list = (header: string, row: (i: number) => string): string =>
    `name,${header}\n${Array.from({ length: 12 }, (_, i) => `Aster ${i} b,${row(i)}\n`).join("")}`;

  test.each([
    ["masses that are possible", "mass_earth,radius_earth", (i: number) => `${470 + 13 * i},${161 + 7 * i}`],
    ["a period", "radius_earth,period", (i: number) => `${1611 + i},${63120 + 17 * i}`],
    [
      "a column beside them that kept its points",
      "mass_earth,radius_earth,semi_major_axis",
      (i: number) => `4.${i},${161 + i},${43 + i}`,
    ],
  ])("also beside %s", async (_, header, row) => {
    await expect(readList(list(header, row))).rejects.toMatchObject({
      code: "lost-decimal-points",
      found: /"radius_earth".*above/,
    });
  });

  test.each([
    ["whole masses", "mass_earth,radius_earth", (i: number) => `${i + 1},1.${i}`],
    ["whole masses and radii", "mass_earth,radius_earth", (i: number) => `${5 * i + 1},${i + 1}`],
    ["radii in kilometres", "mass_earth,radius_km", (i: number) => `${i + 1},${6000 + 100 * i}`],
    ["far companions", "mass_jupiter,semi_major_axis", (i: number) => `${i + 3},${50 * i + 50}`],
    ["one impossible column alone", "radius_earth,period", (i: number) => `${161 + i},6.3`],
  ])("honest whole numbers stay: %s", async (_, header, row) => {
    expect((await readList(list(header, row))).rows).toHaveLength(12);
  });
});

test("a misspelt column is pointed out", async () => {
  const { notes } = await readList("name,mass_eath,radius_earth\nA,1,2\n");
  expect(notes).toEqual(['column "mass_eath" is not used; did you mean mass_earth?']);
});

test("every column is explained", async () => {
  const text =
    "pl_name,pl_bmasse,pl_bmasseerr1,pl_bmasseerr2,pl_bmasselim,colour,radius\nA,,1,-1,0,red,2\nB,5,1,-1,0,,3\n";
  const { columns, ambiguities } = await explainPlanetList(inChunks(text), { file: "list", earthRadius: EARTH_RADIUS });
  expect(columns).toMatchObject([
    { number: 1, column: "pl_name", role: "text", meaning: "name", sample: "A" },
    { column: "pl_bmasse", role: "value", meaning: "mass", unit: "earth", unitSource: "column name", sample: "5" },
    { column: "pl_bmasseerr1", role: "upper error", meaning: "mass" },
    { column: "pl_bmasseerr2", role: "lower error", meaning: "mass" },
    { column: "pl_bmasselim", role: "limit flag", meaning: "mass" },
    { column: "colour", role: "not used", sample: "red" },
    { column: "radius", role: "ambiguous" },
  ]);
  expect(ambiguities[0]?.readings.map(({ option }) => option)).toEqual([
    "--unit radius=earth",
    "--unit radius=jupiter",
  ]);
});

test.each([
  ["R [Rearth]", "radius"],
  ["R [Rjup]", "radius"],
  ["Rad (Rjup)", "radius"],
  ["M [Mjup]", "mass"],
  ["R [Rsun]", "starRadius"],
])("%s is of the body whose unit it has", async (column, quantity) => {
  const { plan } = await readList(`name,density,${column}\nA,5,1\n`, { needs: ["density"] });
  expect([...plan.quantities.keys()]).toEqual(["density", quantity]);
});

test.each(["km", ""])("Rad in %j stays a question", async (unit) => {
  await expect(readList(`name,density,Rad [${unit}]\nA,5,1\n`)).rejects.toMatchObject({ code: "ambiguous-column" });
});

test.each([
  ["Mp", "σMp"],
  ["Mass (M⊕)", "σ_Mass (M⊕)"],
  ["Mp (M⊕)", "δMp"],
  ["Mp (M⊕)", "ΔMp (M⊕)"],
  ["Mp (M⊕)", "∆Mp"],
  ["Mp [M_earth]", "Mp_σ"],
])("the errors of %s are in %s", async (value, error) => {
  const { rows } = await readList(`name,${value},${error}\nA,5,1\n`, { unitChoices: { mass: "earth" } });
  expect(rows[0]?.quantities).toMatchObject({ mass: { written: "5", kind: "measured" } });
});

test("a column name that is not ours is answered with the nearest that is", async () => {
  const choices = { columnChoices: { massProvenanc: "how" } };
  await expect(readList("name,mass_earth,how\nA,5,Msini\n", choices)).rejects.toThrow(
    /did you mean mass_provenance\?.*mass_provenance, radius_provenance/,
  );
  const [row] = (await readList("name,mass_earth,how\nA,5,Msini\n", { columnChoices: { mass_provenance: "how" } }))
    .rows;
  expect(row?.quantities.mass?.kind).toBe("minimum");
});

test("where the list has a name column, the host does not stand in for an empty name", async () => {
  const { rows } = await readList("name,host,mass_earth\n,Aster,1\nBrook b,Brook,2\n");
  expect(rows.map((row) => row.name)).toEqual(["", "Brook b"]);
  expect((await readList("host,mass_earth\nAster,1\n")).rows[0]?.name).toBe("Aster");
});

test("a list without names has host and letter", async () => {
  const [row] = (await readList("pl_hostname,pl_letter,pl_radj\nAster,b,1\n")).rows;
  expect(row?.name).toBe("Aster b");
});
