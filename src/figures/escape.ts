import { visibleText } from "./visibleText.ts";

const entities: Readonly<Record<string, string>> = {
  "&": "&amp;",
  "<": "&lt;",
  ">": "&gt;",
  '"': "&quot;",
  "'": "&#39;",
};

/** Untrusted text for HTML content or a quoted attribute, with invisible characters made visible. */
export function escapeHtml(text: string): string {
  return visibleText(text).replace(/[&<>"']/g, (character) => entities[character] as string);
}

/**
 * A value as JSON that can stand in a script block: no character that could end the block, open a comment or (in
 * readers older than ES2019) end a line.
 */
export function jsonForScript(value: unknown): string {
  return JSON.stringify(value).replace(
    /[<>&\u2028\u2029]/g,
    (character) => `\\u${character.charCodeAt(0).toString(16).padStart(4, "0")}`,
  );
}

/** Program text of ours for a script block: the two sequences HTML gives a meaning inside one, in a string or regex. */
export function escapeScript(code: string): string {
  return code.replace(/<(?=\/script|!--)/gi, "\\x3C").replace(/\r\n?/g, "\n");
}
