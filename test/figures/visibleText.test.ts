import { describe, expect, it } from "vitest";
import { visibleText } from "../../src/figures/visibleText.ts";

describe("visibleText", () => {
  it.each([
    ["a right-to-left override", "abc\u202Edef", "abc[U+202E]def"],
    ["a bidirectional isolate", "\u2066x\u2069", "[U+2066]x[U+2069]"],
    ["a zero-width space", "a\u200Bb", "a[U+200B]b"],
    ["a tab and a bell", "a\tb\u0007", "a[U+0009]b[U+0007]"],
    ["line separators", "a\u2028b\u2029c\nd", "a[U+2028]b[U+2029]c[U+000A]d"],
    ["a lone surrogate", "a\uD800b", "a[U+D800]b"],
    ["an invisible tag character", "a\u{E0041}", "a[U+E0041]"],
  ])("shows %s", (_, text, shown) => {
    expect(visibleText(text)).toBe(shown);
  });

  it("leaves letters of every script, symbols and joined emoji alone", () => {
    const text = "Kepler–γ b, שלום, 系外惑星, می\u200Cخواهم, 👩\u200D🚀, ½ M⊕";
    expect(visibleText(text)).toBe(text);
  });
});
