import { useRef, useState, type ChangeEvent } from 'react';
import type { DesignSummary } from '#shared/contract/designs.ts';
import { problemSentence } from '../../lib/api-problem.ts';
import { Button } from '../../ui/Button.tsx';
import { Dialog, DialogActions } from '../../ui/Dialog.tsx';
import { useCreateDesign } from './designs.queries.ts';
import type { FileComplaint } from './read-design-file.ts';

interface ReadInDesignProps {
  onCreated: (design: DesignSummary) => void;
}

/** A design document from a file becomes a new design; what is wrong with the file is told field by field. */
export function ReadInDesign({ onCreated }: ReadInDesignProps) {
  const input = useRef<HTMLInputElement>(null);
  const [refused, setRefused] = useState<{ fileName: string; complaints: FileComplaint[] } | null>(null);
  const create = useCreateDesign();

  const handleFile = async (event: ChangeEvent<HTMLInputElement>) => {
    const file = event.currentTarget.files?.[0];
    // The same file may be chosen again once it is mended.
    event.currentTarget.value = '';
    if (file === undefined) return;
    // Fetched now, because few visits to the rack read anything in.
    const { readDesignFile } = await import('./read-design-file.ts');
    const reading = await readDesignFile(file);
    if (reading.status === 'refused') {
      setRefused({ fileName: file.name, complaints: reading.complaints });
      return;
    }
    create.mutate(reading.document, {
      onSuccess: onCreated,
      onError: (error) =>
        setRefused({ fileName: file.name, complaints: [{ place: '', message: problemSentence(error) }] }),
    });
  };

  return (
    <>
      <Button onClick={() => input.current?.click()} disabled={create.isPending}>
        {create.isPending ? 'Reading in…' : 'Read in a design'}
      </Button>
      <input
        ref={input}
        type="file"
        accept=".json,application/json"
        aria-label="Design document, a JSON file"
        tabIndex={-1}
        className="hidden"
        onChange={(event) => void handleFile(event)}
      />
      <Dialog
        title="This file was not read in"
        description={`Nothing was made of ${refused?.fileName ?? 'it'}. Mend what stands here, then read it in again.`}
        open={refused !== null}
        onOpenChange={() => setRefused(null)}
        width="wide"
      >
        <Complaints complaints={refused?.complaints ?? []} />
        <DialogActions>
          <Button look="go" onClick={() => setRefused(null)}>
            Close
          </Button>
        </DialogActions>
      </Dialog>
    </>
  );
}

/** Beyond this many the rest follows from the first ones. */
const SHOWN = 20;

function Complaints({ complaints }: { complaints: readonly FileComplaint[] }) {
  return (
    <ul className="border-hair border-t">
      {complaints.slice(0, SHOWN).map(({ place, message }) => (
        <li key={place + message} className="border-hair border-b py-2">
          {place !== '' && <span className="text-data text-ink3 block">{place}</span>}
          {message}
        </li>
      ))}
      {complaints.length > SHOWN && <li className="text-ink2 py-2">And {complaints.length - SHOWN} more.</li>}
    </ul>
  );
}
