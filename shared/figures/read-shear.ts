import type { BayDrawing, LoadDrawing, ShearDrawing } from './drawing.ts';
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
  const marks = !known
    ? []
    : bays.flatMap((bay, i) => {
        const at = `${bays.length > 1 ? `bay${i + 1}/` : ''}theory/${axis}/first`;
        const [VA, VB] = [lines.byKey(`${at}/VA`), lines.byKey(`${at}/VB`)];
        return [
          ...(VA ? [{ at: bay.from, value: VA.value, text: drawn(VA, lines.set).text }] : []),
          ...(VB ? [{ at: bay.to, value: VB.value, text: drawn(VB, lines.set).text }] : []),
        ];
      });
  return { used: drawn(used, lines.set), given, marks };
}
