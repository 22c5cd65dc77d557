import { describe, expect, it } from 'vitest';
import { seenVersion, versionTag } from './draft-version.ts';

describe('seenVersion', () => {
  it.each([1, 7, 123_456_789])('reads back the tag of version %i', (version) => {
    expect(seenVersion(versionTag(version))).toBe(version);
  });

  it.each([
    [undefined, 428],
    ['', 400],
    ['7', 400],
    ['*', 400],
    ['W/"7"', 400],
    ['"7", "8"', 400],
    ['"1234567890"', 400],
  ])('refuses %j with %i', (header, status) => {
    expect(() => seenVersion(header)).toThrow(expect.objectContaining({ status }));
  });
});
