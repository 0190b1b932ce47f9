const LONGEST = 60;

/** A value of a file as it stands there, cut where it is long. */
export function shown(value: unknown): string {
  const text = JSON.stringify(value) ?? "nothing";
  return text.length > LONGEST ? `${text.slice(0, LONGEST)}…` : text;
}
