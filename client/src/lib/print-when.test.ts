import { describe, expect, it } from 'vitest';
import { printWhen } from './print-when.ts';

const now = new Date(2026, 2, 18, 9, 0);

describe('printWhen', () => {
  it.each([
    [new Date(2026, 2, 18, 8, 5), 'today 08:05'],
    [new Date(2026, 2, 17, 23, 59), 'yesterday 23:59'],
    [new Date(2026, 2, 16, 12, 0), '16 March'],
    [new Date(2026, 0, 2), '2 January'],
    [new Date(2025, 11, 2), '2 December 2025'],
  ])('%s', (when, expected) => {
    expect(printWhen(when.toISOString(), now)).toBe(expected);
  });

  it('counts days by the calendar, also over the night when the clocks change', () => {
    expect(printWhen(new Date(2026, 2, 28, 23, 0).toISOString(), new Date(2026, 2, 29, 23, 0))).toBe(
      'yesterday 23:00',
    );
  });
});
