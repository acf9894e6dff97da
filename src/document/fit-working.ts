/*
 * A step that is wider than its column would lie over the result. The working of such a line takes
 * the width of the sheet, with the result below, and is set smaller where that is not enough.
 */

const GAP = 16;
const SMALLEST = 0.6;

const observer = new ResizeObserver((entries) => {
  // What is written changes sizes again: not within the observer's own turn.
  requestAnimationFrame(() => {
    const fits = entries.map(({ target }) => fitOf(target as HTMLElement));
    for (const set of fits) set?.();
  });
});

/** Keeps the working of a line within its sheet, whatever its width; gives the way to stop. */
export function fitWorking(working: HTMLElement): () => void {
  observer.observe(working);
  return () => observer.unobserve(working);
}

/** What there is to set, all measured before anything is set. */
function fitOf(working: HTMLElement): (() => void) | null {
  const line = working.closest<HTMLElement>('[data-line]');
  if (!line || working.clientWidth === 0) return null;
  const beside = line.querySelector<HTMLElement>('.line-result')?.offsetWidth;
  const taken = beside === undefined ? 0 : beside + GAP;
  const isWide = line.hasAttribute('data-wide');
  const room =
    line.clientWidth - working.offsetLeft - Number.parseFloat(getComputedStyle(line).paddingRight);
  const column = isWide ? room - taken : working.clientWidth;
  const scale = Number(working.style.getPropertyValue('--fit') || 1);
  // What KaTeX does not break: between these a formula goes on in the next row.
  const needed = Math.max(
    0,
    ...[...working.querySelectorAll<HTMLElement>('.katex-base')].map(
      (base) => base.offsetWidth / scale,
    ),
  );
  const wide = needed > column;
  const fit = Math.max(SMALLEST, Math.min(1, room / Math.max(needed, 1)));
  return () => {
    line.toggleAttribute('data-wide', wide);
    if (wide && fit < 1) working.style.setProperty('--fit', fit.toFixed(3));
    else working.style.removeProperty('--fit');
  };
}
