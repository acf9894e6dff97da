import type { Verification, VerifyProblem } from '#server/verify/problem.ts';

/** What a verification says, for people to read. */
export function printVerification({ lines, reproduced, problems, notes }: Verification): string {
  const counted = `${reproduced} of ${lines} lines reproduced`;
  const remarks = notes.map((note) => `note: ${note}`);
  if (problems.length === 0)
    return `${[counted, 'arithmetic reproduced; this is not a design check', ...remarks].join('\n')}\n`;
  const head = `NOT REPRODUCED: ${problems.length} ${problems.length === 1 ? 'problem' : 'problems'}`;
  return `${[counted, head, ...problems.map(problemText), ...remarks].join('\n')}\n`;
}

/** `member B1, c1:H1/ratio (formula): is 0.9, its operands give 0.93 [evaluation]`. */
const problemText = ({ member, address, kind, by, reason }: VerifyProblem): string => {
  const who = member ? `member ${member.mark}` : 'the record';
  return `${[who, address].filter(Boolean).join(', ')} (${kind}): ${reason} [${by}]`;
};
