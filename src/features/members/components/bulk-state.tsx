import { Choice } from '#client/ui/choice.tsx';
import { type StateChange, type StatedGroup, statedNames } from '../bulk-change.ts';
import { statedWords } from '../bulk-words.ts';
import { emptySource } from '../source-words.ts';
import { SourceForm } from './source-form.tsx';

/** Which values, where they come from, and whether somebody stands for them. */
export function BulkState(props: { state: StateChange; onChange: (state: StateChange) => void }) {
  const { state, onChange } = props;
  const toggle = (name: StatedGroup) => {
    const of = new Set(state.of);
    if (!of.delete(name)) of.add(name);
    onChange({ ...state, of });
  };
  return (
    <div className="grid gap-4">
      <fieldset>
        <legend className="mb-1 font-semibold">Of these values, where given</legend>
        <div className="grid grid-cols-2 gap-x-3">
          {statedNames.map((name) => (
            <Choice
              key={name}
              type="checkbox"
              checked={state.of.has(name)}
              onChange={() => toggle(name)}
              className={name === 'forces' ? 'col-span-2' : ''}
            >
              {statedWords[name]}
            </Choice>
          ))}
        </div>
      </fieldset>
      <Choice
        type="checkbox"
        checked={state.source === null}
        onChange={(event) =>
          onChange({ ...state, source: event.target.checked ? null : emptySource('drawing') })
        }
      >
        Each keeps its own source
      </Choice>
      {state.source === null ? (
        <Choice
          type="checkbox"
          checked={state.confirmed}
          onChange={(event) => onChange({ ...state, confirmed: event.target.checked })}
          className="border-t border-zinc-2 pt-3 font-medium"
        >
          Confirmed
        </Choice>
      ) : (
        <SourceForm
          what="each of them"
          stated={{ source: state.source, confirmed: state.confirmed }}
          editable
          onChange={({ source, confirmed }) => onChange({ ...state, source, confirmed })}
        />
      )}
    </div>
  );
}
