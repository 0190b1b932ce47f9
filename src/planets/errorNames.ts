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
  { side: "both", prefix: "delta_" },
  { side: "both", prefix: "σ" },
  { side: "both", prefix: "δ" },
  { side: "both", prefix: "Δ" },
  { side: "both", prefix: "∆" },
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
