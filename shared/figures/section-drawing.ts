import type { NamedDrawn, PlateDrawn, SectionDrawing } from './drawing.ts';

/** What is drawn of a section from its sizes by name (`d`, `bf`, `tf` …); null where one is missing. */
export function sectionDrawing(
  section: string,
  size: (name: string) => NamedDrawn | null,
): SectionDrawing | null {
  const plate = (width: string, thickness: string): PlateDrawn | null => {
    const [w, t] = [size(width), size(thickness)];
    return w && t && { width: w, thickness: t };
  };
  const diameter = size('D');
  const wall = size('t');
  if (diameter) return wall && { section, form: 'round', diameter, wall };
  const height = size('Ht');
  if (height) {
    const flange = plate('B', 't');
    // As the properties: outside radius 2t where it is not given.
    const radius = size('Ro')?.value ?? 2 * (wall?.value ?? 0);
    return flange && wall && { section, form: 'box', depth: height, flange, web: wall, radius };
  }
  const [depth, web] = [size('d'), size('tw')];
  if (!depth || !web) return null;
  const [top, bottom] = [plate('bftop', 'tftop'), plate('bfbot', 'tfbot')];
  const middle = depth.value / 2;
  if (top && bottom) {
    const centroid = size('ytop')?.value ?? middle;
    return { section, form: 'i', depth, top, bottom, web, centroid };
  }
  const box = plate('B', 'tf');
  if (box) return { section, form: 'box', depth, flange: box, web, radius: 0 };
  const flange = plate('bf', 'tf');
  if (!flange) return null;
  const xbar = size('xbar');
  return xbar
    ? { section, form: 'channel', depth, flange, web, centroid: xbar.value }
    : { section, form: 'i', depth, top: flange, bottom: flange, web, centroid: middle };
}
