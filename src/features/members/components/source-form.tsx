import { useId } from 'react';
import { Button } from '#client/ui/button.tsx';
import { ProblemText } from '#client/ui/field.tsx';
import { SourceRing } from '#client/ui/source-ring.tsx';
import type { DraftSource } from '#shared/contracts/draft-quantity.ts';
import {
  draftSourceLetter,
  emptySource,
  type StatedBy,
  sourceKinds,
  sourceLack,
} from '../source-words.ts';
import { SourceDetails } from './source-details.tsx';

/** Kind, details and state of a source. */
export function SourceForm(props: {
  what: string;
  stated: StatedBy;
  editable: boolean;
  onChange: (stated: { source: DraftSource; confirmed: boolean }) => void;
  onDone?: () => void;
}) {
  const { stated, onChange } = props;
  const source = stated.source ?? emptySource('typed');
  const lack = sourceLack(source);
  const id = useId();
  return (
    <fieldset disabled={!props.editable} className="grid gap-3">
      <legend className="mb-2 font-semibold">Where {props.what} comes from</legend>
      <div className="grid gap-0.5">
        {sourceKinds.map(({ value, text }) => (
          <label key={value} className="flex items-center gap-2 py-0.5">
            <input
              type="radio"
              name={id}
              checked={source.kind === value}
              onChange={() => onChange({ source: emptySource(value), confirmed: false })}
              className="accent-oxide"
            />
            <SourceRing letter={draftSourceLetter(emptySource(value))} confirmed />
            {text}
          </label>
        ))}
      </div>
      <SourceDetails
        source={source}
        onChange={(next) => onChange({ source: next, confirmed: stated.confirmed })}
      />
      {lack && <ProblemText>{lack}</ProblemText>}
      <label className="flex items-center gap-2 border-t border-zinc-2 pt-3 font-medium">
        <input
          type="checkbox"
          checked={stated.confirmed}
          onChange={(event) => onChange({ source, confirmed: event.target.checked })}
          className="accent-oxide"
        />
        Confirmed
      </label>
      {props.onDone && (
        <Button size="small" onClick={props.onDone} className="justify-self-start">
          Done
        </Button>
      )}
    </fieldset>
  );
}
