import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { unitPreference } from './preferences.ts';
import { useSession } from './session.ts';

/** The unit lengths are shown and typed in: this person's own choice, else the workshop's. */
export function useUnit(): LengthUnit {
  const { workshop } = useSession();
  const choice = unitPreference.use();
  return choice === 'workshop' ? workshop.unit : choice;
}
