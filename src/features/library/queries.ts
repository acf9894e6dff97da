import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';

/** Lines of one's calculations that use a clause; asked for at every opening, as they change. */
export const clauseUsesQuery = (book: string, clause: string) =>
  queryOptions({
    queryKey: keys.clauseUses(book, clause),
    queryFn: ({ signal }) => call('listClauseUses', { params: { book, clause }, signal }),
    staleTime: 0,
  });

/**
 * The published cases run by the engine of this page, once: they change with the program alone.
 * The cases and the procedure come with the first clause that is opened.
 */
export const publishedQuery = queryOptions({
  queryKey: keys.published,
  queryFn: async () => (await import('./run-published.ts')).runPublished(),
  staleTime: Number.POSITIVE_INFINITY,
  gcTime: Number.POSITIVE_INFINITY,
  retry: false,
});
