/** What was asked of a command can't be done: its reason goes to stderr, the exit code is 2. */
export class UsageError extends Error {}
