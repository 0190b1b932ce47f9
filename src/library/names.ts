import * as z from "zod";

/** Names stand in file names, CSV cells and comma-separated options. */
export const nameSchema = z.string().regex(/^[A-Za-z0-9][A-Za-z0-9._-]*$/, {
  error: "a name is made of letters, digits, dots, hyphens and underscores.",
});

export const textSchema = z.string().min(1);
