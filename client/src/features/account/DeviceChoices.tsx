import type { ReactNode } from 'react';
import { HAND_REACH_MM } from '#shared/document/hand-reach.ts';
import {
  handPreference,
  motionPreference,
  notesPreference,
  singleKeysPreference,
  themePreference,
  unitPreference,
  type Preference,
} from '../../lib/preferences.ts';
import { THEME_CHOICES } from '../../lib/theme.ts';
import { Segment } from '../../ui/Segment.tsx';

interface DeviceChoicesProps {
  /** The unit that "the workshop's" stands for. */
  workshopUnit: 'mm' | 'inch';
}

/** What this person wants on this device; each takes effect at once. */
export function DeviceChoices({ workshopUnit }: DeviceChoicesProps) {
  return (
    <div className="grid gap-5">
      <Choice label="Theme" preference={themePreference} options={THEME_CHOICES}>
        Evening is for a shop lit by one lamp.
      </Choice>
      <Choice
        label="Lengths in"
        preference={unitPreference}
        options={[
          { value: 'workshop', label: `The workshop’s (${workshopUnit})` },
          { value: 'mm', label: 'mm' },
          { value: 'inch', label: 'inch' },
        ]}
      >
        Typed lengths may always carry a unit of their own: 3/16", 4.8 mm, #7.
      </Choice>
      <Choice
        label="Notes"
        preference={notesPreference}
        options={[
          { value: 'letters', label: 'C D E' },
          { value: 'syllables', label: 'Do re mi' },
        ]}
      >
        Fixed do: Do is C whatever the key. Typed notes keep their letters.
      </Choice>
      <Choice
        label="Hand"
        preference={handPreference}
        options={[
          { value: 'small', label: `Small, ${HAND_REACH_MM.small} mm` },
          { value: 'middle', label: `Middle, ${HAND_REACH_MM.middle} mm` },
          { value: 'large', label: `Large, ${HAND_REACH_MM.large} mm` },
        ]}
      >
        From one finger’s hole to the next. A longer reach within a hand is marked at the workbench.
      </Choice>
      <Choice
        label="Single keys"
        preference={singleKeysPreference}
        options={[
          { value: 'on', label: 'On' },
          { value: 'off', label: 'Off' },
        ]}
      >
        Such as / to find and ? for the list of keys.
      </Choice>
      <Choice
        label="Motion"
        preference={motionPreference}
        options={[
          { value: 'device', label: 'Follow the device' },
          { value: 'less', label: 'Always still' },
        ]}
      >
        Still bobs jump to their place instead of swinging there.
      </Choice>
    </div>
  );
}

interface ChoiceProps<Value extends string> {
  label: string;
  preference: Preference<Value>;
  options: readonly { value: Value; label: string }[];
  children: ReactNode;
}

function Choice<Value extends string>({ label, preference, options, children }: ChoiceProps<Value>) {
  const value = preference.use();
  return (
    <div>
      <p className="mb-1 font-semibold">{label}</p>
      <Segment label={label} value={value} options={options} onChange={preference.choose} />
      <p className="text-data text-ink3 mt-1">{children}</p>
    </div>
  );
}
