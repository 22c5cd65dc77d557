import { describe, expect, it } from 'vitest';
import { starterDocument } from '#shared/document/starter-documents.ts';
import { readDesignFile } from './read-design-file.ts';

const document = starterDocument({
  kind: 'whistle',
  name: 'Wharf',
  lowestNote: 'D5',
  pitch: { a4Hz: 440, temperament: 'equal', tonic: 'D', centsOffsets: null },
  air: {
    temperatureC: 22,
    relativeHumidity: 0.5,
    co2Fraction: 0.02,
    pressurePa: 101_325,
    mouthTemperatureC: null,
    warmLengthMm: null,
    losses: true,
    fixed: null,
  },
});
const fileOf = (text: string) => new File([text], 'design.json');
const readJson = (json: unknown) => readDesignFile(fileOf(JSON.stringify(json)));

describe('readDesignFile', () => {
  it('reads a design document', async () => {
    await expect(readJson(document)).resolves.toEqual({ status: 'read', document });
  });

  it.each([
    ['', /cannot be read as JSON/],
    ['{"format": ', /cannot be read as JSON/],
    ['\u0000PDF-1.7', /cannot be read as JSON/],
  ])('says what %j is not', async (text, message) => {
    const reading = await readDesignFile(fileOf(text));
    if (reading.status !== 'refused') throw new Error('It was read.');
    expect(reading.complaints[0]?.message).toMatch(message);
  });

  it('tells every field that is wrong, counting as people do', async () => {
    const [first, ...rest] = document.holes;
    const reading = await readJson({
      ...document,
      air: { ...document.air, temperatureC: 400 },
      holes: [{ ...first, diameterMm: 'wide' }, ...rest],
    });
    if (reading.status !== 'refused') throw new Error('It was read.');
    expect(reading.complaints.map(({ place }) => place)).toEqual([
      'air › temperatureC',
      'holes › 1 › diameterMm',
    ]);
  });

  it('tells what the parts get wrong about one another', async () => {
    const [first, ...rest] = document.holes;
    const reading = await readJson({ ...document, holes: [{ ...first, diameterMm: 40 }, ...rest] });
    if (reading.status !== 'refused') throw new Error('It was read.');
    expect(reading.complaints[0]).toMatchObject({ place: 'holes › 1 › diameterMm' });
  });

  it('does not read a film to its end', async () => {
    const reading = await readDesignFile(fileOf(' '.repeat(2_000_001)));
    expect(reading).toMatchObject({ status: 'refused' });
  });
});
