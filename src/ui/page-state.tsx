import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { isProblem, reasonOf } from '#client/lib/problem.ts';
import { Failure, Waiting } from './state-panels.tsx';

/** Shows what a query fetched, and until then, or instead, how it stands with a way on. */
export function Fetched<T>(props: {
  query: UseQueryResult<T>;
  what: string;
  children: (data: T) => ReactNode;
}) {
  const { query, what } = props;
  if (query.data !== undefined) return props.children(query.data);
  if (query.error) {
    return (
      <Failure title={`The ${what} could not be fetched`} onRetry={() => void query.refetch()}>
        {reasonOf(query.error)}
      </Failure>
    );
  }
  return <Waiting what={`the ${what}`} />;
}

/** Whether there is nothing at the address, as far as this person may know. */
export const isAbsent = (query: { data: unknown; error: unknown }): boolean =>
  query.data === undefined &&
  (isProblem(query.error, 'not-found') || isProblem(query.error, 'invalid-request'));
