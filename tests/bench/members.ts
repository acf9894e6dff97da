import { parseInput } from '#shared/members/parse-input.ts';
import type { ResolvedInput, ResolvedMember } from '#shared/members/resolved.ts';

export interface BenchMember {
  readonly name: string;
  readonly input: ResolvedInput;
  readonly member: ResolvedMember;
}

/** A W14×99 in bending about both axes: the section and forces of AISC Design Example H.1B, with end moments. */
const PLAIN = {
  ...{ mark: 'biaxial', section: 'W14X99', material: 'A992', length: '14 ft', ends: 'held' },
  ...{ Lcx: '14 ft', Lcy: '14 ft', Lcz: '14 ft', Lb: '14 ft' },
  ...{ Cb: 'auto', endMomentSign: 'bending' },
};

/** A W18×50 of 40 ft held at three points, under a load between them: four segments. */
const RESTRAINED = {
  ...{ mark: 'restrained', section: 'W18X50', material: 'A992', length: '40 ft', ends: 'held' },
  ...{ Cb: 'auto', endMomentSign: 'bending' },
  restraints: [
    { at: '10 ft', holds: ['top'] },
    { at: '20 ft', holds: ['centre', 'twist'] },
    { at: '31 ft', holds: ['bottom'] },
  ],
};

const kip = (value: number): string => `${value.toFixed(2)} kip`;
const kipFt = (value: number): string => `${value.toFixed(2)} kip ft`;

/** Forces that differ from one combination to the next. */
const plainForces = (i: number) => ({
  name: `combination ${i + 1}`,
  P: kip(400 - 0.05 * i),
  MxA: kipFt(200 - 0.04 * i),
  MxB: kipFt(-150 + 0.03 * i),
  MyA: kipFt(60 - 0.02 * i),
  MyB: kipFt(20),
});
const restrainedForces = (i: number) => ({
  name: `combination ${i + 1}`,
  P: kip(60 - 0.01 * i),
  MxA: kipFt(60),
  MxB: kipFt(-140 + 0.02 * i),
  loads: [{ kind: 'point', bends: 'x', W: kip(16 - 0.002 * i), at: '14 ft', height: 'centre' }],
});

/** An input file holds so many combinations of a member; more are read in parts. */
const PART = 200;

function memberOf(name: string, given: object, forces: (i: number) => object, count: number) {
  const parts = Array.from({ length: Math.ceil(count / PART) }, (_, part) => {
    const length = Math.min(PART, count - part * PART);
    const combinations = Array.from({ length }, (_, i) => forces(part * PART + i));
    const parsed = parseInput({
      ...{ format: 1, standard: 'aisc360-22', design: 'LRFD', units: 'us' },
      analysis: { method: 'direct', secondOrder: 'amplified', sway: 'none' },
      members: [{ ...given, combinations }],
    });
    if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
    return parsed.input;
  });
  const [input] = parts;
  const [member] = input?.members ?? [];
  if (!input || !member) throw new Error('the input has no member');
  const combinations = parts
    .flatMap((part) => part.members.flatMap((m) => m.combinations))
    .map((c, i) => ({ ...c, id: `c${i + 1}` }));
  return { name, input, member: { ...member, combinations } };
}

/** W14×99, LRFD, both axes, with a number of combinations. */
export const plainMember = (count: number): BenchMember =>
  memberOf('W14×99, both axes', PLAIN, plainForces, count);

/** W18×50, LRFD, three restraints and a point load, with a number of combinations. */
export const restrainedMember = (count: number): BenchMember =>
  memberOf('W18×50, restraints and loads', RESTRAINED, restrainedForces, count);
