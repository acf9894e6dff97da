import type { SectionSearch } from '#shared/members/find-sections.ts';
import type { FindOrder, News } from './background-work.ts';
import { type BackgroundWork, useBackgroundWork } from './use-background-work.ts';

/** The search so far; null before the first section is tried. */
export type Finder = BackgroundWork<SectionSearch | null>;

const latest = (was: SectionSearch | null, news: News): SectionSearch | null =>
  news.kind === 'search' ? news.search : was;

export const useFinder = (order: FindOrder | null): Finder =>
  useBackgroundWork<SectionSearch | null>(order, null, latest);
