import { InputError } from "../errors.ts";

const token =
  /[ \t\r\n]*(?:([{}[\],:])|("(?:[^"\\\p{Cc}]|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*")|(-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?|true|false|null))/uy;

/**
 * JSON.parse with an error that names file, line and column in every JavaScript engine.
 * Throws InputError `json-syntax`.
 */
export function parseJson(file: string, text: string): unknown {
  const json = text.replace(/^\uFEFF/, "");
  try {
    return JSON.parse(json);
  } catch (cause) {
    const { offset, wanted } = firstSyntaxError(json);
    const before = json.slice(0, offset).split("\n");
    const place = { file, line: before.length, column: before[before.length - 1].length + 1 };
    const found = offset < json.length ? json.slice(offset, offset + 12).split("\n")[0] : "the end of the file";
    throw new InputError(
      "json-syntax",
      `${file}:${place.line}:${place.column}: this is not JSON: found ${found}, but ${wanted} belongs here.`,
      { ...place, found },
      { cause },
    );
  }
}

/** Where JSON that does not parse goes wrong, by reading its tokens against what may follow each. */
function firstSyntaxError(json: string): { offset: number; wanted: string } {
  const open: string[] = [];
  let wanted = "a value";
  token.lastIndex = 0;
  for (;;) {
    const start = token.lastIndex;
    const match = token.exec(json);
    const offset = match
      ? start + match[0].search(/[^ \t\r\n]/)
      : start + (/^[ \t\r\n]*/.exec(json.slice(start))?.[0].length ?? 0);
    const next = match && afterToken(match[1] ?? (match[2] === undefined ? "value" : "string"), wanted, open);
    if (!next) return { offset, wanted };
    wanted = next;
  }
}

const OPENED: Readonly<Record<string, string>> = { "{": 'a key in quotes or "}"', "[": 'a value or "]"' };
const CLOSES: Readonly<Record<string, string>> = { "}": "{", "]": "[" };

/** What may come after `kind` of token where `wanted` was due; undefined if it must not stand there. */
function afterToken(kind: string, wanted: string, open: string[]): string | undefined {
  const inside = open.at(-1);
  const closed = (): string => (open.length === 0 ? "the end" : `"," or "${open.at(-1) === "{" ? "}" : "]"}"`);
  if (kind in CLOSES) {
    if (!wanted.includes(`"${kind}"`) || CLOSES[kind] !== inside) return undefined;
    open.pop();
    return closed();
  }
  if (kind === ",") return wanted.startsWith('","') ? (inside === "{" ? "a key in quotes" : "a value") : undefined;
  if (kind === ":") return wanted === '":"' ? "a value" : undefined;
  if (wanted.startsWith("a key")) return kind === "string" ? '":"' : undefined;
  if (!wanted.startsWith("a value")) return undefined;
  if (!(kind in OPENED)) return closed();
  open.push(kind);
  return OPENED[kind];
}
