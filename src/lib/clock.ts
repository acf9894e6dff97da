const time = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });
const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });

/** `09:41` */
export const clockTime = (at: Date): string => time.format(at);

/** `09:41` today, else `12 Nov 2026`. */
export function when(timestamp: string, now = new Date()): string {
  const at = new Date(timestamp);
  return at.toDateString() === now.toDateString() ? time.format(at) : day.format(at);
}
