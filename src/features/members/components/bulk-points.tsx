import { useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { reasonOf } from '#client/lib/problem.ts';
import { SelectField } from '#client/ui/text-field.tsx';
import type { MemberDraft } from '#shared/contracts/members.ts';
import { restraintText } from '../part-texts.ts';
import { memberQuery } from '../queries.ts';

/** The member whose points held between the ends are copied, and what they are. */
export function BulkPoints(props: {
  calculationId: string;
  members: readonly { readonly id: string; readonly mark: string }[];
  onFrom: (draft: MemberDraft | null) => void;
}) {
  const { calculationId, members, onFrom } = props;
  const [from, setFrom] = useState('');
  const query = useQuery({ ...memberQuery(calculationId, from), enabled: from !== '' });
  const draft = from === '' ? undefined : query.data?.draft;
  // biome-ignore lint/correctness/useExhaustiveDependencies: told once of each draft
  useEffect(() => onFrom(draft ?? null), [draft]);
  return (
    <>
      <SelectField
        label="As in"
        value={from}
        problem={query.error ? reasonOf(query.error) : undefined}
        options={[
          { value: '', text: 'choose' },
          ...members.map(({ id, mark }) => ({ value: id, text: mark || 'without a mark' })),
        ]}
        onValue={setFrom}
      />
      {draft && (
        <div className="mt-2 text-small">
          {!draft.restraints ? (
            <p>It describes none: the others will describe none either.</p>
          ) : draft.restraints.length === 0 ? (
            <p>Held nowhere between its ends.</p>
          ) : (
            <ol>
              {draft.restraints.map((row) => (
                <li key={row.id}>{restraintText(row)}</li>
              ))}
            </ol>
          )}
          <p className="mt-1.5 text-zinc-7">
            The copies are not confirmed. Moments over points that a member has now go with those
            points; lengths typed stay in place of those that follow.
          </p>
        </div>
      )}
    </>
  );
}
