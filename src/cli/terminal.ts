/**
 * Text from a user's files or command line, safe to print: control characters, which could move the cursor or start a
 * new line of a comment block, become visible escapes. Line breaks stay with `keepLineBreaks`.
 */
export function escapeControls(text: string, options: { keepLineBreaks: boolean } = { keepLineBreaks: true }): string {
  return text.replace(/[\p{Cc}\p{Zl}\p{Zp}\u202A-\u202E\u2066-\u2069]/gu, (character) =>
    character === "\n" && options.keepLineBreaks ? character : escapeOf(character),
  );
}

function escapeOf(character: string): string {
  return `\\u${character.charCodeAt(0).toString(16).padStart(4, "0")}`;
}
