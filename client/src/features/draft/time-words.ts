const CLOCK = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });
const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long' });

/** `14:06`, and the day where it was not today: `17 March, 14:06`. */
export function timeWords(iso: string, now = new Date()): string {
  const time = new Date(iso);
  const clock = CLOCK.format(time);
  return time.toDateString() === now.toDateString() ? clock : `${DAY.format(time)}, ${clock}`;
}
