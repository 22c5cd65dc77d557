// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { lengthFormat } from './length-format.ts';
import { a4Format, type NumberFormat } from './number-format.ts';
import { NumberField } from './NumberField.tsx';

interface Setup {
  value?: number;
  format?: NumberFormat;
  min?: number;
  max?: number;
  error?: string;
}

/** A field whose figure is stored as it is in a form; `stored` saw every figure that was kept. */
function setUp({ value = 6.5, format = lengthFormat('mm'), ...limits }: Setup = {}) {
  const stored = vi.fn<(value: number) => void>();
  function Stored() {
    const [figure, setFigure] = useState(value);
    return (
      <NumberField
        label="Diameter"
        value={figure}
        format={format}
        onChange={(next) => {
          stored(next);
          setFigure(next);
        }}
        {...limits}
      />
    );
  }
  render(<Stored />);
  return { field: screen.getByRole('textbox', { name: 'Diameter' }), stored, user: userEvent.setup() };
}

afterEach(cleanup);

describe('NumberField', () => {
  it.each([
    ['7', 7],
    ['11,1mm', 11.1],
    ['7/16 in', 11.1125],
    ['0.4375"', 11.1125],
    ['1 3/8"', 34.925],
    ['12.7/2', 6.35],
    ['+0.2', 6.7],
    ['+1/64 in', 6.896875],
  ])('keeps %s as %d mm', async (typed, mm) => {
    const { field, stored, user } = setUp();
    await user.clear(field);
    await user.type(field, `${typed}{Enter}`);
    expect(stored).toHaveBeenCalledTimes(1);
    expect(stored.mock.calls[0]?.[0]).toBeCloseTo(mm, 6);
  });

  it('keeps what is typed when the field is left', async () => {
    const { field, stored, user } = setUp();
    await user.clear(field);
    await user.type(field, '8');
    await user.tab();
    expect(stored.mock.calls).toEqual([[8]]);
    expect(field).toHaveProperty('value', '8.0');
  });

  it('throws nothing away that it cannot read, says so, and reads it once it is mended', async () => {
    const { field, stored, user } = setUp();
    await user.clear(field);
    await user.type(field, '6.x');
    await user.tab();
    expect(stored).not.toHaveBeenCalled();
    expect(field).toHaveProperty('value', '6.x');
    expect(field.getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByRole('alert').textContent).toContain('Type a size such as');
    await user.type(field, '{Backspace}4{Enter}');
    expect(stored.mock.calls).toEqual([[6.4]]);
    expect(screen.queryByRole('alert')).toBeNull();
  });

  it('puts the stored figure back at Escape', async () => {
    const { field, stored, user } = setUp();
    await user.clear(field);
    await user.type(field, '99{Escape}');
    expect(field).toHaveProperty('value', '6.5');
    await user.tab();
    expect(stored).not.toHaveBeenCalled();
  });

  it('steps with the arrows, ten at a time with Shift, without leaving dust behind', async () => {
    const { field, stored, user } = setUp({ value: 0.2 });
    await user.click(field);
    await user.keyboard('{ArrowUp}{Shift>}{ArrowUp}{/Shift}{ArrowDown}');
    expect(stored.mock.calls.flat()).toEqual([0.3, 1.3, 1.2]);
  });

  it('steps on from what is typed', async () => {
    const { field, stored, user } = setUp();
    await user.clear(field);
    await user.type(field, '8{ArrowUp}');
    expect(stored.mock.calls).toEqual([[8.1]]);
  });

  it('does not step past its limits and refuses figures beyond them in words', async () => {
    const { field, stored, user } = setUp({ value: 9.95, min: 2, max: 10 });
    await user.click(field);
    await user.keyboard('{ArrowUp}');
    expect(stored.mock.calls).toEqual([[10]]);
    expect(screen.getByRole('button', { name: 'More: Diameter' })).toHaveProperty('disabled', true);
    await user.clear(field);
    await user.type(field, '12{Enter}');
    expect(stored).toHaveBeenCalledTimes(1);
    expect(field).toHaveProperty('value', '12');
    expect(screen.getByRole('alert').textContent).toBe('Make it between 2.0 and 10.0 mm.');
  });

  it('steps with − and +', async () => {
    const { stored, user } = setUp();
    await user.click(screen.getByRole('button', { name: 'More: Diameter' }));
    await user.click(screen.getByRole('button', { name: 'Less: Diameter' }));
    await user.click(screen.getByRole('button', { name: 'Less: Diameter' }));
    expect(stored.mock.calls.flat()).toEqual([6.6, 6.5, 6.4]);
  });

  it('shows and reads inches without changing what is stored', async () => {
    const { field, stored, user } = setUp({ value: 6.35, format: lengthFormat('inch') });
    expect(field).toHaveProperty('value', '0.250');
    await user.click(field);
    await user.tab();
    expect(stored).not.toHaveBeenCalled();
    await user.clear(field);
    await user.type(field, '3/8{Enter}');
    expect(stored.mock.calls[0]?.[0]).toBeCloseTo(9.525, 9);
  });

  it('says what somebody else found wrong, tied to the field', () => {
    const { field } = setUp({ error: 'Hole 3 is wider than the bore.' });
    const message = screen.getByRole('alert');
    expect(message.textContent).toBe('Hole 3 is wider than the bore.');
    expect(field.getAttribute('aria-describedby')).toBe(message.id);
  });

  it('takes a sign for a sign where figures are no lengths', async () => {
    const { field, stored, user } = setUp({ value: 440, format: a4Format, min: 300, max: 600 });
    await user.clear(field);
    await user.type(field, '+415 Hz{Enter}');
    expect(stored.mock.calls).toEqual([[415]]);
  });
});
