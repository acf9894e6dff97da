import type { Line } from './line.ts';
import type { MemberRecord } from './record.ts';

/** Full address within a member of a reference found in a line of `combination` (null: member line). */
export const addressOf = (ref: string, combination: string | null): string =>
  ref.startsWith(':') ? `${combination}${ref}` : ref;

/** Combination id and key of an address. */
export function splitAddress(address: string): { combination: string | null; key: string } {
  const at = address.indexOf(':');
  return at < 0
    ? { combination: null, key: address }
    : { combination: address.slice(0, at), key: address.slice(at + 1) };
}

export interface PlacedLine {
  readonly address: string;
  readonly combination: string | null;
  readonly line: Line;
}

/** All lines of a member in reading order: member lines, then each combination's. */
export function placedLines(member: Pick<MemberRecord, 'lines' | 'combinations'>): PlacedLine[] {
  return [
    ...member.lines.map((line) => ({ address: line.key, combination: null, line })),
    ...member.combinations.flatMap((c) =>
      c.lines.map((line) => ({ address: `${c.id}:${line.key}`, combination: c.id, line })),
    ),
  ];
}
