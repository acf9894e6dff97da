import { classNames } from '#client/ui/class-names.ts';
import { findShape, printedDesignation } from '#shared/sections/table.ts';
import { SectionPreview } from './section-preview.tsx';

/** The designations that hold what was typed, beside the outline of the one pointed at. */
export function SectionChoice(props: {
  list: string;
  typed: string;
  found: readonly string[];
  active: number;
  onPoint: (index: number) => void;
  onChoose: (designation: string) => void;
}) {
  const { list, found, active } = props;
  const shown = found[active];
  return (
    <>
      <div
        role="listbox"
        id={list}
        aria-label="Sections"
        className="max-h-84 w-56 shrink-0 overflow-y-auto py-1"
      >
        {found.map((designation, index) => (
          <SectionOption
            key={designation}
            id={`${list}-${index}`}
            designation={designation}
            active={index === active}
            onPoint={() => props.onPoint(index)}
            onChoose={() => props.onChoose(designation)}
          />
        ))}
      </div>
      <div className="min-w-0 flex-1 border-l border-zinc-2 p-3">
        {shown ? (
          <SectionPreview designation={shown} />
        ) : (
          <p className="text-zinc-7">
            No shape of the tables is called “{props.typed}”. Designations read like W12X79,
            C15X33.9, HSS8X6X1/2 or Pipe8STD.
          </p>
        )}
      </div>
    </>
  );
}

function SectionOption(props: {
  id: string;
  designation: string;
  active: boolean;
  onPoint: () => void;
  onChoose: () => void;
}) {
  const shape = findShape(props.designation);
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
      onPointerMove={props.onPoint}
      onClick={props.onChoose}
      className={classNames(
        'figures grid grid-cols-[minmax(0,1fr)_auto] gap-x-2 px-3 py-0.5',
        props.active && 'bg-ink text-paper',
      )}
    >
      <span className="whitespace-nowrap">{printedDesignation(props.designation)}</span>
      {shape && (
        <span
          className={classNames('font-condensed text-small', !props.active && 'text-zinc-7')}
        >{`${shape.family}, ${shape.weight} lb/ft`}</span>
      )}
    </div>
  );
}
