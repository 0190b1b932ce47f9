/** A physical constant with all that a referee asks for. `uncertainty` is the standard one, 0 where exact by definition. */
export interface Constant {
  readonly value: number;
  readonly unit: string;
  readonly uncertainty: number;
  readonly source: string;
}

const iau2015 = "IAU 2015 Resolution B3; Prsa et al. 2016, AJ 152, 41, doi:10.3847/0004-6256/152/2/41";
const codata2022 = "CODATA 2022; Mohr et al. 2025, Rev. Mod. Phys. 97, 025002";

const nominal = (value: number, unit: string): Constant => ({ value, unit, uncertainty: 0, source: iau2015 });

export const constants = {
  gravitational: { value: 6.6743e-11, unit: "m3 kg-1 s-2", uncertainty: 1.5e-15, source: codata2022 },
  atomicMass: { value: 1.66053906892e-27, unit: "kg", uncertainty: 5.2e-37, source: codata2022 },
  gasConstant: { value: 8.31446261815324, unit: "J mol-1 K-1", uncertainty: 0, source: codata2022 },
  stefanBoltzmann: { value: 5.6703744191844314e-8, unit: "W m-2 K-4", uncertainty: 0, source: codata2022 },
  earthMassParameter: nominal(3.986004e14, "m3 s-2"),
  jupiterMassParameter: nominal(1.2668653e17, "m3 s-2"),
  sunMassParameter: nominal(1.3271244e20, "m3 s-2"),
  earthRadius: nominal(6.3781e6, "m"),
  jupiterRadius: nominal(7.1492e7, "m"),
  sunRadius: nominal(6.957e8, "m"),
  /** What the Earth receives from the Sun; lists give insolation in this unit. */
  solarIrradiance: nominal(1361, "W m-2"),
  earthMeanRadius: {
    value: 6.371e6,
    unit: "m",
    uncertainty: 100,
    source: "mean radius 6371.0084 km (IAU WGCCRE, Archinal et al. 2018) in its usual rounding",
  },
  day: { value: 86400, unit: "s", uncertainty: 0, source: "SI Brochure, 9th edition, table 8" },
  julianYear: { value: 31557600, unit: "s", uncertainty: 0, source: "365.25 days; IAU Style Manual, Wilkins 1990" },
  astronomicalUnit: { value: 149597870700, unit: "m", uncertainty: 0, source: "IAU 2012 Resolution B2" },
} as const satisfies Record<string, Constant>;

export const G = constants.gravitational.value;

/** Nominal GM / G, so that mass and mass parameter cannot disagree [kg]; relative uncertainty that of G, 2.2e-5. */
export const EARTH_MASS = constants.earthMassParameter.value / G;
export const JUPITER_MASS = constants.jupiterMassParameter.value / G;
export const SUN_MASS = constants.sunMassParameter.value / G;

/** Nominal equatorial radii [m], IAU 2015 B3. */
export const EARTH_RADIUS = constants.earthRadius.value;
export const JUPITER_RADIUS = constants.jupiterRadius.value;
export const SUN_RADIUS = constants.sunRadius.value;

export const EARTH_FLUX = constants.solarIrradiance.value;

export const GPA = 1e9;
export const GIGAYEAR = 1e9 * constants.julianYear.value;
