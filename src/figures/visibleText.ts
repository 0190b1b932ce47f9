/**
 * Text as it may be shown: characters that are invisible or reorder what stands beside them (control and format
 * characters, line separators, lone surrogates) become their code point in brackets, e.g. `[U+202E]`. The zero-width
 * joiner and non-joiner stay, since scripts and emoji need them.
 */
export function visibleText(text: string): string {
  return text.replace(unseen, (character) => {
    const code = character.codePointAt(0) ?? 0;
    return `[U+${code.toString(16).toUpperCase().padStart(4, "0")}]`;
  });
}

const unseen = /(?![\u200C\u200D])[\p{Cc}\p{Cf}\p{Cs}\p{Zl}\p{Zp}]/gu;
