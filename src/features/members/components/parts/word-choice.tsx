import { classNames } from '#client/ui/class-names.ts';

/** Words side by side of which some, or one, hold. */
export function WordChoice<T extends string>(props: {
  id: string;
  /** As it is read aloud: what the words are of. */
  label: string;
  words: readonly { readonly value: T; readonly text: string; readonly about: string }[];
  chosen: readonly T[];
  invalid: boolean;
  describedBy?: string | undefined;
  disabled: boolean;
  onChoose: (value: T) => void;
}) {
  return (
    // biome-ignore lint/a11y/useSemanticElements: a fieldset cannot be laid out in a line
    <div
      role="group"
      id={props.id}
      tabIndex={-1}
      aria-label={props.label}
      aria-describedby={props.describedBy}
      className={classNames(
        'flex w-full rounded-field border bg-paper',
        props.invalid ? 'border-oxide' : 'border-zinc-3',
      )}
    >
      {props.words.map(({ value, text, about }) => {
        const pressed = props.chosen.includes(value);
        return (
          <button
            key={value}
            type="button"
            aria-pressed={pressed}
            title={about}
            disabled={props.disabled}
            onClick={() => props.onChoose(value)}
            className={classNames(
              'h-6.5 flex-auto border-r border-zinc-2 px-1.5 font-condensed text-small whitespace-nowrap last:border-r-0',
              pressed ? 'bg-ink text-paper' : 'text-zinc-7 enabled:hover:bg-zinc-1',
            )}
          >
            {text}
          </button>
        );
      })}
    </div>
  );
}
