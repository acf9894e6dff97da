import { same } from '#client/lib/same.ts';

/** One field of a draft: its JSON value, and what a person reads of it. */
export interface DraftField {
  readonly id: string;
  readonly label: string;
  readonly text: string;
  readonly value: unknown;
}

/** How a kind of draft falls into fields, and how one field is carried over. */
export interface MergeRules<T> {
  readonly fields: (value: T) => readonly DraftField[];
  readonly take: (into: T, from: T, id: string) => T;
}

/** A field that both changed, each to something else; null where it is gone. */
export interface Clash {
  readonly id: string;
  readonly label: string;
  readonly mine: string | null;
  readonly theirs: string | null;
}

export interface Merge<T> {
  /** Theirs, with the fields carried over that only I changed. */
  readonly agreed: T;
  readonly clashes: readonly Clash[];
}

/** Puts two changes of one version together; nothing of either is lost, clashes are for a person. */
export function merge<T>(base: T, mine: T, theirs: T, rules: MergeRules<T>): Merge<T> {
  const before = byId(rules.fields(base));
  const my = byId(rules.fields(mine));
  const their = byId(rules.fields(theirs));
  let agreed = theirs;
  const clashes: Clash[] = [];
  for (const id of new Set([...my.keys(), ...their.keys(), ...before.keys()])) {
    const m = my.get(id);
    const t = their.get(id);
    const b = before.get(id);
    if (same(m?.value, b?.value) || same(m?.value, t?.value)) continue;
    if (same(t?.value, b?.value)) {
      agreed = rules.take(agreed, mine, id);
      continue;
    }
    const label = m?.label ?? t?.label ?? id;
    clashes.push({ id, label, mine: m?.text ?? null, theirs: t?.text ?? null });
  }
  return { agreed, clashes };
}

const byId = (fields: readonly DraftField[]) => new Map(fields.map((field) => [field.id, field]));
