import type { LengthName } from '#shared/contracts/members.ts';
import type { Block } from '#shared/report/tree.ts';

/** A length of the member as the sheet's own line prints it, where it was not given. */
export function derivedLength(blocks: readonly Block[], name: LengthName): string | null {
  const address = `E2/${name}`;
  const line = blocks.find((block) => block.kind === 'line' && block.address === address);
  if (line?.kind !== 'line' || line.lineKind === 'given' || !line.result) return null;
  return `${line.result.value} ${line.result.unit}`;
}
