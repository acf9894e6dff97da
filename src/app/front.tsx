import { type ReactNode, useEffect } from 'react';
import { Mark } from './mark.tsx';

/** The page before the door: what this is at the left, what is asked at the right. */
export function Front({ title, children }: { title: string; children: ReactNode }) {
  useEffect(() => {
    document.title = `${title} · Stanchion`;
  }, [title]);
  return (
    <div className="grid min-h-screen lg:grid-cols-[minmax(0,1fr)_minmax(420px,520px)]">
      <aside
        aria-label="What Stanchion is"
        className="on-ink relative flex flex-col justify-between gap-10 overflow-hidden bg-ink p-8 text-paper lg:p-14"
      >
        <p className="flex items-center gap-3 text-title font-semibold">
          <Mark className="h-7 w-7" />
          Stanchion
        </p>
        <ColumnDrawing />
        <div className="max-w-[54ch]">
          <p className="font-serif text-display">Calculations that can be followed home.</p>
          <p className="mt-3 text-zinc-2">
            Steel members under axial force and bending: every printed number with its formula, its
            clause, its substituted values and the source of the input it started from.
          </p>
          <p className="mt-6 border-t border-zinc-7 pt-3 text-small text-zinc-3">
            A calculation does not replace the locally adopted code and its amendments. A licensed
            engineer takes responsibility for it.
          </p>
        </div>
      </aside>
      <main id="main" className="flex flex-col justify-center bg-paper px-8 py-12 lg:px-14">
        <h1 className="mb-6 border-b-2 border-ink pb-2 font-serif text-display font-semibold">
          {title}
        </h1>
        {children}
      </main>
    </div>
  );
}

/** A pinned member bowing under load, with its first-order line: what the work is about. */
function ColumnDrawing() {
  return (
    <svg viewBox="0 0 520 190" className="w-full max-w-[620px]" aria-hidden="true" fill="none">
      <g className="stroke-zinc-5" strokeWidth="1" strokeDasharray="5 4">
        <path d="M60 110H460" />
      </g>
      <path d="M60 110C160 40 360 46 460 110" className="stroke-oxide-3" strokeWidth="2" />
      <path d="M60 110C160 74 360 78 460 110" className="stroke-zinc-3" strokeWidth="1.2" />
      <path d="M254 58V110" className="stroke-oxide-3" strokeWidth="1" />
      <circle cx="254" cy="58" r="3.500" className="fill-oxide-3" />
      <g className="stroke-paper" strokeWidth="1.400">
        <path d="M4 110H50M41 105l10 5-10 5M516 110H470M479 105l-10 5 10 5" />
        <path d="M60 110l-10 16h20zM46 130h28" />
        <circle cx="460" cy="118" r="8" />
        <path d="M446 130h28" />
      </g>
    </svg>
  );
}
