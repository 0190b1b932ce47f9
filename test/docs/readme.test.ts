import { spawnSync } from "node:child_process";
import { mkdirSync, mkdtempSync, readFileSync, rmSync, symlinkSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { delimiter, dirname, join, resolve } from "node:path";
import { afterAll, describe, expect, test } from "vitest";
import { commands } from "../../src/cli/commands.ts";

/** A fenced block: what stands after the fence, and its text. */
interface Block {
  readonly info: string;
  readonly text: string;
}

interface Session {
  readonly command: string;
  readonly output: string;
}

const blocks = fencedBlocks(readFileSync("README.md", "utf8"));
const sessions = blocks.filter(({ info }) => info === "console").flatMap(({ text }) => sessionsOf(text));

// All sessions share a folder, as they would for a reader who follows the page.
const folder = mkdtempSync(join(tmpdir(), "bulkwright-readme-"));
symlinkSync(resolve("dist/cli/main.js"), join(folder, "bulkwright"));
for (const { info, text } of blocks) {
  const file = /^\w+ file=(\S+)$/.exec(info)?.[1];
  if (!file) continue;
  mkdirSync(dirname(join(folder, file)), { recursive: true });
  writeFileSync(join(folder, file), text);
}
afterAll(() => rmSync(folder, { recursive: true }));

describe("README", () => {
  test.each(sessions)("`$command` prints what the page shows", ({ command, output }) => {
    expect(printed(command)).toMatch(pattern(output));
  });

  test.each(commands)("has a session of `bulkwright $name`", ({ name }) => {
    expect(sessions.some(({ command }) => command.includes(`bulkwright ${name}`))).toBe(true);
  });

  test("names npm scripts that exist", () => {
    const { scripts } = JSON.parse(readFileSync("package.json", "utf8"));
    const shell = blocks.filter(({ info }) => info === "sh").map(({ text }) => text);
    const named = shell.flatMap((text) => [...text.matchAll(/^npm (?:run )?(\w+)/gm)].map((match) => match[1]));
    expect(named).toContain("start");
    expect(named.filter((name) => !(name in scripts) && name !== "install")).toEqual([]);
  });
});

function printed(command: string): string {
  const env = { ...process.env, PATH: `${folder}${delimiter}${process.env.PATH}`, NO_COLOR: "1" };
  // Errors are part of what a reader sees.
  const { stdout } = spawnSync("bash", ["-c", `{ ${command}\n} 2>&1`], { cwd: folder, env, encoding: "utf8" });
  return stdout.trimEnd();
}

/** Matches the shown output, with `…` alone on a line for any lines left out. */
function pattern(output: string): RegExp {
  const parts = output.split(/^…$/m).map((part) => part.replace(/[.*+?^${}()|[\]\\]/g, "\\$&"));
  return new RegExp(`^${parts.join("[\\s\\S]*?")}$`);
}

function sessionsOf(text: string): Session[] {
  return text
    .split(/^\$ /m)
    .slice(1)
    .map((session) => {
      const [command, ...output] = session.split("\n");
      return { command, output: output.join("\n").trimEnd() };
    });
}

function fencedBlocks(markdown: string): Block[] {
  return [...markdown.matchAll(/^```([^\n]*)\n([\s\S]*?)^```$/gm)].map(([, info, text]) => ({ info, text }));
}
