import { SceneView } from '#client/document/figure-block.tsx';
import { SymbolMark } from '#client/ui/symbol.tsx';
import { sectionDrawing } from '#shared/figures/section-drawing.ts';
import { sectionOutline } from '#shared/figures/section-outline.ts';
import { findShape, type Property, printedDesignation } from '#shared/sections/table.ts';

const shown = [
  ['A', 'A_g'],
  ['Ix', 'I_x'],
  ['Zx', 'Z_x'],
  ['rx', 'r_x'],
  ['Iy', 'I_y'],
  ['Zy', 'Z_y'],
  ['ry', 'r_y'],
  ['J', 'J'],
] as const;

/** A section's outline to scale and the properties an engineer chooses by. */
export function SectionPreview({ designation }: { designation: string }) {
  const shape = findShape(designation);
  if (!shape) return null;
  const properties: Readonly<Record<string, Property>> = shape.properties;
  const drawing = sectionDrawing(printedDesignation(shape.designation), (symbol) => {
    const found = Object.hasOwn(properties, symbol) ? properties[symbol] : undefined;
    return found ? { symbol, value: found.value, text: found.published } : null;
  });
  return (
    <div className="grid gap-2">
      <div className="mx-auto w-64">{drawing && <SceneView scene={sectionOutline(drawing)} />}</div>
      <dl className="grid grid-cols-2 gap-x-4 font-condensed text-small">
        {shown.map(([name, tex]) => (
          <div key={name} className="flex justify-between gap-2">
            <dt>
              <SymbolMark tex={tex} />
              <span className="sr-only">{name}</span>
            </dt>
            <dd className="figures font-medium">{shape.properties[name].published}</dd>
          </div>
        ))}
      </dl>
      <p className="text-tiny text-zinc-7">{shape.table.title}</p>
    </div>
  );
}
