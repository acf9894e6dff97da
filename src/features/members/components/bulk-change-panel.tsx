import { useQuery } from '@tanstack/react-query';
import { useEffect, useMemo, useRef, useState } from 'react';
import { count } from '#client/lib/count.ts';
import { isProblem, reasonOf } from '#client/lib/problem.ts';
import { useAnnounce } from '#client/ui/announcements.tsx';
import { Button } from '#client/ui/button.tsx';
import { PartHead } from '#client/ui/paper.tsx';
import { Failure, Waiting } from '#client/ui/state-panels.tsx';
import type { Calculation } from '#shared/contracts/calculations.ts';
import { patchBetween } from '#shared/contracts/draft-patch.ts';
import type { Member } from '#shared/contracts/members.ts';
import { mostChangedAtOnce } from '#shared/contracts/several-members.ts';
import type { VerdictsOrder } from '../background-work.ts';
import type { SeveralChange } from '../bulk-change.ts';
import { useChangeMembers } from '../bulk-mutations.ts';
import { type PlannedChange, plannedChanges } from '../bulk-plan.ts';
import { severalMembersQuery } from '../bulk-queries.ts';
import { changeWords } from '../bulk-words.ts';
import { firstDraft } from '../first-draft.ts';
import { useVerdicts } from '../use-verdicts.ts';
import { BulkChangeForm } from './bulk-change-form.tsx';
import { BulkPreview } from './bulk-preview.tsx';

const nothingYet: SeveralChange = {
  ...{ kind: 'section', pointsOf: null },
  pattern: { ...firstDraft(''), material: '', ends: { text: '', confirmed: false } },
  state: { of: new Set(), source: null, confirmed: true },
};

/** One change of several members: fetched first, so that what is seen is what is changed. */
export function BulkChangePanel(props: {
  calculation: Calculation;
  memberIds: readonly string[];
  onLeaveOut: (id: string) => void;
  onClose: () => void;
}) {
  const { calculation, memberIds } = props;
  const [fetched] = useState(memberIds);
  const query = useQuery(severalMembersQuery(calculation.id, fetched));
  const head = useRef<HTMLDivElement>(null);
  const isThere = query.data !== undefined;
  useEffect(() => {
    if (isThere) head.current?.querySelector('select')?.focus();
  }, [isThere]);
  const many = count(memberIds.length, 'member');
  return (
    <section ref={head} aria-label={`Change ${many}`}>
      <PartHead
        title={`Change ${many}`}
        actions={
          <Button size="small" onClick={props.onClose}>
            Back to the list
          </Button>
        }
      />
      {query.error ? (
        <Failure title="The members could not be fetched" onRetry={() => void query.refetch()}>
          {reasonOf(query.error)}
        </Failure>
      ) : query.data ? (
        <Change {...props} members={query.data.filter(({ id }) => memberIds.includes(id))} />
      ) : (
        <Waiting what="the members" />
      )}
    </section>
  );
}

function Change(props: {
  calculation: Calculation;
  members: readonly Member[];
  onLeaveOut: (id: string) => void;
  onClose: () => void;
}) {
  const { calculation, members } = props;
  const { basis } = calculation;
  const [change, setChange] = useState(nothingYet);
  const planned = useMemo(() => plannedChanges(members, change), [members, change]);
  const moved = planned.filter(({ isNone }) => !isNone);
  const order = useMemo((): VerdictsOrder | null => {
    const drafts = planned
      .filter(({ isNone }) => !isNone)
      .map(({ member: { id }, after }) => ({ id, draft: after }));
    return drafts.length === 0 ? null : { task: 'verdicts', basis, members: drafts };
  }, [planned, basis]);
  const verdicts = useVerdicts(order);
  const refused = refusals(moved, verdicts.result, change.kind);
  const { apply, conflict, failure, isPending } = useApply(calculation.id, change, props.onClose);
  const tooMany = moved.length > mostChangedAtOnce;
  const hindrance =
    moved.length === 0
      ? 'Nothing changes yet.'
      : tooMany
        ? `At most ${mostChangedAtOnce} members change at once: leave some out.`
        : refused.size > 0
          ? `${[...refused.values()].map(({ mark }) => mark).join(', ')} cannot take this value: correct it, or leave ${refused.size === 1 ? 'that member' : 'those members'} out.`
          : verdicts.state === 'done' || verdicts.state === 'failed'
            ? null
            : `${verdicts.result.size} of ${moved.length} run with the change …`;
  return (
    <>
      <div className="grid grid-cols-[290px_minmax(0,1fr)] items-start gap-x-7">
        <div className="bg-margin px-4 py-4">
          <BulkChangeForm
            calculationId={calculation.id}
            units={basis.units}
            members={calculation.memberRows}
            change={change}
            problemAt={(path) =>
              [...refused.values()].find((problem) => problem.path === path)?.message
            }
            onChange={setChange}
          />
        </div>
        <div className="min-w-0">
          <BulkPreview rows={planned} verdicts={verdicts.result} onLeaveOut={props.onLeaveOut} />
        </div>
      </div>
      {conflict && (
        <div className="mt-4">
          <Failure title="Nothing was changed: others changed members meanwhile">
            <ul>
              {conflict.map(({ path, message }) => (
                <li key={path}>{message}.</li>
              ))}
            </ul>
            What stands here now holds their changes. See what this change comes to, and apply it
            again.
          </Failure>
        </div>
      )}
      {failure && (
        <div className="mt-4">
          <Failure title="Nothing was changed">{failure}</Failure>
        </div>
      )}
      {verdicts.state === 'failed' && (
        <div className="mt-4">
          <Failure title="The verdicts could not be worked out here" onRetry={verdicts.again}>
            The server runs each member when it is changed.
          </Failure>
        </div>
      )}
      <div className="mt-5 flex items-center justify-end gap-4 border-t border-zinc-2 pt-4">
        <p role="status" className="text-small text-zinc-7">
          {isPending ? `Changing ${count(moved.length, 'member')} …` : hindrance}
        </p>
        <Button onClick={props.onClose}>Cancel</Button>
        <Button rank="main" disabled={hindrance !== null || isPending} onClick={() => apply(moved)}>
          Change {count(moved.length, 'member')}
        </Button>
      </div>
    </>
  );
}

/** Members in which the changed field itself is refused, with where and why. */
function refusals(
  moved: readonly PlannedChange[],
  verdicts: ReturnType<typeof useVerdicts>['result'],
  kind: SeveralChange['kind'],
) {
  const own: Readonly<Partial<Record<SeveralChange['kind'], RegExp>>> = {
    steel: /^material/,
    ends: /^(ends|springs)/,
    sense: /^endMomentSign/,
    points: /^restraints/,
    // Sources and state refuse no value.
    state: /(?!)/,
  };
  const ofField = own[kind] ?? new RegExp(`^${kind}\\b`);
  return new Map(
    moved.flatMap(({ member }) => {
      const verdict = verdicts.get(member.id);
      const problem =
        verdict && !verdict.ok
          ? verdict.problems.find(({ path }) => ofField.test(path))
          : undefined;
      const mark = member.draft.mark || 'A member without a mark';
      return problem ? [[member.id, { ...problem, mark }] as const] : [];
    }),
  );
}

/** Sends a change, and offers the way back once it is done. */
function useApply(calculationId: string, { kind }: SeveralChange, onDone: () => void) {
  const mutation = useChangeMembers(calculationId);
  const announce = useAnnounce();
  // A promise tells its end even where this panel is gone by then.
  const send = mutation.mutateAsync;
  const takeBack = (moved: readonly PlannedChange[], versions: ReadonlyMap<string, number>) => {
    const changes = moved.map(({ member: { id, draft }, after }) => ({
      ...{ memberId: id, version: versions.get(id) ?? 0 },
      patch: patchBetween(after, draft),
    }));
    send(changes).then(
      () => announce(`${count(moved.length, 'member')} as before.`),
      (error: Error) => announce(`Not taken back. ${conflictText(error)}`),
    );
  };
  const apply = (moved: readonly PlannedChange[]) => {
    const changes = moved.map(({ member: { id, version }, patch }) => ({
      ...{ memberId: id, version, patch },
    }));
    send(changes).then(
      ({ changed }) => {
        const versions = new Map(changed.map(({ memberId, version }) => [memberId, version]));
        announce({
          text: `${changeWords[kind]} changed in ${count(moved.length, 'member')}.`,
          action: { label: 'Undo', run: () => takeBack(moved, versions) },
        });
        onDone();
      },
      // What refused it is shown in the panel.
      () => undefined,
    );
  };
  const { error } = mutation;
  const conflict = isProblem(error, 'conflict') ? (error.details?.problems ?? []) : null;
  return {
    ...{ apply, isPending: mutation.isPending, conflict },
    failure: error && !conflict ? failureText(error) : null,
  };
}

const failureText = (error: Error): string =>
  isProblem(error, 'too-large')
    ? 'These are more values than one change can hold: leave some members out.'
    : reasonOf(error);

const conflictText = (error: Error): string =>
  isProblem(error, 'conflict')
    ? (error.details?.problems ?? []).map(({ message }) => `${message}.`).join(' ')
    : reasonOf(error);
