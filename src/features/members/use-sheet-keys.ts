import { type KeyboardEvent, type RefObject, useCallback } from 'react';
import type { SheetFolds } from './use-sheet-folds.ts';

interface SheetKeys {
  readonly sheet: RefObject<HTMLElement | null>;
  readonly trace: RefObject<HTMLElement | null>;
  readonly chosen: string | null;
  readonly choose: (address: string) => void;
  readonly close: () => void;
  readonly copyLine: (address: string) => void;
  readonly folds: Pick<SheetFolds, 'fold' | 'turnAll'>;
}

const isTyping = (target: EventTarget): boolean =>
  target instanceof HTMLElement && /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName);

const lineAt = (target: EventTarget): HTMLElement | null =>
  target instanceof Element ? target.closest<HTMLElement>('[data-line]') : null;

/** Where the keyboard can stand on the sheet: heads of sections and lines that are not folded. */
const stopsOf = (sheet: HTMLElement | null): HTMLElement[] =>
  [...(sheet?.querySelectorAll<HTMLElement>('[data-line], [data-section]') ?? [])].filter(isOpen);

const isOpen = (element: Element): boolean => element.closest('[data-folded]') === null;

const headOf = (group: Element | null | undefined): HTMLElement | null =>
  group?.querySelector<HTMLElement>('[data-section]') ?? null;

/** The keys of the sheet and of the trace beside it. */
export function useSheetKeys(keys: SheetKeys) {
  const { sheet, trace, chosen, choose, close, copyLine, folds } = keys;
  return useCallback(
    (event: KeyboardEvent) => {
      if (event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return;
      const line = lineAt(event.target);
      const address = line?.dataset.line ?? chosen;
      const group = event.target instanceof Element ? event.target.closest('[data-group]') : null;
      const inTrace = trace.current?.contains(event.target as Node) ?? false;
      switch (event.key) {
        case 'ArrowDown':
        case 'ArrowUp': {
          const by = event.key === 'ArrowDown' ? 1 : -1;
          if (inTrace) step([...(trace.current?.querySelectorAll<HTMLElement>('.rung') ?? [])], by);
          else if (group || line) step(stopsOf(sheet.current), by);
          else return;
          break;
        }
        case 'Enter':
          if (!line || event.target !== line || !address) return;
          choose(address);
          break;
        case 's':
        case 'u': {
          if (!address) return;
          if (address !== chosen) choose(address);
          const list = event.key === 's' ? '[data-ladder] .rung' : '[data-used-by] .rung';
          // The trace of a line just chosen stands there after the next drawing.
          requestAnimationFrame(() =>
            requestAnimationFrame(() => trace.current?.querySelector<HTMLElement>(list)?.focus()),
          );
          break;
        }
        case 'c':
          if (!address) return;
          copyLine(address);
          break;
        case 'f': {
          const head = headOf(group);
          if (!head?.dataset.section) return;
          folds.fold(head.dataset.section, head.getAttribute('aria-expanded') === 'true');
          // A line that is folded away leaves the keyboard at the head of its section.
          head.focus();
          break;
        }
        case 'F':
          if (inTrace) return;
          folds.turnAll();
          if (group) headOf(outermost(group))?.focus();
          break;
        case 'Escape':
          if (!chosen) return;
          focusLine(sheet.current, chosen);
          close();
          break;
        default:
          return;
      }
      event.preventDefault();
    },
    [sheet, trace, chosen, choose, close, copyLine, folds],
  );
}

function outermost(group: Element): Element {
  const outer = group.parentElement?.closest('[data-group]');
  return outer ? outermost(outer) : group;
}

function step(elements: readonly HTMLElement[], by: 1 | -1) {
  const at = elements.indexOf(document.activeElement as HTMLElement);
  elements[Math.max(0, Math.min(elements.length - 1, at + by))]?.focus();
}

export const lineElement = (sheet: HTMLElement | null, address: string): HTMLElement | null =>
  sheet?.querySelector<HTMLElement>(`[data-line="${CSS.escape(address)}"]`) ?? null;

/**
 * Moves the focus to a line of the sheet; `where` it comes to stand if it is out of sight. False
 * where it is not there or folded.
 */
export function focusLine(
  sheet: HTMLElement | null,
  address: string,
  where: ScrollLogicalPosition = 'nearest',
): boolean {
  const line = lineElement(sheet, address);
  if (!line || !isOpen(line)) return false;
  line.focus({ preventScroll: true });
  line.scrollIntoView({ block: where });
  return true;
}

/** Moves the focus to the head of a section and brings it to the top. */
export function focusSection(sheet: HTMLElement | null, address: string): void {
  const head = sheet?.querySelector<HTMLElement>(`[data-section="${CSS.escape(address)}"]`);
  head?.focus({ preventScroll: true });
  head?.closest('[data-group]')?.scrollIntoView({ block: 'start' });
}
