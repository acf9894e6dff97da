import { useId } from 'react';
import { Button } from '#client/ui/button.tsx';
import { Choice } from '#client/ui/choice.tsx';
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
      <div className="grid">
        {sourceKinds.map(({ value, text }) => (
          <Choice
            key={value}
            type="radio"
            name={id}
            checked={source.kind === value}
            onChange={() => onChange({ source: emptySource(value), confirmed: false })}
          >
            <SourceRing letter={draftSourceLetter(emptySource(value))} confirmed />
            {text}
          </Choice>
        ))}
      </div>
      <SourceDetails
        source={source}
        onChange={(next) => onChange({ source: next, confirmed: stated.confirmed })}
      />
      {lack && <ProblemText>{lack}</ProblemText>}
      <Choice
        type="checkbox"
        checked={stated.confirmed}
        onChange={(event) => onChange({ source, confirmed: event.target.checked })}
        className="border-t border-zinc-2 pt-3 font-medium"
      >
        Confirmed
      </Choice>
      {props.onDone && (
        <Button size="small" onClick={props.onDone} className="justify-self-start">
          Done
        </Button>
      )}
    </fieldset>
  );
}
