// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { documentFaults } from '#shared/document/document-faults.ts';
import { benchFrame, benchGeometry } from '../../bench/bench-geometry.ts';
import { WHOLE } from '../../bench/bench-view.ts';
import { drawnBody } from '../../bench/drawn-body.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { BorePanel } from './BorePanel.tsx';

// There is no worker here: what a wider bore does is tested with the engine itself.
vi.mock('../../engine/start-engine.ts', () => ({
  startEngine: () => ({ remote: { study: () => Promise.resolve(null) }, close: () => undefined }),
}));

/** The document as the last edit left it. */
let shown: DesignDocument;
const keepShown = (document: DesignDocument) => {
  shown = document;
  return document;
};

function Bench({ document: start }: { document: DesignDocument }) {
  const [document, setDocument] = useState(start);
  return (
    <BorePanel
      document={document}
      prediction={null}
      sensitivities={null}
      unit="mm"
      bandCents={[5, 8, 15]}
      readOnly={null}
      selection={{ hole: null, fingering: null, register: 'all' }}
      onSelect={() => undefined}
      onEdit={(edit) => setDocument((before) => keepShown(edit.change(before)))}
      geometry={benchGeometry(document, benchFrame(drawnBody(document), 1440, WHOLE))}
    />
  );
}

const user = userEvent.setup({ delay: null });
const typeInto = async (name: string, text: string) => {
  const field = screen.getByRole('textbox', { name });
  await user.clear(field);
  await user.type(field, `${text}{Enter}`);
};

afterEach(cleanup);

describe('the bore', () => {
  it('is drawn and narrowed by keys alone', async () => {
    render(<Bench document={whistleDocument()} />);
    await user.click(screen.getByRole('button', { name: 'Add a station' }));
    expect(shown.bore.stations).toHaveLength(3);
    const knot = screen.getByRole('button', { name: 'Station 2, 134.7 from foot, 12.70 wide' });
    knot.focus();
    await user.keyboard('{Alt>}{ArrowDown}{ArrowRight}{/Alt}{Alt>}{Shift>}{ArrowDown}{/Shift}{/Alt}');
    expect(shown.bore.stations[1]).toEqual({ positionMm: 130.4, diameterMm: 12.64 });
  });

  it('takes sizes as a maker types them', async () => {
    render(<Bench document={whistleDocument()} />);
    await user.click(screen.getByRole('button', { name: 'Add a station' }));
    await typeInto('Diameter', '1/2"');
    await typeInto('From foot', '133');
    expect(shown.bore.stations[1]).toEqual({ positionMm: 132, diameterMm: 12.7 });
  });

  it('begins where a longer window ends', async () => {
    render(<Bench document={whistleDocument()} />);
    await typeInto('Lip to windway', '5');
    expect(shown.bore.stations[0]?.positionMm).toBe(-5);
    expect(shown.outside.stations[0]?.positionMm).toBe(-5);
  });

  it('is cut to length with its outside', async () => {
    render(<Bench document={whistleDocument()} />);
    await typeInto('Length', '260');
    expect(shown.bore.stations.at(-1)?.positionMm).toBe(260);
    expect(shown.outside.stations.at(-1)?.positionMm).toBe(260);
  });

  it.each(['Embouchure hole', 'Rim', 'Reed', 'Ideal, open', 'Ideal, closed'])(
    'takes another mouth end: %s',
    async (name) => {
      render(<Bench document={whistleDocument()} />);
      await user.selectOptions(screen.getByLabelText('Kind'), name);
      expect(screen.getByRole('heading', { name })).toBeTruthy();
      expect(documentFaults(shown)).toEqual([]);
    },
  );

  it('shows the outside in the same table', async () => {
    render(<Bench document={whistleDocument()} />);
    await user.click(screen.getByRole('button', { name: 'outside' }));
    await user.click(screen.getByRole('button', { name: 'Station 2, 0.0 from foot' }));
    await typeInto('Diameter', '16');
    expect(shown.outside.stations[1]?.diameterMm).toBe(16);
    expect(shown.bore.stations[1]?.diameterMm).toBe(12.7);
  });
});
