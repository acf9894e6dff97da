import type { Handler } from '#server/http/handler.ts';
import type { calculations as contracts } from '#shared/contracts/calculations.ts';
import { inputOf } from '#shared/contracts/draft-input.ts';
import { loadForRun } from './load-for-run.ts';

/** The calculation as the command line's INPUT.json, as typed. */
export const downloadInput: Handler<typeof contracts.downloadInput> = async (context) => {
  const { deps, viewer, scope } = context;
  const { basis, members, number } = await loadForRun(deps.db, viewer, scope.calculationId);
  const content = `${JSON.stringify(inputOf(basis, members), null, 2)}\n`;
  return { content, filename: `${number}.input.json` };
};
