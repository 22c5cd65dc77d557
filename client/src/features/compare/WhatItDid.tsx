import type { SummaryRow } from './summary-rows.ts';
import { NoteWords } from './NoteWords.tsx';

interface WhatItDidProps {
  rows: readonly SummaryRow[];
  labels: { a: string; b: string };
}

/** Both instruments as wholes, figure by figure; what differs is bold. */
export function WhatItDid({ rows, labels }: WhatItDidProps) {
  return (
    <section aria-labelledby="did-heading" className="mt-4">
      <h2 id="did-heading" className="text-section font-semibold">
        What it comes to
      </h2>
      <table className="mt-0.5 w-full border-collapse">
        <thead>
          <tr className="text-label text-ink3">
            <td />
            <th scope="col" className="w-24 px-2 pb-0.5 text-right font-normal">
              {labels.a}
            </th>
            <th scope="col" className="w-24 px-2 pb-0.5 text-right font-normal">
              {labels.b}
            </th>
          </tr>
        </thead>
        <tbody className="border-hair border-b">
          {rows.map(({ label, a, b }) => (
            <tr key={label} className="border-hair h-7 border-t">
              <th scope="row" className="text-ink2 px-2 text-left font-normal">
                {label}
              </th>
              <td className="px-2 text-right whitespace-nowrap">
                <NoteWords text={a} />
              </td>
              <td className={`px-2 text-right whitespace-nowrap ${a === b ? '' : 'font-bold'}`}>
                <NoteWords text={b} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
