import { sectionName } from '#client/document/section-name.ts';
import { count } from '#client/lib/count.ts';
import { Note } from '#client/ui/note.tsx';
import type { MemberDraft } from '#shared/contracts/members.ts';
import { analysedForces } from '../other-section.ts';

const list = new Intl.ListFormat('en', { type: 'conjunction' });

/** What does not follow the section: its forces, and values that were given for the one before. */
export function FinderForces({ draft }: { draft: MemberDraft }) {
  const { combinations, sections } = analysedForces(draft);
  const own = [
    ...(draft.netSection ? ['the net section'] : []),
    ...(draft.charts?.x || draft.charts?.y ? ['the stiffness ratios of the joints'] : []),
  ];
  if (combinations === 0 && own.length === 0) return null;
  return (
    <div className="mt-3 max-w-[92ch]">
      <Note tone="asks">
        {combinations > 0 && (
          <>
            Forces do not follow the section here.{' '}
            {combinations === 1 ? 'Those' : `Those of ${count(combinations, 'combination')}`}{' '}
            {sections.length > 0
              ? `were analysed with ${list.format(sections.map(sectionName))}: with another section they stay as they are, marked as analysed with that one, and count as not confirmed until the analysis is run again.`
              : 'stay as they are with every section.'}
          </>
        )}
        {own.length > 0 &&
          ` As given for the present section and kept for every other: ${list.format(own)}. Give them anew with the section that is taken.`}
      </Note>
    </div>
  );
}
