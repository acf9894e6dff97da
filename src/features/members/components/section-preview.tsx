import { SceneView } from '#client/document/figure-block.tsx';
import { SymbolMark } from '#client/ui/symbol.tsx';
import { sectionOutline } from '#shared/figures/section-outline.ts';
import {
  findShape,
  type PropertyName,
  printedDesignation,
  W_TABLE,
  type WShape,
} from '#shared/sections/table.ts';

const shown: readonly (readonly [PropertyName, string])[] = [
  ['A', 'A_g'],
  ['Ix', 'I_x'],
  ['Zx', 'Z_x'],
  ['rx', 'r_x'],
  ['Iy', 'I_y'],
  ['Zy', 'Z_y'],
  ['ry', 'r_y'],
  ['J', 'J'],
];

/** A section's outline to scale and the properties an engineer chooses by. */
export function SectionPreview({ designation }: { designation: string }) {
  const shape = findShape(designation);
  if (!shape) return null;
  return (
    <div className="grid gap-2">
      <div className="mx-auto w-64">
        <SceneView scene={sectionOutline(drawingOf(shape))} />
      </div>
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
      <p className="text-tiny text-zinc-7">{W_TABLE.title}</p>
    </div>
  );
}

function drawingOf({ designation, properties }: WShape) {
  const drawn = (symbol: PropertyName) => ({
    symbol,
    value: properties[symbol].value,
    text: properties[symbol].published,
  });
  return {
    section: printedDesignation(designation),
    depth: drawn('d'),
    flangeWidth: drawn('bf'),
    webThickness: drawn('tw'),
    flangeThickness: drawn('tf'),
  };
}
