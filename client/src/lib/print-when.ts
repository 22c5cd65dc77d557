const MONTHS = [
  ...['January', 'February', 'March', 'April', 'May', 'June', 'July'],
  ...['August', 'September', 'October', 'November', 'December'],
];

/** "today 11:32", "yesterday 18:42", "16 March", "2 December 2024": nearer times are told more exactly. */
export function printWhen(at: string, now = new Date()): string {
  const when = new Date(at);
  const clock = `${String(when.getHours()).padStart(2, '0')}:${String(when.getMinutes()).padStart(2, '0')}`;
  const days = Math.round((startOfDay(now) - startOfDay(when)) / 86_400_000);
  if (days === 0) return `today ${clock}`;
  if (days === 1) return `yesterday ${clock}`;
  return when.getFullYear() === now.getFullYear()
    ? printDay(when)
    : `${printDay(when)} ${when.getFullYear()}`;
}

/** "18 March" */
export function printDay(date: Date): string {
  return `${date.getDate()} ${MONTHS[date.getMonth()] ?? ''}`;
}

function startOfDay(date: Date): number {
  return new Date(date.getFullYear(), date.getMonth(), date.getDate()).getTime();
}
