import { useEffect, useState } from 'react';

/** Seconds since something began to run; 0 while it doesn't. */
export function useSeconds(running: boolean): number {
  const [seconds, setSeconds] = useState(0);
  useEffect(() => {
    if (!running) return setSeconds(0);
    const began = Date.now();
    const timer = window.setInterval(
      () => setSeconds(Math.round((Date.now() - began) / 1000)),
      500,
    );
    return () => window.clearInterval(timer);
  }, [running]);
  return seconds;
}
