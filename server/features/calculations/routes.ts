import type { HandlersOf } from '#server/http/handler.ts';
import type { calculations } from '#shared/contracts/calculations.ts';
import { createCalculation } from './create-calculation.ts';
import { downloadInput } from './download-input.ts';
import { loadCalculation } from './queries.ts';
import { updateCalculation } from './update-calculation.ts';

export const calculationHandlers: HandlersOf<typeof calculations> = {
  createCalculation,
  showCalculation: ({ deps, viewer, scope }) =>
    loadCalculation(deps.db, viewer, scope.calculationId),
  updateCalculation,
  downloadInput,
};
