import { formulaHtml, isSet } from './set-formula.ts';

/*
 * Setting a whole sheet takes longer than a keystroke may. A formula is set at once when it is new,
 * known, or in view; the others wait until the browser is idle or they come into view. In a folded
 * section a new one waits too.
 */

const inView = new WeakSet<Element>();
const waiting = new Map<Element, string>();
let idle: number | null = null;

const observer = new IntersectionObserver(
  (entries) => {
    for (const { target, isIntersecting } of entries) {
      if (isIntersecting) {
        inView.add(target);
        flush(target);
      } else inView.delete(target);
    }
  },
  { rootMargin: '300px 0px' },
);

export function watchFormula(element: Element): () => void {
  observer.observe(element);
  return () => {
    observer.unobserve(element);
    waiting.delete(element);
  };
}

export function showFormula(element: Element, tex: string): void {
  waiting.set(element, tex);
  const isNew = !element.hasChildNodes() && element.closest('[data-folded]') === null;
  if (isNew || isSet(tex) || inView.has(element)) flush(element);
  else if (idle === null) idle = whenIdle(flushSome);
}

function flush(element: Element) {
  const tex = waiting.get(element);
  if (tex === undefined) return;
  waiting.delete(element);
  element.innerHTML = formulaHtml(tex);
}

// Paper shows what is folded on the screen.
window.addEventListener('beforeprint', () => {
  for (const element of [...waiting.keys()]) flush(element);
});

function flushSome(timeLeft: () => number) {
  idle = null;
  for (const element of [...waiting.keys()]) {
    if (timeLeft() < 2) break;
    flush(element);
  }
  if (waiting.size > 0) idle = whenIdle(flushSome);
}

/** Safari has no idle callback: a pause and a small budget do there. */
function whenIdle(run: (timeLeft: () => number) => void): number {
  if ('requestIdleCallback' in window) {
    return window.requestIdleCallback((deadline) => run(() => deadline.timeRemaining()));
  }
  return setTimeout(() => {
    const end = performance.now() + 8;
    run(() => end - performance.now());
  }, 60) as unknown as number;
}
