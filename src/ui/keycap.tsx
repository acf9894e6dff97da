/** A key of the keyboard. */
export function Keycap({ children }: { children: string }) {
  return (
    <kbd className="inline-flex h-4.5 min-w-4.5 items-center justify-center rounded-field border border-zinc-3 bg-paper px-1 font-mono text-tiny text-ink">
      {children}
    </kbd>
  );
}
