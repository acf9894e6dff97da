import { useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';
import type { BodyInputOf } from '#shared/contracts/contract.ts';
import type { Project, projects } from '#shared/contracts/projects.ts';

type Routes = typeof projects;
export type ProjectValues = BodyInputOf<Routes['createProject']>;
export type DrawingValues = BodyInputOf<Routes['createDrawing']>;

export function useCreateProject() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: ProjectValues) => call('createProject', { body }),
    onSuccess: (project: Project) => {
      client.setQueryData(keys.project(project.id), project);
      void client.invalidateQueries({ queryKey: keys.desk });
    },
  });
}

export function useUpdateProject(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: BodyInputOf<Routes['updateProject']>) =>
      call('updateProject', { params: { projectId }, body }),
    onSuccess: (project) => {
      client.setQueryData(keys.project(projectId), project);
      void client.invalidateQueries({ queryKey: keys.desk });
    },
  });
}

/** Changes of the drawing register; the project is fetched again after each, done or refused. */
function useDrawingChange<V, R>(change: (values: V) => Promise<R>, projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: change,
    onSettled: () => client.invalidateQueries({ queryKey: keys.project(projectId) }),
  });
}

export const useCreateDrawing = (projectId: string) =>
  useDrawingChange(
    (body: DrawingValues) => call('createDrawing', { params: { projectId }, body }),
    projectId,
  );

export const useUpdateDrawing = (projectId: string) =>
  useDrawingChange(
    ({ drawingId, ...body }: DrawingValues & { version: number; drawingId: string }) =>
      call('updateDrawing', { params: { projectId, drawingId }, body }),
    projectId,
  );

export const useDeleteDrawing = (projectId: string) =>
  useDrawingChange(
    (drawingId: string) => call('deleteDrawing', { params: { projectId, drawingId } }),
    projectId,
  );

export const useRestoreDrawing = (projectId: string) =>
  useDrawingChange(
    (drawingId: string) => call('restoreDrawing', { params: { projectId, drawingId }, body: {} }),
    projectId,
  );
