import { type Crossing, plainKey } from './crossings.ts';
import { type Checked, checksOf, type Run } from './results.ts';
import { JUMPS, type Jump, type Part, RULES } from './standard-jumps.ts';

/** What smooth lines may change over a step, as a share. */
export const SMOOTH = 1e-7;

/** A jump that a crossing allows, with the size it may have there. */
interface Allowed {
  readonly jump: Jump;
  readonly size: number;
}

const allowedAt = (c: Crossing): readonly Allowed[] =>
  [...JUMPS, ...RULES]
    .filter(({ at }) => at.some((key) => c.flipped.includes(key) || c.appeared.includes(key)))
    .map((jump) => ({ jump, size: jump.size(c) }));

const PARTS: Readonly<Record<string, Part>> = {
  ...{ 'H1/axial': 'axial', 'H1/x': 'x', 'H1/y': 'y' },
  ...{ 'G/x/check': 'shear', 'G/y/check': 'shear' },
};

/** The checks by plain key; of several segments the worst. */
function worstChecks(r: Run): ReadonlyMap<string, Checked> {
  const worst = new Map<string, Checked>();
  for (const check of checksOf(r)) {
    const key = plainKey(check.key);
    if (!(worst.get(key) && (worst.get(key) as Checked).ratio >= check.ratio))
      worst.set(key, check);
  }
  return worst;
}

export interface Compared {
  readonly faults: readonly string[];
  /** By name of a jump, the share by which it did jump, and what it may. */
  readonly seen: readonly { readonly name: string; readonly by: number; readonly size: number }[];
}

/** The checks on both sides of a crossing: equal, but for the jumps that stand there. */
export function compareSides(c: Crossing): Compared {
  const allowed = allowedAt(c);
  const sum = (chosen: readonly Allowed[]) => chosen.reduce((total, { size }) => total + size, 0);
  const [before, after] = [worstChecks(c.before), worstChecks(c.after)];
  const faults: string[] = [];
  const seen: { name: string; by: number; size: number }[] = [];
  // Segments that begin or end make the checks of others the worst.
  const segments = c.flipped.includes('F1/r/holds');
  for (const [key, a] of before) {
    const b = after.get(key);
    if (!b) continue;
    const part = PARTS[key];
    const own = allowed.filter(({ jump }) => part && jump.parts.includes(part));
    const compare = (of: 'capacity' | 'demand', scale: number) => {
      const by = Math.abs(a[of] - b[of]) / scale;
      const jumps = own.filter(({ jump }) => jump.of === of);
      const [only, ...others] = jumps.filter(({ size }) => size > 0);
      if (only && others.length === 0) seen.push({ name: only.jump.name, by, size: only.size });
      if (!segments && by > sum(jumps) * (1 + 1e-6) + SMOOTH)
        faults.push(`${key}: the ${of} jumps by ${by}, ${sum(jumps)} is allowed`);
    };
    if (part) {
      compare('capacity', Math.max(a.capacity, b.capacity));
      compare('demand', Math.max(a.demand, b.demand, a.capacity));
    }
    const jumps = part ? own : allowed;
    const room = Math.max(a.ratio, b.ratio) * sum(jumps) * (1 + 1e-6) + SMOOTH;
    const by = Math.abs(a.ratio - b.ratio - expectedStep(c, key));
    if (by > room * Math.max(1, a.ratio))
      faults.push(`${key}: the ratio jumps by ${by}, ${room} is allowed`);
  }
  return { faults, seen };
}

/**
 * H1-1a and H1-1b where they change at Pr/Pc = 0.2: 0.2 + 8/9 M against 0.1 + M, which are equal for
 * M = 0.9 only, at a ratio of 1. The ratio before less the one after.
 */
function expectedStep(c: Crossing, key: string): number {
  if (key !== 'H1/check' || !c.flipped.includes('H1/branch')) return 0;
  const side = (r: Run) => {
    const address =
      worstChecks(r)
        .get(key)
        ?.key.replace(/check$/, 'ratio') ?? '';
    const line = r.lines.get(address);
    if (line?.kind !== 'formula') throw new Error(`no ratio at ${address}`);
    return { a: line.formula.includes('H1-1a'), ratio: line.value };
  };
  const [before, after] = [side(c.before), side(c.after)];
  if (before.a === after.a) return 0;
  const M = before.a ? ((before.ratio - 0.2) * 9) / 8 : before.ratio - 0.1;
  return (before.a ? 1 : -1) * (0.1 - M / 9);
}
