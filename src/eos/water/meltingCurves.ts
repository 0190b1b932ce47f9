/**
 * Pressures [Pa] at which ice melts or sublimes at a temperature [K].
 * Source  IAPWS R14-08(2011), eqs. 1-6; Wagner et al. 2011, J. Phys. Chem. Ref. Data 40, 043103, doi:10.1063/1.3657937
 * Valid   each between the temperatures in its comment; phaseDiagram.ts is what asks for them there
 * Checked the release's check values: test/eos/water/meltingCurves.test.ts
 */
const TRIPLE_PRESSURE = 611.657;

/** 50-273.16 K. */
export function sublimationPressure(temperature: number): number {
  const th = temperature / 273.16;
  const sum = -21.2144006 * th ** 0.00333333333 + 27.3203819 * th ** 1.20666667 - 6.1059813 * th ** 1.70333333;
  return TRIPLE_PRESSURE * Math.exp(sum / th);
}

/** 251.165-273.16 K. */
export function meltingPressureIh(temperature: number): number {
  const th = temperature / 273.16;
  return (
    TRIPLE_PRESSURE *
    (1 + 1.19539337e6 * (1 - th ** 3) + 8.08183159e4 * (1 - th ** 25.75) + 3.3382686e3 * (1 - th ** 103.75))
  );
}

/** 251.165-256.164 K. */
export function meltingPressureIII(temperature: number): number {
  return 208.566e6 * (1 - 0.299948 * (1 - (temperature / 251.165) ** 60));
}

/** 256.164-273.31 K. */
export function meltingPressureV(temperature: number): number {
  return 350.1e6 * (1 - 1.18721 * (1 - (temperature / 256.164) ** 8));
}

/** 273.31-355 K. */
export function meltingPressureVI(temperature: number): number {
  return 632.4e6 * (1 - 1.07476 * (1 - (temperature / 273.31) ** 4.6));
}

/**
 * 355-715 K. With the volumes used here the fusion entropy it implies by Clapeyron's equation is steady near 1.4 kJ/kg/K
 * to 420 K but 5.3 kJ/kg/K at 650 K: it is too steep there, by what separates it from Frank, Fei & Hu 2004 (5.6 GPa at
 * 550 K, from memory), whose curve implies 1.2 to 2.0 kJ/kg/K.
 */
export function meltingPressureVII(temperature: number): number {
  const th = temperature / 355;
  return 2216e6 * Math.exp(1.73683 * (1 - 1 / th) - 0.0544606 * (1 - th ** 5) + 0.806106e-7 * (1 - th ** 22));
}
