import type { ReactNode } from 'react';
import { useVersionedDraft, type VersionedDraft } from '#client/lib/draft/use-versioned-draft.ts';
import { ConflictDialog } from '#client/ui/conflict-dialog.tsx';
import { useFormKeys } from '#client/ui/use-form-keys.ts';
import type { Calculation } from '#shared/contracts/calculations.ts';
import { basisRules } from '../basis-fields.ts';
import { type HeadAndBasis, useUpdateCalculation } from '../mutations.ts';
import { AnalysisPart, BookPart, CodePart, HeadPart, ProvisionsPart } from './basis-parts.tsx';

const storedOf = (calculation: Calculation) => ({
  version: calculation.version,
  value: { number: calculation.number, title: calculation.title, basis: calculation.basis },
  changedBy: calculation.changedBy,
  changedAt: calculation.changedAt,
});

/** The draft of a calculation's head and basis, which saves itself. */
export function useBasisDraft(calculation: Calculation): VersionedDraft<HeadAndBasis> {
  const update = useUpdateCalculation(calculation.id);
  return useVersionedDraft<HeadAndBasis>({
    key: `basis/${calculation.id}`,
    stored: storedOf(calculation),
    rules: basisRules,
    editable: calculation.can.edit,
    save: async (version, value) => storedOf(await update.mutateAsync({ version, ...value })),
    readTheirs: (theirs) => storedOf(theirs as Calculation),
  });
}

/** The basis of design, part by part: what it is at the left, what is set at the right. */
export function BasisForm(props: { draft: VersionedDraft<HeadAndBasis>; editable: boolean }) {
  const { draft, editable } = props;
  useFormKeys(draft);
  const part = { value: draft.value, edit: draft.edit };
  return (
    <>
      <fieldset disabled={!editable}>
        <legend className="sr-only">Basis of design</legend>
        <Part title="This calculation">
          <HeadPart {...part} />
        </Part>
        <Part
          title="Standard and units"
          about="Material constants carry both published values; one set is pinned here, whatever the units shown."
        >
          <BookPart {...part} />
        </Part>
        <Part
          title="The analysis behind the forces"
          about="How the member forces were found decides what is still to be added to them."
        >
          <AnalysisPart {...part} />
        </Part>
        <Part
          title="Optional provisions"
          about="The standard permits them; each is used only where it is chosen here."
        >
          <ProvisionsPart {...part} />
        </Part>
        <Part
          title="Codes and assumptions"
          about="A calculation does not replace the locally adopted code and its amendments."
        >
          <CodePart {...part} />
        </Part>
      </fieldset>
      {draft.conflict && (
        <ConflictDialog
          what="The basis of design"
          conflict={draft.conflict}
          rules={basisRules}
          onSettle={draft.settle}
        />
      )}
    </>
  );
}

function Part(props: { title: string; about?: string; children: ReactNode }) {
  return (
    <section className="grid grid-cols-[minmax(180px,1fr)_3fr] gap-x-10 border-b border-zinc-2 py-6">
      <div>
        <h2 className="font-serif text-head font-semibold">{props.title}</h2>
        {props.about && <p className="mt-1 text-small text-zinc-7">{props.about}</p>}
      </div>
      <div className="grid grid-cols-2 gap-4">{props.children}</div>
    </section>
  );
}
