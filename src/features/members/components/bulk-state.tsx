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
            <label
              key={name}
              className={`flex items-center gap-2 py-0.5 ${name === 'forces' ? 'col-span-2' : ''}`}
            >
              <input
                type="checkbox"
                checked={state.of.has(name)}
                onChange={() => toggle(name)}
                className="accent-oxide"
              />
              {statedWords[name]}
            </label>
          ))}
        </div>
      </fieldset>
      <label className="flex items-center gap-2">
        <input
          type="checkbox"
          checked={state.source === null}
          onChange={(event) =>
            onChange({ ...state, source: event.target.checked ? null : emptySource('drawing') })
          }
          className="accent-oxide"
        />
        Each keeps its own source
      </label>
      {state.source === null ? (
        <label className="flex items-center gap-2 border-t border-zinc-2 pt-3 font-medium">
          <input
            type="checkbox"
            checked={state.confirmed}
            onChange={(event) => onChange({ ...state, confirmed: event.target.checked })}
            className="accent-oxide"
          />
          Confirmed
        </label>
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
