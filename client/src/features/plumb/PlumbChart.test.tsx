// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { benchFrame, benchGeometry } from '../../bench/bench-geometry.ts';
import { WHOLE } from '../../bench/bench-view.ts';
import { drawnBody } from '../../bench/drawn-body.ts';
import { PlumbChart } from './PlumbChart.tsx';

const document = whistleDocument();
const geometry = benchGeometry(document, benchFrame(drawnBody(document), 1440, WHOLE));
const prediction: DesignPrediction = {
  engine: 'test',
  notices: [],
  fingerings: document.fingerings.map(({ id, note, register }) => ({
    id,
    note,
    register,
    targetHz: 784,
    frequencyHz: id === 'f-a5' ? null : 780,
    centsFromScale: id === 'f-a5' ? null : id === 'f-g5' ? -6.1 : 1.2,
    beatsHz: 4,
    mode: 1,
    ladder: [],
    ventHole: null,
    cutoffHz: null,
    accuracyCents: 12,
    notices: id === 'f-g5' ? [{ code: 'weak', message: 'Weak beside the one above.' }] : [],
  })),
};

function renderChart(onSelect = vi.fn()) {
  render(
    <PlumbChart
      document={document}
      prediction={prediction}
      sensitivities={null}
      unit="mm"
      bandCents={[5, 8, 15]}
      readOnly={null}
      selection={{ hole: null, fingering: null, register: 'all' }}
      onSelect={onSelect}
      onEdit={vi.fn()}
      geometry={geometry}
      isDragging={false}
      isOld={false}
    />,
  );
  return onSelect;
}

describe('PlumbChart', () => {
  afterEach(cleanup);

  it('says every note with its cents, flat or sharp', () => {
    renderChart();
    expect(screen.getByRole('button', { name: 'G 5 6.1 cents flat' })).toBeTruthy();
    expect(screen.getByRole('button', { name: 'F sharp 5 1.2 cents sharp' })).toBeTruthy();
  });

  it('hangs no bob for a note that does not sound, and says so', () => {
    renderChart();
    expect(screen.getByRole('button', { name: 'A 5 no steady note' }).querySelector('circle')).toBeNull();
  });

  it('chooses the note and its hole together, by keyboard too', async () => {
    const user = userEvent.setup();
    const onSelect = renderChart();
    screen.getByRole('button', { name: 'G 5 6.1 cents flat' }).focus();
    await user.keyboard('{Enter}');
    expect(onSelect).toHaveBeenCalledWith({ hole: 'h4', fingering: 'f-g5' });
  });

  it('opens what has to be known about a figure beside it', async () => {
    const user = userEvent.setup();
    renderChart();
    await user.click(screen.getByRole('button', { name: 'What to know about G5' }));
    expect(await screen.findByText('Weak beside the one above.')).toBeTruthy();
  });

  it('gives the same figures as a table', () => {
    renderChart();
    const table = screen.getByRole('table', { name: 'Predicted pitch of every fingering' });
    expect(table.textContent).toContain('\u22126.1');
  });
});
