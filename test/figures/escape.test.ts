import { runInNewContext } from "node:vm";
import fc from "fast-check";
import { SaxesParser } from "saxes";
import { describe, expect, it } from "vitest";
import { escapeHtml, escapeScript, jsonForScript } from "../../src/figures/escape.ts";
import { hoverText, plotlyText } from "../../src/figures/plotlyText.ts";
import { visibleText } from "../../src/figures/visibleText.ts";
import { hostileNames } from "./inventedSurvey.ts";

const seed = 20;

/** Any text, rich in characters that mean something to a parser; without the two code points XML forbids. */
const untrusted = fc
  .oneof(
    fc.string({ unit: "binary", maxLength: 40 }),
    fc
      .array(fc.constantFrom(..."<>&\"'$%{}/!-;#=` ab\u2028\u202E\n"), { maxLength: 40 })
      .map((parts) => parts.join("")),
    fc.constantFrom(...hostileNames),
  )
  .map((text) => text.replace(/[\uFFFE\uFFFF]/g, ""));

describe("escapeHtml", () => {
  it("comes back from a parser as the visible text, in content and in an attribute", () => {
    fc.assert(
      fc.property(untrusted, (text) => {
        const seen = { content: "", attribute: "", elements: 0 };
        const parser = new SaxesParser();
        parser.on("opentag", ({ attributes }) => {
          seen.elements += 1;
          seen.attribute = String(attributes.t);
        });
        parser.on("text", (content) => {
          seen.content += content;
        });
        parser.write(`<a t="${escapeHtml(text)}">${escapeHtml(text)}</a>`).close();
        expect(seen).toEqual({ content: visibleText(text), attribute: visibleText(text), elements: 1 });
      }),
      { seed },
    );
  });
});

describe("jsonForScript", () => {
  it("is the same value without a character that HTML gives a meaning", () => {
    fc.assert(
      fc.property(fc.array(untrusted), (texts) => {
        const json = jsonForScript(texts);
        expect(JSON.parse(json)).toEqual(JSON.parse(JSON.stringify(texts)));
        expect(json).not.toMatch(/[<>&\u2028\u2029]/);
      }),
      { seed },
    );
  });
});

describe("escapeScript", () => {
  it("keeps what a program does and hides what would end its block", () => {
    const code = 'const a = "</script><!-- </SCRIPT>"; [a, /<\\/script>/.test(a), /<!--/.test(a)]';
    const escaped = escapeScript(code);
    expect(escaped).not.toMatch(/<\/script|<!--/i);
    expect(runInNewContext(escaped)).toEqual(runInNewContext(code));
  });
});

describe("plotlyText", () => {
  /** How Plotly 4 reads text (its svg_text_utils): tags are cut at `<…>`, then each entity is decoded once. */
  const readByPlotly = (text: string): string =>
    text
      .split(/<[^<>]*>/)
      .join("")
      .replace(/&(#\d+|#x[\da-fA-F]+|[a-z]+);/g, (_, name: string) => String.fromCodePoint(Number(name.slice(1))));

  it("comes back as the visible text and holds no sign of Plotly's or the drawing script's languages", () => {
    fc.assert(
      fc.property(untrusted, (text) => {
        const escaped = plotlyText(text);
        expect(readByPlotly(escaped)).toBe(visibleText(text));
        expect(escaped).not.toMatch(/[<>$%{}()]|&(?!#\d+;)/);
      }),
      { seed },
    );
  });

  it("wraps long lines, cuts endless ones and never inside an entity", () => {
    const lines = hoverText(["<".repeat(1000), "short"]).split("<br>");
    expect(lines).toHaveLength(5);
    expect(lines.map((line) => readByPlotly(line).length)).toEqual([46, 46, 46, 46, 5]);
    expect(readByPlotly(lines[3] as string)).toMatch(/…$/);
  });
});
