import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { readSelection, writeSelection } from './selection-address.ts';

const document = whistleDocument();

describe('the choice in the address', () => {
  it('is a hole by its label and a note by its name', () => {
    const selection = readSelection(new URLSearchParams('hole=4&note=G5&register=2'), document);
    expect(selection).toEqual({ hole: 'h4', fingering: 'f-g5', register: 2 });
  });

  it.each(['hole=4&note=F%235', 'hole=foot', 'hole=mouth&register=3', ''])(
    'comes back as it was: %s',
    (text) => {
      const search = new URLSearchParams(text);
      expect(
        writeSelection(new URLSearchParams(), readSelection(search, document), document).toString(),
      ).toBe(search.toString());
    },
  );

  it('passes over what the instrument does not have', () => {
    expect(readSelection(new URLSearchParams('hole=9&note=H9&register=0'), document)).toEqual({
      hole: null,
      fingering: null,
      register: 'all',
    });
  });

  it('tells two fingerings of one note apart', () => {
    const [first] = document.fingerings;
    const twice = { ...document, fingerings: [...document.fingerings, { ...first!, id: 'f-other' }] };
    const search = writeSelection(
      new URLSearchParams('x=1'),
      { hole: null, fingering: 'f-other', register: 'all' },
      twice,
    );
    expect(search.toString()).toBe('x=1&note=D5.2');
    expect(readSelection(search, twice).fingering).toBe('f-other');
  });
});
