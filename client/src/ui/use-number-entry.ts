import { useState, type KeyboardEvent } from 'react';
import type { NumberFormat, NumberReading } from './number-format.ts';

export interface NumberEntryOptions {
  value: number;
  format: NumberFormat;
  min?: number;
  max?: number;
  /** Called with every new figure that could be read and lies inside the limits. */
  onChange: (value: number) => void;
}

export interface NumberEntry {
  text: string;
  /** Why what is typed was not taken; null while there is nothing to say. */
  complaint: string | null;
  /** The stored figure stands at its limit, so that − or + leads nowhere. */
  isLeast: boolean;
  isMost: boolean;
  commit: () => void;
  step: (steps: number) => void;
  onKeyDown: (event: KeyboardEvent) => void;
  onType: (text: string) => void;
}

/** What happens between the first key and the stored figure. Nothing typed is thrown away while it cannot be read. */
export function useNumberEntry({ value, format, onChange, ...limits }: NumberEntryOptions): NumberEntry {
  const { min = -Infinity, max = Infinity } = limits;
  /** null: the field shows the stored figure. */
  const [typed, setTyped] = useState<string | null>(null);
  const [complaint, setComplaint] = useState<string | null>(null);

  const settle = (next: number) => {
    setTyped(null);
    setComplaint(null);
    if (Math.abs(next - value) > 1e-9) onChange(next);
  };

  const commit = () => {
    if (typed === null) return;
    const reading = readTyped(typed, value, format);
    if (reading.status === 'unreadable') setComplaint(reading.message);
    else if (reading.value < min - 1e-9 || reading.value > max + 1e-9)
      setComplaint(outsideMessage(min, max, format));
    else settle(reading.value);
  };

  /** From what is typed if it can be read, else from what is stored. */
  const step = (steps: number) => {
    const reading = typed === null ? null : readTyped(typed, value, format);
    const from = reading?.status === 'read' ? reading.value : value;
    settle(Math.min(max, Math.max(min, tidy(from + steps * format.step))));
  };

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    const direction = { ArrowUp: 1, ArrowDown: -1 }[event.key];
    if (direction !== undefined) {
      event.preventDefault();
      step(direction * (event.shiftKey ? 10 : 1));
    } else if (event.key === 'Enter') commit();
    else if (event.key === 'Escape' && typed !== null) {
      event.stopPropagation();
      setTyped(null);
      setComplaint(null);
    }
  };

  const onType = (text: string) => {
    setTyped(text);
    setComplaint(null);
  };

  return {
    text: typed ?? format.print(value),
    complaint,
    isLeast: value <= min,
    isMost: value >= max,
    commit,
    step,
    onKeyDown,
    onType,
  };
}

function readTyped(text: string, value: number, format: NumberFormat): NumberReading {
  const added = /^\s*\+(.*)$/.exec(text)?.[1];
  if (!format.addsWithPlus || added === undefined) return format.read(text);
  const reading = format.read(added);
  return reading.status === 'read' ? { status: 'read', value: tidy(value + reading.value) } : reading;
}

/** Steps of 0.1 leave 0.30000000000000004 behind; a nanometre is finer than anything drilled. */
function tidy(value: number): number {
  return Math.round(value * 1e6) / 1e6;
}

function outsideMessage(min: number, max: number, format: NumberFormat): string {
  const unit = format.suffix === '' ? '' : ` ${format.suffix}`;
  if (max === Infinity) return `Make it ${format.print(min)}${unit} or more.`;
  if (min === -Infinity) return `Make it ${format.print(max)}${unit} or less.`;
  return `Make it between ${format.print(min)} and ${format.print(max)}${unit}.`;
}
