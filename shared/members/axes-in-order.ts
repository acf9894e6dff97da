import type { Recorder } from '../calc/recorder.ts';
import { clause } from '../standards/aisc360-22/writer.ts';
import type { SectionQuantities } from './section-quantities.ts';

/** Whether both axes of a section are the same; Ix and Iy may then differ in their last digit. */
export const axesAlike = (s: SectionQuantities): boolean =>
  s.kind === 'round' || ((s.kind === 'rect-hss' || s.kind === 'box') && s.square);

/**
 * Whether x is the major axis, as F2 to F7 take it. Where Iy exceeds Ix a line says so with an
 * outside-scope notice, and the answer is false.
 */
export function axesInOrder(r: Recorder, axis: 'x' | 'y', s: SectionQuantities): boolean {
  if (axesAlike(s) || s.Iy.value <= s.Ix.value) return true;
  r.choice(
    `F1/${axis}/axes`,
    [{ left: s.Iy, relation: '>', right: s.Ix, outcome: 'x is the minor axis of this section' }],
    '',
    { title: 'Axes of the section', clause: clause('F1') },
  );
  r.notice(
    `F1/${axis}/outside`,
    'outside scope',
    'axes-exchanged',
    'The section is stiffer about y than about x: Chapter F tells the major axis from the minor, and the rules used here take x for the major axis. Flexure about this axis is not checked.',
    { title: 'Major and minor axis exchanged', clause: clause('F1') },
  );
  return false;
}
