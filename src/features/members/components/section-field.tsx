import { Popover } from 'radix-ui';
import { type KeyboardEvent, useId, useState } from 'react';
import { sectionName } from '#client/document/section-name.ts';
import { fieldClass } from '#client/ui/field.tsx';
import { findShape, searchShapes } from '#shared/sections/table.ts';
import { withStated, withText } from '../edit-draft.ts';
import { InputRow } from './input-row.tsx';
import { useMemberForm } from './member-form-context.ts';
import { SectionChoice } from './section-choice.tsx';
import { SizesFields } from './sizes-fields.tsx';
import { SourceControl } from './source-control.tsx';

/** The section by its designation, or by sizes of its own. */
export function SectionField({ units }: { units: 'us' | 'si' }) {
  const { draft } = useMemberForm();
  return draft.sizes ? <SizesFields sizes={draft.sizes} units={units} /> : <DesignationField />;
}

/** The section by typing part of its designation: `12x79`, `w14`; its outline stands beside the list. */
function DesignationField() {
  const { draft, edit, editable, problemAt } = useMemberForm();
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(0);
  const list = useId();
  const quantity = draft.section;
  const problem = open ? undefined : problemAt('section');
  const found = open ? searchShapes(quantity.text, 60) : [];
  const put = (text: string, field: string) =>
    edit(withStated(draft, 'section', withText(quantity, text)), field);
  const choose = (designation: string | undefined) => {
    if (designation === undefined) return;
    put(designation, 'section/chosen');
    setOpen(false);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      if (!open) return setOpen(true);
      const by = event.key === 'ArrowDown' ? 1 : -1;
      setActive((at) => Math.max(0, Math.min(found.length - 1, at + by)));
    } else if (event.key === 'Enter' && open) {
      event.preventDefault();
      choose(found[active]);
    } else if (event.key === 'Escape' && open) {
      event.stopPropagation();
      setOpen(false);
    }
  };
  return (
    <Popover.Root open={open} onOpenChange={setOpen}>
      <InputRow
        path="section"
        label="Section"
        problem={problem}
        source={
          <SourceControl
            what="section"
            stated={quantity}
            onChange={(stated) =>
              edit(withStated(draft, 'section', { ...quantity, ...stated }), 'section/source')
            }
          />
        }
      >
        {(control) => (
          <Popover.Anchor asChild>
            <input
              {...control}
              role="combobox"
              aria-expanded={open}
              {...(open ? { 'aria-controls': list } : {})}
              aria-autocomplete="list"
              {...(open && found[active] ? { 'aria-activedescendant': `${list}-${active}` } : {})}
              value={
                open
                  ? quantity.text
                  : sectionName(findShape(quantity.text)?.designation ?? quantity.text)
              }
              readOnly={!editable}
              autoComplete="off"
              spellCheck={false}
              maxLength={60}
              onChange={(event) => {
                put(event.target.value, 'section');
                setActive(0);
                setOpen(true);
              }}
              onClick={() => editable && setOpen(true)}
              onBlur={() => setOpen(false)}
              onKeyDown={editable ? onKeyDown : undefined}
              className={fieldClass(problem !== undefined)}
            />
          </Popover.Anchor>
        )}
      </InputRow>
      <Popover.Portal>
        <Popover.Content
          side="bottom"
          align="start"
          sideOffset={3}
          collisionPadding={10}
          aria-label="Sections found"
          onOpenAutoFocus={(event) => event.preventDefault()}
          onCloseAutoFocus={(event) => event.preventDefault()}
          // The field keeps the focus, so that typing goes on.
          onPointerDown={(event) => event.preventDefault()}
          onInteractOutside={(event) => event.preventDefault()}
          className="z-40 flex w-[540px] rounded-field border border-ink bg-paper shadow-sheet"
        >
          <SectionChoice
            list={list}
            typed={quantity.text}
            found={found}
            active={active}
            onPoint={setActive}
            onChoose={choose}
          />
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}
