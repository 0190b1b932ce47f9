import { readdirSync, readFileSync } from "node:fs";
import { builtinModules } from "node:module";
import { join, posix } from "node:path";
import { describe, expect, test } from "vitest";

/** From low to high; a file may import from its own layer and from lower ones. */
const layers = [
  "errors",
  "units",
  "numerics",
  "eos",
  "mineralogy",
  "library",
  "envelope",
  "interior",
  "curve",
  "planets",
  "inference",
  "crosscheck",
  "figures",
  "demo",
  "cli",
];

interface SourceFile {
  /** Relative to src, with forward slashes. */
  readonly path: string;
  readonly text: string;
  /** Module names as written. */
  readonly imports: readonly string[];
}

const files = sourceFiles();

describe("source files", () => {
  test("are found", () => {
    expect(files.map(({ path }) => path)).toContain("cli/main.ts");
  });

  test("belong to a known layer", () => {
    expect(files.map(({ path }) => layerOf(path)).filter((layer) => ![...layers, "index"].includes(layer))).toEqual([]);
  });

  test("import from their own layer or lower ones only", () => {
    const upward = importPairs().filter(([from, to]) => rank(to) > rank(from));
    expect(upward.map(arrow)).toEqual([]);
  });

  test("of planets import errors and units only", () => {
    const pairs = importPairs().filter(([from]) => layerOf(from) === "planets");
    expect(pairs.filter(([, to]) => !["errors", "units", "planets"].includes(layerOf(to))).map(arrow)).toEqual([]);
  });

  test("do not import each other in a cycle", () => {
    expect(findCycle(new Map(files.map(({ path }) => [path, localImports(path)])))).toBeUndefined();
  });

  test("outside cli leave Node, the process and the console alone", () => {
    const offenders = files.filter(({ path }) => layerOf(path) !== "cli");
    const touching = offenders.flatMap(({ path, text, imports }) => [
      ...imports.filter(isNodeModule).map((name) => `${path} imports ${name}`),
      ...[...withoutComments(text).matchAll(/\b(process|console|Buffer|__dirname)\b\s*[.[(]/g)].map(
        ([use]) => `${path} uses ${use}`,
      ),
    ]);
    expect(touching).toEqual([]);
  });

  test("have named exports only", () => {
    const offenders = files.filter(({ text }) => /^export\s+default\b|\bas\s+default\b/m.test(withoutComments(text)));
    expect(offenders.map(({ path }) => path)).toEqual([]);
  });

  test("hold at most 300 lines", () => {
    const long = files.filter(({ path, text }) => !path.endsWith(".generated.ts") && text.split("\n").length > 301);
    expect(long.map(({ path }) => path)).toEqual([]);
  });
});

test("the cycle finder finds a cycle", () => {
  const ring = new Map([
    ["a", ["b"]],
    ["b", ["c"]],
    ["c", ["b"]],
  ]);
  expect(findCycle(ring)).toEqual(["b", "c", "b"]);
});

function sourceFiles(): SourceFile[] {
  const names = readdirSync("src", { recursive: true, encoding: "utf8" }).filter((name) => name.endsWith(".ts"));
  return names.sort().map((name) => {
    const text = readFileSync(join("src", name), "utf8");
    return { path: name.replaceAll("\\", "/"), text, imports: importsOf(text) };
  });
}

function importsOf(text: string): string[] {
  const statement = /^(?:import|export)\b[^;"']*?\bfrom\s*"([^"]+)"|^import\s*"([^"]+)"|\bimport\(\s*"([^"]+)"\s*\)/gm;
  return [...withoutComments(text).matchAll(statement)].map((match) => match[1] ?? match[2] ?? match[3]);
}

function withoutComments(text: string): string {
  return text.replace(/\/\*[\s\S]*?\*\/|(?<=^|\s)\/\/.*$/gm, "");
}

/** Files of src that `path` imports, relative to src. */
function localImports(path: string): string[] {
  const relative = files.find((file) => file.path === path)?.imports.filter((name) => name.startsWith(".")) ?? [];
  const resolved = relative.map((name) => posix.join(posix.dirname(path), name));
  return resolved.filter((name) => !name.startsWith(".."));
}

function importPairs(): [string, string][] {
  return files.flatMap(({ path }) => localImports(path).map((to): [string, string] => [path, to]));
}

function layerOf(path: string): string {
  return path.split("/")[0].replace(/\.ts$/, "");
}

/** index.ts names the public API: above all layers but cli. */
function rank(path: string): number {
  const layer = layerOf(path);
  return layer === "index" ? layers.indexOf("cli") - 0.5 : layers.indexOf(layer);
}

function isNodeModule(name: string): boolean {
  return name.startsWith("node:") || builtinModules.includes(name);
}

function arrow([from, to]: [string, string]): string {
  return `${from} → ${to}`;
}

/** The first cycle met, as a path that ends where it began. */
function findCycle(graph: ReadonlyMap<string, readonly string[]>): string[] | undefined {
  const finished = new Set<string>();
  const visit = (node: string, path: readonly string[]): string[] | undefined => {
    if (path.includes(node)) return [...path.slice(path.indexOf(node)), node];
    if (finished.has(node)) return undefined;
    for (const next of graph.get(node) ?? []) {
      const cycle = visit(next, [...path, node]);
      if (cycle) return cycle;
    }
    finished.add(node);
    return undefined;
  };
  for (const node of graph.keys()) {
    const cycle = visit(node, []);
    if (cycle) return cycle;
  }
  return undefined;
}
