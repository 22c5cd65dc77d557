// @vitest-environment jsdom
import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { benchFrame, benchGeometry } from '../../bench/bench-geometry.ts';
import { WHOLE } from '../../bench/bench-view.ts';
import { drawnBody } from '../../bench/drawn-body.ts';
import type { DesignEdit } from '../../bench/panel-props.ts';
import { HoleTable } from './HoleTable.tsx';

const document = whistleDocument();
const geometry = benchGeometry(document, benchFrame(drawnBody(document), 1440, WHOLE));

function renderTable(readOnly: string | null = null) {
  const onEdit = vi.fn<(edit: DesignEdit) => void>();
  render(
    <HoleTable
      document={document}
      geometry={geometry}
      sensitivities={null}
      unit="mm"
      selection={{ hole: 'h4', fingering: null, register: 'all' }}
      readOnly={readOnly}
      onSelect={vi.fn()}
      onEdit={onEdit}
    />,
  );
  return onEdit;
}

describe('HoleTable', () => {
  afterEach(cleanup);

  it('is a table with a column for each hole and the foot', () => {
    renderTable();
    const table = screen.getByRole('table', { name: 'Sizes of the holes' });
    const heads = within(table).getAllByRole('columnheader');
    expect(heads.map((head) => head.textContent)).toEqual([
      'Size',
      ...['1', '2', '3', '4', '5', '6'].map((number) => `Hole ${number}`),
      'Foot',
    ]);
  });

  it('takes a size as a maker types it, as one edit of that hole', async () => {
    const user = userEvent.setup();
    const onEdit = renderTable();
    const cell = screen.getByRole('textbox', { name: 'Diameter, Hole 4' });
    await user.clear(cell);
    await user.type(cell, '1/4"{Enter}');
    expect(onEdit).toHaveBeenCalledOnce();
    expect(onEdit.mock.calls[0]?.[0].change(document).holes[3]?.diameterMm).toBeCloseTo(6.35, 6);
  });

  it('stores a position from the mouth end that was typed from the foot', async () => {
    const user = userEvent.setup();
    const onEdit = renderTable();
    const cell = screen.getByRole('textbox', { name: 'From foot, Hole 6' });
    await user.clear(cell);
    await user.type(cell, '50{Enter}');
    expect(onEdit.mock.calls[0]?.[0].change(document).holes[5]?.positionMm).toBeCloseTo(215, 6);
  });

  it('says what would do for a hole that is wider than the bore, and changes nothing', async () => {
    const user = userEvent.setup();
    const onEdit = renderTable();
    const cell = screen.getByRole('textbox', { name: 'Diameter, Hole 4' });
    await user.clear(cell);
    await user.type(cell, '13{Enter}');
    expect(screen.getByRole('alert').textContent).toContain('12.0');
    expect(onEdit).not.toHaveBeenCalled();
  });

  it('shows plain figures where nothing may be changed', () => {
    renderTable('Visitors look at designs.');
    expect(screen.queryByRole('textbox')).toBeNull();
    expect(screen.getByRole('table').textContent).toContain('78.2');
  });
});
