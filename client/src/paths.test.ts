import { matchPath } from 'react-router';
import { describe, expect, it } from 'vitest';
import { isCompareView, isWorkbenchPanel, paths, patterns } from './paths.ts';

describe('paths', () => {
  it('has every address of the program', () => {
    const addresses = Object.fromEntries(
      Object.entries({
        ...paths,
        signIn: () => paths.signIn(),
        design: () => paths.design(12),
        workbench: () => paths.workbench(12, 3, 'holes'),
        compare: () => paths.compare(12, 14),
        chooseToCompare: () => paths.chooseToCompare(12),
      }).map(([name, address]) => [name, address()]),
    );
    expect(addresses).toEqual({
      home: '/',
      signIn: '/sign-in',
      start: '/start',
      today: '/today',
      designs: '/designs',
      newDesign: '/designs/new',
      design: '/designs/12',
      workbench: '/designs/12/r/3/holes',
      compare: '/designs/compare/12/14/holes',
      chooseToCompare: '/designs?compare=12',
      account: '/account',
      workshopDefaults: '/workshop/defaults',
      workshopMembers: '/workshop/members',
    });
  });

  it('keeps where to go back to through the sign-in, whatever stands in it', () => {
    const address = new URL(paths.signIn('/designs?search=a&b#c'), 'http://bench.example');
    expect(address.pathname).toBe('/sign-in');
    expect(address.searchParams.get('back')).toBe('/designs?search=a&b#c');
  });

  it('leaves the way back out when it is the way on anyway', () => {
    expect(paths.signIn('/')).toBe('/sign-in');
  });

  it.each([
    [patterns.design, paths.design(7), { id: '7' }],
    [patterns.compare, paths.compare(7, 7, 'air'), { a: '7', b: '7', view: 'air' }],
    [patterns.workbench, paths.workbench(7, 2, 'air'), { id: '7', rev: '2', panel: 'air' }],
  ])('matches %s to the addresses it makes', (pattern, address, params) => {
    expect(matchPath(pattern, address)?.params).toEqual(params);
  });
});

describe('isWorkbenchPanel', () => {
  it.each([
    ['holes', true],
    ['air', true],
    ['fit', false],
    ['', false],
    [undefined, false],
    [null, false],
  ])('%s: %s', (panel, expected) => {
    expect(isWorkbenchPanel(panel)).toBe(expected);
  });
});

describe('isCompareView', () => {
  it.each([
    ['notes', true],
    ['air', true],
    ['fit', false],
    [undefined, false],
  ])('%s: %s', (view, expected) => {
    expect(isCompareView(view)).toBe(expected);
  });
});
