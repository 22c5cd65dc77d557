import type { Config } from 'tailwindcss';

const colour = (name: string) => `var(--${name})`;

/** The bench's names, as utilities: `bg-paper`, `text-ink3`, `border-hair`. Values and themes are in styles/tokens.css. */
const COLOURS = [
  ...['paper', 'sheet', 'bench', 'groove', 'hair', 'line', 'ink', 'ink2', 'ink3', 'scrim'],
  ...['mark', 'mark-ink', 'mark-soft', 'mark-line', 'r1', 'r2', 'r3'],
  ...['true', 'true-edge', 'true-ink', 'wait', 'wait-ink', 'stop', 'stop-soft'],
  ...['w1', 'w2', 'w3', 'w4', 'wood-edge', 'wood-bg', 'wood-hatch', 'hole', 'cham', 'block', 'air'],
  ...['s1', 's2', 's3', 'steel-edge', 'tick'],
];

export default {
  content: ['./client/index.html', './client/src/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      ...Object.fromEntries(COLOURS.map((name) => [name, colour(name)])),
    },
    fontFamily: { sans: ['var(--font-bench)'] },
    borderRadius: { none: '0', chip: '3px', control: '4px', disc: '9999px' },
    boxShadow: { pop: 'var(--pop)', none: 'none' },
    extend: {
      screens: { tablet: '700px', lying: '1024px', bar: '1025px', desk: '1280px' },
      spacing: { margin: 'var(--margin)', 'top-bar': 'var(--top-bar)' },
      fontSize: {
        instruction: ['42px', { lineHeight: '50px', letterSpacing: '-0.015em' }],
        reading: ['34px', '38px'],
        page: ['28px', { lineHeight: '34px', letterSpacing: '-0.01em' }],
        title: ['22px', '26px'],
        section: ['19px', '26px'],
        row: ['17px', '20px'],
        value: ['17px', '22px'],
        body: ['15px', '21px'],
        data: ['14px', '20px'],
        label: ['13px', '18px'],
        small: ['12.5px', '16px'],
      },
    },
  },
} satisfies Config;
