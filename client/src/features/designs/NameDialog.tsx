import { useForm } from 'react-hook-form';
import { renameDesignRequest } from '#shared/contract/designs.ts';
import { problemFields } from '../../lib/api-problem.ts';
import { zodResolver } from '../../lib/zod-resolver.ts';
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
  open: boolean;
  mutation: { isPending: boolean; error: unknown; reset: () => void };
  onClose: () => void;
  onName: (name: string) => void;
}

export function NameDialog({ title, description, open, mutation, onClose, ...form }: NameDialogProps) {
  const handleOpen = (isOpen: boolean) => {
    if (isOpen) return;
    mutation.reset();
    onClose();
  };
  return (
    <Dialog title={title} description={description} open={open} onOpenChange={handleOpen}>
      <NameForm {...form} mutation={mutation} onCancel={() => handleOpen(false)} />
    </Dialog>
  );
}

type NameFormProps = Pick<NameDialogProps, 'verb' | 'name' | 'mutation' | 'onName'> & {
  onCancel: () => void;
};

function NameForm({ verb, name, mutation, onName, onCancel }: NameFormProps) {
  const { register, handleSubmit, formState } = useForm<{ name: string }>({
    resolver: zodResolver(renameDesignRequest),
    defaultValues: { name },
  });
  const refused = problemFields(mutation.error).name;
  return (
    <form noValidate onSubmit={(event) => void handleSubmit((values) => onName(values.name.trim()))(event)}>
      <Field
        label="Name"
        autoComplete="off"
        {...register('name')}
        onFocus={(event) => event.currentTarget.select()}
        error={formState.errors.name?.message ?? refused}
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
