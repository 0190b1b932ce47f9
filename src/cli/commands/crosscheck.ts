import { type Command, Option } from "commander";
import { publicationRules } from "../../crosscheck/choosePublication.ts";
import type { QuantityName } from "../../planets/quantity.ts";
import { checkList } from "../checkList.ts";
import type { CommandContext } from "../commandContext.ts";
import { compareWithLists } from "../compareWithLists.ts";
import type { CrosscheckOptions } from "../crosscheckOptions.ts";
import { explainLists } from "../explainColumns.ts";
import { openLibrary } from "../libraryFolder.ts";
import { addListOptions } from "../listOptions.ts";
import { checkDestinations } from "../outputFile.ts";
import { type PlanetListFile, planetListFile } from "../planetListFile.ts";
import { addResultOptions, destinations } from "../resultOptions.ts";
import { addRuleOptions } from "../ruleOptions.ts";

const example = `
--column and --unit speak of LIST; a file LIST.columns.json beside any of the lists says the same of it.

Examples:
  bulkwright crosscheck planets.csv --out findings.csv --html findings.html
  bulkwright crosscheck planets.csv other.csv --out pairs.csv`;

/** A list without any of these cannot be checked or compared. */
const needed: readonly QuantityName[] = ["mass", "minimumMass", "radius", "density", "period", "semiMajorAxis"];

export function define(command: Command, context: CommandContext): void {
  addRuleOptions(addListOptions(addResultOptions(command)))
    .argument("<list>", "planet list; `-` reads standard input")
    .argument("[other...]", "lists to match it with, one after another")
    .addOption(
      new Option(
        "--choose <rule>",
        "one publication a planet, by this rule; when lists are matched `preferred`, else all are checked",
      ).choices(publicationRules),
    )
    .option("--aliases <file>", "CSV of name,alias: further names of planets")
    .option("--library <folder>", "of your own compositions and materials")
    .option("--html <file>", "write a page with the same table, to sort and filter, there")
    .addHelpText("after", example)
    .action(async (list: string, others: readonly string[]) => {
      const options = command.optsWithGlobals<CrosscheckOptions>();
      const problem = misuse([list, ...others], options);
      if (problem !== undefined) command.error(`error: ${problem}`);
      await crosscheck(list, others, options, context);
    });
}

function misuse(lists: readonly string[], { aliases, rules, ignore, failOn }: CrosscheckOptions): string | undefined {
  if (lists.filter((list) => list === "-").length > 1) return "only one list can be read from standard input";
  if (lists.length === 1) return aliases && "--aliases is for lists to match; give another list";
  return (rules || ignore || failOn) && "--rules, --ignore and --fail-on are for one list; leave the others out";
}

async function crosscheck(
  list: string,
  others: readonly string[],
  options: CrosscheckOptions,
  context: CommandContext,
): Promise<void> {
  const { library, inputs } = await openLibrary(options.library, context.io);
  const files: PlanetListFile[] = [await planetListFile(list, options, context.io, needed)];
  const { column: _, unit: __, ...withoutChoices } = options;
  for (const other of others) files.push(await planetListFile(other, withoutChoices, context.io, needed));
  const read = [...inputs, ...files.flatMap((file) => file.inputs), ...(options.aliases ? [options.aliases] : [])];
  await checkDestinations(destinations(options), read);
  if (options.explainColumns) await explainLists(files, options, context);
  else if (others.length === 0) await checkList(files[0], library, options, context);
  else await compareWithLists(files, library, options, context);
}
