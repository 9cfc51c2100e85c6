import type { Page } from '../../shared/api/common';

/** Keyset paging for infinite queries: the page parameter is the piece of query string that asks for the next page. */
export const nextPage = {
  initialPageParam: '',
  getNextPageParam: (last: Page<unknown>) =>
    last.next === null ? undefined : `&after=${encodeURIComponent(last.next)}`,
};
