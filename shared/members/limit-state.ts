import type { Line, LineOf } from '../calc/line.ts';
import type { CombinationRecord, CoverageRow } from '../calc/record.ts';
import type { Axis } from './bay-moments.ts';
import type { CombinationRun } from './member-strengths.ts';

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
  /** The part of the member that the cell is for; null for the whole. */
  readonly segment: string | null;
}

/** Limit states that stand in every table, whether or not they apply. */
export interface LimitState {
  readonly id: string;
  readonly title: string;
  readonly clause: readonly [clause: string, equation?: string];
  /** Outside every sheet, whatever the member and its forces. */
  readonly never?: true;
  /** It has a cell for every segment. */
  readonly bySegment?: true;
  readonly tell: (c: Context) => Told;
}

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

export interface Found {
  readonly line: Line;
  readonly address: string;
}

/** The line of that key in the segment, else in the combination, else in the member. */
export const find = (c: Context, key: string): Found | null => {
  const keys = c.segment === null ? [key] : [`${c.segment}/${key}`, key];
  for (const wanted of keys) {
    const own = c.record.lines.find((l) => l.key === wanted);
    if (own) return { line: own, address: `${c.record.id}:${wanted}` };
  }
  const line = c.memberLines.find((l) => l.key === key);
  return line ? { line, address: key } : null;
};

/** The line a governing line took, without the scope of its reference. */
export const takenBy = (c: Context, governing: string): string | null => {
  const found = find(c, governing);
  return found?.line.kind === 'governing' ? found.line.governs.replace(/^:/, '') : null;
};

export const strength = (
  address: string | null,
  governs: boolean,
  otherwise: string = LESS,
): Told =>
  governs
    ? { state: 'governs', because: 'gives the strength', address }
    : { state: 'does not govern', because: otherwise, address };

export const LESS = 'another limit state gives less';
export const noMoment = (axis: Axis): string =>
  `no moment about the ${axis === 'x' ? 'major' : 'minor'} axis`;

export const bent = (c: Context, axis: Axis): boolean => {
  const plane = c.run.planes[axis];
  return plane ? plane.state !== 'none' : c.run.bends[axis];
};

/** Why a check of this combination isn't there although its forces are. */
export function unreached(c: Context, axes: readonly Axis[]): Told {
  for (const axis of axes) {
    const state = c.run.planes[axis]?.state;
    if (state === 'failed') {
      const notice = c.record.lines.find(
        (l) => l.key.endsWith(`App8/${axis}/unstable`) || l.key === 'C2/squash',
      );
      const address = notice ? `${c.record.id}:${notice.key}` : null;
      return notReached('no finite second-order moment exists', address);
    }
    if (state === 'outside scope') {
      const notice = find(c, `theory/${axis}/outside`);
      return outside(notice?.line.title ?? 'see the notice on the sheet', notice?.address ?? null);
    }
  }
  const lacking = ['axial', ...axes]
    .map((part) => find(c, `H1/${part}/lacking`))
    .find((f) => f !== null);
  return lacking
    ? outside(lacking.line.title, lacking.address)
    : notReached('a step before it has no value');
}

/** A check of the segment, or of the combination. */
export const check = (
  c: Context,
  key: string,
): { readonly line: LineOf<'check'>; readonly address: string } | null => {
  const found = find(c, key);
  return found?.line.kind === 'check' ? { line: found.line, address: found.address } : null;
};

export function checked(
  c: Context,
  { line, address }: { readonly line: LineOf<'check'>; readonly address: string },
): Told {
  const { governing, verdict, ratio } = c.record.summary;
  if (governing?.address === address)
    return { state: 'governs', because: 'largest utilisation', address, check: line };
  return {
    state: 'does not govern',
    because: ratio === null ? `the combination is ${verdict}` : 'no larger utilisation',
    address,
    check: line,
  };
}
