import { describe, expect, it } from 'vitest';
import { whistleDocument } from '../../../tests/support/whistle-document.ts';
import { valueWords } from './value-words.ts';

const document = whistleDocument();

describe('values in words', () => {
  it.each([
    [6.5, 'diameterMm', '6.5 mm'],
    [186.8, 'positionMm', '78.2 mm from foot'],
    [null, 'chimneyMm', 'from the wall'],
    [null, 'undercut', 'none'],
    [undefined, 'holes', 'not there'],
    [0.5, 'relativeHumidity', '50 %'],
    [-3, 'centsOffset', '−3.0 cents'],
    [true, 'losses', 'on'],
    [24, 'temperatureC', '24 °C'],
    [['h1', 'h2'], 'covered', '1 2'],
    [[], 'half', 'none'],
    [[{ hole: 'h6', fraction: 0.5, from: 'side' }], 'half', '6 by 50 %'],
    [[{ positionMm: 0, diameterMm: 12.7 }], 'stations', '12.7 at 265.0'],
    [document.fingerings[0], '', 'D5, register 1'],
    [{ innerDiameterMm: 8, depthMm: 2 }, 'undercut', '8.0 mm, 2.0 mm'],
    [{ kind: 'rim', cover: 0.25, correctionScale: 1 }, 'mouthEnd', 'rim, 25 %, 1'],
  ])('%j in %s reads %s', (value, key, words) => {
    expect(valueWords(value, key, { document, unit: 'mm' })).toBe(words);
  });

  it('are in inch where the person measures in inch', () => {
    expect(valueWords(6.35, 'diameterMm', { document, unit: 'inch' })).toBe('0.250 in');
  });
});
