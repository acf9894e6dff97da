import { fieldClass, ProblemText } from '#client/ui/field.tsx';
import { type LoadText, textsOfLoad } from '#shared/contracts/draft-input-parts.ts';
import { type DraftLoad, loadKinds } from '#shared/contracts/draft-parts.ts';
import { withLoad, withoutLoad } from '../../edit-loads.ts';
import { controlId } from '../../member-fields.ts';
import { heightWords, loadKindWords, loadWords } from '../../part-words.ts';
import { readable } from '../input-row.tsx';
import { useMemberForm } from '../member-form-context.ts';
import { QuantityRow } from '../quantity-row.tsx';
import { focusControl } from '../stale-notice.tsx';
import { PartHead } from './part.tsx';
import { WordChoice } from './word-choice.tsx';

const placeholders = {
  us: { line: 'kip/ft', point: 'kip', place: 'ft from A' },
  si: { line: 'kN/m', point: 'kN', place: 'm from A' },
} as const;

/** What stands in a field that is empty. */
function placeholderOf(name: LoadText, kind: DraftLoad['kind'], units: 'us' | 'si'): string {
  const { line, point, place } = placeholders[units];
  if (name === 'W') return point;
  if (name.startsWith('w')) return line;
  if (kind === 'varying') return name === 'from' ? 'end A' : 'end B';
  return place;
}

/** One load: its kind and axis, its amounts and places, and where on the section it acts. */
export function LoadRow(props: {
  row: string;
  load: DraftLoad;
  index: number;
  path: string;
  units: 'us' | 'si';
}) {
  const { row, load, index, path, units } = props;
  const { draft, edit, editable } = useMemberForm();
  const called = `Load ${index + 1}`;
  const change = (next: Partial<DraftLoad>, field: string) =>
    edit(withLoad(draft, row, load.id, next), `${row}/${load.id}/${field}`);
  const texts = textsOfLoad(load.kind);
  return (
    <li className="border-b border-zinc-2 pt-1.5 pb-2">
      <PartHead
        text={called}
        action="Delete"
        onAction={() => {
          edit(withoutLoad(draft, row, load.id), `${row}/loads/delete`);
          focusControl(path.replace(/\[\d+\]$/, ''));
        }}
      />
      <div className="my-1 grid grid-cols-[minmax(0,1fr)_84px] gap-1.5">
        <select
          id={controlId(`${path}.kind`)}
          aria-label={`${called} is`}
          value={load.kind}
          disabled={!editable}
          onChange={({ target }) =>
            change({ kind: target.value as DraftLoad['kind'], confirmed: false }, 'kind')
          }
          className={fieldClass(false)}
        >
          {loadKinds.map((kind) => (
            <option key={kind} value={kind}>
              {loadKindWords[kind]}
            </option>
          ))}
        </select>
        <select
          aria-label={`${called} bends the member`}
          value={load.bends}
          disabled={!editable}
          title="The axis that the load bends the member about"
          onChange={({ target }) =>
            change({ bends: target.value as DraftLoad['bends'], confirmed: false }, 'bends')
          }
          className={fieldClass(false)}
        >
          <option value="x">about x</option>
          <option value="y">about y</option>
        </select>
      </div>
      {texts.map((name) => (
        <QuantityRow
          key={name}
          path={`${path}.${name}`}
          words={loadWords[name]}
          quantity={{ text: load[name], source: load.source, confirmed: load.confirmed }}
          placeholder={placeholderOf(name, load.kind, units)}
          withSource={name === texts[0]}
          onChange={({ text, source, confirmed }) =>
            change({ [name]: text, source, confirmed }, name)
          }
        />
      ))}
      {(load.bends === 'x' || load.height !== '') && (
        <HeightRow load={load} called={called} path={`${path}.height`} onChange={change} />
      )}
    </li>
  );
}

function HeightRow(props: {
  load: DraftLoad;
  called: string;
  path: string;
  onChange: (next: Partial<DraftLoad>, field: string) => void;
}) {
  const { load, called } = props;
  const { editable, problemAt } = useMemberForm();
  const problem = problemAt(props.path);
  const id = controlId(props.path);
  return (
    <>
      <div className="grid grid-cols-[minmax(0,1fr)_141px] items-center gap-x-1.25 py-0.5">
        <span className="font-condensed">Acts at</span>
        <WordChoice
          id={id}
          label={`${called} acts at`}
          words={heightWords}
          chosen={load.height === '' ? [] : [load.height]}
          invalid={problem !== undefined}
          describedBy={problem ? `${id}-problem` : undefined}
          disabled={!editable}
          onChoose={(height) => props.onChange({ height, confirmed: false }, 'height')}
        />
      </div>
      {problem && <ProblemText id={`${id}-problem`}>{readable(problem)}</ProblemText>}
    </>
  );
}
