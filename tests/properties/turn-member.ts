import type { Load, Member } from './member.ts';

type Support = Member['supports'][number];

/** Every force and load of a member times a factor, or those that bend alone. */
export function scaled(m: Member, by: number, axial = true): Member {
  return {
    ...m,
    P: axial ? m.P * by : m.P,
    ...{ MxA: m.MxA * by, MxB: m.MxB * by, MyA: m.MyA * by, MyB: m.MyB * by },
    supports: m.supports.map(({ at, Mx, My }) => supportOf(at, times(Mx, by), times(My, by))),
    loads: m.loads.map((load): Load => {
      if (load.kind === 'point') return { ...load, W: load.W * by };
      if (load.kind === 'uniform') return { ...load, w: load.w * by };
      return { ...load, wFrom: load.wFrom * by, wTo: load.wTo * by };
    }),
  };
}
const times = (value: number | undefined, by: number) =>
  value === undefined ? undefined : value * by;
const supportOf = (at: number, Mx: number | undefined, My: number | undefined): Support => ({
  at,
  ...(Mx !== undefined && { Mx }),
  ...(My !== undefined && { My }),
});

const FLANGES: Readonly<Record<string, string>> = { top: 'bottom', bottom: 'top' };
const flipped = (word: string): string => FLANGES[word] ?? word;

/** The member on its head: moments and loads that bend act the other way, the flanges change. */
export function turnedOver(m: Member): Member {
  const turned = scaled(m, -1, false);
  return {
    ...turned,
    loads: turned.loads.map((load) => ({
      ...load,
      ...(load.height && { height: flipped(load.height) as 'top' | 'bottom' | 'centre' }),
    })),
    ...(m.restraints && {
      restraints: m.restraints.map(({ at, holds }) => ({ at, holds: holds.map(flipped) })),
    }),
  };
}

/** The member end for end; moments are in the bending sense. */
export function mirrored(m: Member): Member {
  const place = (z: number) => m.L - z;
  return {
    ...m,
    ...{ MxA: m.MxB, MxB: m.MxA, MyA: m.MyB, MyB: m.MyA },
    ...(m.restraints && {
      restraints: m.restraints.map(({ at, holds }) => ({ at: place(at), holds })).reverse(),
    }),
    supports: m.supports.map((support) => ({ ...support, at: place(support.at) })).reverse(),
    loads: m.loads.map((load): Load => {
      if (load.kind === 'point') return { ...load, at: place(load.at) };
      const reach =
        load.from === undefined || load.to === undefined
          ? {}
          : { from: place(load.to), to: place(load.from) };
      if (load.kind === 'uniform') return { ...load, ...reach };
      return { ...load, ...reach, wFrom: load.wTo, wTo: load.wFrom };
    }),
  };
}

const ACROSS: Readonly<Record<string, string>> = { 'in-plane': 'centre', centre: 'in-plane' };

/** The member turned by a right angle about its axis. */
export function quarterTurned(m: Member): Member {
  const lengths = m.lengths && { ...m.lengths, ...across(m.lengths) };
  return {
    ...m,
    ...{ MxA: m.MyA, MxB: m.MyB, MyA: m.MxA, MyB: m.MxB },
    ...(lengths && { lengths }),
    ...(m.restraints && {
      restraints: m.restraints.map(({ at, holds }) => ({
        at,
        holds: holds.map((word) => ACROSS[word] ?? word),
      })),
    }),
    supports: m.supports.map(({ at, Mx, My }) => supportOf(at, My, Mx)),
    loads: m.loads.map((load) => ({ ...load, bends: load.bends === 'x' ? 'y' : 'x' })),
  };
}
const across = ({ Lcx, Lcy }: NonNullable<Member['lengths']>) => ({
  ...(Lcy !== undefined && { Lcx: Lcy }),
  ...(Lcx !== undefined && { Lcy: Lcx }),
});
