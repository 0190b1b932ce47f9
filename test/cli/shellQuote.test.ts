import { execFileSync } from "node:child_process";
import fc from "fast-check";
import { expect, test } from "vitest";
import { shellQuote } from "../../src/cli/shellQuote.ts";

test("plain arguments stay plain", () => {
  expect(["curve", "--masses", "0.1:20:60", "a/b.csv"].map(shellQuote).join(" ")).toBe(
    "curve --masses 0.1:20:60 a/b.csv",
  );
});

test("a shell reads back what was quoted, on one line", () => {
  const samples = fc.sample(fc.string({ unit: "grapheme" }), { numRuns: 60, seed: 4 });
  const texts = ["", "it's", "$HOME `x` \\ !", "two\nlines", "\u001b[31m", "\\'\n'", ...samples].map((text) =>
    text.replaceAll("\0", ""),
  );
  const quoted = texts.map(shellQuote);
  for (const text of quoted) expect(text).not.toMatch(/\p{Cc}/u);
  const output = execFileSync("bash", ["-c", `printf '%s\\0' ${quoted.join(" ")}`], { encoding: "utf8" });
  expect(output.split("\0").slice(0, -1)).toEqual(texts);
});
