/**
 * Seconds of processor time that one call of each takes: the least of some rounds in turn, since
 * other work on the machine only adds.
 */
export function secondsEach(
  calls: Readonly<Record<string, () => unknown>>,
  rounds: number,
): Record<string, number> {
  const least: Record<string, number> = {};
  for (let round = 0; round < rounds; round += 1)
    for (const [name, call] of Object.entries(calls))
      least[name] = Math.min(least[name] ?? Number.POSITIVE_INFINITY, secondsOf(call));
  return least;
}

/** Seconds that a round of one call lasts at least. */
const SHORTEST = 0.25;

function secondsOf(call: () => unknown): number {
  const start = process.cpuUsage();
  let calls = 0;
  let taken = 0;
  while (taken < SHORTEST) {
    call();
    calls += 1;
    const { user, system } = process.cpuUsage(start);
    taken = (user + system) / 1e6;
  }
  return taken / calls;
}
