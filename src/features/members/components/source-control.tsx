import { Popover } from 'radix-ui';
import { useState } from 'react';
import { Hint } from '#client/ui/hint.tsx';
import { SourceRingButton } from '#client/ui/source-ring.tsx';
import type { DraftSource } from '#shared/contracts/draft-quantity.ts';
import { draftSourceLetter, draftSourceText, type StatedBy } from '../source-words.ts';
import { useMemberForm } from './member-form-context.ts';
import { SourceForm } from './source-form.tsx';

/** The ring beside a given value: explains its source on hover and focus, opens it to be changed. */
export function SourceControl(props: {
  /** As it is read aloud. */
  what: string;
  /** As it is printed, where that is not the same. */
  printed?: string;
  stated: StatedBy;
  onChange: (stated: { source: DraftSource; confirmed: boolean }) => void;
}) {
  const { what, stated, onChange } = props;
  const { editable } = useMemberForm();
  const [open, setOpen] = useState(false);
  const state = stated.confirmed ? 'confirmed' : 'not confirmed';
  const said = `${draftSourceText(stated.source)}, ${state}`;
  return (
    <Popover.Root open={open} onOpenChange={setOpen}>
      <Hint text={said}>
        <Popover.Trigger asChild>
          <SourceRingButton
            letter={draftSourceLetter(stated.source)}
            confirmed={stated.confirmed}
            aria-label={`Source of ${what}: ${said}`}
          />
        </Popover.Trigger>
      </Hint>
      <Popover.Portal>
        <Popover.Content
          side="right"
          align="start"
          sideOffset={8}
          collisionPadding={10}
          aria-label={`Source of ${what}`}
          className="z-40 w-76 rounded-field border border-ink bg-paper p-4 shadow-sheet"
        >
          <SourceForm
            what={props.printed ?? what}
            stated={stated}
            editable={editable}
            onChange={onChange}
            onDone={() => setOpen(false)}
          />
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}
