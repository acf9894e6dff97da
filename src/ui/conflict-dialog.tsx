import { useState } from 'react';
import { when } from '#client/lib/clock.ts';
import type { Clash, MergeRules } from '#client/lib/draft/merge.ts';
import type { Conflict } from '#client/lib/draft/use-versioned-draft.ts';
import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';

type Choice = 'mine' | 'theirs';

/** Two people changed one thing: the fields that both changed are chosen one by one. */
export function ConflictDialog<T>(props: {
  what: string;
  conflict: Conflict<T>;
  rules: MergeRules<T>;
  onSettle: (value: T) => void;
}) {
  const { conflict, rules } = props;
  const { clashes, theirs } = conflict;
  const [choices, setChoices] = useState<Readonly<Record<string, Choice>>>({});
  const open = clashes.filter(({ id }) => !choices[id]).length;
  const settle = () =>
    props.onSettle(
      clashes
        .filter(({ id }) => choices[id] === 'mine')
        .reduce((value, { id }) => rules.take(value, conflict.mine, id), conflict.agreed),
    );
  return (
    <Dialog
      title={`${props.what} was changed in the meantime`}
      wide
      footer={
        <Button rank="main" disabled={open > 0} onClick={settle}>
          {open > 0 ? `${open} still to choose` : 'Save this'}
        </Button>
      }
    >
      <p className="max-w-[70ch]">
        {theirs.changedBy} saved another version ({when(theirs.changedAt)}).{' '}
        {clashes.length === 0
          ? 'You changed different fields; both changes can stand.'
          : 'Where you both changed a field, choose which value stands. All other changes of both are kept.'}
      </p>
      {clashes.map((clash) => (
        <ClashRow
          key={clash.id}
          clash={clash}
          who={theirs.changedBy}
          choice={choices[clash.id]}
          onChoose={(choice) => setChoices((was) => ({ ...was, [clash.id]: choice }))}
        />
      ))}
    </Dialog>
  );
}

function ClashRow(props: {
  clash: Clash;
  who: string;
  choice: Choice | undefined;
  onChoose: (choice: Choice) => void;
}) {
  const { clash, who, choice, onChoose } = props;
  const options = [
    { value: 'mine', label: 'Yours', text: clash.mine },
    { value: 'theirs', label: `${who}’s`, text: clash.theirs },
  ] as const;
  return (
    <fieldset className="mt-4 grid grid-cols-[minmax(140px,1fr)_2fr_2fr] items-baseline gap-4 border-t border-zinc-2 pt-3">
      <legend className="sr-only">{clash.label}</legend>
      <span aria-hidden="true" className="font-medium">
        {clash.label}
      </span>
      {options.map(({ value, label, text }) => (
        <label key={value} className="flex items-baseline gap-2">
          <input
            type="radio"
            name={`clash-${clash.id}`}
            checked={choice === value}
            onChange={() => onChoose(value)}
            className="accent-oxide"
          />
          <span>
            <span className="block text-small text-zinc-7">{label}</span>
            <span className="font-medium">{text === null ? 'deleted' : text || 'empty'}</span>
          </span>
        </label>
      ))}
    </fieldset>
  );
}
