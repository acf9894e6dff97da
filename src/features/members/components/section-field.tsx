import { type KeyboardEvent, useId, useState } from 'react';
import { sectionName } from '#client/document/section-name.ts';
import { classNames } from '#client/ui/class-names.ts';
import { fieldClass } from '#client/ui/field.tsx';
import { findShape, searchShapes } from '#shared/sections/table.ts';
import { withStated, withText } from '../edit-draft.ts';
import { InputRow } from './input-row.tsx';
import { useMemberForm } from './member-form-context.ts';
import { SectionPreview } from './section-preview.tsx';
import { SourceControl } from './source-control.tsx';

/** The section by typing part of its designation: `12x79`, `w14`; its outline stands beside the list. */
export function SectionField() {
  const { draft, edit, editable, problemAt } = useMemberForm();
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(0);
  const list = useId();
  const quantity = draft.section;
  const problem = problemAt('section');
  const found = open ? searchShapes(quantity.text, 60) : [];
  const type = (text: string) => {
    edit(withStated(draft, 'section', withText(quantity, text)), 'section');
    setActive(0);
    setOpen(true);
  };
  const choose = (designation: string | undefined) => {
    if (designation === undefined) return;
    edit(withStated(draft, 'section', withText(quantity, designation)), 'section/chosen');
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
  const shown = found[active];
  return (
    <div className="relative">
      <InputRow
        path="section"
        label="Section"
        problem={open ? undefined : problem}
        source={
          quantity.text.trim() !== '' && (
            <SourceControl
              what="section"
              stated={quantity}
              onChange={(stated) =>
                edit(withStated(draft, 'section', { ...quantity, ...stated }), 'section/source')
              }
            />
          )
        }
      >
        {(control) => (
          <input
            {...control}
            role="combobox"
            aria-expanded={open}
            aria-controls={list}
            aria-autocomplete="list"
            {...(open && shown ? { 'aria-activedescendant': `${list}-${active}` } : {})}
            value={open ? quantity.text : (findShape(quantity.text)?.designation ?? quantity.text)}
            readOnly={!editable}
            autoComplete="off"
            spellCheck={false}
            maxLength={60}
            onChange={(event) => type(event.target.value)}
            onClick={() => editable && setOpen(true)}
            onBlur={() => setOpen(false)}
            onKeyDown={editable ? onKeyDown : undefined}
            className={fieldClass(problem !== undefined && !open)}
          />
        )}
      </InputRow>
      {open && (
        <div className="absolute top-9 left-0 z-30 flex w-[480px] rounded-field border border-ink bg-paper shadow-sheet">
          <div
            role="listbox"
            id={list}
            aria-label="Sections"
            className="max-h-80 w-38 shrink-0 overflow-y-auto py-1"
          >
            {found.map((designation, index) => (
              <SectionOption
                key={designation}
                id={`${list}-${index}`}
                designation={designation}
                active={index === active}
                onPoint={() => setActive(index)}
                onChoose={() => choose(designation)}
              />
            ))}
          </div>
          <div className="min-w-0 flex-1 border-l border-zinc-2 p-3">
            {shown ? (
              <SectionPreview designation={shown} />
            ) : (
              <p className="text-zinc-7">
                No W shape is called “{quantity.text}”. Designations read like W12X79.
              </p>
            )}
          </div>
        </div>
      )}
    </div>
  );
}

function SectionOption(props: {
  id: string;
  designation: string;
  active: boolean;
  onPoint: () => void;
  onChoose: () => void;
}) {
  return (
    // biome-ignore lint/a11y/useFocusableInteractive: the combobox keeps the focus and points here
    // biome-ignore lint/a11y/useKeyWithClickEvents: the combobox has the keys
    <div
      role="option"
      id={props.id}
      aria-selected={props.active}
      ref={(element) => {
        if (props.active) element?.scrollIntoView({ block: 'nearest' });
      }}
      onPointerDown={(event) => event.preventDefault()}
      onPointerMove={props.onPoint}
      onClick={props.onChoose}
      className={classNames('figures px-3 py-0.5', props.active && 'bg-ink text-paper')}
    >
      {sectionName(props.designation)}
    </div>
  );
}
