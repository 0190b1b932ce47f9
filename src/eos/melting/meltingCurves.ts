import { GPA } from "../../units/constants.ts";
import type { MeltingCurve, SimonBranch } from "./meltingTemperature.ts";

/** A single branch T = T0 ((P - P0)/a + 1)^c, pressures in GPa. */
const branch = (phase: string, from: number, temperatureZero: number, zero: number, scale: number, exponent: number) =>
  ({
    phase,
    fromPressure: from * GPA,
    temperatureZero,
    pressureZero: zero * GPA,
    scale: scale * GPA,
    exponent,
  }) satisfies SimonBranch;

/**
 * Published melting curves. Where two disagree, both are here: MgSiO3 at 135.75 GPa melts at 5321 K or 5657 K.
 * Checked test/eos/melting/meltingCurves.test.ts
 */
export const meltingCurves = {
  ironAnzellini: {
    name: "iron-anzellini-2013",
    title: "iron, static experiments",
    branches: [branch("fcc", 5.2, 1991, 5.2, 27.39, 1 / 2.38), branch("hcp", 98.5, 3712, 98.5, 161.2, 1 / 1.72)],
    calibrated: [5.2 * GPA, 200 * GPA],
    source: {
      citation: "Anzellini et al. 2013, Science 340, 464",
      doi: "10.1126/science.1233514",
      note: "coefficients from memory; they give the abstract's 6230 K at 330 GPa",
    },
  },
  ironKraus: {
    name: "iron-kraus-2022",
    title: "iron, laser ramp compression",
    branches: [branch("hcp", 260, 5530, 260, 293, 0.552)],
    calibrated: [260 * GPA, 1000 * GPA],
    source: { citation: "Kraus et al. 2022, Science 375, 202", doi: "10.1126/science.abm1472", note: "from memory" },
  },
  ironStixrude: {
    name: "iron-stixrude-2014",
    title: "iron, power law for super-Earth cores",
    branches: [branch("hcp", 50, 6500, 340, 340, 0.515)],
    calibrated: [50 * GPA, 1500 * GPA],
    source: {
      citation: "Stixrude 2014, Phil. Trans. R. Soc. A 372, 20130076",
      doi: "10.1098/rsta.2013.0076",
      note: "from memory, limits of use included",
    },
  },
  silicateStixrude: {
    name: "mgsio3-stixrude-2014",
    title: "MgSiO3, power law; mantle solidus by a depression with x = 0.79",
    branches: [branch("bridgmanite", 25, 5400, 140, 140, 0.48)],
    calibrated: [25 * GPA, 500 * GPA],
    source: {
      citation: "Stixrude 2014, Phil. Trans. R. Soc. A 372, 20130076",
      doi: "10.1098/rsta.2013.0076",
      note: "limits of use from memory; exceeds the upper bound of 9430 K at 500 GPa of Fei et al. 2021, Nat. Commun. 12, 876",
    },
  },
  silicateBelonoshko: {
    name: "mgsio3-belonoshko-2005",
    title: "MgSiO3, ab initio two-phase simulation",
    branches: [branch("bridgmanite", 25, 1831, 0, 4.6, 0.33)],
    calibrated: [25 * GPA, 500 * GPA],
    source: {
      citation: "Belonoshko et al. 2005, Phys. Rev. Lett. 94, 195701, equation 2",
      doi: "10.1103/PhysRevLett.94.195701",
      note: "from memory, limits of use included",
    },
  },
} as const satisfies Record<string, MeltingCurve>;
