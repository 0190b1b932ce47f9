import { parse as parseYaml } from "yaml";
import { z } from "zod";
import { InputError } from "../../errors.ts";
import { parseRecords, splitCells } from "./delimited.ts";
import { dialectOf } from "./dialect.ts";
import type { LineReader } from "./lineReader.ts";
import type { RawTable } from "./rawTable.ts";

const headerSchema = z.object({
  delimiter: z.enum([" ", ","]).default(" "),
  datatype: z
    .array(z.object({ name: z.coerce.string(), unit: z.string().optional(), description: z.string().optional() }))
    .min(1),
});

export const isEcsv = (head: string): boolean => /^# %ECSV\s+\d/.test(head);

/**
 * Enhanced character-separated values 1.0: a YAML header in comments, then a delimited table.
 * Source  Aldcroft 2015, Astropy Proposal for Enhancement 6 (APE 6)
 * Throws  `ecsv-version`, `ecsv-header`
 */
export async function readEcsv(lines: LineReader, file: string): Promise<RawTable> {
  const comments = await lines.takeWhile((line) => line.text.startsWith("#"));
  const version = /%ECSV\s+(\S+)/.exec(comments[0]?.text ?? "")?.[1] ?? "";
  if (!/^(?:0\.9|1\.\d+)$/.test(version)) throw wrongVersion(file, version);
  const header = readHeader(
    comments.map((line) => line.text.replace(/^# ?/, "")),
    file,
  );
  const format = "ecsv";
  const dialect = { ...dialectOf("comma-separated", header.delimiter), format } as const;
  const names = await lines.next();
  const found = names === undefined ? [] : splitCells(names.text, dialect);
  const expected = header.datatype.map((column) => column.name);
  if (found.join("\n") !== expected.join("\n")) throw namesDiffer(file, names?.number, expected, found);
  return { format, columns: header.datatype, batches: parseRecords(lines.rest(), dialect, file) };
}

function readHeader(lines: readonly string[], file: string): z.infer<typeof headerSchema> {
  const start = lines.findIndex((line) => line.trim() === "---");
  try {
    const text = lines.slice(start + 1).filter((line) => !line.startsWith("%"));
    return headerSchema.parse(parseYaml(text.join("\n"), { logLevel: "silent" }));
  } catch (cause) {
    const reason = cause instanceof z.ZodError ? z.prettifyError(cause) : cause instanceof Error ? cause.message : "";
    throw new InputError(
      "ecsv-header",
      `${file}: the YAML header of this ECSV file cannot be used: ${reason.slice(0, 500)}`,
      { file, line: 1 },
      { cause },
    );
  }
}

const wrongVersion = (file: string, version: string): InputError =>
  new InputError("ecsv-version", `${file}: ECSV version "${version}" is not known; this reader knows 0.9 and 1.x`, {
    file,
    line: 1,
    found: version,
  });

const namesDiffer = (file: string, line: number | undefined, expected: string[], found: string[]): InputError =>
  new InputError(
    "ecsv-header",
    `${file}${line === undefined ? "" : `, line ${line}`}: the column names ${found.slice(0, 20).join(", ") || "are missing and"} ` +
      `differ from those of the YAML header, ${expected.slice(0, 20).join(", ")}`,
    { file, line, found: found.join(" ") },
  );
