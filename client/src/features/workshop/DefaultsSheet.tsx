import type { Workshop } from '#shared/contract/session.ts';
import { Refusal } from '../../ui/Problem.tsx';

interface DefaultsSheetProps {
  workshop: Workshop;
  /** Why they cannot be changed by this person. */
  refusal: string;
}

/** The same figures in the same order, for those who only read them. */
export function DefaultsSheet({ workshop, refusal }: DefaultsSheetProps) {
  const [first, second, third] = workshop.bandCents;
  const rows: readonly (readonly [string, string])[] = [
    ['Name of the workshop', workshop.name],
    ['Lengths in', workshop.unit],
    ['Positions count from', workshop.referenceEnd === 'foot' ? 'the foot' : 'the mouth end'],
    ['Pitch of A', `${workshop.a4Hz} Hz`],
    ['Air in the bore', `${workshop.temperatureC} °C`],
    [
      'In tune within',
      `${first ?? '–'}, ${second ?? '–'}, ${third ?? '–'} cents in registers 1, 2, 3 and up`,
    ],
  ];
  return (
    <div className="grid max-w-160 gap-4">
      <Refusal>{refusal}</Refusal>
      <dl className="border-hair border-t">
        {rows.map(([name, value]) => (
          <div key={name} className="border-hair grid grid-cols-[minmax(0,200px)_1fr] gap-4 border-b py-2.5">
            <dt className="text-ink2">{name}</dt>
            <dd className="font-semibold break-words">{value}</dd>
          </div>
        ))}
      </dl>
    </div>
  );
}
