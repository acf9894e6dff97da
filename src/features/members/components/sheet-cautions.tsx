import { CAUTIONS } from '#shared/report/cautions.ts';

/** What every sheet says, under it. */
export const SheetCautions = () => (
  <footer className="mx-auto max-w-[880px] border-t border-zinc-2 bg-paper px-6 py-4 text-small text-zinc-7">
    <ul className="grid gap-1">
      {CAUTIONS.map((caution) => (
        <li key={caution}>{caution}</li>
      ))}
    </ul>
  </footer>
);
