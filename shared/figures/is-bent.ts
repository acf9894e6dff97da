import type { PlaneDrawing } from './drawing.ts';

/** Whether moments or loads bend the member in a plane. */
export const isBent = ({ endA, endB, supports, loads }: PlaneDrawing): boolean =>
  [endA, endB, ...supports].some((m) => m.value !== 0) || loads.length > 0;
