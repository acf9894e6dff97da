import type { GivenValue, Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import { placeFormulas } from '../standards/aisc360-22/e2.ts';
import type { BayLoad } from '../standards/elastic-theory/bay.ts';
import { distance } from './geometry.ts';
import { samePlace } from './resolve-restraints.ts';
import type { ResolvedCombination, ResolvedLoad, ResolvedMember } from './resolved.ts';
import { type Bay, type Places, placeQuantity } from './restraint-lines.ts';

const KIND = { uniform: 'uniform', linear: 'linear', point: 'point' } as const;
const HEIGHT = {
  top: 'at the top flange',
  centre: 'at the shear centre',
  bottom: 'at the bottom flange',
} as const;

/** A load with its lines; `from` and `to` are null at the ends of the member. */
interface LoadLines {
  readonly load: ResolvedLoad;
  readonly w: readonly [Quantity, Quantity] | null;
  readonly W: Quantity | null;
  readonly from: Quantity | null;
  readonly to: Quantity | null;
}

/** The loads of one plane as given lines. */
export function loadLines(
  r: Recorder,
  c: ResolvedCombination,
  axis: 'x' | 'y',
): readonly LoadLines[] {
  return c.loads
    .filter((load) => load.axis === axis)
    .map((load): LoadLines => {
      const at = `given/${axis}/${load.id}`;
      const name = `Load ${load.id.replace('load', '')}, ${KIND[load.kind]}`;
      const place = (key: string, symbol: string, given: GivenValue, words: string) =>
        r.given(`${at}/${key}`, symbol, 'length', given, { title: `${name}: ${words} end A` });
      if (axis === 'x') {
        const { source, confirmed } =
          load.kind === 'uniform' ? load.w : load.kind === 'point' ? load.W : load.wFrom;
        const title = `Load ${load.id.replace('load', '')} acts`;
        r.statement(`${at}/height`, HEIGHT[load.height], source, confirmed, { title });
      }
      if (load.kind === 'point')
        return {
          load,
          w: null,
          W: r.given(`${at}/W`, 'W', 'force', load.W, { title: name }),
          from: place('at', 'z', load.at, 'distance from'),
          to: null,
        };
      const w = (key: string, symbol: string, given: GivenValue, title: string) =>
        r.given(`${at}/${key}`, symbol, 'lineLoad', given, { title });
      const both: readonly [Quantity, Quantity] =
        load.kind === 'uniform'
          ? twice(w('w', 'w', load.w, name))
          : [
              w('wFrom', 'wa', load.wFrom, `${name}, where it starts`),
              w('wTo', 'wb', load.wTo, `${name}, where it ends`),
            ];
      return {
        load,
        w: both,
        W: null,
        from: load.reach && place('from', 'za', load.reach.from, 'it starts, distance from'),
        to: load.reach && place('to', 'zb', load.reach.to, 'it ends, distance from'),
      };
    });
}

const twice = (q: Quantity): readonly [Quantity, Quantity] => [q, q];

/** What cutting loads at the bays needs beside them. */
export interface Cutting {
  readonly member: ResolvedMember;
  readonly L: Quantity;
  readonly places: Places;
  /** The start of places, zero; written once where a load needs it. */
  readonly start: () => Quantity;
}

/** The part of each load that lies in a bay, places measured from the bay's start. */
export function loadsOfBay(
  r: Recorder,
  bay: Bay,
  loads: readonly LoadLines[],
  q: Cutting,
): readonly BayLoad[] {
  const [z0, z1] = [distance(bay.from, q.member), distance(bay.to, q.member)];
  const length = q.L.value;
  const same = (a: number, b: number) => samePlace(a, b, length);
  return loads.flatMap(({ load, w, W, from, to }): BayLoad[] => {
    const local = (z: Quantity): Quantity => {
      const za = placeQuantity(q.places, bay.from);
      return za
        ? r.formula(
            placeFormulas.local,
            `given/${load.axis}/${load.id}/${z.ref.split('/').at(-1)}`,
            { z, za },
          )
        : z;
    };
    if (W && from) {
      const inside = from.value > z0 && from.value < z1;
      return inside && !same(from.value, z0) && !same(from.value, z1)
        ? [{ kind: 'point', W, at: local(from) }]
        : [];
    }
    if (!w) return [];
    const [f, t] = [from?.value ?? 0, to?.value ?? length];
    const cutFrom = f < z0 || same(f, z0);
    const cutTo = t > z1 || same(t, z1);
    const [a, b] = [cutFrom ? z0 : f, cutTo ? z1 : t];
    if (b <= a || same(a, b)) return [];
    const start = cutFrom || !from ? q.start() : local(from);
    const end = cutTo || !to ? bay.L1 : local(to);
    if (load.kind === 'uniform') return [{ kind: 'uniform', w: w[0], from: start, to: end }];
    const at = (place: 'a' | 'b', given: Quantity, z: number, own: number): Quantity => {
      if (same(z, own)) return given;
      const cut = placeQuantity(q.places, place === 'a' ? bay.from : bay.to);
      return r.formula(placeFormulas.intensity, `given/${load.axis}/${load.id}/w${place}`, {
        ...{ wa: w[0], wb: w[1], za: from ?? q.start(), zb: to ?? q.L },
        z: cut ?? (place === 'a' ? q.start() : q.L),
      });
    };
    return [
      {
        kind: 'linear',
        ...{ wa: at('a', w[0], a, f), wb: at('b', w[1], b, t), from: start, to: end },
      },
    ];
  });
}
