import { createHash } from 'node:crypto';
import type { DraftQuantity } from '#shared/contracts/draft-quantity.ts';
import type { DraftCombination } from '#shared/contracts/members.ts';

/** Builders of the demo's form values, by where a value comes from. */

export const none: DraftQuantity = { text: '', confirmed: false };

export const typed = (text: string): DraftQuantity => ({
  text,
  source: { kind: 'typed' },
  confirmed: true,
});

export const drawn = (
  text: string,
  number: string,
  revision: string,
  detail: string,
): DraftQuantity => ({
  text,
  source: { kind: 'drawing', number, revision, detail },
  confirmed: true,
});

/** An assumption stays unconfirmed until a drawing or a person confirms it. */
export const assumed = (text: string, basis: string): DraftQuantity => ({
  text,
  source: { kind: 'assumption', basis },
  confirmed: false,
});

/** P, then the moments MxA, MxB, MyA, MyB; an empty one is zero. */
export type ForceRow = readonly [name: string, P: string, ...moments: string[]];

/** An invented analysis file: its rows as CSV, so that its SHA-256 is that of a real text. */
export interface ForceFile {
  readonly name: string;
  readonly sha256: string;
  readonly rows: readonly ForceRow[];
}

export function forceFile(name: string, rows: readonly ForceRow[]): ForceFile {
  const text = rows.map((row) => `${row.join(',')}\n`).join('');
  return { name, rows, sha256: createHash('sha256').update(text).digest('hex') };
}

/** A combination whose forces are a row of the file, confirmed unless said otherwise. */
export function fromFile(file: ForceFile, id: string, row: number, confirmed = true) {
  const found = file.rows[row - 1];
  if (!found) throw new Error(`${file.name} has no row ${row}`);
  const [name, P, MxA = '', MxB = '', MyA = '', MyB = ''] = found;
  const value = (text: string): DraftQuantity =>
    text === ''
      ? none
      : {
          text,
          source: { kind: 'file', file: file.name, row: String(row), sha256: file.sha256 },
          confirmed,
        };
  return {
    ...{ id, name, P: value(P), MxA: value(MxA), MxB: value(MxB) },
    ...{ MyA: value(MyA), MyB: value(MyB), MxMax: none, MyMax: none },
  } satisfies DraftCombination;
}
