import type { ValuedLine } from '../calc/line.ts';
import type { MemberRecord } from '../calc/record.ts';
import { isSamePlace } from './chain-ends.ts';
import type { HeldPoint, Hold, LengthChain, NamedDrawn, Place } from './drawing.ts';
import { drawn } from './read-line.ts';
import { operandRef, type SheetLines } from './sheet-lines.ts';

/** How the sheet says what a restraint holds. */
const WORDS: readonly (readonly [Hold, string])[] = [
  ['in-plane', 'in the plane'],
  ['top', 'top flange'],
  ['bottom', 'bottom flange'],
  ['centre', 'shear centre'],
  ['twist', 'twist'],
];

/** The points between the ends at which a member is held, from A. */
export function readHeld(member: MemberRecord, lines: SheetLines): HeldPoint[] {
  return member.lines.flatMap((line): HeldPoint[] => {
    const [, name] = /^given\/([^/]+)\/holds$/.exec(line.key) ?? [];
    const z = name === undefined ? undefined : lines.byKey(`given/${name}/z`);
    if (line.kind !== 'statement' || name === undefined || !z) return [];
    const holds = WORDS.filter(([, said]) => line.statement.includes(said)).map(([hold]) => hold);
    const place = drawn(z, lines.set);
    return [{ name, place, holds: new Set(holds), words: line.statement }];
  });
}

/** How a place is called that is an end or a held point; null for any other. */
export function nameOf(z: number, length: number, held: readonly HeldPoint[]): string | null {
  const same = (other: number) => isSamePlace(z, other, length);
  if (same(0)) return 'A';
  if (same(length)) return 'B';
  return held.find(({ place }) => same(place.value))?.name ?? null;
}

/** A place from its distance to a point that has a name. */
export const placeFrom = (distance: ValuedLine, from: number, name: string, lines: SheetLines) =>
  ({
    value: from + distance.value,
    words: `at ${drawn(distance, lines.set).text} from ${name}`,
  }) satisfies Place;

/** Buckling lengths that are cut in bays, and the segments of the combination. */
export function readChains(lines: SheetLines, governing: string | null): LengthChain[] {
  const lengths = (['x', 'y', 'z'] as const).flatMap((about): LengthChain[] => {
    const symbol = `Lc${about}`;
    const longest = lines.byKey(`E2/${symbol}`);
    // Bays without the restraints that a buckling length leaves out, else those of the plane.
    const [first = []] = [`E2/${symbol}`, `E2/${about}`]
      .map((at) => numbered(lines, (n) => `${at}/bay${n}`))
      .filter((found) => found.length > 0);
    if (!longest || first.length === 0) return [];
    const words = drawn(longest, lines.set).text;
    return [{ symbol, pieces: first, governs: null, words }];
  });
  const segments = numbered(lines, (n) => `s${n}/F2/Lb`);
  if (segments.length < 2) return lengths;
  const index = segments.findIndex((_, i) => `s${i + 1}` === governing);
  const words = index < 0 ? '' : `segment ${index + 1} governs`;
  const governs = index < 0 ? null : index;
  return [...lengths, { symbol: 'Lb', pieces: segments, governs, words }];
}

function numbered(lines: SheetLines, key: (n: number) => string): NamedDrawn[] {
  const found: NamedDrawn[] = [];
  for (let line = lines.byKey(key(1)); line; line = lines.byKey(key(found.length + 1)))
    found.push(drawn(line, lines.set));
  return found;
}

/**
 * Where a moment between the ends of a bay lies: at the end of stretch n (`M2`), or in it where the
 * shear is zero (`Me2`, `Me2b`); distance from the bay's start.
 */
export function distanceOf(lines: SheetLines, moment: ValuedLine): ValuedLine | undefined {
  const [, at = '', extreme, n = ''] = /^(.*)\/M(e?)(\d+b?)$/.exec(moment.key) ?? [];
  if (extreme) return lines.byKey(`${at}/z${n}`);
  const end = operandRef(moment, 'xi');
  const stretch = end === undefined ? undefined : lines.byRef(end);
  // The length of a stretch that does not begin at the bay's start names where it ends.
  const to = /\/l\d+$/.test(stretch?.key ?? '') ? operandRef(stretch, 'zj') : undefined;
  return to === undefined ? stretch : lines.byRef(to);
}
