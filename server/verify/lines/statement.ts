import { canonicalText } from '#shared/calc/hashes.ts';
import type { LineOf } from '#shared/calc/line.ts';
import { stateWord } from './given.ts';
import type { LineContext } from './line-context.ts';

/** A statement of the input: its source and state, and for the section its words. */
export function* checkStatement(
  line: LineOf<'statement'>,
  { input, member }: LineContext,
): Iterable<string> {
  if (line.key === 'given/section' && line.statement !== member.section)
    yield `says ${line.statement}, but the member is ${member.section}`;
  const restraint = input?.restraints?.find((r) => line.key === `given/${r.id}/holds`);
  const stated =
    restraint ??
    (line.key === 'given/section'
      ? input?.section
      : line.key === 'given/ends'
        ? input?.ends
        : null);
  if (!stated) return;
  if (line.key === 'given/section' && input && input.section.value !== line.statement)
    yield `says ${line.statement}, but the input says ${input.section.value}`;
  if (stated.confirmed !== line.confirmed)
    yield `says ${stateWord(line.confirmed)}, but the input says ${stateWord(stated.confirmed)}`;
  if (canonicalText(stated.source) !== canonicalText(line.source))
    yield 'names another source than the input';
}
