import { useDeferredValue, useMemo, useState, type ReactNode } from 'react';
import type { Workshop } from '#shared/contract/session.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';
import { Button } from '../../ui/Button.tsx';
import { Problem } from '../../ui/Problem.tsx';
import {
  adviseBore,
  chooseKind,
  drawAnswers,
  firstAnswers,
  nameOf,
  type Answers,
  type Drawing,
} from './answers.ts';
import { KindChoice } from './KindChoice.tsx';
import { ScaleQuestions } from './ScaleQuestions.tsx';
import { StartFrom, type ExistingDesign } from './StartFrom.tsx';

interface NewDesignFormProps {
  workshop: Workshop;
  unit: LengthUnit;
  existing: readonly ExistingDesign[];
  from: number | null;
  onFrom: (id: number | null) => void;
  /** The document of the design begun from; null while it is fetched, and without one. */
  fromDocument: DesignDocument | null;
  isCreating: boolean;
  error: unknown;
  onCreate: (document: DesignDocument) => void;
  /** Draws the instrument as it stands. */
  strip: (document: DesignDocument) => ReactNode;
}

/** Three questions down the page; the instrument above draws itself as they are answered. */
export function NewDesignForm(props: NewDesignFormProps) {
  const { workshop, unit, from, fromDocument, strip } = props;
  const [answers, setAnswers] = useState<Answers>(() => firstAnswers(workshop));
  const asked = useDeferredValue(answers);
  const drawing = useMemo(() => drawAnswers(asked), [asked]);
  const shown = from === null ? documentOf(drawing) : fromDocument;
  const name = nameOf(answers).trim();
  const nameError = name === '' ? 'Give the design a name.' : undefined;
  const isBoreWrong = from === null && adviseBore(answers, unit).status === 'wrong';
  const isReady = shown !== null && nameError === undefined && !isBoreWrong && asked === answers;

  return (
    <form
      onSubmit={(event) => {
        event.preventDefault();
        if (isReady) props.onCreate({ ...shown, name });
      }}
    >
      <FormHead canCreate={isReady && !props.isCreating} isCreating={props.isCreating} />
      {shown !== null && strip(shown)}
      <div className="px-margin grid gap-3 pt-4">
        <Problem error={props.error} />
        {from === null && <DrawingNotes drawing={drawing} />}
      </div>
      <div className="px-margin lying:grid-cols-3 grid gap-x-10 gap-y-8 pt-4 pb-10">
        <Question id="new-design-kind" title="Kind" isAnswered={from !== null}>
          <KindChoice value={answers.kind} onChange={(kind) => setAnswers(chooseKind(answers, kind))} />
        </Question>
        <Question id="new-design-scale" title="Lowest note and scale" isAnswered={from !== null}>
          <ScaleQuestions answers={answers} onChange={setAnswers} />
        </Question>
        <Question id="new-design-start" title="Start from">
          <StartFrom
            answers={answers}
            onChange={setAnswers}
            unit={unit}
            existing={props.existing}
            from={from}
            onFrom={props.onFrom}
            nameError={nameError}
          />
        </Question>
      </div>
    </form>
  );
}

function FormHead({ canCreate, isCreating }: { canCreate: boolean; isCreating: boolean }) {
  return (
    <div className="px-margin max-bar:justify-end flex flex-wrap items-start justify-between gap-3 pt-3.5 pb-3">
      <h1 className="text-page max-bar:sr-only font-semibold">New design</h1>
      <Button type="submit" look="go" disabled={!canCreate}>
        {isCreating ? 'Laying it out…' : 'Lay it on the bench'}
      </Button>
    </div>
  );
}

const documentOf = (drawing: Drawing) => (drawing.status === 'drawn' ? drawing.document : null);

interface QuestionProps {
  id: string;
  title: string;
  /** Comes with the design that is begun from. */
  isAnswered?: boolean;
  children: ReactNode;
}

function Question({ id, title, isAnswered = false, children }: QuestionProps) {
  return (
    <section aria-labelledby={id} className="border-hair border-t pt-3">
      <h2 id={id} className="text-section mb-3 font-semibold">
        {title}
      </h2>
      {isAnswered ? <p className="text-ink2">Comes with the design you start from.</p> : children}
    </section>
  );
}

/** Notes further off than this are worth a word before anything is laid on the bench, cents. */
const WORTH_A_WORD_CENTS = 2;

function DrawingNotes({ drawing }: { drawing: Drawing }) {
  if (drawing.status === 'refused')
    return (
      <ul role="alert" className="rounded-control border-stop bg-stop-soft border-l-3 px-3 py-2">
        {drawing.messages.map((message) => (
          <li key={message}>{message}</li>
        ))}
      </ul>
    );
  const { furthestCents } = drawing;
  if (furthestCents === null || Math.abs(furthestCents) < WORTH_A_WORD_CENTS)
    return (
      <p role="status" className="text-ink2">
        Holes stand where the plain notes of register 1 meet the scale. Everything can be changed on the
        bench.
      </p>
    );
  return (
    <p role="status" className="rounded-control bg-wait text-ink px-3 py-2">
      Holes of these sizes cannot all be placed: one note stays {Math.abs(furthestCents).toFixed(1)} cents{' '}
      {furthestCents < 0 ? 'flat' : 'sharp'}. A wider or narrower bore, or another lowest note, may do.
    </p>
  );
}
