const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });
const DAY_AND_TIME = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  hour: '2-digit',
  minute: '2-digit',
  hourCycle: 'h23',
});

/** `12 March 2026` */
export function printDay(date: Date): string {
  return DAY.format(date);
}

/** `12 March, 14:06` */
export function printDayAndTime(date: Date): string {
  return DAY_AND_TIME.format(date).replace(' at ', ', ');
}
