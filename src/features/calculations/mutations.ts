import { useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '#client/lib/api.ts';
import { keys } from '#client/lib/keys.ts';
import type { BasisDraft, Calculation } from '#shared/contracts/calculations.ts';

function useKept() {
  const client = useQueryClient();
  return (calculation: Calculation) => {
    client.setQueryData(keys.calculation(calculation.id), calculation);
    void client.invalidateQueries({ queryKey: keys.project(calculation.project.id) });
    void client.invalidateQueries({ queryKey: keys.report(calculation.id) });
    void client.invalidateQueries({ queryKey: keys.desk });
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
