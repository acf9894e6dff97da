/** Input that no server has yet, kept in this browser: on which version it stands, and both values. */
export interface Unsaved<T> {
  readonly version: number;
  readonly base: T;
  readonly value: T;
  readonly at: string;
}

const prefix = (key: string) => `stanchion/unsaved/${key}/`;

/** Keeps the input; where the browser has no room or forbids it, the page itself still holds it. */
export function keepUnsaved<T>(key: string, unsaved: Unsaved<T>): void {
  try {
    forgetUnsaved(key, unsaved.version);
    localStorage.setItem(`${prefix(key)}${unsaved.version}`, JSON.stringify(unsaved));
  } catch {
    // Full or switched off.
  }
}

export function recallUnsaved<T>(key: string): Unsaved<T> | null {
  try {
    for (const name of namesOf(key)) {
      const text = localStorage.getItem(name);
      if (text) return JSON.parse(text) as Unsaved<T>;
    }
  } catch {
    // Unreadable: as if there were none.
  }
  return null;
}

/** Forgets what is kept of a thing, but for one version if it is named. */
export function forgetUnsaved(key: string, except?: number): void {
  try {
    for (const name of namesOf(key)) {
      if (name !== `${prefix(key)}${except}`) localStorage.removeItem(name);
    }
  } catch {
    // Switched off: nothing is kept.
  }
}

const namesOf = (key: string): string[] =>
  Array.from({ length: localStorage.length }, (_, i) => localStorage.key(i) ?? '').filter((name) =>
    name.startsWith(prefix(key)),
  );
