import type { PlanetRow } from "../planets/quantity.ts";
import { groupBy } from "./groupBy.ts";
import type { MatchMethod, StepResult } from "./listMatch.ts";
import { pairUp } from "./pairUp.ts";
import { foldCase, hostKey, nameKey } from "./planetName.ts";

type Step = (rows: readonly PlanetRow[], others: readonly PlanetRow[]) => StepResult;
type KeysOf = (row: PlanetRow) => readonly string[];
type Possible = (row: PlanetRow, other: PlanetRow) => boolean;

/** The steps of matching by name, surest first. */
export function matchByName(aliases: ReadonlyMap<string, string>): Step[] {
  const canonical = new Map([...aliases].map(([alias, name]) => [nameKey(alias), nameKey(name)]));
  const own: KeysOf = (row) => [ownKey(row)];
  const all: KeysOf = (row) => {
    const keys = [ownKey(row), ...aliasKeys(row)];
    return keys.flatMap((key) => [key, canonical.get(key) ?? ""]);
  };
  const folded: KeysOf = (row) => all(row).map(foldCase);
  return [
    step("name", own, own),
    step("alias", all, all),
    step("name-ignoring-case", folded, folded, periodsAgree),
    byHost,
  ];
}

/** A planet's own name key; host and letter stand in for a missing name. */
function ownKey({ name, texts }: PlanetRow): string {
  const key = nameKey(name);
  return key === "" && texts.host && texts.letter ? nameKey(`${texts.host} ${texts.letter}`) : key;
}

const aliasKeys = ({ texts }: PlanetRow) => (texts.aliases ?? "").split(/[,;|]/).map(nameKey);

function step(method: MatchMethod, keysOf: KeysOf, otherKeysOf: KeysOf, possible: Possible = () => true): Step {
  return (rows, others) => {
    const entries = others.flatMap((row) => [...new Set(otherKeysOf(row))].map((key) => ({ row, key })));
    const index = groupBy(entries, ({ key }) => key);
    const candidates = new Map(
      rows.map((row) => {
        const found = keysOf(row).flatMap((key) => (key === "" ? [] : (index.get(key) ?? [])));
        const distinct = [...new Set(found.map((entry) => entry.row))];
        return [row, distinct.filter((other) => possible(row, other))] as const;
      }),
    );
    return pairUp(candidates, method);
  };
}

/** A name without a planet's letter is that of the star, and good enough for its only planet left, or the only one of like period. */
const byHost: Step = (rows, others) => {
  const bare: KeysOf = (row) => (hostKey(ownKey(row)) === undefined ? [foldCase(ownKey(row))] : []);
  const hosts: KeysOf = (row) => [foldCase(hostKey(ownKey(row)) ?? "")];
  const forward = step("host", bare, hosts, periodsAgree)(rows, others);
  const backward = step("host", hosts, bare, periodsAgree)(rows, others);
  return { pairs: [...forward.pairs, ...backward.pairs], ambiguous: [...forward.ambiguous, ...backward.ambiguous] };
};

/** What rests on less than the whole name must not contradict the periods: `Foo 1 B` may be the star beside `Foo 1 b`. */
const periodsAgree: Possible = (row, other) => {
  const [a, b] = [row.quantities.period?.value, other.quantities.period?.value];
  return !a || !b || Math.abs(Math.log(a / b)) < 0.1;
};
