import type { News, VerdictsOrder } from './background-work.ts';
import type { MemberVerdict } from './member-verdict.ts';
import { type BackgroundWork, useBackgroundWork } from './use-background-work.ts';

type Verdicts = ReadonlyMap<string, MemberVerdict>;
const none: Verdicts = new Map();

const added = (was: Verdicts, news: News): Verdicts =>
  news.kind === 'verdict' ? new Map([...was, [news.id, news.verdict]]) : was;

/** The verdict of each member of an order, by its id, as they come. */
export const useVerdicts = (order: VerdictsOrder | null): BackgroundWork<Verdicts> =>
  useBackgroundWork(order, none, added);
