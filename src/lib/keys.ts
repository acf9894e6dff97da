/** Under which keys answers are kept, so that a change of one thing can fetch others again. */
export const keys = {
  session: ['session'],
  desk: ['desk'],
  project: (projectId: string) => ['project', projectId],
  calculation: (calculationId: string) => ['calculation', calculationId],
  member: (memberId: string) => ['member', memberId],
  published: ['published'],
  clauseUses: (book: string, clause: string) => ['clause-uses', book, clause],
  report: (calculationId: string) => ['report', calculationId],
} as const;
