import { Button } from '../../ui/Button.tsx';
import { Dialog, DialogActions } from '../../ui/Dialog.tsx';
import type { FileComplaint } from './read-design-file.ts';

interface FileComplaintsProps {
  fileName: string;
  complaints: readonly FileComplaint[];
  onClose: () => void;
}

/** What is wrong with a file, field by field. */
export function FileComplaints({ fileName, complaints, onClose }: FileComplaintsProps) {
  return (
    <Dialog
      title="This file was not read in"
      description={`Nothing was made of ${fileName}. Mend what stands here, then read it in again.`}
      open
      onOpenChange={onClose}
      width="wide"
    >
      <Complaints complaints={complaints} />
      <DialogActions>
        <Button look="go" onClick={onClose}>
          Close
        </Button>
      </DialogActions>
    </Dialog>
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
