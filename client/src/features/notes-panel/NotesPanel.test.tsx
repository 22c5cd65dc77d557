// @vitest-environment jsdom
import { cleanup, render, screen, within } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { benchFrame, benchGeometry } from '../../bench/bench-geometry.ts';
import { WHOLE } from '../../bench/bench-view.ts';
import { drawnBody } from '../../bench/drawn-body.ts';
import type { Selection } from '../../bench/panel-props.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { NotesPanel } from './NotesPanel.tsx';

/** The document as the last edit left it. */
let shown: DesignDocument;
const keepShown = (document: DesignDocument) => {
  shown = document;
  return document;
};

function Bench({ document: start, readOnly = null }: { document: DesignDocument; readOnly?: string | null }) {
  const [document, setDocument] = useState(start);
  const [selection, setSelection] = useState<Selection>({ hole: null, fingering: null, register: 'all' });
  return (
    <NotesPanel
      document={document}
      prediction={null}
      sensitivities={null}
      unit="mm"
      bandCents={[5, 8, 15]}
      readOnly={readOnly}
      selection={selection}
      onSelect={(change) => setSelection((before) => ({ ...before, ...change }))}
      onEdit={(edit) => setDocument((before) => keepShown(edit.change(before)))}
      geometry={benchGeometry(document, benchFrame(drawnBody(document), 1440, WHOLE))}
    />
  );
}

/** Three notes are enough of a chart, and quick to find a button in. */
const whistle = whistleDocument();
const short = {
  ...whistle,
  fingerings: whistle.fingerings.filter(({ note }) => ['D5', 'E5', 'G5'].includes(note)),
};

const fingeringOf = (note: string) => shown.fingerings.find((fingering) => fingering.note === note);

const user = userEvent.setup({ delay: null });
afterEach(cleanup);

describe('the fingering chart', () => {
  it('covers, half covers and opens a hole with taps', async () => {
    render(<Bench document={short} />);
    await user.click(screen.getByLabelText('G5: Hole 6 open'));
    expect(fingeringOf('G5')?.covered).toContain('h6');
    await user.click(screen.getByLabelText('G5: Hole 6 covered'));
    expect(fingeringOf('G5')?.half).toEqual([{ hole: 'h6', fraction: 0.5, from: 'side' }]);
    await user.click(screen.getByLabelText('G5: Hole 6 half covered'));
    expect(fingeringOf('G5')?.half).toEqual([]);
  });

  it('runs from the lowest note to the highest, whatever the order of the document', () => {
    render(<Bench document={{ ...short, fingerings: short.fingerings.toReversed() }} />);
    const notes = screen.getAllByRole('rowheader').map((cell) => cell.textContent);
    expect(notes[0]).toBe('D5');
    expect(notes.at(-1)).toBe('G5');
  });

  it('is walked with the arrows, and opens the fields of the chosen note', async () => {
    render(<Bench document={short} />);
    await user.click(screen.getByRole('button', { name: 'D5' }));
    await user.keyboard('{ArrowDown}');
    expect(document.activeElement?.textContent).toBe('E5');
    expect(screen.getByRole('group', { name: 'Fingering of E5' })).toBeTruthy();
  });

  it('takes a note as it is typed, and says what it cannot read', async () => {
    render(<Bench document={short} />);
    await user.click(screen.getByRole('button', { name: 'E5' }));
    const field = within(screen.getByRole('group', { name: 'Fingering of E5' })).getByLabelText('Note');
    await user.clear(field);
    await user.type(field, 'H9{Enter}');
    expect(screen.getByRole('alert').textContent).toBe('Type a note such as D5, F#5 or Bb4.');
    expect(field).toHaveProperty('value', 'H9');
    await user.clear(field);
    await user.type(field, 'eb5{Enter}');
    expect(fingeringOf('Eb5')?.covered).toHaveLength(5);
  });

  it('adds, copies and removes fingerings', async () => {
    render(<Bench document={short} />);
    await user.click(screen.getByRole('button', { name: 'D5' }));
    await user.click(screen.getByRole('button', { name: 'Add a fingering' }));
    expect(fingeringOf('D#5')).toBeDefined();
    await user.click(screen.getByRole('button', { name: 'Remove the fingering' }));
    expect(fingeringOf('D#5')).toBeUndefined();
  });

  it('says so when it is empty, and offers the usual chart', async () => {
    render(<Bench document={{ ...short, fingerings: [] }} />);
    expect(screen.getByText('No fingerings yet, so there is nothing to predict.')).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Lay in the usual chart over D4' }));
    expect(shown.fingerings.map(({ note }) => note)).toContain('F#4');
  });

  it('only shows where nothing may be changed', () => {
    render(<Bench document={short} readOnly="Only makers change designs." />);
    expect(screen.queryByRole('button', { name: /Hole 6/ })).toBeNull();
    expect(screen.queryByRole('button', { name: 'Add a fingering' })).toBeNull();
  });
});

describe('the scale', () => {
  it('begins own cents at zero for all twelve', async () => {
    render(<Bench document={short} />);
    await user.selectOptions(screen.getByLabelText('Temperament'), 'own');
    expect(shown.pitch).toMatchObject({ temperament: 'own', centsOffsets: new Array(12).fill(0) });
    expect(screen.getByLabelText('F#')).toBeTruthy();
  });
});
