import * as z from "zod";
import { suggestion } from "./nearest.ts";
import { shown } from "./shown.ts";

/** An object in which unknown keys are an error that names the known ones; its message has a line for each. */
export function strictObject<Shape extends z.ZodRawShape>(shape: Shape): z.ZodObject<Shape, z.core.$strict> {
  const known = Object.keys(shape);
  return z.strictObject(shape, {
    error: (issue) =>
      issue.code === "unrecognized_keys"
        ? issue.keys.map((key) => unknownKey(key, (issue.input as Record<string, unknown>)[key], known)).join("\n")
        : undefined,
  });
}

function unknownKey(key: string, value: unknown, known: readonly string[]): string {
  return `unknown key, with the value ${shown(value)}.${suggestion(key, known)} Known keys here: ${known.join(", ")}.`;
}
