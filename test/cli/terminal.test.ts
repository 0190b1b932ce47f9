import { expect, test } from "vitest";
import { escapeControls } from "../../src/cli/terminal.ts";

test("control characters and direction overrides become visible", () => {
  expect(escapeControls("a\u001b[2Jb\rc\u202Ed\u0085")).toBe("a\\u001b[2Jb\\u000dc\\u202ed\\u0085");
});

test("line breaks stay where asked", () => {
  expect(escapeControls("a\nb")).toBe("a\nb");
  expect(escapeControls("a\nb\u2028", { keepLineBreaks: false })).toBe("a\\u000ab\\u2028");
});
