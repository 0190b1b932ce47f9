const pattern =
  /^([+-]?)(\d{1,3})\s*(?:[:h°d]|deg|\s)\s*(\d{1,2})\s*(?:[:m'′]|\s)\s*(\d{1,2}(?:\.\d*)?)\s*(?:s|"|″|'')?$/;

/** `18h57m44.03s`, `+49 18 18.5`, `-05:02:36`: degrees, from hours where `isHours`; undefined for anything else. */
export function readSexagesimal(text: string, isHours: boolean): number | undefined {
  const match = pattern.exec(text.trim());
  if (match === null) return undefined;
  const [, sign, whole, minutes, seconds] = match;
  const size = Number(whole) + Number(minutes) / 60 + Number(seconds) / 3600;
  return (sign === "-" ? -size : size) * (isHours ? 15 : 1);
}
