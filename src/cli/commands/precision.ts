import { type Command, InvalidArgumentError, Option } from "commander";
import type { PairLabels } from "../../inference/precision/statement.ts";
import type { CommandContext } from "../commandContext.ts";
import { explainLists } from "../explainColumns.ts";
import { familyNames, fractionFamily } from "../fractionFamilies.ts";
import { openLibrary } from "../libraryFolder.ts";
import { addListOptions, parseNames } from "../listOptions.ts";
import { listPrecision } from "../listPrecision.ts";
import { parsePercentages, parseSigmas, parseValueWithErrors, positiveNumber } from "../numberOptions.ts";
import { checkDestinations } from "../outputFile.ts";
import { planetListFile } from "../planetListFile.ts";
import { planetPrecision } from "../planetPrecision.ts";
import type { PrecisionOptions } from "../precisionRun.ts";
import { addResultOptions, destinations } from "../resultOptions.ts";

const example = `
Examples:
  bulkwright precision --mass-earth 5,0.5 --radius-earth 1.6,0.05 --between earth-like,water --html map.html
  bulkwright precision planets.csv --between silicate,earth-like --halve radius --out worth.csv`;

export function define(command: Command, context: CommandContext): void {
  addListOptions(addResultOptions(command))
    .argument("[list]", "planet list to rank; `-` reads standard input")
    .requiredOption("--between <a,b>", "the two compositions to tell apart", parsePair)
    .option("--mass-earth <value,error>", "of one planet: VALUE,ERROR or VALUE,MINUS,PLUS", parseValueWithErrors)
    .option(
      "--radius-earth <value,error>",
      "of one planet, likewise; one of the two may be left out",
      parseValueWithErrors,
    )
    .addOption(new Option("--sigma <levels>", "to reach").argParser(parseSigmas).default(parseSigmas("2,3,5"), "2,3,5"))
    .addOption(
      new Option("--family <name>", "whose fraction a measurement shall narrow")
        .choices(familyNames)
        .default(familyNames[0]),
    )
    .option("--library <folder>", "of your own compositions and materials")
    .option("--keep <columns>", "columns of the list to carry along, separated by commas", parseNames)
    .addOption(
      new Option("--halve <error>", "of a list: what to rank by; by default the better of mass and radius").choices([
        "mass",
        "radius",
        "both",
        "either",
      ]),
    )
    .option(
      "--proportion <number>",
      "of one planet: relative mass error over relative radius error when both improve; by default as now",
      positiveNumber,
    )
    .option("--html <file>", "of one planet: write a page with the map of errors there")
    .option("--mass-errors-percent <list>", "of that map: from:to:count or 1,2,5", parsePercentages)
    .option("--radius-errors-percent <list>", "of that map, likewise", parsePercentages)
    .addHelpText("after", example)
    .action(async (list: string | undefined) => {
      const options = command.optsWithGlobals<PrecisionOptions>();
      const problem = usageProblem(list, options);
      if (problem !== undefined) command.error(`error: ${problem}`);
      await precision(list, options, context);
    });
}

async function precision(list: string | undefined, options: PrecisionOptions, context: CommandContext): Promise<void> {
  const { library, inputs } = await openLibrary(options.library, context.io);
  const file = list === undefined ? undefined : await planetListFile(list, options, context.io);
  await checkDestinations(destinations(options), [...(file?.inputs ?? []), ...inputs]);
  if (file && options.explainColumns) return explainLists([file], options, context);
  const [first, second] = options.between;
  const run = {
    options,
    context,
    library,
    pair: [library.composition(first), library.composition(second)],
    family: fractionFamily(options.family, library),
  } as const;
  await (file === undefined ? planetPrecision(run) : listPrecision(file, run));
}

function usageProblem(list: string | undefined, options: PrecisionOptions): string | undefined {
  const isOnePlanet = options.massEarth !== undefined || options.radiusEarth !== undefined;
  if ((list !== undefined) === isOnePlanet)
    return "give either a list, or --mass-earth or --radius-earth of one planet";
  const { proportion, html, massErrorsPercent, radiusErrorsPercent, halve } = options;
  const ofOnePlanet = [proportion, html, massErrorsPercent, radiusErrorsPercent];
  if (!isOnePlanet && ofOnePlanet.some((value) => value !== undefined)) {
    return "--proportion, --html and the errors of its map are for one planet: give --mass-earth and --radius-earth";
  }
  return isOnePlanet && halve !== undefined ? "--halve ranks a list; for one planet all halvings are shown" : undefined;
}

function parsePair(text: string): PairLabels {
  const [first, second, ...more] = parseNames(text);
  if (second === undefined || more.length > 0 || first === second) {
    throw new InvalidArgumentError("Give two different compositions.");
  }
  return [first, second];
}
