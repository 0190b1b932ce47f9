import { InputError } from "../../errors.ts";

export const malformed = (file: string, line: number, cause: Error): InputError =>
  new InputError(
    "xml-malformed",
    `${file}, line ${line}: not well-formed XML: ${cause.message.replace(/^\d+:\d+: /, "")}`,
    { file, line },
    { cause },
  );

export const noTable = (file: string): InputError =>
  new InputError("votable-no-table", `${file}: this XML file holds no VOTable table with fields`, { file });

/** Archives answer a failed query with a well-formed VOTable that says so. */
export const failedQuery = (file: string, found: string): InputError =>
  new InputError("votable-query-failed", `${file}: the archive answered with an error instead of a table: ${found}`, {
    file,
    found,
  });

export const externalData = (file: string, line: number, what: string): InputError =>
  new InputError(
    "votable-external-data",
    `${file}, line ${line}: ${what}, which is not read; save the table with its data as TABLEDATA`,
    { file, line },
  );

export const unreadable = (file: string, line: number, what: "field" | "data", cause: unknown): InputError =>
  new InputError(
    `votable-${what}`,
    `${file}, line ${line}: the ${what} cannot be read: ${cause instanceof Error ? cause.message : ""}`,
    { file, line },
    { cause },
  );

export const textTooLong = (file: string, line: number, limit: number): InputError =>
  new InputError("line-too-long", `${file}, line ${line}: a cell is longer than the limit of ${limit} characters`, {
    file,
    line,
  });
