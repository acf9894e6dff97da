import type { Line, LineOf } from '../calc/line.ts';
import type { CombinationRecord, CoverageRow } from '../calc/record.ts';
import type { CombinationRun } from './combination.ts';

type Cell = CoverageRow['cells'][number];

/** What a cell of the completeness table says; `check` gives it a ratio. */
export type Told = Pick<Cell, 'state' | 'because'> & {
  readonly address?: string | null;
  readonly check?: LineOf<'check'>;
};

export interface Context {
  readonly run: CombinationRun;
  readonly record: CombinationRecord;
  readonly memberLines: readonly Line[];
}

/** Limit states that stand in every table, whether or not they apply. */
export interface LimitState {
  readonly id: string;
  readonly title: string;
  readonly clause: readonly [clause: string, equation?: string];
  /** Outside every sheet, whatever the member and its forces. */
  readonly never?: true;
  readonly tell: (c: Context) => Told;
}

export type Axis = 'x' | 'y';

export const na = (because: string): Told => ({ state: 'not applicable', because });
export const outside = (because: string, address: string | null = null): Told => ({
  state: 'outside scope',
  because,
  address,
});
export const notReached = (because: string, address: string | null = null): Told => ({
  state: 'not reached',
  because,
  address,
});

export const find = (c: Context, key: string): { line: Line; address: string } | null => {
  const own = c.record.lines.find((l) => l.key === key);
  if (own) return { line: own, address: `${c.record.id}:${key}` };
  const line = c.memberLines.find((l) => l.key === key);
  return line ? { line, address: key } : null;
};

/** The line a governing line took, without the scope of its reference. */
export const takenBy = (c: Context, governing: string): string | null => {
  const found = find(c, governing);
  return found?.line.kind === 'governing' ? found.line.governs.replace(/^:/, '') : null;
};

export const strength = (c: Context, key: string, governs: boolean, otherwise: string): Told => {
  const address = find(c, key)?.address ?? null;
  return governs
    ? { state: 'governs', because: 'gives the strength', address }
    : { state: 'does not govern', because: otherwise, address };
};

export const LESS = 'another limit state gives less';
export const noMoment = (axis: Axis): string =>
  `no moment about the ${axis === 'x' ? 'major' : 'minor'} axis`;

export const bent = (c: Context, axis: Axis): boolean =>
  (c.run.planes[axis]?.state ?? 'none') !== 'none';

/** Why a check of this combination isn't there although its forces are. */
export function unreached(c: Context, axes: readonly Axis[]): Told {
  for (const axis of axes) {
    const state = c.run.planes[axis]?.state;
    const at = (...keys: string[]) => keys.map((k) => find(c, k)).find((f) => f !== null) ?? null;
    if (state === 'failed') {
      const notice = at(`App8/${axis}/unstable`, 'C2/squash');
      return notReached('no finite second-order moment exists', notice?.address ?? null);
    }
    if (state === 'outside scope') {
      const notice = at(`theory/${axis}/outside`);
      return outside(notice?.line.title ?? 'see the notice on the sheet', notice?.address ?? null);
    }
  }
  const web = axes.includes('x') && bent(c, 'x') ? find(c, 'F4/outside') : null;
  return web ? outside(web.line.title, web.address) : notReached('a step before it has no value');
}

export const check = (c: Context, key: string): LineOf<'check'> | undefined =>
  c.record.lines.find((l): l is LineOf<'check'> => l.kind === 'check' && l.key === key);

export function checked(c: Context, found: LineOf<'check'>): Told {
  const { governing, verdict, ratio } = c.record.summary;
  const address = `${c.record.id}:${found.key}`;
  if (governing?.address === address)
    return { state: 'governs', because: 'largest utilisation', address, check: found };
  return {
    state: 'does not govern',
    because: ratio === null ? `the combination is ${verdict}` : 'no larger utilisation',
    address,
    check: found,
  };
}
