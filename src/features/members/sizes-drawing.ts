import type { DraftSizes, SizeName } from '#shared/contracts/draft-parts.ts';
import { sizesOf } from '#shared/contracts/draft-section.ts';
import type { SectionDrawing } from '#shared/figures/drawing.ts';
import { sectionDrawing } from '#shared/figures/section-drawing.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import { sizedShapeWords } from './part-words.ts';

/** Sizes of two flanges as the drawing calls them. */
const drawnAs: Readonly<Record<string, SizeName>> = {
  ...{ bftop: 'bfTop', tftop: 'tfTop', bfbot: 'bfBottom', tfbot: 'tfBottom' },
};

/** The outline of a section while its sizes are typed; null until all can be read and are above zero. */
export function sizesDrawing(sizes: DraftSizes): SectionDrawing | null {
  return sectionDrawing(sizedShapeWords[sizes.shape], (symbol) => {
    const name = sizesOf(sizes).find((size) => size === (drawnAs[symbol] ?? symbol));
    const parsed = name && parseQuantity(sizes[name], 'length');
    if (!name || !parsed?.ok || !(parsed.quantity.value > 0)) return null;
    return { symbol: name, value: parsed.quantity.value, text: parsed.quantity.text };
  });
}
