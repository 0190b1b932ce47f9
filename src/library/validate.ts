import type * as z from "zod";
import { InputError } from "../errors.ts";
import { suggestion } from "./nearest.ts";
import { shown } from "./shown.ts";

/** The value as the schema reads it, or all that is wrong with it, each with file, key path and what is allowed. */
export function validate<Schema extends z.ZodType>(
  schema: Schema,
  file: string,
  value: unknown,
): { value: z.output<Schema>; problems?: never } | { value?: never; problems: InputError[] } {
  const result = schema.safeParse(value, { error: describe, reportInput: true });
  if (result.success) return { value: result.data };
  // A misspelt key is first an unknown one and then a missing one; the former says more.
  const unknownFirst = [...result.error.issues].sort((a, b) => Number(isUnknownKey(b)) - Number(isUnknownKey(a)));
  return { problems: unknownFirst.flatMap((issue) => problemsOf(file, issue)) };
}

const isUnknownKey = (issue: z.core.$ZodIssue): issue is z.core.$ZodIssueUnrecognizedKeys =>
  issue.code === "unrecognized_keys";

function problemsOf(file: string, issue: z.core.$ZodIssue): InputError[] {
  if (isUnknownKey(issue)) {
    const messages = issue.message.split("\n");
    const values = issue.input as Record<string, unknown>;
    return issue.keys.map((key, i) => problem("unknown-key", file, [...issue.path, key], values[key], messages[i]));
  }
  const code = issue.code === "custom" ? String(issue.params?.code ?? "wrong-value") : "wrong-value";
  return [problem(code, file, issue.path, issue.input, issue.message)];
}

function problem(code: string, file: string, path: PropertyKey[], found: unknown, message: string): InputError {
  const keyPath = path
    .map((key) => (typeof key === "number" ? `[${key}]` : `.${String(key)}`))
    .join("")
    .slice(1);
  return new InputError(code, `${file}: ${keyPath === "" ? "" : `${keyPath}: `}${message}`, {
    file,
    column: keyPath,
    found: shown(found),
  });
}

const articles: Readonly<Record<string, string>> = {
  number: "a number",
  string: "text in quotes",
  object: "an object { … }",
  array: "a list [ … ]",
};

/** What is wrong and what is allowed, for the kinds of issue our schemas can raise. */
function describe(issue: z.core.$ZodRawIssue): string | undefined {
  const received = issue.input === undefined ? "missing" : `${shown(issue.input)} is not allowed`;
  switch (issue.code) {
    case "invalid_type":
      return `${received}; ${articles[issue.expected] ?? issue.expected} is needed.`;
    case "too_small":
    case "too_big": {
      const low = issue.code === "too_small";
      const bound = low ? issue.minimum : issue.maximum;
      if (issue.origin !== "number") return `${received}; it must not be empty.`;
      return `${received}; a number ${low ? "above" : "below"}${issue.inclusive ? " or equal to" : ""} ${bound} is needed.`;
    }
    case "invalid_value":
      return `${received}; allowed: ${issue.values.map((value) => JSON.stringify(value)).join(", ")}.`;
    case "invalid_union":
      return issue.discriminator === undefined ? undefined : unknownChoice(issue.discriminator, issue);
    default:
      return undefined;
  }
}

function unknownChoice(key: string, issue: z.core.$ZodRawIssue & { options?: readonly unknown[] }): string {
  const found = (issue.input as Record<string, unknown>)[key];
  const options = issue.options ?? [];
  const allowed = options.map((option) => JSON.stringify(option)).join(", ");
  if (found === undefined) return `missing; allowed: ${allowed}.`;
  return `${shown(found)} is not known.${suggestion(String(found), options.map(String))} Allowed: ${allowed}.`;
}
