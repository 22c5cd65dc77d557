import { useSearchParams } from 'react-router';
import type { ListDesignsQuery } from '#shared/contract/designs.ts';
import { readChoosing, withChoosing, writeListAddress } from './list-address.ts';

/** Writes a list into the address; what is being chosen to be compared goes on being chosen. */
export function useListSearch(): (list: ListDesignsQuery) => string {
  const [search] = useSearchParams();
  return (list) => withChoosing(writeListAddress(list), readChoosing(search)).toString();
}
