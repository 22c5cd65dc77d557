import { useState, type SyntheticEvent } from 'react';
import { renameDesignRequest } from '#shared/contract/designs.ts';
import { plainWords } from '#shared/document/plain-words.ts';
import { problemFields } from '../../lib/api-problem.ts';
import { Button } from '../../ui/Button.tsx';
import { Dialog, DialogActions } from '../../ui/Dialog.tsx';
import { Field } from '../../ui/Field.tsx';
import { Problem } from '../../ui/Problem.tsx';

interface NameDialogProps {
  title: string;
  description?: string;
  verb: string;
  /** What stands in the field at first. */
  name: string;
  mutation: { isPending: boolean; error: unknown; reset: () => void };
  onClose: () => void;
  onName: (name: string) => void;
}

export function NameDialog({ title, description, mutation, onClose, ...form }: NameDialogProps) {
  const handleOpen = (isOpen: boolean) => {
    if (isOpen) return;
    mutation.reset();
    onClose();
  };
  return (
    <Dialog title={title} description={description} open onOpenChange={handleOpen}>
      <NameForm {...form} mutation={mutation} onCancel={() => handleOpen(false)} />
    </Dialog>
  );
}

type NameFormProps = Pick<NameDialogProps, 'verb' | 'name' | 'mutation' | 'onName'> & {
  onCancel: () => void;
};

function NameForm({ verb, name, mutation, onName, onCancel }: NameFormProps) {
  const [typed, setTyped] = useState(name);
  const [complaint, setComplaint] = useState<string | undefined>();
  const refused = problemFields(mutation.error).name;
  const handleSubmit = (event: SyntheticEvent) => {
    event.preventDefault();
    const reading = renameDesignRequest.safeParse({ name: typed }, { error: plainWords });
    setComplaint(reading.error?.issues[0]?.message);
    if (reading.success) onName(reading.data.name);
  };
  return (
    <form noValidate onSubmit={handleSubmit}>
      <Field
        label="Name"
        autoComplete="off"
        value={typed}
        onChange={(event) => setTyped(event.currentTarget.value)}
        onFocus={(event) => event.currentTarget.select()}
        error={complaint ?? refused}
      />
      <div className="mt-3">
        <Problem error={refused === undefined ? mutation.error : null} />
      </div>
      <DialogActions>
        <Button look="quiet" onClick={onCancel}>
          Cancel
        </Button>
        <Button type="submit" look="go" disabled={mutation.isPending}>
          {verb}
        </Button>
      </DialogActions>
    </form>
  );
}
