import { chainEnds, isSamePlace } from './chain-ends.ts';
import type {
  HeldPoint,
  LengthChain,
  LoadDrawing,
  MemberDrawing,
  PlaneDrawing,
} from './drawing.ts';
import { isBent } from './is-bent.ts';

/** What the drawing of a member shows, in words. */
export function describeMember(drawing: MemberDrawing): string {
  const { axial, lengths, chains, held, planes } = drawing;
  const force =
    axial === null || axial.value === 0
      ? 'no axial force'
      : `axial ${axial.value > 0 ? 'compression' : 'tension'} ${axial.symbol} ${axial.text}`;
  const moments = planes
    .filter((p) => p.endA.value !== 0 || p.endB.value !== 0)
    .flatMap((p) => [p.endA, p.endB])
    .map((m) => `${m.symbol} ${m.text}`);
  const ends = chainEnds(chains.find(({ symbol }) => symbol === 'Lb')?.pieces ?? []);
  return [
    `Member ${drawing.mark} to scale: ${drawing.section}, ${drawing.length.text} long, held at both ends`,
    force,
    listed('end moments', moments),
    ...planes.flatMap(overSupports),
    ...planes
      .filter((plane) => isBent(plane) && plane.bays.length === 0)
      .map(({ plane }) => `moments about ${axisOf(plane)} between the ends not known`),
    ...held.map((point) => describeHeld(point, ends, drawing.length.value)),
    ...planes.flatMap((plane) => plane.loads.map((load) => describeLoad(load, plane))),
    listed(
      'lengths',
      lengths.map((l) => `${l.symbol} ${l.text}`),
    ),
    ...chains.map(describeChain),
  ]
    .filter((part) => part !== null)
    .join('; ')
    .concat('.');
}

const listed = (what: string, all: readonly string[]): string | null =>
  all.length > 0 ? `${what} ${all.join(', ')}` : null;

const overSupports = ({ plane, supports }: PlaneDrawing): string[] =>
  supports.map((s) => `moment about ${axisOf(plane)} ${s.place.words} ${s.text}`);

function describeHeld(
  { name, place, words }: HeldPoint,
  segmentEnds: readonly number[],
  length: number,
): string {
  const ends = segmentEnds.some((z) => isSamePlace(z, place.value, length));
  return `restraint ${name} at ${place.text} from A holds ${words}${ends ? ', where an unbraced segment ends' : ''}`;
}

const axisOf = (plane: PlaneDrawing['plane']): 'x' | 'y' => (plane === 'major' ? 'x' : 'y');

function describeLoad(load: LoadDrawing, { plane }: PlaneDrawing): string {
  const what =
    load.kind === 'point'
      ? `${load.force.text} at ${load.at.text} from A`
      : `${load.start === load.end ? load.start.text : `${load.start.text} at its start, ${load.end.text} at its end,`} ${load.reach || 'over the whole length'}`;
  const where = load.heightWords === '' ? '' : `, ${load.heightWords}`;
  return `${load.name}, bending about ${axisOf(plane)}: ${what}${where}`;
}

function describeChain({ symbol, pieces, words }: LengthChain): string {
  const lengths = pieces.map((piece) => piece.text).join(', ');
  const longest = symbol === 'Lb' ? words : `the longest counts, ${words}`;
  return `${symbol} from A in pieces ${lengths}${longest === '' ? '' : ` (${longest})`}`;
}
