import type { Source } from "../eos/material.ts";
import type { EndMember } from "./endMember.ts";

const source: Source = {
  citation: "Stixrude & Lithgow-Bertelloni 2011, Geophys. J. Int. 184, 1180, Table A1",
  doi: "10.1111/j.1365-246X.2010.04890.x",
};

/** V0 cm³/mol, K0 GPa, K0', θ0 K, γ0, q0. */
type Row = readonly [number, number, number, number, number, number];

const member = (name: string, formula: string, [v, k, kp, theta, gamma, q]: Row): EndMember => ({
  name,
  formula,
  volumeCm3PerMol: v,
  bulkModulusGPa: k,
  bulkModulusPrime: kp,
  debyeTemperatureK: theta,
  gammaZero: gamma,
  qZero: q,
  source,
});

/**
 * End members of the mantle's minerals.
 * Checked densities at 0, 25 and 100 GPa: test/mineralogy/endMember.test.ts
 */
export const endMembers = {
  forsterite: member("forsterite", "Mg2SiO4", [43.603, 127.9555, 4.21796, 809.1703, 0.99282, 2.10672]),
  fayalite: member("fayalite", "Fe2SiO4", [46.29, 134.9622, 4.21796, 618.7007, 1.06023, 3.6466]),
  mgWadsleyite: member("Mg-wadsleyite", "Mg2SiO4", [40.515, 168.6948, 4.3229, 843.4973, 1.2061, 2.0188]),
  mgRingwoodite: member("Mg-ringwoodite", "Mg2SiO4", [39.493, 184.9009, 4.22035, 877.7094, 1.10791, 2.3914]),
  feRingwoodite: member("Fe-ringwoodite", "Fe2SiO4", [41.86, 213.412, 4.22035, 677.7177, 1.27193, 2.3914]),
  enstatite: member("enstatite", "Mg2Si2O6", [62.676, 107.0768, 7.02751, 812.1848, 0.78479, 3.43846]),
  hpClinoenstatite: member("HP-clinoenstatite", "Mg2Si2O6", [60.76, 116.0254, 6.23685, 824.4439, 1.12473, 0.20401]),
  akimotoite: member("akimotoite", "MgSiO3", [26.354, 210.706, 5.62088, 935.9778, 1.18984, 2.34514]),
  mgMajorite: member("Mg-majorite", "Mg4Si4O12", [114.324, 165.1183, 4.21183, 822.458, 0.97682, 1.53581]),
  pyrope: member("pyrope", "Mg3Al2Si3O12", [113.08, 170.2396, 4.11067, 823.2102, 1.01424, 1.42169]),
  mgBridgmanite: member("Mg-bridgmanite", "MgSiO3", [24.445, 250.5264, 4.14, 905.9412, 1.56508, 1.10945]),
  feBridgmanite: member("Fe-bridgmanite", "FeSiO3", [25.485, 272.1152, 4.14, 870.8122, 1.56508, 1.10945]),
  mgPostPerovskite: member("Mg-post-perovskite", "MgSiO3", [24.419, 231.2, 4, 855.8173, 1.89155, 1.09081]),
  fePostPerovskite: member("Fe-post-perovskite", "FeSiO3", [25.459, 231.2, 4, 781.3465, 1.89155, 1.09081]),
  periclase: member("periclase", "MgO", [11.244, 161.3836, 3.84045, 767.0977, 1.36127, 1.7217]),
  wustite: member("wüstite", "FeO", [12.264, 179.4442, 4.9376, 454.1592, 1.53047, 1.7217]),
  stishovite: member("stishovite", "SiO2", [14.017, 314.3352, 3.75122, 1107.824, 1.37466, 2.83517]),
  seifertite: member("seifertite", "SiO2", [13.67, 327.5843, 4.01553, 1140.772, 1.37466, 2.83517]),
  coesite: member("coesite", "SiO2", [20.657, 113.5856, 4, 852.4267, 0.39157, 1]),
  quartz: member("quartz", "SiO2", [23.67003, 49.54743, 4.33155, 816.3307, -0.00296, 1]),
  caPerovskite: member("Ca-perovskite", "CaSiO3", [27.45, 236, 3.9, 795.779, 1.88839, 0.89769]),
  corundum: member("corundum", "Al2O3", [25.577, 252.5457, 4.33728, 932.5696, 1.32442, 1.30316]),
} as const satisfies Record<string, EndMember>;
