import type { LoadDrawing, Plane } from './drawing.ts';
import { drawn } from './read-line.ts';
import type { SheetLines } from './sheet-lines.ts';

/** The loads of one plane in the order of the sheet; `length` of the member in mm. */
export function readLoads(lines: SheetLines, plane: Plane, length: number): LoadDrawing[] {
  const axis = plane === 'major' ? 'x' : 'y';
  const ids = lines.keys.flatMap((key) => {
    const [, id] = new RegExp(`^given/${axis}/(load\\d+)/(?:W|w|wFrom)$`).exec(key) ?? [];
    return id === undefined ? [] : [id];
  });
  return ids.flatMap((id): LoadDrawing[] => {
    const at = `given/${axis}/${id}`;
    const line = (name: string) => {
      const found = lines.byKey(`${at}/${name}`);
      return found ? drawn(found, lines.set) : undefined;
    };
    const said = lines.any(`${at}/height`);
    const heightWords = said?.kind === 'statement' ? said.statement : '';
    const common = {
      name: id.replace('load', 'load '),
      height: heightOf(heightWords),
      heightWords,
    };
    const [force, place] = [line('W'), line('at')];
    if (force && place) return [{ ...common, kind: 'point', force, at: place }];
    const uniform = line('w');
    const [start, end] = [uniform ?? line('wFrom'), uniform ?? line('wTo')];
    if (!start || !end) return [];
    const [from, to] = [line('from'), line('to')];
    const reach = from && to ? `from ${from.text} to ${to.text}` : '';
    const ends = { from: from?.value ?? 0, to: to?.value ?? length };
    return [{ ...common, kind: 'line', ...ends, reach, start, end }];
  });
}

const heightOf = (words: string): LoadDrawing['height'] =>
  words.includes('top') ? 'top' : words.includes('bottom') ? 'bottom' : 'centre';
