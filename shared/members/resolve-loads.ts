import type { GivenValue } from '../calc/quantity.ts';
import type { DimensionName } from '../units/dimension.ts';
import type { Given } from './given-values.ts';
import type { CombinationInput } from './input.ts';
import type { LoadInput } from './load-input.ts';
import { samePlace } from './resolve-restraints.ts';
import type { ResolvedLoad, ResolvedRestraint, ResolvedSupport } from './resolved.ts';

export interface PlacesContext {
  /** Path of the combination within the member: `combinations[0]`. */
  readonly path: string;
  readonly length: GivenValue;
  readonly restraints: readonly ResolvedRestraint[] | null;
  readonly problem: (path: string, message: string) => void;
  /** A quantity of this force set. */
  readonly read: (path: string, given: Given | undefined, d: DimensionName) => GivenValue | null;
}

/** Loads between the ends, with their places; every place must lie on the member. */
export function resolveLoads(
  loads: readonly LoadInput[] | undefined,
  { path, length, problem, read }: PlacesContext,
): readonly ResolvedLoad[] {
  return (loads ?? []).flatMap((load, i): ResolvedLoad[] => {
    const at = `${path}.loads[${i}]`;
    const place = (field: string, given: Given | undefined): GivenValue | null => {
      const found = read(`${at}.${field}`, given, 'length');
      if (found && (found.value < 0 || found.value > length.value * (1 + 1e-9)))
        problem(
          `${at}.${field}`,
          `is ${found.text} from end A, which is not on the member of ${length.text}`,
        );
      return found;
    };
    if (load.bends === 'x' && load.height === undefined)
      problem(
        `${at}.height`,
        'is needed: a load above or below the shear centre changes lateral-torsional buckling; "top", "centre" or "bottom"',
      );
    const head = { id: `load${i + 1}`, axis: load.bends, height: load.height ?? 'centre' } as const;
    if (load.kind === 'point') {
      const [W, where] = [read(`${at}.W`, load.W, 'force'), place('at', load.at)];
      return W && where ? [{ ...head, kind: 'point', W, at: where }] : [];
    }
    if ((load.from === undefined) !== (load.to === undefined))
      problem(
        `${at}.${load.from === undefined ? 'from' : 'to'}`,
        'is needed beside the other end of the load',
      );
    const [from, to] = [place('from', load.from), place('to', load.to)];
    if (from && to && to.value <= from.value)
      problem(`${at}.to`, `is ${to.text}, not beyond where the load starts, ${from.text}`);
    const reach = from && to ? { from, to } : null;
    if (load.kind === 'uniform') {
      const w = read(`${at}.w`, load.w, 'lineLoad');
      return w ? [{ ...head, kind: 'uniform', w, reach }] : [];
    }
    const wFrom = read(`${at}.wFrom`, load.wFrom, 'lineLoad');
    const wTo = read(`${at}.wTo`, load.wTo, 'lineLoad');
    return wFrom && wTo ? [{ ...head, kind: 'linear', wFrom, wTo, reach }] : [];
  });
}

/** Moments over held points, each of which must be a restraint of the member in that plane. */
export function resolveSupports(
  supports: CombinationInput['supports'],
  { path, length, restraints, problem, read }: PlacesContext,
): readonly ResolvedSupport[] {
  return (supports ?? []).flatMap((given, i): ResolvedSupport[] => {
    const at = `${path}.supports[${i}]`;
    const place = read(`${at}.at`, given.at, 'length');
    if (!place) return [];
    const restraint = restraints?.find((r) => samePlace(r.at.value, place.value, length.value));
    if (!restraint) {
      problem(`${at}.at`, `is ${place.text} from end A, where the member has no restraint`);
      return [];
    }
    return [
      {
        restraint: restraint.id,
        Mx: read(`${at}.Mx`, given.Mx, 'moment'),
        My: read(`${at}.My`, given.My, 'moment'),
      },
    ];
  });
}
