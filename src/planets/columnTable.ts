import type { QuantityName, TextName } from "./quantity.ts";
import type { Dimension } from "./unitTable.ts";

/**
 * Which column names mean what. Adding a name is adding a word here; nothing else in the reader knows any name.
 * Names are compared as keys: lower case, everything but letters and digits one underscore (`columnKey`).
 */
export interface QuantityColumns {
  /** Our own column name without its unit; with `ownUnit` it is what `--column` takes and what we write. */
  readonly ownName: string;
  readonly ownUnit: string;
  readonly title: string;
  readonly dimension: Dimension;
  /** The unit where nothing states one, because lists use no other. Without it the unit must be known. */
  readonly usualUnit?: string;
  /** `mass` also stands for `planet_mass`, `pl_mass`, `mass_p`; a star's for `star_mass`, `st_mass`, `mass_star`. */
  readonly body: "planet" | "star";
  /** Words that need the body beside them, because alone they could mean the other body. */
  readonly words?: string;
  /** Names that mean this quantity as they stand. */
  readonly names: string;
  /** Names that carry a unit of their own, by that unit. */
  readonly unitNames?: Readonly<Record<string, string>>;
  /** Groups of one archive's names for nearly the same thing: where several are present the first group is used. */
  readonly preference?: readonly string[];
}

export const quantityColumns: Readonly<Record<QuantityName, QuantityColumns>> = {
  mass: {
    ownName: "mass",
    ownUnit: "earth",
    title: "planet mass",
    dimension: "mass",
    body: "planet",
    words: "m",
    names: "mass mp mpl true_mass bmass best_mass",
    unitNames: {
      earth: "pl_bmasse pl_masse pl_cmasse",
      jupiter: "pl_bmassj pl_massj pl_cmassj",
    },
    preference: ["pl_bmasse pl_bmassj", "pl_masse pl_massj", "pl_cmasse pl_cmassj"],
  },
  minimumMass: {
    ownName: "minimum_mass",
    ownUnit: "earth",
    title: "minimum mass (M sin i)",
    dimension: "mass",
    body: "planet",
    names: "minimum_mass min_mass msini m_sini m_sin_i mpsini mass_sini mass_sin_i",
    unitNames: { earth: "pl_msinie", jupiter: "pl_msinij" },
  },
  radius: {
    ownName: "radius",
    ownUnit: "earth",
    title: "planet radius",
    dimension: "length",
    body: "planet",
    words: "r rad",
    names: "radius rp rpl",
    unitNames: { earth: "pl_rade koi_prad", jupiter: "pl_radj" },
  },
  density: {
    ownName: "density",
    ownUnit: "kg_m3",
    title: "bulk density",
    dimension: "density",
    usualUnit: "g-cm3",
    body: "planet",
    words: "dens",
    names: "density bulk_density mean_density rho rhop",
  },
  period: {
    ownName: "period",
    ownUnit: "days",
    title: "orbital period",
    dimension: "time",
    usualUnit: "day",
    body: "planet",
    words: "orbper p",
    names: "period orbital_period orb_period per p porb p_orb koi_period toi_period",
  },
  semiMajorAxis: {
    ownName: "semi_major_axis",
    ownUnit: "au",
    title: "semi-major axis",
    dimension: "length",
    usualUnit: "au",
    body: "planet",
    words: "orbsmax smax",
    names: "semi_major_axis semimajor_axis semimajoraxis sma smax axis a koi_sma",
  },
  eccentricity: {
    ownName: "eccentricity",
    ownUnit: "",
    title: "eccentricity",
    dimension: "ratio",
    usualUnit: "1",
    body: "planet",
    words: "orbeccen eccen",
    names: "eccentricity ecc e koi_eccen",
  },
  inclination: {
    ownName: "inclination",
    ownUnit: "deg",
    title: "inclination",
    dimension: "angle",
    usualUnit: "deg",
    body: "planet",
    words: "orbincl incl",
    names: "inclination inc incl i koi_incl",
  },
  equilibriumTemperature: {
    ownName: "equilibrium_temperature",
    ownUnit: "k",
    title: "equilibrium temperature",
    dimension: "temperature",
    usualUnit: "k",
    body: "planet",
    words: "eqt temperature temp",
    names: "equilibrium_temperature eq_temperature equilibrium_temp teq t_eq temp_calculated koi_teq",
  },
  insolation: {
    ownName: "insolation",
    ownUnit: "earth",
    title: "insolation",
    dimension: "irradiance",
    usualUnit: "earth",
    body: "planet",
    words: "insol flux",
    names: "insolation insol insolation_flux incident_flux stellar_flux seff s_eff koi_insol",
  },
  surfaceGravity: {
    ownName: "surface_gravity",
    ownUnit: "m_s2",
    title: "surface gravity of the planet",
    dimension: "acceleration",
    usualUnit: "m-s2",
    body: "planet",
    words: "g",
    names: "surface_gravity gravity",
    unitNames: { "log-cgs": "pl_logg planet_logg planet_log_g" },
  },
  radiusRatio: {
    ownName: "radius_ratio",
    ownUnit: "",
    title: "planet radius over stellar radius",
    dimension: "ratio",
    usualUnit: "1",
    body: "planet",
    words: "ratror",
    names: "radius_ratio rp_rs rprs rp_rstar rp_r_star r_p_r_s r_p_r_star rp_over_rs ror rr koi_ror",
  },
  scaledAxis: {
    ownName: "scaled_axis",
    ownUnit: "",
    title: "semi-major axis over stellar radius",
    dimension: "ratio",
    usualUnit: "1",
    body: "planet",
    words: "ratdor",
    names: "scaled_axis a_rs ars a_rstar a_r_star a_r_s a_over_rs aor dor ar koi_dor",
  },
  velocityAmplitude: {
    ownName: "velocity_amplitude",
    ownUnit: "m_s",
    title: "radial-velocity semi-amplitude",
    dimension: "speed",
    usualUnit: "m-s",
    body: "planet",
    words: "rvamp",
    names: "velocity_amplitude rv_amplitude rv_semi_amplitude semi_amplitude rvamp k k_rv",
  },
  starMass: {
    ownName: "star_mass",
    ownUnit: "sun",
    title: "stellar mass",
    dimension: "mass",
    usualUnit: "sun",
    body: "star",
    words: "mass m",
    names: "ms mstar mass_star koi_smass",
  },
  starRadius: {
    ownName: "star_radius",
    ownUnit: "sun",
    title: "stellar radius",
    dimension: "length",
    usualUnit: "sun",
    body: "star",
    words: "radius rad r",
    names: "rs rstar koi_srad",
  },
  starTemperature: {
    ownName: "star_temperature",
    ownUnit: "k",
    title: "stellar effective temperature",
    dimension: "temperature",
    usualUnit: "k",
    body: "star",
    words: "temperature temp t",
    names: "teff t_eff effective_temperature effective_temp koi_steff",
  },
  starDensity: {
    ownName: "star_density",
    ownUnit: "kg_m3",
    title: "stellar density",
    dimension: "density",
    usualUnit: "g-cm3",
    body: "star",
    words: "density dens rho",
    names: "rhostar koi_srho",
  },
  starSurfaceGravity: {
    ownName: "star_surface_gravity",
    ownUnit: "m_s2",
    title: "surface gravity of the star",
    dimension: "acceleration",
    usualUnit: "log-cgs",
    body: "star",
    words: "surface_gravity gravity logg log_g",
    names: "logg log_g koi_slogg",
  },
  starMetallicity: {
    ownName: "star_metallicity",
    ownUnit: "dex",
    title: "stellar metallicity",
    dimension: "metallicity",
    usualUnit: "dex",
    body: "star",
    words: "met",
    names: "metallicity fe_h feh m_h fe koi_smet",
  },
  starAge: {
    ownName: "star_age",
    ownUnit: "gyr",
    title: "stellar age",
    dimension: "time",
    usualUnit: "gyr",
    body: "star",
    names: "age koi_sage",
  },
  rightAscension: {
    ownName: "right_ascension",
    ownUnit: "deg",
    title: "right ascension",
    dimension: "angle",
    usualUnit: "deg",
    body: "star",
    names: "right_ascension ra radeg ra_deg ra_j2000 raj2000",
  },
  declination: {
    ownName: "declination",
    ownUnit: "deg",
    title: "declination",
    dimension: "angle",
    usualUnit: "deg",
    body: "star",
    names: "declination dec decl dedeg dec_deg dec_j2000 dej2000",
  },
};

/** Names of text columns, the surest first: where several are present the first of the list is used. */
export const textColumns: Readonly<Record<TextName, string>> = {
  name: "name pl_name planet_name planet planetname planet_identifier p_name exoplanet kepler_name object id system toi kepoi_name",
  host: "host hostname pl_hostname host_name star_name star starname host_star s_name",
  letter: "letter pl_letter planet_letter",
  aliases: "aliases alternate_names alternative_names other_names alt_names",
  status: "status planet_status disposition pl_status soltype koi_disposition tfopwg_disp",
  controversial: "controversial pl_controv_flag controversial_flag",
  massProvenance: "mass_provenance pl_bmassprov mass_prov mass_detection_type mass_measurement_type",
  radiusProvenance: "radius_provenance pl_radprov radius_detection_type radius_measurement_type",
  reference: "reference pl_refname ref refname bibcode recent_reference citation source paper discovery_reference",
  publicationDate: "publication_date pl_pubdate pubdate releasedate updated rowupdate",
  discoveryMethod: "discovery_method discoverymethod pl_discmethod detection_type detection_method method",
  preferred: "preferred default_flag default is_default",
};

/** Names that two quantities answer to; they are never guessed. */
export const ambiguousNames: Readonly<Record<string, readonly QuantityName[]>> = {
  m: ["mass", "starMass"],
  r: ["radius", "starRadius"],
  t: ["equilibriumTemperature", "starTemperature"],
  temp: ["equilibriumTemperature", "starTemperature"],
  temperature: ["equilibriumTemperature", "starTemperature"],
};

/** Prefixes of older tables whose names are otherwise those of newer ones. */
export const prefixRenames: Readonly<Record<string, string>> = {
  fpl_: "pl_",
  fst_: "st_",
  mpl_: "pl_",
  mst_: "st_",
  p_: "planet_",
  s_: "star_",
};

/** A published list whose documentation gives units that its header leaves out, known by the columns it has. */
export interface KnownList {
  readonly title: string;
  /** All of these keys must be present. */
  readonly signature: string;
  readonly units: Readonly<Partial<Record<QuantityName, string>>>;
  /** Columns that mean something else here than in general. */
  readonly names?: Readonly<Record<string, QuantityName>>;
}

const jupiterUnits = { mass: "jupiter", minimumMass: "jupiter", radius: "jupiter" } as const;

/** Units from the lists' own documentation pages, from memory. */
export const knownLists: readonly KnownList[] = [
  {
    title: "the exoplanet.eu catalogue",
    signature: "name mass mass_error_min mass_error_max radius orbital_period semi_major_axis star_name star_mass",
    units: { ...jupiterUnits, surfaceGravity: "log-cgs" },
    names: { log_g: "surfaceGravity" },
  },
  {
    title: "the catalogue of transiting systems (TEPCat)",
    signature: "system m_a r_a m_b r_b g_b rho_b",
    units: { ...jupiterUnits, density: "jupiter", starDensity: "sun" },
    names: {
      m_a: "starMass",
      r_a: "starRadius",
      logga: "starSurfaceGravity",
      rho_a: "starDensity",
      m_b: "mass",
      r_b: "radius",
      g_b: "surfaceGravity",
      rho_b: "density",
    },
  },
  {
    title: "the exoplanets.org table",
    signature: "name mass msini umass mstar per",
    units: { ...jupiterUnits, surfaceGravity: "log-cgs" },
    names: { r: "radius" },
  },
  {
    title: "the habitable-exoplanets catalogue",
    signature: "p_name p_mass p_radius p_period s_mass",
    units: { mass: "earth", radius: "earth" },
  },
];

export type ErrorSide = "minus" | "plus" | "both";

/** How a column of errors is named after the column of values it belongs to, by suffix of its key. */
export const errorSuffixes: Readonly<Record<ErrorSide, string>> = {
  plus:
    "err1 _err1 _plus _error_max _err_max _max_err _err_up _errup _erru _uerr _err_upper _upper_err _error_upper " +
    "_upper_error _upper_unc _unc_upper _uncertainty_upper _upper_uncertainty _err_plus _error_plus _plus_err _ep _eu " +
    "_err_hi _hi_err _err_high _err_pos _pos_err _sigma_plus _sigma_upper _error_1",
  minus:
    "err2 _err2 _minus _error_min _err_min _min_err _err_dn _errdn _errd _err_down _errdown _lerr _err_lower _lower_err " +
    "_error_lower _lower_error _lower_unc _unc_lower _uncertainty_lower _lower_uncertainty _err_minus _error_minus " +
    "_minus_err _em _el _err_lo _lo_err _err_low _err_neg _neg_err _sigma_minus _sigma_lower _error_2",
  both: "_err err _error _sigma _unc _uncertainty _std _pm",
};

/**
 * The same by prefix of the name as written. Capital `E_` beside small `e_` is the upper error beside the lower one in
 * CDS tables (standard 3.2 of the catalogues' description); `e_` alone is both.
 */
export const errorPrefixes: readonly { readonly side: ErrorSide; readonly prefix: string }[] = [
  { side: "plus", prefix: "E_" },
  { side: "both", prefix: "e_" },
  { side: "both", prefix: "err_" },
  { side: "both", prefix: "sigma_" },
  { side: "both", prefix: "u" },
  { side: "both", prefix: "U" },
];

/** Columns that give either an error or the bound itself, which only the values can tell. */
export const boundSuffixes = {
  minus: "_lower lower _low _lo _min _p16 _16",
  plus: "_upper upper _high _hi _max _p84 _84",
} as const;

/** Names that mean nothing by themselves: they belong to the value column before them, in this order. */
export const positionalErrors: Readonly<Record<ErrorSide, string>> = {
  both: "err error unc uncertainty sigma",
  plus: "errup erru err_up err_plus err_hi plus upper",
  minus: "errdn errd errdown err_down err_minus err_lo minus lower",
};

/** How a column of limit flags is named after the column of values. */
export const limitSuffixes = "lim _lim _limit _limit_flag _lim_flag _limitflag";
export const limitPrefixes = "l_";
