import type { ValuedLine } from '../calc/line.ts';
import type { BayDrawing, LoadDrawing, ShearDrawing } from './drawing.ts';
import { distanceOf } from './read-held.ts';
import { drawn } from './read-line.ts';
import { governingLine, type SheetLines } from './sheet-lines.ts';

/** The shear of a plane where the sheet checks it; null where it doesn't. */
export function readShear(
  lines: SheetLines,
  axis: 'x' | 'y',
  bays: readonly BayDrawing[],
  loads: readonly LoadDrawing[],
): ShearDrawing | null {
  const check = lines.any(`G/${axis}/check`);
  const used = check?.kind === 'check' ? lines.byRef(check.demand) : undefined;
  if (!used) return null;
  const given = governingLine(lines, used).key === `G/${axis}/given`;
  // A largest moment without its load leaves the diagram open, and so its shear.
  const known =
    (loads.length > 0 || !lines.byKey(`given/M${axis}Max`)) && !lines.byKey(`App8/${axis}/Mlt`);
  const several = bays.length > 1;
  const marks = known
    ? bays.flatMap((bay, i) =>
        marksOfBay(lines, `${several ? `bay${i + 1}/` : ''}theory/${axis}/first`, bay),
      )
    : [];
  return { used: drawn(used, lines.set), given, marks };
}

/** Shear at the ends of a bay, and before and behind its forces. */
function marksOfBay(lines: SheetLines, at: string, bay: BayDrawing): ShearDrawing['marks'] {
  const mark = (line: ValuedLine | undefined, z: number) =>
    line ? [{ at: z, value: line.value, text: drawn(line, lines.set).text }] : [];
  const VA = lines.byKey(`${at}/VA`);
  const between: ShearDrawing['marks'][number][] = [];
  // The end of stretch n has a moment line wherever another stretch follows.
  for (let n = 1, M = lines.byKey(`${at}/M1`); M; n += 1, M = lines.byKey(`${at}/M${n}`)) {
    const z = bay.from + (distanceOf(lines, M)?.value ?? 0);
    const behind = lines.byKey(`${at}/V${n}/behind`);
    between.push(...mark(lines.byKey(`${at}/V${n}`), z), ...mark(behind, z));
  }
  const last = between.at(-1);
  const VB = mark(lines.byKey(`${at}/VB`), bay.to);
  // Without load in the last stretch the shear keeps its value to the end.
  const end = last ? [{ ...last, at: bay.to }] : mark(VA, bay.to);
  return [...mark(VA, bay.from), ...between, ...(VB.length > 0 ? VB : end)];
}
