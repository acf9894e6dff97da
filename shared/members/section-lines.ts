import type { Quantity } from '../calc/quantity.ts';
import type { Recorder } from '../calc/recorder.ts';
import type { AnyProperty, PropertyOf, TabulatedKind } from '../sections/columns.ts';
import { type Section, sectionName } from '../sections/section.ts';
import { printedDesignation, type Shape } from '../sections/table.ts';
import type { ResolvedSteel } from './material.ts';
import type { SectionQuantities } from './section-quantities.ts';
import { sizedSectionLines } from './sized-section-lines.ts';

const TITLES: Readonly<Record<AnyProperty, string>> = {
  A: 'Gross area',
  d: 'Depth',
  bf: 'Flange width',
  tw: 'Web thickness',
  tf: 'Flange thickness',
  kdes: 'Outer face to web toe of fillet',
  xbar: 'Centroid from the back of the web',
  lambdaf: 'Flange width-to-thickness ratio',
  lambdaw: 'Web width-to-thickness ratio',
  B: 'Outside width',
  Ht: 'Outside height',
  D: 'Outside diameter',
  t: 'Design wall thickness',
  lambdab: 'Width-to-thickness ratio of the shorter wall',
  lambdah: 'Width-to-thickness ratio of the longer wall',
  lambdad: 'Diameter-to-thickness ratio',
  Ix: 'Second moment of area, major axis',
  Sx: 'Elastic modulus, major axis',
  Zx: 'Plastic modulus, major axis',
  rx: 'Radius of gyration, major axis',
  Iy: 'Second moment of area, minor axis',
  Sy: 'Elastic modulus, minor axis',
  Zy: 'Plastic modulus, minor axis',
  ry: 'Radius of gyration, minor axis',
  J: 'Torsional constant',
  Cw: 'Warping constant',
  rts: 'Effective radius of gyration',
  ho: 'Distance between flange centroids',
  ro: 'Polar radius of gyration about the shear centre',
  H: 'Flexural constant',
};

/**
 * Every property of the section that the checks use: of a table's row as published, or of sizes by
 * formulas, b/t with them, never both. x is the major axis. B4.2: the tables give the design wall
 * thickness of HSS; for a tube by its nominal wall it follows from the steel.
 */
export function sectionLines(
  r: Recorder,
  section: Section,
  steel: ResolvedSteel,
): SectionQuantities {
  r.section('section', `Section ${printedDesignation(sectionName(section))}`);
  if (section.by === 'sizes') return sizedSectionLines(r, section.sizes, steel);
  const { shape } = section;
  if (shape.note)
    r.notice('section/note', 'note', 'published-values-off-sizes', shape.note, {
      title: 'Published values and sizes',
    });
  switch (shape.kind) {
    case 'i':
      return { kind: 'i', made: 'rolled', ...tabulated(r, shape.kind, shape) };
    case 'channel':
      return { kind: 'channel', ...tabulated(r, shape.kind, shape) };
    case 'rect-hss': {
      const q = tabulated(r, shape.kind, shape);
      return { kind: 'rect-hss', square: q.B.value === q.Ht.value, ...q };
    }
    case 'round':
      return { kind: 'round', ...tabulated(r, shape.kind, shape) };
  }
}

/** A rounded detailing value for M and HP, and of no use to the checks: printed for W shapes only. */
const printed = (name: string, shape: Shape): boolean => name !== 'kdes' || shape.family === 'W';

/** Where a symbol means something else elsewhere: a channel's flange is bf/tf. */
const SYMBOLS: Readonly<Record<string, string>> = { 'channel lambdaf': 'lambdafc' };

function tabulated<K extends TabulatedKind>(
  r: Recorder,
  kind: K,
  shape: Shape & { readonly kind: K },
): Readonly<Record<PropertyOf<K>, Quantity>> {
  const { table } = shape;
  return Object.fromEntries(
    Object.entries(shape.properties)
      .filter(([name]) => printed(name, shape))
      .map(([name, { value, dimension, published, column }]) => [
        name,
        r.lookup(
          `section/${name}`,
          SYMBOLS[`${kind} ${name}`] ?? name,
          dimension,
          {
            ...{ value, published, column },
            table: table.name,
            row: shape.designation,
            tableSource: `${table.title}, ${table.publisher}`,
          },
          { title: TITLES[name as AnyProperty] },
        ),
      ]),
  ) as Record<PropertyOf<K>, Quantity>;
}
