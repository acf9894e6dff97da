import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';

export const projectQuery = (projectId: string) =>
  queryOptions({
    queryKey: keys.project(projectId),
    queryFn: ({ signal }) => call('showProject', { params: { projectId }, signal }),
  });
