import { useMutation, useQueryClient } from '@tanstack/react-query';
import { deskKey } from '#client/features/desk/queries.ts';
import { projectKey } from '#client/features/projects/queries.ts';
import { call } from '#client/lib/api.ts';
import type { BasisDraft, Calculation } from '#shared/contracts/calculations.ts';
import { calculationKey } from './queries.ts';

function useKept() {
  const client = useQueryClient();
  return (calculation: Calculation) => {
    client.setQueryData(calculationKey(calculation.id), calculation);
    void client.invalidateQueries({ queryKey: projectKey(calculation.project.id) });
    void client.invalidateQueries({ queryKey: deskKey });
  };
}

export function useCreateCalculation(projectId: string) {
  const keep = useKept();
  return useMutation({
    mutationFn: (body: { number: string; title: string; basis: BasisDraft }) =>
      call('createCalculation', { params: { projectId }, body }),
    onSuccess: keep,
  });
}

export interface HeadAndBasis {
  readonly number: string;
  readonly title: string;
  readonly basis: BasisDraft;
}

export function useUpdateCalculation(calculationId: string) {
  const keep = useKept();
  return useMutation({
    mutationFn: (body: HeadAndBasis & { version: number }) =>
      call('updateCalculation', { params: { calculationId }, body }),
    onSuccess: keep,
  });
}
