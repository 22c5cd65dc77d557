import { plainFormat, type NumberFormat } from './number-format.ts';

interface PercentFormatOptions {
  /** One step, in percent. */
  stepPercent: number;
  digits?: number;
  example: string;
}

/** Shares of one, shown and typed in percent. */
export function percentFormat({ stepPercent, digits = 0, example }: PercentFormatOptions): NumberFormat {
  const plain = plainFormat({ suffix: '%', step: stepPercent, digits, example });
  return {
    ...plain,
    step: stepPercent / 100,
    print: (share) => plain.print(share * 100),
    read: (text) => {
      const reading = plain.read(text);
      return reading.status === 'read' ? { status: 'read', value: reading.value / 100 } : reading;
    },
  };
}
