import type { GivenValue } from '#shared/calc/quantity.ts';
import type {
  ResolvedCombination,
  ResolvedInput,
  ResolvedLoad,
  ResolvedMember,
  ResolvedSway,
} from '#shared/members/resolved.ts';
import { springsOf } from '#shared/members/sprung-moments.ts';
import type { SectionSizes } from '#shared/sections/sizes.ts';

const LENGTHS = ['Lcx', 'Lcy', 'Lcz', 'Lb'] as const;

/** The value that a member's input has for the line of that key; null where it gives none. */
export function givenIn(
  input: ResolvedInput,
  member: ResolvedMember,
  combination: string | null,
  key: string,
): GivenValue | null {
  if (combination === null) return ofMember(input, member, key);
  const found = member.combinations.find((c) => c.id === combination);
  return found ? ofCombination(input, member, found, key) : null;
}

function ofMember(input: ResolvedInput, member: ResolvedMember, key: string): GivenValue | null {
  const [group, name = '', part = ''] = key.split('/');
  if (group === 'steel')
    return member.steel.kind === 'own' && (name === 'Fy' || name === 'Fu')
      ? member.steel[name]
      : null;
  if (group === 'section')
    return member.shape?.by === 'sizes' ? sizeNamed(member.shape.sizes, name) : null;
  if (group !== 'given') return null;
  const restraint = member.restraints?.find((r) => r.id === name);
  if (restraint) return part === 'z' ? restraint.at : null;
  if (name === 'x' || name === 'y') return member.charts[name]?.[part as 'GA' | 'GB'] ?? null;
  const length = LENGTHS.find((l) => l === name);
  if (length) return member[length];
  const net = member.netSection;
  switch (name) {
    case 'L':
      return member.length;
    case 'Cb':
      return member.Cb === 'auto' ? null : member.Cb;
    case 'a':
      return member.stiffeners;
    case 'driftRatio':
      return input.driftRatio;
    case 'Ae':
      return net && 'Ae' in net ? net.Ae : null;
    case 'An':
    case 'U':
      return net && 'An' in net ? net[name] : null;
    default:
      return null;
  }
}

/** Sizes by the symbols of their lines. */
const SIZES: Readonly<Record<string, string>> = {
  bftop: 'bfTop',
  tftop: 'tfTop',
  bfbot: 'bfBottom',
  tfbot: 'tfBottom',
  tnom: 't',
};

function sizeNamed(sizes: SectionSizes, symbol: string): GivenValue | null {
  const found = Object.entries(sizes).find(([name]) => name === (SIZES[symbol] ?? symbol));
  const value = found?.[1];
  return typeof value === 'object' ? value : null;
}

function ofCombination(
  input: ResolvedInput,
  member: ResolvedMember,
  c: ResolvedCombination,
  key: string,
): GivenValue | null {
  const [group, name = '', part = '', last = ''] = key.split('/');
  if (group !== 'given') return null;
  const moment = /^M([xy])(A|B|Max)$/.exec(name);
  if (moment) {
    const plane = c.moments[moment[1] as 'x' | 'y'];
    return plane[moment[2] === 'Max' ? 'max' : (moment[2] as 'A' | 'B')];
  }
  if (name === 'P') return c.P;
  if (name === 'start')
    return { ...member.length, value: 0, text: input.units === 'us' ? '0 ft' : '0 m' };
  if (name === 'Vx' || name === 'Vy') return c.shears[name === 'Vx' ? 'x' : 'y'];
  if (name === 'springs') {
    const axis = part.startsWith('x') ? 'x' : 'y';
    const springs = springsOf(member, axis, input.units);
    return springs?.[part.endsWith('A') ? 'A' : 'B'] ?? null;
  }
  if (name === 'sway') return c.sway && ofSway(c.sway, part, last);
  const support = c.supports.find((s) => s.restraint === name);
  if (support) return part === 'Mx' ? support.Mx : part === 'My' ? support.My : null;
  const load = c.loads.find((l) => l.axis === name && l.id === part);
  return load ? ofLoad(load, last) : null;
}

function ofLoad(load: ResolvedLoad, part: string): GivenValue | null {
  if (load.kind === 'point') return part === 'W' ? load.W : part === 'at' ? load.at : null;
  if (part === 'from' || part === 'to') return load.reach?.[part] ?? null;
  if (load.kind === 'uniform') return part === 'w' ? load.w : null;
  return part === 'wFrom' ? load.wFrom : part === 'wTo' ? load.wTo : null;
}

function ofSway(sway: ResolvedSway, part: string, last: string): GivenValue | null {
  if (part === 'P') return sway.P;
  const direction = part === 'x' || part === 'y' ? sway[part] : null;
  if (!direction) return null;
  const { stiffness } = direction;
  switch (last) {
    case 'MA':
    case 'MB':
    case 'Pstory':
    case 'PeStory':
      return direction[last];
    case 'H':
    case 'height':
    case 'drift':
      return stiffness?.[last] ?? null;
    case 'Pmf':
      return stiffness && typeof stiffness.RM === 'object' ? stiffness.RM : null;
    default:
      return null;
  }
}
