import { readdirSync, readFileSync } from "node:fs";
import { expect, test } from "vitest";

const unitSuffix = /(KgM3|PerGPa|GPa|MPaPerK|Pa|K|Earth|Gyr|SI|KgJ|JKgK2?)$/;
const dimensionless = [
  ...["massFraction", "order", "exponent", "bulkModulusPrime", "bulkModulusPrimeInfinite"],
  ...["gammaZero", "gammaInfinity", "beta", "q", "qZero", "gammaExponent"],
  ...["nickel", "sulphur", "silicon", "oxygen", "densityDeficit", "ironMoleFraction"],
  ...["magnesiumToSilicon", "ironNumber"],
];

const files = ["compositions", "compositions/materials", "compositions/families"].flatMap((folder) =>
  readdirSync(folder)
    .filter((name) => name.endsWith(".json"))
    .map((name) => `${folder}/${name}`),
);

test("there are files to look at", () => {
  expect(files.length).toBeGreaterThan(10);
});

test.each(files)("every number in %s has its unit in its key", (file) => {
  const unnamed = numericKeys(JSON.parse(readFileSync(file, "utf8"))).filter(
    (key) => !unitSuffix.test(key) && !dimensionless.includes(key),
  );
  expect(unnamed).toEqual([]);
});

function numericKeys(value: unknown): string[] {
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => (typeof inner === "number" ? [key] : numericKeys(inner)));
}
