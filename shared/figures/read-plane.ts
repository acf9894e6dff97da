import type { ValuedLine } from '../calc/line.ts';
import type {
  BayDrawing,
  HeldPoint,
  MomentLevel,
  MomentMark,
  NamedDrawn,
  Place,
  Plane,
  PlaneDrawing,
} from './drawing.ts';
import { firstOrderMoments, secondOrderMoments, signedLargest } from './plane-curves.ts';
import { distanceOf, nameOf, placeFrom } from './read-held.ts';
import { drawn } from './read-line.ts';
import { readLoads } from './read-loads.ts';
import { readShear } from './read-shear.ts';
import { operandRef, type SheetLines } from './sheet-lines.ts';

/** What the planes of a member have in common. */
export interface PlaneMember {
  readonly length: number;
  readonly force: number;
  readonly held: readonly HeldPoint[];
  /** Lengths of the combination's segments; none where the member is one. */
  readonly segments: readonly number[];
}

/** Shares by which a moment of a check must differ from the curve to be drawn apart. */
const SAME_MOMENT = 1e-3;

export function readPlane(
  lines: SheetLines,
  plane: Plane,
  member: PlaneMember,
): PlaneDrawing | null {
  const axis = plane === 'major' ? 'x' : 'y';
  const [givenA, givenB] = [lines.bySymbol(`M${axis}A`), lines.bySymbol(`M${axis}B`)];
  if (!givenA || !givenB) return null;
  // Given in the joint sense, the moment at B has a line of its own in the bending sense.
  const bendingB = lines.bySymbol(`M${axis}Bb`) ?? givenB;
  const endA = drawn(givenA, lines.set);
  const endB: NamedDrawn = { ...drawn(givenB, lines.set), value: bendingB.value };
  const loads = readLoads(lines, plane, member.length);
  const ends = { endA, endB, loads: loads.length };
  const bays = readBays(lines, axis, member, ends);
  const marks = bays.flatMap((bay, i) => marksOfBay(lines, axis, bay, bays.length, i, member));
  const tension = member.force < 0;
  const bare: PlaneDrawing = {
    ...{ plane, endA, endB, loads, bays, tension },
    supports: readSupports(lines, axis, member.held),
    swayed: lines.byKey(`App8/${axis}/Mlt`) !== undefined,
    largest: largestOf(lines, axis, { endA, endB, marks, bays, length: member.length }),
    extremes: marks,
    required: [],
    shear: readShear(lines, axis, bays, loads),
  };
  const drawing = {
    ...bare,
    extremes: marks.filter(({ place }) => place.value !== bare.largest?.place.value),
  };
  return { ...drawing, required: requiredLevels(lines, axis, drawing, member) };
}

/** The member as one bay, or its bays where every one has its moments. */
function readBays(
  lines: SheetLines,
  axis: 'x' | 'y',
  { length, force }: PlaneMember,
  ends: { readonly endA: NamedDrawn; readonly endB: NamedDrawn; readonly loads: number },
): BayDrawing[] {
  const lengths: number[] = [];
  for (let bay = lines.byKey(`E2/${axis}/bay1`); bay; )
    bay = lines.byKey(`E2/${axis}/bay${lengths.push(bay.value) + 1}`);
  const kLof = (at: string): number | null =>
    // Without axial force the second order is the first.
    lines.byKey(`${at}/kL`)?.value ?? (force === 0 ? 0 : null);
  const outside = lines.any(`theory/${axis}/outside`) !== undefined;
  if (lengths.length <= 1) {
    if (outside && ends.loads > 0) return [];
    const { endA, endB } = ends;
    const kL = kLof(`theory/${axis}`);
    return [{ from: 0, to: length, MA: endA.value, MB: endB.value, kL }];
  }
  let from = 0;
  const bays = lengths.map((bay, i): BayDrawing | null => {
    const at = `bay${i + 1}/theory/${axis}`;
    const end = (name: string) => {
      const ref = operandRef(lines.byKey(`${at}/${name}`), 'M');
      return ref === undefined ? undefined : lines.byRef(ref)?.value;
    };
    const [MA, MB] = [end('absA'), end('absB')];
    const start = from;
    from += bay;
    if (MA === undefined || MB === undefined) return null;
    const bent = MA !== 0 || MB !== 0 || lines.byKey(`${at}/Mhigh`) !== undefined;
    return { from: start, to: from, MA, MB, kL: bent ? kLof(at) : 0 };
  });
  const known = bays.filter((bay) => bay !== null);
  return outside || known.length < bays.length ? [] : known;
}

function readSupports(
  lines: SheetLines,
  axis: 'x' | 'y',
  held: readonly HeldPoint[],
): MomentMark[] {
  return held.flatMap(({ name, place }): MomentMark[] => {
    const line = lines.byKey(`given/${name}/M${axis}`);
    if (!line) return [];
    const { value, text } = drawn(line, lines.set);
    const crest = value > 0;
    return [{ value, text, crest, place: { value: place.value, words: `over ${name}` } }];
  });
}

/** The extremes between the ends of a bay, of second order where the sheet has it. */
function marksOfBay(
  lines: SheetLines,
  axis: 'x' | 'y',
  bay: BayDrawing,
  bays: number,
  index: number,
  { length, held }: PlaneMember,
): MomentMark[] {
  const theory = bays > 1 ? `bay${index + 1}/theory/${axis}` : `theory/${axis}`;
  const start = nameOf(bay.from, length, held) ?? 'A';
  const mark = (
    line: ValuedLine,
    value: number,
    distance: ValuedLine | undefined,
    crest: boolean,
  ): MomentMark[] =>
    distance
      ? [
          {
            ...{ value, crest },
            text: drawn(line, lines.set).text,
            place: placeFrom(distance, bay.from, start, lines),
          },
        ]
      : [];
  const at = lines.byKey(`${theory}/Mmax`) ? theory : `${theory}/first`;
  const ofEnds = lines.byKey(`${theory}/zmax`);
  const largest = lines.byKey(`${theory}/Mmax`);
  if (ofEnds && largest) {
    const larger = Math.abs(bay.MA) >= Math.abs(bay.MB) ? bay.MA : bay.MB;
    return mark(largest, Math.sign(larger) * largest.value, ofEnds, larger > 0);
  }
  return ['Mhigh', 'Mlow'].flatMap((name): MomentMark[] => {
    const line = lines.byKey(`${at}/${name}`);
    const moment = line?.kind === 'governing' ? lines.byRef(line.governs) : undefined;
    return line && moment?.key.startsWith(`${at}/M`)
      ? mark(line, line.value, distanceOf(lines, moment), name === 'Mhigh')
      : [];
  });
}

/** The largest of the ends and the marks, by its line. */
function largestOf(
  lines: SheetLines,
  axis: 'x' | 'y',
  q: {
    readonly endA: NamedDrawn;
    readonly endB: NamedDrawn;
    readonly marks: readonly MomentMark[];
    readonly bays: readonly BayDrawing[];
    readonly length: number;
  },
): PlaneDrawing['largest'] {
  const symbol = `Mmax${axis}`;
  const { endA, endB, marks, bays, length } = q;
  const atA = Math.abs(endA.value) >= Math.abs(endB.value);
  const end: Place = { value: atA ? 0 : length, words: `at end ${atA ? 'A' : 'B'}` };
  const larger = atA ? endA : endB;
  const highest = marks.reduce<MomentMark | null>(
    (most, one) => (Math.abs(one.value) > Math.abs(most?.value ?? 0) ? one : most),
    null,
  );
  const ofSupports = Math.max(0, ...bays.flatMap(({ MA, MB }) => [Math.abs(MA), Math.abs(MB)]));
  if (highest && Math.abs(highest.value) >= ofSupports) return { symbol, ...highest };
  // Over a held point the given moment is the mark.
  if (bays.length > 1) return null;
  const line = lines.byKey(`theory/${axis}/Mmax`);
  return line
    ? {
        ...drawn(line, lines.set),
        value: Math.sign(larger.value) * line.value,
        crest: larger.value > 0,
        place: end,
      }
    : null;
}

/** The demands of the checks of flexure alone where the curve does not show them. */
function requiredLevels(
  lines: SheetLines,
  axis: 'x' | 'y',
  plane: PlaneDrawing,
  { length, segments }: PlaneMember,
): MomentLevel[] {
  const curve = secondOrderMoments(plane, length) ?? firstOrderMoments(plane, length);
  const parts = segments.length > 1 ? segments : [length];
  const marked = Math.abs(signedLargest(curve, 0, length));
  let from = 0;
  const levels = parts.flatMap((part, i): MomentLevel[] => {
    const reach = { from, to: from + part };
    from += part;
    const check = lines.any(`${parts.length > 1 ? `s${i + 1}/` : ''}H1/${axis}`);
    const used = check?.kind === 'check' ? lines.byRef(check.demand) : undefined;
    const shown = signedLargest(curve, reach.from, reach.to);
    if (!used || Math.abs(used.value - Math.abs(shown)) <= SAME_MOMENT * marked) return [];
    const sign = Math.sign(shown) || 1;
    return [{ ...reach, value: sign * used.value, text: drawn(used, lines.set).text }];
  });
  // Where the largest of all is the one that is marked, the others say nothing more.
  const isMarked = ({ value }: MomentLevel) =>
    Math.abs(Math.abs(value) - marked) <= SAME_MOMENT * marked;
  return levels.some(isMarked) ? [] : levels;
}
