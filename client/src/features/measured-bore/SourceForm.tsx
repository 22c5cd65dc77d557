import { useRef, useState, type ChangeEvent, type DragEvent, type Ref } from 'react';
import { Button } from '../../ui/Button.tsx';
import { FieldFrame } from '../../ui/Field.tsx';
import { readTableFile } from './measured-table-file.ts';
import type { SourceDesk } from './use-measured-source.ts';

interface SourceFormProps {
  desk: Pick<SourceDesk, 'source' | 'readIn' | 'retype' | 'clear' | 'isKept'>;
  rows: number;
  textRef?: Ref<HTMLTextAreaElement>;
}

/** Where a table comes in: chosen, dropped, pasted or typed. */
export function SourceForm({ desk, rows, textRef }: SourceFormProps) {
  const { source } = desk;
  const [refusal, setRefusal] = useState<string | null>(null);
  const take = async (file: File | undefined) => {
    if (file === undefined) return;
    const reading = await readTableFile(file);
    setRefusal(reading.status === 'refused' ? reading.message : null);
    if (reading.status === 'read') desk.readIn(reading.text, file.name);
  };
  const drop = (event: DragEvent) => {
    event.preventDefault();
    void take(event.dataTransfer.files[0]);
  };
  return (
    <div onDragOver={(event) => event.preventDefault()} onDrop={drop}>
      <div className="mb-3 flex flex-wrap items-center gap-2">
        <FileButton
          label={source.text === '' ? 'Choose a file' : 'Choose another file'}
          onFile={(file) => void take(file)}
        />
        {source.text !== '' && (
          <Button look="bare" size="small" onClick={desk.clear}>
            Clear the table
          </Button>
        )}
      </div>
      <FieldFrame
        label="Table of measurements"
        hint="A row to each place: its distance, then one or more diameters. Tabs, semicolons or commas between them, in mm or inch, with or without a heading."
        {...(refusal === null ? {} : { error: refusal })}
      >
        {(parts) => (
          <textarea
            {...parts}
            ref={textRef}
            rows={rows}
            value={source.text}
            spellCheck={false}
            autoComplete="off"
            placeholder={'Distance; Diameter at 0°; Diameter at 90°\n0; 12,72; 12,73\n5; 12,71; 12,72'}
            onChange={(event) => desk.retype(event.currentTarget.value)}
            className="rounded-control border-line bg-sheet text-data text-ink placeholder:text-ink3 aria-invalid:border-stop w-full resize-y border px-3 py-2 font-sans whitespace-pre"
          />
        )}
      </FieldFrame>
      {!desk.isKept && (
        <p className="text-data text-ink2 mt-1">
          This browser keeps nothing for the page: the table is lost when the page is loaded again.
        </p>
      )}
    </div>
  );
}

function FileButton({ label, onFile }: { label: string; onFile: (file: File | undefined) => void }) {
  const input = useRef<HTMLInputElement>(null);
  const handleFile = (event: ChangeEvent<HTMLInputElement>) => {
    const file = event.currentTarget.files?.[0];
    onFile(file);
    // The same file may be chosen again once it is mended.
    event.currentTarget.value = '';
  };
  return (
    <>
      <Button size="small" onClick={() => input.current?.click()}>
        {label}
      </Button>
      <input
        ref={input}
        type="file"
        accept=".csv,.tsv,.txt,text/csv,text/tab-separated-values,text/plain"
        aria-label="File of measurements, CSV or TSV"
        tabIndex={-1}
        className="hidden"
        onChange={handleFile}
      />
    </>
  );
}
