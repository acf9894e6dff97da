import { expect } from 'vitest';
import type { MemberRecord } from '#shared/calc/record.ts';
import { inUnit } from '../in-unit.ts';
import { firstMember, linesOf, recordOf, valueAt } from '../run-input.ts';

export interface Given {
  readonly design?: 'LRFD' | 'ASD';
  readonly units?: 'us' | 'si';
  readonly analysis?: Record<string, unknown>;
  readonly member: Record<string, unknown>;
  readonly forces: Record<string, unknown>;
}

/** Record of one member under one combination, c1; direct analysis and amplified moments unless said. */
export const runOne = ({ design = 'LRFD', units = 'us', analysis, member, forces }: Given) =>
  firstMember(
    recordOf({
      format: 1,
      standard: 'aisc360-22',
      design,
      units,
      analysis: { method: 'direct', secondOrder: 'amplified', sway: 'none', ...analysis },
      members: [
        {
          mark: 'by hand',
          material: 'A992',
          ends: 'held',
          ...member,
          combinations: [{ name: 'any', ...forces }],
        },
      ],
    }),
  );

/** Expects a line's value in a unit, to ten digits unless the working carries fewer. */
export function expectValue(
  member: MemberRecord,
  address: string,
  unit: string,
  byHand: number,
  relative = 1e-9,
): void {
  const value = inUnit(valueAt(member, address), unit);
  const scale = byHand === 0 ? 1 : Math.abs(byHand);
  expect(
    Math.abs(value - byHand) / scale,
    `${address} is ${value} ${unit}, by hand ${byHand}`,
  ).toBeLessThan(relative);
}

/** Outcome of a choice line. */
export function outcomeAt(member: MemberRecord, address: string): string {
  const line = linesOf(member).get(address);
  if (line?.kind !== 'choice') throw new Error(`no choice at ${address}`);
  return line.outcome;
}

/** Value of what a check compares, as the sheet takes it. */
export function demandOf(member: MemberRecord, address: string): number {
  const line = linesOf(member).get(address);
  if (line?.kind !== 'check') throw new Error(`no check at ${address}`);
  return valueAt(member, line.demand.startsWith(':') ? `c1${line.demand}` : line.demand);
}
