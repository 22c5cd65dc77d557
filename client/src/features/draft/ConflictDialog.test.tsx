// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { ConflictDialog } from './ConflictDialog.tsx';

const ancestor = whistleDocument();
const withHoles = (diameters: Record<string, number>): DesignDocument => ({
  ...ancestor,
  holes: ancestor.holes.map((hole) => ({ ...hole, diameterMm: diameters[hole.id] ?? hole.diameterMm })),
});
const mine = withHoles({ h1: 6.8, h4: 7 });
const theirs = withHoles({ h2: 8.2, h4: 6.8 });

function show() {
  const onSettle = vi.fn<(document: DesignDocument, label: string) => void>();
  const newer = {
    designId: 12,
    version: 8,
    savedAt: '2025-03-18T14:06:00Z',
    savedBy: { id: 4, name: 'Bryn Askell' },
    document: theirs,
  };
  render(<ConflictDialog mine={mine} newer={newer} ancestor={ancestor} unit="mm" onSettle={onSettle} />);
  return onSettle;
}

const user = userEvent.setup({ delay: null });
afterEach(cleanup);

describe('two drafts of one design', () => {
  it('stand side by side with what stood there before', () => {
    show();
    const row = screen.getByRole('row', { name: /Hole 4 diameter/ });
    expect([...row.children].map((cell) => cell.textContent)).toEqual([
      'Hole 4 diameter',
      '6.5 mm',
      '7.0 mm',
      '6.8 mm',
    ]);
  });

  it('choose the side that changed, and ask where both did', async () => {
    const onSettle = show();
    expect(screen.getByRole('radio', { name: 'Hole 1 diameter: mine, 6.8 mm' })).toHaveProperty(
      'checked',
      true,
    );
    expect(
      screen.getByRole('radio', { name: 'Hole 2 diameter: that of Bryn Askell, 8.2 mm' }),
    ).toHaveProperty('checked', true);
    const use = screen.getByRole('button', { name: 'Use what is chosen' });
    expect(use).toHaveProperty('disabled', true);
    await user.click(screen.getByRole('radio', { name: 'Hole 4 diameter: that of Bryn Askell, 6.8 mm' }));
    await user.click(use);
    expect(onSettle).toHaveBeenCalledWith(
      withHoles({ h1: 6.8, h2: 8.2, h4: 6.8 }),
      'Merged with the draft of Bryn Askell',
    );
  });

  it.each([
    ['Keep all of mine', mine],
    ['Take all of theirs', theirs],
  ])('%s', async (name, document) => {
    const onSettle = show();
    await user.click(screen.getByRole('button', { name }));
    expect(onSettle.mock.calls[0]?.[0]).toEqual(document);
  });
});
