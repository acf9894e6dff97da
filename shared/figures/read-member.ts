import { isValued, type Line, type ValuedLine } from '../calc/line.ts';
import type { CombinationRecord, MemberRecord } from '../calc/record.ts';
import { UNIT_SETS, type UnitSet, type UnitSetName } from '../units/unit-set.ts';
import type { MemberDrawing, NamedDrawn, Place, Plane, PlaneDrawing } from './drawing.ts';
import { drawn } from './read-line.ts';
import { sectionText } from './section-text.ts';

const LENGTHS = ['Lcx', 'Lcy', 'Lcz', 'Lb'] as const;
const AXIS = { major: 'x', minor: 'y' } as const satisfies Record<Plane, string>;

/** What a member's figures draw under one combination; null where the record has no length. */
export function readMember(
  member: MemberRecord,
  combination: CombinationRecord | null,
  units: UnitSetName,
): MemberDrawing | null {
  const set = UNIT_SETS[units];
  const ofMember = (symbol: string) => bySymbol(member.lines, symbol);
  const length = ofMember('L');
  if (!length) return null;
  const value = (symbol: string): number | null => ofMember(symbol)?.value ?? null;
  const lines = combination?.lines ?? [];
  const axial = bySymbol(lines, 'P') ?? bySymbol(lines, 'Pr');
  return {
    mark: member.mark,
    section: sectionText(member.section),
    length: drawn(length, set),
    depth: value('d') ?? value('Ht') ?? value('D'),
    width: value('bf') ?? value('bfmax') ?? value('B') ?? value('D'),
    lengths: LENGTHS.map(ofMember)
      .filter((line) => line !== undefined)
      .map((line) => drawn(line, set)),
    axial: axial ? drawn(axial, set) : null,
    planes: (['major', 'minor'] as const)
      .map((plane) =>
        readPlane(lines, plane, { length: length.value, force: axial?.value ?? 0 }, set),
      )
      .filter((plane) => plane !== null),
  };
}

function readPlane(
  lines: readonly Line[],
  plane: Plane,
  member: { readonly length: number; readonly force: number },
  set: UnitSet,
): PlaneDrawing | null {
  const axis = AXIS[plane];
  const [givenA, givenB] = [bySymbol(lines, `M${axis}A`), bySymbol(lines, `M${axis}B`)];
  if (!givenA || !givenB) return null;
  // Given in the joint sense, the moment at B has a line of its own in the bending sense.
  const bendingB = bySymbol(lines, `M${axis}Bb`) ?? givenB;
  const endA = drawn(givenA, set);
  const endB: NamedDrawn = { ...drawn(givenB, set), value: bendingB.value };
  const largest = byKey(lines, `theory/${axis}/Mmax`);
  const kL = byKey(lines, `theory/${axis}/kL`);
  const atA = Math.abs(endA.value) >= Math.abs(endB.value);
  const sign = Math.sign(atA ? endA.value : endB.value);
  const zmax = byKey(lines, `theory/${axis}/zmax`);
  const used = usedMoment(lines, axis);
  const required = used && used.value !== largest?.value ? used : null;
  const place: Place = zmax
    ? { value: zmax.value, words: `at ${drawn(zmax, set).text} from A` }
    : { value: atA ? 0 : member.length, words: `at end ${atA ? 'A' : 'B'}` };
  return {
    plane,
    endA,
    endB,
    // Without axial force the second order is the first.
    kL: kL?.value ?? (member.force === 0 ? 0 : null),
    largest: largest ? { ...drawn(largest, set), value: sign * largest.value, place } : null,
    required: required ? { ...drawn(required, set), value: sign * required.value } : null,
  };
}

/** The demand of the check of flexure alone. */
function usedMoment(lines: readonly Line[], axis: 'x' | 'y'): ValuedLine | undefined {
  const check = lines.find((line) => line.key === `H1/${axis}`);
  return check?.kind === 'check' ? byKey(lines, check.demand.replace(/^:/, '')) : undefined;
}

const bySymbol = (lines: readonly Line[], symbol: string): ValuedLine | undefined =>
  lines.filter(isValued).find((line) => line.symbol === symbol);

const byKey = (lines: readonly Line[], key: string): ValuedLine | undefined =>
  lines.filter(isValued).find((line) => line.key === key);
