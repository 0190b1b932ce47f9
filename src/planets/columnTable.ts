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
    words: "temperature temp t teff",
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
    words: "age",
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
  rad: ["radius", "starRadius"],
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
