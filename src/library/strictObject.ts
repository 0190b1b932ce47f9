import { z } from "zod";
import { suggestion } from "./nearest.ts";

/** An object in which an unknown key is an error that names the known ones. */
export function strictObject<Shape extends z.ZodRawShape>(shape: Shape): z.ZodObject<Shape, z.core.$strict> {
  const known = Object.keys(shape);
  return z.strictObject(shape, {
    error: (issue) =>
      issue.code === "unrecognized_keys"
        ? issue.keys.map((key) => unknownKey(key, (issue.input as Record<string, unknown>)[key], known)).join(" ")
        : undefined,
  });
}

function unknownKey(key: string, value: unknown, known: readonly string[]): string {
  return `unknown key "${key}" (value ${JSON.stringify(value)}).${suggestion(key, known)} Known keys here: ${known.join(", ")}.`;
}
