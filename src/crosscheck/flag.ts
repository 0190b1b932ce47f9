/** Whether a yes-or-no cell says yes. */
export const isSet = (flag: string | undefined): boolean => /^\s*(1|true|yes|y)\s*$/i.test(flag ?? "");
