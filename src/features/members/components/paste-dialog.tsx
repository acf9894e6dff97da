import { useMemo, useState } from 'react';
import { count } from '#client/lib/count.ts';
import { Button } from '#client/ui/button.tsx';
import { Choice } from '#client/ui/choice.tsx';
import { Dialog } from '#client/ui/dialog.tsx';
import { TextArea, TextField } from '#client/ui/text-field.tsx';
import type { DraftSource } from '#shared/contracts/draft-quantity.ts';
import { actionNames, actionOf, type DraftCombination } from '#shared/contracts/members.ts';
import { forcesFromTable, pastedTable } from '../forces/forces-from-table.ts';
import type { ColumnUse } from '../forces/recognise-columns.ts';
import { PastedRows, PasteProblems } from './pasted-rows.tsx';

/** A table from a spreadsheet: what it was understood as, before anything is taken over. */
export function PasteDialog(props: {
  text: string;
  units: 'us' | 'si';
  present: readonly DraftCombination[];
  onClose: () => void;
  onTake: (combinations: readonly DraftCombination[]) => void;
}) {
  const { units, present } = props;
  const [text, setText] = useState(props.text);
  const [file, setFile] = useState('');
  const [chosen, setChosen] = useState<Readonly<Record<number, ColumnUse>>>({});
  const [replaces, setReplaces] = useState(() => present.every(isBlank));
  const table = useMemo(() => pastedTable(text), [text]);
  const columns = table.columns.map((column, index) => ({
    ...column,
    use: chosen[index] ?? column.use,
  }));
  const kept = replaces ? [] : present.filter((row) => !isBlank(row));
  const source = (row: number): DraftSource | undefined =>
    file.trim() === '' ? undefined : { kind: 'file', file: file.trim(), row: String(row) };
  const found = forcesFromTable(
    { ...table, columns },
    { units, taken: present, source, confirmed: false },
  );
  const assign = (index: number, use: ColumnUse) => setChosen((was) => ({ ...was, [index]: use }));
  return (
    <Dialog
      title="A table of forces"
      wide
      onClose={props.onClose}
      footer={
        <>
          <Button onClick={props.onClose}>Cancel</Button>
          <Button
            rank="main"
            disabled={found.combinations.length === 0}
            onClick={() => props.onTake([...kept, ...found.combinations])}
          >
            Take over {count(found.combinations.length, 'combination')}
          </Button>
        </>
      }
    >
      <TextArea
        label="Paste the table here, with its header row"
        hint="Columns such as Combination, P (kip), MxA (kip ft), MxB, MyA, MyB; Vx, Vy; numbers may carry their own units."
        rows={table.rows.length > 0 ? 4 : 9}
        spellCheck={false}
        wrap="off"
        value={text}
        onChange={(event) => {
          setText(event.target.value);
          setChosen({});
        }}
      />
      {table.rows.length > 0 && (
        <>
          <div className="mt-4 grid grid-cols-[1fr_auto] items-end gap-6">
            <TextField
              label="The file it comes from"
              optional
              maxLength={200}
              placeholder="hall-forces.xlsx"
              hint="Each value then names this file and its row. Without it they count as typed."
              value={file}
              onChange={(event) => setFile(event.target.value)}
            />
            <Choice
              type="checkbox"
              checked={replaces}
              onChange={(event) => setReplaces(event.target.checked)}
              className="pb-6"
            >
              Put it in place of the {count(present.length, 'present row')}
            </Choice>
          </div>
          {!table.hasHeader && (
            <p className="mt-3 font-medium text-oxide">
              No header row was recognised: say below what each column holds.
            </p>
          )}
          <PastedRows table={{ ...table, columns }} problems={found.problems} onAssign={assign} />
          <PasteProblems problems={found.problems} />
        </>
      )}
    </Dialog>
  );
}

const isBlank = (row: DraftCombination): boolean =>
  row.name === '' &&
  actionNames.every((action) => actionOf(row, action).text === '') &&
  !row.loads?.length &&
  !row.supports?.length &&
  row.sway === undefined;
