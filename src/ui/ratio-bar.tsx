/** A ratio against its limit, which stands at the bar's right end; over it the bar is oxide and full. */
export function RatioBar({ ratio }: { ratio: number | null }) {
  if (ratio === null) return <span className="text-small text-zinc-7">no ratio</span>;
  const over = ratio > 1;
  // The limit stands at 9/10 of the bar, so that what is over it can be seen to be.
  const limit = 90;
  const end = Math.min(100, ratio * limit);
  return (
    <svg
      className="block h-2.5 w-full"
      viewBox="0 0 100 10"
      preserveAspectRatio="none"
      aria-hidden="true"
    >
      <rect x="0" y="2" width={limit} height="6" className="fill-zinc-1" />
      <rect x="0" y="2" width={end} height="6" className={over ? 'fill-oxide' : 'fill-ink'} />
      <rect x={limit - 0.3} y="0" width="0.6" height="10" className="fill-ink" />
    </svg>
  );
}
