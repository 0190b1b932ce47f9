import { describe, expect, it } from "vitest";
import { isentrope } from "../../src/eos/thermal/temperaturePaths.ts";
import { planetSolver } from "../../src/interior/planetSolver.ts";
import { type ProfilePoint, solveProfile } from "../../src/interior/profile.ts";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import { StructureSolver } from "../../src/interior/structureSolver.ts";
import { WarmSolver } from "../../src/interior/warmSolver.ts";
import { buildThermalEos } from "../../src/library/buildThermal.ts";
import { buildCurve } from "../../src/library/forms.ts";
import { loadLibrary } from "../../src/library/library.ts";
import { materialSchema } from "../../src/library/schemas.ts";
import { EARTH_MASS, GPA } from "../../src/units/constants.ts";
import { expectClose } from "../support/expectClose.ts";
import * as files from "../support/warmFiles.ts";

const CORE = 0.325;
const layers = (core: string, mantle: string, coreHeat: object = {}) => [
  { material: core, massFraction: CORE, ...coreHeat },
  { material: mantle, massFraction: 1 - CORE },
];
const adiabatic = { temperature: { mode: "adiabatic", potentialTemperatureK: 1600 } };
const freezing = { ...files.liquidIron, untilFreezing: { curve: "iron-anzellini-2013" } };

const library = loadLibrary([
  files.materialOf("iron", files.hcpIron),
  files.materialOf("rock", files.bridgmanite),
  files.materialOf("cold-iron", files.cold(files.hcpIron)),
  files.materialOf("cold-rock", files.cold(files.bridgmanite)),
  files.materialOf("core", freezing, files.hcpIron),
  files.mantleOf("minerals", 1.25, 0.1),
  files.compositionOf("cold", layers("cold-iron", "cold-rock")),
  files.compositionOf("room", layers("iron", "rock"), { temperature: { mode: "isothermal", temperatureK: 300 } }),
  files.compositionOf("hot", layers("iron", "rock"), { temperature: { mode: "isothermal", temperatureK: 2000 } }),
  files.compositionOf("jump", layers("iron", "rock", { temperatureJumpK: 1500 }), adiabatic),
  files.compositionOf("full", layers("core", "minerals", { topTemperatureK: 4500 }), adiabatic),
  files.compositionOf("no-jump", layers("iron", "minerals"), adiabatic),
  files.compositionOf("magma", layers("core", "minerals", { topTemperatureK: 5500 }), {
    temperature: { mode: "adiabatic", potentialTemperatureK: 2300 },
  }),
  files.compositionOf("half-warm", layers("cold-iron", "rock"), adiabatic),
  files.compositionOf(
    "over-cold-shell",
    [
      { material: "iron", massFraction: 0.3, temperatureJumpK: 200 },
      { material: "cold-rock", massFraction: 0.3 },
      { material: "rock", massFraction: 0.4 },
    ],
    adiabatic,
  ),
  files.compositionOf("tabled", layers("iron", "rock"), {
    temperature: { mode: "table", pressureGPa: [0, 25, 160, 400], temperatureK: [1600, 1900, 2600, 5000] },
  }),
]);
const planet = (name: string, mass = EARTH_MASS) => solvePlanet(library.composition(name), mass);
const profile = (name: string) => solveProfile(library.composition(name), EARTH_MASS, 101).points;
const kelvin = ({ temperature }: ProfilePoint): number => temperature ?? Number.NaN;

describe("a warm planet", () => {
  it("is the cold one where it is as warm as the laboratory", () => {
    const [warm, cold] = [planet("room"), planet("cold")];
    const tolerance = { rel: 1e-9, because: "the same curves; integration and shooting at their tolerance" };
    expectClose(warm.radius, cold.radius, tolerance);
    expectClose(warm.centralPressure, cold.centralPressure, tolerance);
    expectClose(warm.inertiaFactor ?? Number.NaN, cold.inertiaFactor ?? Number.NaN, tolerance);
  });

  it("is larger when hotter, by thermal expansion", () => {
    // α of 1 to 4e-5 / K under pressure over 1700 K: 1 to 3 % in density, a third of it in radius.
    const growth = planet("hot").radius / planet("room").radius - 1;
    expect(growth).toBeGreaterThan(0.003);
    expect(growth).toBeLessThan(0.012);
  });

  it("costs nothing where no material answers to temperature", () => {
    expect(planetSolver(library.composition("cold"))).toBeInstanceOf(StructureSolver);
    expect(planetSolver(library.composition("room"))).toBeInstanceOf(WarmSolver);
  });

  it("does not depend on the guess, nor on the planet solved before", () => {
    const composition = library.composition("full");
    const fresh = planet("full");
    const solver = planetSolver(composition);
    solver.solve(3 * EARTH_MASS);
    for (const other of [solver.solve(EARTH_MASS), solver.solve(EARTH_MASS, 1e11), solver.solve(EARTH_MASS, 8e11)]) {
      expect(Math.abs(other.radius / fresh.radius - 1)).toBeLessThan(
        fresh.radiusRelativeError + other.radiusRelativeError,
      );
      expectClose(other.centralPressure, fresh.centralPressure, {
        rel: 1e-7,
        because: "boundary pressures settle to 1e-7",
      });
    }
  });

  it.each(["jump", "full", "tabled", "over-cold-shell"])(
    "of %s has a stated error that bounds the true one",
    (name) => {
      const composition = library.composition(name);
      for (const earths of [0.05, 0.3, 1, 3]) {
        const coarse = planetSolver(composition).solve(earths * EARTH_MASS);
        const tight = new WarmSolver(composition, { tolerance: 1e-11 }).solve(earths * EARTH_MASS);
        expect(Math.abs(coarse.radius / tight.radius - 1)).toBeLessThanOrEqual(coarse.radiusRelativeError);
        expect(coarse.radiusRelativeError).toBeLessThan(1e-7);
      }
    },
  );

  it("has no more rounds to make once the layers begin where they were built for", () => {
    const { boundaries, composition } = planet("full");
    const top = boundaries.find(({ kind }) => kind === "layer")?.pressure ?? 0;
    const { curve } = composition.layers[0].material.phases[0];
    expectClose(curve.temperature?.(curve.coordinate(top)) ?? 0, 4500, {
      rel: 1e-8,
      because: "built for the pressure of the round before, 1e-7 off, on an adiabat with d ln T / d ln P < 0.1",
    });
  });
});

describe("the temperature inside", () => {
  it("begins at the potential temperature and ends at the centre", () => {
    const points = profile("jump");
    expectClose(kelvin(points[points.length - 1]), 1600, { rel: 1e-10, because: "given" });
    expect(points.every((point) => kelvin(point) >= 1600 * (1 - 1e-10))).toBe(true);
  });

  it("is continuous within a layer and jumps between layers as stated", () => {
    for (const [name, jump] of [
      ["jump", 1500],
      ["tabled", 0],
    ] as const) {
      const points = profile(name);
      const i = points.findIndex(({ layer }) => layer === "rock");
      const step = kelvin(points[i - 1]) - kelvin(points[i]);
      expect(Math.abs(step - jump)).toBeLessThan(1e-3);
    }
    const full = profile("full");
    full.forEach((point, i) => {
      if (i === 0 || point.radius !== full[i - 1].radius || point.layer !== full[i - 1].layer) return;
      expectClose(kelvin(point), kelvin(full[i - 1]), { rel: 1e-11, because: "no latent heat" });
    });
    expect(kelvin(full.findLast(({ layer }) => layer === "core") as ProfilePoint)).toBeCloseTo(4500, 3);
  });

  it("rises along the material's own adiabatic gradient", () => {
    const file = materialSchema.parse(JSON.parse(files.materialOf("rock", files.bridgmanite).text));
    const { eos: keys, thermal } = file.phases?.[0] ?? {};
    if (keys === undefined || thermal === undefined) throw new Error("no phase");
    const curve = buildCurve(keys, () => []);
    if (curve === "bridge") throw new Error("no curve");
    const eos = buildThermalEos(curve, keys, thermal);
    const points = profile("jump").filter(({ layer }) => layer === "rock");
    for (let i = 2; i < points.length - 2; i += 5) {
      const [below, here, above] = [points[i - 1], points[i], points[i + 1]];
      const slope = (kelvin(below) - kelvin(above)) / (below.pressure - above.pressure);
      const { adiabaticGradient } = eos.at(here.pressure, kelvin(here));
      expectClose(slope, adiabaticGradient, { rel: 2e-3, because: "second-order difference over 1/50 of the radius" });
    }
    const middle = points[20];
    const direct = isentrope(eos, 0, 1600);
    expectClose(kelvin(middle), direct.temperature(direct.coordinate(middle.pressure)), {
      rel: 1e-9,
      because: "the same adiabat",
    });
  });

  it("follows a table of pressures, straight between its rows", () => {
    for (const point of profile("tabled").filter(({ layer }) => layer === "rock")) {
      const { pressure } = point;
      const expected =
        pressure < 25 * GPA ? 1600 + (300 * pressure) / (25 * GPA) : 1900 + (700 * (pressure / GPA - 25)) / 135;
      expectClose(kelvin(point), expected, { rel: 1e-9, because: "the polynomials of the curve break at the rows" });
    }
  });

  it("passes through a layer that does not know it", () => {
    const points = profile("over-cold-shell");
    const shell = points.filter(({ layer }) => layer === "cold-rock");
    expect(shell.every(({ temperature }) => temperature === undefined)).toBe(true);
    const core = points.findLast(({ layer }) => layer === "iron") as ProfilePoint;
    const rock = points.find(({ layer }) => layer === "rock") as ProfilePoint;
    expect(kelvin(core) - kelvin(rock)).toBeCloseTo(200, 3);
    const outside = profile("half-warm").find(({ layer }) => layer === "rock") as ProfilePoint;
    expect(kelvin(outside)).toBeGreaterThan(2000);
  });
});

describe("phases in a warm planet", () => {
  it("come in the order of the mantle, and the core freezes where its adiabat meets the melting curve", () => {
    const { boundaries, composition } = planet("full");
    expect(boundaries.map(({ phase }) => phase)).toEqual([
      "hcp",
      "liquid",
      "post-perovskite",
      "bridgmanite",
      "ringwoodite",
      "wadsleyite",
      "olivine",
    ]);
    const { pressure } = boundaries[0];
    const { curve } = composition.layers[0].material.phases[0];
    const temperature = curve.temperature?.(curve.coordinate(pressure)) ?? 0;
    // Anzellini et al. 2013, Science 340, 464: T = 3712 ((P - 98.5)/161.2 + 1)^(1/1.72), P in GPa.
    expectClose(temperature, 3712 * ((pressure / GPA - 98.5) / 161.2 + 1) ** (1 / 1.72), {
      rel: 1e-6,
      because: "the core's adiabat starts 1e-7 from where the boundary came to lie",
    });
  });
});

describe("notes", () => {
  const note = (name: string, mass?: number) => planet(name, mass).notes;

  it("say where a core begins as warm as the rock above it", () => {
    const { boundaries, notes } = planet("no-jump");
    const top = boundaries.find(({ kind }) => kind === "layer");
    expect(notes).toEqual([
      `iron begins as warm as minerals ends, at ${top?.temperature?.toFixed(0)} K: a jump of 0 K, as none is stated; ` +
        "the Earth's is some 1500 K",
    ]);
  });

  it("are not needed with a jump, at one temperature throughout, or along a table", () => {
    for (const name of ["jump", "full", "hot", "tabled", "cold"]) expect(note(name)).toEqual([]);
  });

  it("say where a stated temperature is lower than that of the rock above", () => {
    const [cold] = note("full", 20 * EARTH_MASS);
    expect(cold).toMatch(/^core begins at 4500 K, as stated, cooler than minerals ends \(\d{4} K\): for this mass/);
    expect(Number(/\((\d+) K\)/.exec(cold)?.[1])).toBeGreaterThan(4500);
  });

  it("mark rock above its melting curve, and say what the solid costs", () => {
    const [melt, ...others] = note("magma");
    expect(others).toEqual([]);
    expect(melt).toMatch(
      /^minerals is molten \(above mgsio3-stixrude-2014\) from 25\.0 to [\d.]+ GPa but taken as solid: its density there is [\d.]+ to 15 % too high, the radius up to [\d.]+ % too small$/,
    );
    // There the adiabat meets 5400 (P/140)^0.48 K, Stixrude 2014.
    const high = Number(/to ([\d.]+) GPa/.exec(melt)?.[1]);
    const { curve } = planet("magma").composition.layers[1].material.phases.findLast(
      ({ fromPressure }) => fromPressure < high * GPA,
    ) as { curve: { coordinate(p: number): number; temperature?(y: number): number } };
    const kelvins = curve.temperature?.(curve.coordinate(high * GPA)) ?? 0;
    expectClose(kelvins, 5400 * (high / 140) ** 0.48, {
      rel: 0.01,
      because: "three digits, and samples 0.6 GPa apart",
    });
  });
});
