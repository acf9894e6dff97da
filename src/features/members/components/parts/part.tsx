import { Fragment, type ReactNode, useId } from 'react';
import { useMemberForm } from '../member-form-context.ts';
import { focusControl } from '../stale-notice.tsx';

/** A part of the inputs that not every member has; it goes as a whole. */
export function Part(props: { title: string; onRemove?: () => void; children: ReactNode }) {
  const { editable } = useMemberForm();
  const id = useId();
  return (
    <section aria-labelledby={id} className="mt-5">
      <div className="mb-1 flex items-baseline justify-between gap-2">
        <h2 id={id} className="caps">
          {props.title}
        </h2>
        {editable && props.onRemove && (
          <button
            type="button"
            aria-label={`Remove ${props.title.toLowerCase()}`}
            onClick={props.onRemove}
            className="link py-0.5 font-condensed text-small text-zinc-7"
          >
            Remove
          </button>
        )}
      </div>
      {props.children}
    </section>
  );
}

/** Within a part: one of its rows or directions, named, with what takes it away. */
export function PartHead(props: { text: string; action: string; onAction: () => void }) {
  const { editable } = useMemberForm();
  return (
    <div className="flex items-baseline justify-between gap-2">
      <h3 className="font-condensed font-semibold">{props.text}</h3>
      {editable && (
        <button
          type="button"
          onClick={props.onAction}
          aria-label={`${props.action} ${props.text.toLowerCase()}`}
          className="link py-0.5 font-condensed text-small text-zinc-7"
        >
          {props.action}
        </button>
      )}
    </div>
  );
}

export interface PartLink {
  readonly text: string;
  readonly open: () => void;
  /** Path of the control that then has the focus. */
  readonly first: string;
}

/** What else can be said, in one sentence: nothing of it stands in the way of a plain member. */
export function PartLinks(props: { lead: string; links: readonly PartLink[] }) {
  const { editable } = useMemberForm();
  if (!editable || props.links.length === 0) return null;
  return (
    <p className="mt-3 text-small text-zinc-7">
      {props.lead}{' '}
      {props.links.map(({ text, open, first }, index) => (
        <Fragment key={text}>
          {index > 0 && (index === props.links.length - 1 ? ' or ' : ', ')}
          <button
            type="button"
            className="link text-ink"
            onClick={() => {
              open();
              focusControl(first);
            }}
          >
            {text}
          </button>
        </Fragment>
      ))}
      .
    </p>
  );
}
