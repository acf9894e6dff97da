import { assembleReport } from '#shared/report/assemble.ts';
import { fullTemplate } from './full-template.ts';
import { makeRecord } from './make-record.ts';
import type { Tasks } from './tasks.ts';

/** The report of a calculation as its document tree, for the screen. */
export function makeDocument({
  drafts,
  document,
}: Tasks['document']['given']): Tasks['document']['made'] {
  const made = makeRecord(drafts);
  if ('problems' in made) return made;
  const { record } = made;
  const { resultHash, snapshotHash } = record;
  if (resultHash === null || snapshotHash === null) throw new Error('the record is not sealed');
  const tree = assembleReport({ template: fullTemplate(), record, document });
  return { tree, resultHash, snapshotHash };
}
