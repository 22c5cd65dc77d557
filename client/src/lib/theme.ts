import { motionPreference, themePreference } from './preferences.ts';

export type ThemeChoice = ReturnType<typeof themePreference.read>;

export const THEME_CHOICES: readonly { value: ThemeChoice; label: string }[] = [
  { value: 'day', label: 'Day' },
  { value: 'evening', label: 'Evening' },
  { value: 'device', label: 'Follow the device' },
];

const deviceIsDark = () => matchMedia('(prefers-color-scheme: dark)');

function paint(): void {
  const choice = themePreference.read();
  const root = document.documentElement;
  root.dataset.theme =
    choice === 'evening' || (choice === 'device' && deviceIsDark().matches) ? 'evening' : 'day';
  root.dataset.motion = motionPreference.read();
  document
    .querySelector('meta[name="theme-color"]')
    ?.setAttribute('content', getComputedStyle(root).getPropertyValue('--paper').trim());
}

/** Paints the chosen theme now, and again whenever the person or the device changes it. */
export function startTheme(): void {
  paint();
  themePreference.subscribe(paint);
  motionPreference.subscribe(paint);
  deviceIsDark().addEventListener('change', paint);
}
