import { type BayCurve, bayCurve, bayPlaces, SAME, type Sample } from './bay-curve.ts';
import type { BayDrawing, PlaneDrawing } from './drawing.ts';

/** First-order moments along all bays. */
export function firstOrderMoments(plane: PlaneDrawing, length: number): Sample[] {
  // Between forces alone it is straight.
  const curved = plane.loads.some((load) => load.kind === 'line');
  const curveOf = (bay: BayDrawing) => bayCurve(bay, plane.loads, 0, false);
  return momentsAlong(plane, curved ? length : Infinity, curveOf) ?? [];
}

/** Second-order moments along all bays; null where a bay has none. */
export const secondOrderMoments = (plane: PlaneDrawing, length: number): Sample[] | null =>
  momentsAlong(plane, length, (bay) =>
    bay.kL === null ? null : bayCurve(bay, plane.loads, bay.kL, plane.tension),
  );

function momentsAlong(
  plane: PlaneDrawing,
  length: number,
  curveOf: (bay: BayDrawing) => BayCurve | null,
): Sample[] | null {
  const samples: Sample[] = [];
  for (const bay of plane.bays) {
    const curve = curveOf(bay);
    if (!curve) return null;
    for (const z of bayPlaces(bay, plane.loads, length))
      samples.push({ z: bay.from + z, value: curve.moment(z) });
  }
  return samples;
}

/** First-order shear along all bays, with a step at every force and every held point. */
export function shearAlong(plane: PlaneDrawing, length: number): Sample[] {
  return plane.bays.flatMap((bay) => {
    const curve = bayCurve(bay, plane.loads, 0, false);
    if (!curve) return [];
    const forces = new Set(
      plane.loads.flatMap((load) => (load.kind === 'point' ? [load.at.value - bay.from] : [])),
    );
    return bayPlaces(bay, plane.loads, length).flatMap((z): Sample[] => {
      const behind = { z: bay.from + z, value: curve.shear(z) };
      if (!forces.has(z)) return [behind];
      return [{ z: bay.from + z, value: curve.shear(z * (1 - SAME)) }, behind];
    });
  });
}

/** The largest in size between two places, with its sign; straight between samples. */
export function signedLargest(samples: readonly Sample[], from: number, to: number): number {
  const inside = samples.filter(({ z }) => z >= from && z <= to).map(({ value }) => value);
  const all = [...inside, valueAt(samples, from), valueAt(samples, to)];
  return all.reduce((most, value) => (Math.abs(value) > Math.abs(most) ? value : most), 0);
}

/** The value at a place, straight between samples. */
export function valueAt(samples: readonly Sample[], z: number): number {
  const after = samples.findIndex((sample) => sample.z >= z);
  const [a, b] = [samples[after - 1], samples[after]];
  if (!b) return samples.at(-1)?.value ?? 0;
  return a && b.z > a.z ? a.value + ((b.value - a.value) * (z - a.z)) / (b.z - a.z) : b.value;
}
