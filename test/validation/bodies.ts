import type { Planet } from "../../src/interior/planet.ts";
import { solvePlanet } from "../../src/interior/solvePlanet.ts";
import type { Check } from "./check.ts";
import { massOf, outermostForRadius, shipped, topOf, withOutermost } from "./model.ts";

const JPL = "JPL Solar System Dynamics, physical parameters";

interface Measured {
  /** GM [km³/s²]. */
  readonly massParameter: number;
  readonly radiusKm: number;
}

/** GM and mean radius: JPL, with DE440, MAR097, JUP365 and SAT441. */
const measured = {
  venus: { massParameter: 324858.592, radiusKm: 6051.8 },
  mars: { massParameter: 42828.37362, radiusKm: 3389.5 },
  mercury: { massParameter: 22031.8686, radiusKm: 2439.4 },
  moon: { massParameter: 4902.8, radiusKm: 1737.4 },
  io: { massParameter: 5959.91547, radiusKm: 1821.49 },
  europa: { massParameter: 3202.7121, radiusKm: 1560.8 },
  ganymede: { massParameter: 9887.83275, radiusKm: 2631.2 },
  callisto: { massParameter: 7179.2834, radiusKm: 2410.3 },
  titan: { massParameter: 8978.1371, radiusKm: 2574.76 },
} as const satisfies Record<string, Measured>;

/** Compositions and the GM [km³/s²] of their bodies. */
export const bodyMasses = [
  ...Object.entries(measured).map(([name, { massParameter }]) => [name, massParameter] as const),
  ["callisto-hydrated", measured.callisto.massParameter] as const,
  ["titan-hydrated", measured.titan.massParameter] as const,
];

type Bar = Pick<Check, "reference" | "allowed" | "source" | "miss"> & { readonly independent: boolean };

export function rockyBodyChecks(): Check[] {
  const venus = planetOf("venus");
  const mars = planetOf("mars");
  const mercury = planetOf("mercury");
  const moon = planetOf("moon");
  const io = planetOf("io");
  return [
    radius(venus, { allowed: 0.008, independent: true }),
    inertia(venus, {
      reference: 0.337,
      source: "Margot et al. 2021, Nat. Astron. 5, 676: 0.337(24)",
      independent: true,
    }),

    radius(mars, { allowed: 0.007, independent: true }),
    inertia(mars, {
      reference: 0.3645,
      allowed: 0.01,
      source: "Konopliv et al. 2016, Icarus 274, 253: polar 0.3644(5) on 3396 km (from memory), as mean on 3389.5 km",
      independent: true,
    }),
    coreRadius(mars, {
      reference: 1650,
      allowed: [1620, 1830],
      source: "Stähler et al. 2021: 1830(40); Samuel et al. 2023: 1650(20); Khan et al. 2023: 1675(30) km",
      independent: true,
    }),

    radius(mercury, { allowed: 0.007, independent: false }),
    inertia(mercury, {
      reference: 0.343,
      allowed: [0.333, 0.349],
      source: "Genova et al. 2019: 0.333(5); Bertone et al. 2021: 0.343(6); Margot et al. 2012: 0.346(14)",
      independent: false,
    }),
    coreRadius(mercury, {
      reference: 2020,
      source: "Hauck et al. 2013: 2020(30) km (from memory)",
      independent: false,
    }),

    radius(moon, { allowed: 0.01, independent: true }),
    inertia(moon, {
      reference: 0.3929,
      allowed: 0.008,
      source: "0.3929(9), as in Williams et al. 1996; GRAIL 0.392728(12) (from memory)",
      independent: false,
    }),
    coreRadius(moon, { reference: 330, source: "Weber et al. 2011, Science 331, 309", independent: false }),

    radius(io, { allowed: 0.01, independent: true }),
    inertia(io, {
      reference: 0.37824,
      allowed: 0.008,
      source: "Schubert et al. 2004: 0.37824(22); Anderson et al. 2001: 0.37685(35) (from memory)",
      independent: true,
    }),
  ];
}

/** What the phase diagram of water and the published models of each moon call for, from the top down. */
const sequence = {
  europa: ["ice-Ih", "liquid"],
  ganymede: ["ice-Ih", "liquid", "ice-VI"],
  callisto: ["ice-Ih", "liquid", "ice-V", "ice-VI"],
  titan: ["ice-Ih", "liquid", "ice-V", "ice-VI"],
} as const;

const inertias = {
  europa: {
    reference: 0.346,
    allowed: 0.03,
    source: "Anderson et al. 1998: 0.346(5); Gomez Casajus et al. 2021: 0.3547(24) (from memory)",
  },
  ganymede: { reference: 0.3115, allowed: 0.03, source: "Anderson et al. 1996: 0.3115(28)" },
  callisto: {
    reference: 0.3549,
    allowed: 0.03,
    source: "Anderson et al. 2001: 0.3549(42), for hydrostatic equilibrium",
  },
  titan: {
    reference: 0.3414,
    allowed: 0.03,
    source: "Iess et al. 2010: 0.3414(5) (from memory), for hydrostatic equilibrium",
  },
} as const;

const MIXED = "separated into rock and ice here; the measured value calls for an interior only partly separated";
const LIGHT_ROCK =
  "rock lighter than CI chondrites give it (porous, or with organics), or an interior partly mixed with ice";

/** The water fraction is found from the radius, which is therefore an input and no test. */
export function icyMoonChecks(): Check[] {
  return [
    ...icyMoon("europa", "europa"),
    ...icyMoon("ganymede", "ganymede"),
    ...icyMoon("callisto", "callisto", { difference: 0.1403, reason: MIXED }),
    ...icyMoon("callisto-hydrated", "callisto", {
      difference: 0.1108,
      reason: `${MIXED}; hydrated rock makes up part of it`,
    }),
    ...icyMoon("titan", "titan", {
      difference: 0.1042,
      reason: `${LIGHT_ROCK}; anhydrous rock with a metal core is too dense`,
    }),
    ...icyMoon("titan-hydrated", "titan", { difference: 0.0726, reason: LIGHT_ROCK }),
  ];
}

function icyMoon(name: string, moon: keyof typeof inertias, miss?: Check["miss"]): Check[] {
  const { massParameter, radiusKm } = measured[moon];
  const mass = massOf(massParameter);
  const composition = shipped(name);
  const stated = composition.layers[composition.layers.length - 1].massFraction;
  const water = outermostForRadius(composition, mass, radiusKm * 1e3);
  const planet = solvePlanet(withOutermost(composition, water), mass);
  const found = planet.boundaries.filter(({ layer }) => layer === "water-phases").map(({ phase }) => phase);
  return [
    {
      body: name,
      quantity: "water mass fraction that gives the radius, against the file's",
      unit: "",
      computed: water,
      reference: stated,
      allowed: 2e-4,
      independent: false,
      source: `radius ${radiusKm} km, ${JPL}, is an input`,
    },
    {
      body: name,
      quantity: "phases of water from the surface down",
      unit: "",
      computed: found.reverse().join(", "),
      reference: sequence[moon].join(", "),
      independent: true,
      source:
        "phase diagram of IAPWS R14-08(2011); oceans: Kivelson et al. 2000 and 2002, Iess et al. 2012 (from memory)",
    },
    inertia(planet, { ...inertias[moon], miss, independent: true }),
  ];
}

function planetOf(name: keyof typeof measured): Planet {
  return solvePlanet(shipped(name), massOf(measured[name].massParameter));
}

function radius(planet: Planet, bar: { allowed: number; independent: boolean }): Check {
  const { name } = planet.composition;
  const reference = measured[name as keyof typeof measured].radiusKm;
  return { body: name, quantity: "radius", unit: "km", computed: planet.radius / 1e3, reference, source: JPL, ...bar };
}

function inertia({ composition, inertiaFactor }: Planet, bar: Bar): Check {
  return {
    body: composition.name,
    quantity: "moment of inertia factor, mean",
    unit: "",
    computed: inertiaFactor ?? Number.NaN,
    ...bar,
  };
}

function coreRadius(planet: Planet, bar: Bar): Check {
  const { name, layers } = planet.composition;
  return {
    body: name,
    quantity: "core radius",
    unit: "km",
    computed: topOf(planet, layers[0].name).radius / 1e3,
    ...bar,
  };
}
