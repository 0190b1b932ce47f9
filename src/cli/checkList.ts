import { checkRows } from "../crosscheck/checkRows.ts";
import { choosePublications } from "../crosscheck/choosePublication.ts";
import type { Severity } from "../crosscheck/finding.ts";
import { findingColumns, findingRecord } from "../crosscheck/findingRecord.ts";
import { countFindings, type RuleCount } from "../crosscheck/runRules.ts";
import { InputError } from "../errors.ts";
import { findingsPage, severities } from "../figures/findingsPage.ts";
import type { Library } from "../library/library.ts";
import type { PlanetList } from "../planets/readPlanetList.ts";
import type { CommandContext } from "./commandContext.ts";
import type { CrosscheckOptions } from "./crosscheckOptions.ts";
import { allOf } from "./interruptible.ts";
import { writeOutputFile } from "./outputFile.ts";
import { physicalLimits } from "./physicalLimits.ts";
import { openPlanetList, type PlanetListFile } from "./planetListFile.ts";
import { provenanceOf, reproducingCommand } from "./provenance.ts";
import { recordCells } from "./recordTable.ts";
import { emitTable, summarise, tell } from "./resultOptions.ts";
import { chosenRules } from "./ruleOptions.ts";
import { textTable } from "./textTable.ts";
import { version } from "./version.ts";

/** Holds one list to the rules. Throws InputError `fail-on` at the end where the user asked for that. */
export async function checkList(
  file: PlanetListFile,
  library: Library,
  options: CrosscheckOptions,
  { io, args }: CommandContext,
): Promise<void> {
  const earthRadius = options.earthRadiusKm;
  const list = await openPlanetList(file, io);
  const notes = [...library.notes, ...list.notes];
  tell(notes, options, io);

  const iron = library.composition("iron");
  const rules = chosenRules(options);
  const { rows, choices } = await chosenRows(list, options);
  const { findings, rowCount } = await checkRows(rows, physicalLimits(iron), rules);
  const records = findings.map((finding) => findingRecord(finding, earthRadius.value));
  const counts = countFindings(findings);

  const table = {
    columns: [...findingColumns, ...(choices ? ["choice"] : [])],
    rows: records.map((record) => [
      ...recordCells(record, findingColumns),
      ...(choices ? [choices.get(Number(record.row))] : []),
    ]),
  };
  const version1 = `columns of findings, version 1; ${rowCount} rows checked`;
  const provenance = provenanceOf({ args, earthRadius, compositions: [iron], notes: [...notes, version1] });
  await emitTable(table, provenance, options, io);
  if (options.html !== undefined) {
    const made = {
      version,
      earthRadius: `1 Earth radius = ${earthRadius.value / 1e3} km`,
      command: reproducingCommand(args),
    };
    const page = { list: list.file, rowCount, records, counts, rules, notes, made };
    await writeOutputFile(options.html, await findingsPage(page));
  }
  summarise(summary(list.file, rowCount, counts), options, io);
  failIfAsked(counts, options);
}

/** All rows as they come or, if the user wants one publication a planet, the chosen ones and how they were. */
async function chosenRows({ rows }: PlanetList, { choose }: CrosscheckOptions) {
  if (choose === undefined) return { rows };
  const chosen = choosePublications(await allOf(rows), choose);
  return {
    rows: chosen.map(({ row }) => row),
    choices: new Map(chosen.map(({ row, choice }) => [row.row, choice])),
  };
}

function summary(file: string, rowCount: number, counts: readonly RuleCount[]): string {
  const total = counts.reduce((sum, { count }) => sum + count, 0);
  const head = `${file}: ${total} findings in ${rowCount} rows\n`;
  if (total === 0) return head;
  return (
    head +
    textTable(
      ["severity", "count", "rule"],
      counts.map(({ severity, count, rule }) => [severity, count, rule]),
    )
  );
}

function failIfAsked(counts: readonly RuleCount[], { failOn }: CrosscheckOptions): void {
  if (failOn === undefined) return;
  const grave: readonly Severity[] = severities.slice(0, severities.indexOf(failOn) + 1);
  const found = counts.filter(({ severity }) => grave.includes(severity)).reduce((sum, { count }) => sum + count, 0);
  if (found === 0) return;
  throw new InputError(
    "fail-on",
    `${found} findings of severity ${grave.join(" or ")}, and --fail-on ${failOn} was asked.`,
  );
}
