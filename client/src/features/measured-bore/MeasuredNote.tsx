import { useEffect, useRef, type ReactNode } from 'react';
import type { PanelProps } from '../../bench/panel-props.ts';
import { Button } from '../../ui/Button.tsx';
import { counted } from './measured-words.ts';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';

interface MeasuredNoteProps extends Pick<PanelProps, 'geometry' | 'readOnly'> {
  desk: MeasuredBoreDesk;
}

/** What of a measured bore concerns the drawn one: that it is in use, or lies beside it, and how to get back. */
export function MeasuredNote({ desk, geometry, readOnly }: MeasuredNoteProps) {
  const { used, source, besideStations } = desk;
  const note = useRef<HTMLDivElement>(null);
  useEffect(() => {
    // The button that was pressed is gone with its screen.
    if (window.document.activeElement === window.document.body && used !== null)
      note.current?.focus({ preventScroll: true });
  }, [used]);
  return (
    <div ref={note} role="status" tabIndex={-1}>
      {used !== null && (
        <NoteLine action="Put the drawn bore back" onAction={desk.takeBack}>
          <b className="text-ink font-semibold">
            The bore is now {counted(used.stations, 'station')} of {used.name}.
          </b>
        </NoteLine>
      )}
      {besideStations !== null && (
        <NoteLine action="Go on with it" onAction={desk.open}>
          Dashed: the measured bore
          {source.fileName === null ? '' : `, ${source.fileName}`}.{' '}
          <Button look="bare" size="small" className="px-1" onClick={() => desk.keepBeside(false)}>
            Take it away
          </Button>
        </NoteLine>
      )}
      {geometry.layout === 'phone' && used === null && (
        // The header has no room for it there.
        <Button size="small" className="mb-3" disabled={readOnly !== null} onClick={desk.open}>
          Read in a measured bore
        </Button>
      )}
    </div>
  );
}

interface NoteLineProps {
  action: string;
  onAction: () => void;
  children: ReactNode;
}

function NoteLine({ action, onAction, children }: NoteLineProps) {
  return (
    <p className="border-hair text-data text-ink2 mb-2 border-b pb-2">
      {children}{' '}
      <Button look="bare" size="small" className="px-1" onClick={onAction}>
        {action}
      </Button>
    </p>
  );
}
