import { execFileSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join, resolve } from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";

let folder: string;

const inFolder = (command: string, ...args: string[]) => execFileSync(command, args, { cwd: folder, encoding: "utf8" });

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "bulkwright-package-"));
  const pack = ["pack", "--silent", "--ignore-scripts", "--pack-destination", folder];
  const tarball = execFileSync("npm", pack, { encoding: "utf8" }).trim();
  writeFileSync(join(folder, "package.json"), '{ "type": "module" }\n');
  // Offline, since nothing but the tarball may be needed.
  inFolder("npm", "install", "--offline", "--no-audit", "--no-fund", join(folder, tarball));
}, 120_000);

afterAll(() => rmSync(folder, { recursive: true, force: true }));

test("the installed command computes a curve of a shipped composition", () => {
  const output = inFolder("npx", "--offline", "bulkwright", "curve", "earth-like", "--masses", "1,2");
  const rows = output.split("\n").filter((line) => line.startsWith("earth-like,"));
  expect(rows).toHaveLength(2);
});

test("the installed library works where there is no Node, as in a web page", () => {
  const program = `
    delete globalThis.Buffer;
    const print = console.log;
    delete globalThis.process;
    const { EARTH_MASS, loadLibrary, readPlanetList, shippedFiles, solvePlanet } = await import("bulkwright");
    const planet = solvePlanet(loadLibrary(shippedFiles).composition("earth-like"), EARTH_MASS);
    async function* chunks() { yield new TextEncoder().encode("name,mass_earth\\nInvented b,5\\n"); }
    const list = await readPlanetList(chunks(), { file: "list.csv", earthRadius: 6.3781e6 });
    for await (const row of list.rows) print(row.name, planet.radius);
  `;
  writeFileSync(join(folder, "use.js"), program);
  const [name, radius] = inFolder(process.execPath, "use.js").split(/(?<=b) /);
  expect(name).toBe("Invented b");
  expect(Number(radius)).toBeGreaterThan(6.2e6);
});

test("its types stand on their own", () => {
  writeFileSync(
    join(folder, "use.ts"),
    'import { solvePlanet } from "bulkwright";\nexport const solve = solvePlanet;\n',
  );
  const compiler = resolve("node_modules/typescript/bin/tsc");
  const strict = [
    "--strict",
    "--noEmit",
    "--module",
    "nodenext",
    "--target",
    "es2023",
    "--lib",
    "es2023,dom,dom.iterable,dom.asynciterable",
  ];
  inFolder(process.execPath, compiler, ...strict, "--types", "", "use.ts");
});

test("it ships the compositions, the documents and the licences of what is bundled", () => {
  const shipped = inFolder("find", "node_modules/bulkwright", "-maxdepth", "2");
  for (const name of ["README.md", "LICENSE", "CHANGELOG.md", "CITATION.cff", "compositions/materials", "dist/cli"]) {
    expect(shipped).toContain(name);
  }
  const licences = readFileSync(join(folder, "node_modules/bulkwright/dist/THIRD-PARTY-LICENSES.txt"), "utf8");
  for (const name of ["commander", "csv-parse", "plotly.js-dist", "zod"]) expect(licences).toContain(`\n${name} `);
});
