import { lazy, Suspense, useRef, useState, type ChangeEvent } from 'react';
import type { DesignSummary } from '#shared/contract/designs.ts';
import { problemSentence } from '../../lib/api-problem.ts';
import { Button } from '../../ui/Button.tsx';
import { useCreateDesign } from './designs.queries.ts';
import type { FileComplaint } from './read-design-file.ts';

/** Fetched when a file was refused. */
const FileComplaints = lazy(async () => ({ default: (await import('./FileComplaints.tsx')).FileComplaints }));

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
      {refused !== null && (
        <Suspense fallback={null}>
          <FileComplaints {...refused} onClose={() => setRefused(null)} />
        </Suspense>
      )}
    </>
  );
}
