import { queryOptions } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';

export const projectKey = (projectId: string) => ['project', projectId] as const;

export const projectQuery = (projectId: string) =>
  queryOptions({
    queryKey: projectKey(projectId),
    queryFn: ({ signal }) => call('showProject', { params: { projectId }, signal }),
  });
