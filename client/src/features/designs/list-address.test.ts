import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DESIGN_SORTS, listDesignsQuery, type ListDesignsQuery } from '#shared/contract/designs.ts';
import {
  changeList,
  isWholeList,
  readChoosing,
  readListAddress,
  sortList,
  withChoosing,
  writeListAddress,
} from './list-address.ts';

const usual = listDesignsQuery.parse({});
const read = (search: string) => readListAddress(new URLSearchParams(search));

const anyList: fc.Arbitrary<ListDesignsQuery> = fc.record(
  {
    search: fc.string({ maxLength: 40 }).map((text) => text.trim()),
    kind: fc.constantFrom('window', 'embouchure', 'rim', 'reed'),
    mine: fc.boolean(),
    archived: fc.boolean(),
    sort: fc.constantFrom(...DESIGN_SORTS),
    order: fc.constantFrom('asc', 'desc'),
    page: fc.integer({ min: 1, max: 100_000 }),
    pageSize: fc.integer({ min: 1, max: 100 }),
  },
  { requiredKeys: ['search', 'mine', 'archived', 'sort', 'order', 'page', 'pageSize'] },
);

describe('the address of a list of designs', () => {
  it('is read back as it was written', () => {
    fc.assert(
      fc.property(anyList, (list) => {
        expect(readListAddress(new URLSearchParams(writeListAddress(list).toString()))).toEqual(list);
      }),
    );
  });

  it('is plain for the plain list', () => {
    expect(writeListAddress(usual).toString()).toBe('');
  });

  it.each([
    ['page=0', {}],
    ['page=two&search=low', { search: 'low' }],
    ['sort=colour&mine=true', { mine: true }],
    ['kind=harp', {}],
    ['utm=mail&kind=reed', { kind: 'reed' }],
    ['pageSize=5000', {}],
  ])('opens %s and drops what makes no sense', (search, expected) => {
    expect(read(search)).toEqual({ ...usual, ...expected });
  });
});

describe('changeList', () => {
  it('begins at the first page again, unless the page is what changes', () => {
    const deep = { ...usual, page: 4 };
    expect(changeList(deep, { mine: true })).toMatchObject({ page: 1, mine: true });
    expect(changeList(deep, { page: 5 }).page).toBe(5);
  });
});

describe('sortList', () => {
  it('sorts another column the way it is usually read, and the same one the other way round', () => {
    const byName = sortList(usual, 'name');
    expect(byName).toMatchObject({ sort: 'name', order: 'asc' });
    expect(sortList(byName, 'name').order).toBe('desc');
    expect(sortList(byName, 'changed')).toMatchObject({ sort: 'changed', order: 'desc' });
  });
});

describe('isWholeList', () => {
  it.each([
    ['', true],
    ['page=3&sort=name', true],
    ['search=d', false],
    ['kind=rim', false],
    ['mine=true', false],
    ['archived=true', false],
  ])('%s: %s', (search, expected) => {
    expect(isWholeList(read(search))).toBe(expected);
  });
});

describe('choosing what to compare', () => {
  it.each([
    ['compare=two', 'two'],
    ['compare=12', 12],
    ['compare=0', null],
    ['compare=x', null],
    ['', null],
  ])('%s is %s', (search, choosing) => {
    expect(readChoosing(new URLSearchParams(search))).toBe(choosing);
  });

  it('goes on through another list, and ends', () => {
    const list = writeListAddress(read('kind=window'));
    expect(withChoosing(list, 12).toString()).toBe('kind=window&compare=12');
    expect(withChoosing(withChoosing(list, 12), null).toString()).toBe('kind=window');
  });
});
