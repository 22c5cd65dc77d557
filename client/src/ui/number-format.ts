export type NumberReading = { status: 'read'; value: number } | { status: 'unreadable'; message: string };

/** How a stored figure is printed into a field and read back from what was typed. */
export interface NumberFormat {
  /** Stands behind the figure: mm, in, Hz, °C. Empty for a bare figure. */
  suffix: string;
  /** One step of the arrows and of − and +, in the stored unit. */
  step: number;
  print: (value: number) => string;
  read: (text: string) => NumberReading;
  /** `+0.2` adds to what stands there, as on a dial; without it a sign is just a sign. */
  addsWithPlus: boolean;
}

interface PlainFormatOptions {
  suffix: string;
  step: number;
  digits: number;
  /** What could be typed instead, for the sentence about what could not be read. */
  example: string;
}

const PLAIN_NUMBER = /^[+-]?(\d+([.,]\d*)?|[.,]\d+)$/;

/** Figures that are not lengths: temperatures, frequencies, cents, degrees. */
export function plainFormat({ suffix, step, digits, example }: PlainFormatOptions): NumberFormat {
  return {
    suffix,
    step,
    addsWithPlus: false,
    print: (value) => printPlain(value, digits),
    read: (text) => {
      const bare = text
        .trim()
        .replaceAll('−', '-')
        .replace(new RegExp(`\\s*${escapeForRegExp(suffix)}$`, 'i'), '');
      if (!PLAIN_NUMBER.test(bare))
        return {
          status: 'unreadable',
          message: `Cannot read “${text.trim()}”. Type a figure such as ${example}.`,
        };
      return { status: 'read', value: Number(bare.replace(',', '.')) };
    },
  };
}

/** At least `digits` decimals, and as many more (to six) as the stored figure has. */
function printPlain(value: number, digits: number): string {
  let text = value.toFixed(digits);
  for (let more = digits + 1; Math.abs(Number(text) - value) > 1e-9 && more <= 6; more += 1) {
    text = value.toFixed(more);
  }
  return Number(text) === 0 ? text.replace('-', '') : text.replace('-', '−');
}

function escapeForRegExp(text: string): string {
  return text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
}

export const a4Format = plainFormat({ suffix: 'Hz', step: 1, digits: 0, example: '440 or 415' });
export const temperatureFormat = plainFormat({ suffix: '°C', step: 0.5, digits: 0, example: '24 or 21.5' });
export const centsFormat = plainFormat({ suffix: 'cents', step: 0.5, digits: 0, example: '5 or 7.5' });
