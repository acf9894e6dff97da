import { classNames } from '#client/ui/class-names.ts';
import { actionNames } from '#shared/contracts/members.ts';
import type { PastedTable, TableProblem } from '../forces/forces-from-table.ts';
import type { ColumnUse } from '../forces/recognise-columns.ts';
import { actionWords } from '../member-fields.ts';

const uses: readonly { readonly value: ColumnUse; readonly text: string }[] = [
  { value: 'leave', text: 'leave out' },
  { value: 'name', text: 'Combination' },
  ...actionNames.map((action) => ({
    value: action,
    text: `${action}, ${actionWords[action].label.toLowerCase()}`,
  })),
];

/** The pasted rows under what each column is taken for, which can be changed. */
export function PastedRows(props: {
  table: PastedTable;
  problems: readonly TableProblem[];
  onAssign: (column: number, use: ColumnUse) => void;
}) {
  const { table, problems } = props;
  const wrong = new Set(problems.map(({ row, column }) => `${row}/${column}`));
  return (
    <section
      // biome-ignore lint/a11y/noNoninteractiveTabindex: a wide table scrolls, by keyboard too
      tabIndex={0}
      aria-label="Understood as"
      className="mt-4 max-h-72 overflow-auto border-y border-zinc-3"
    >
      <table className="figures w-full border-collapse font-condensed text-small">
        <thead className="sticky top-0 bg-paper">
          <tr className="border-b-2 border-ink">
            <th scope="col" className="px-2 text-right font-semibold text-zinc-7">
              Row
            </th>
            {table.columns.map((column, index) => (
              <th
                // biome-ignore lint/suspicious/noArrayIndexKey: columns in their order
                key={index}
                scope="col"
                className="px-2 py-1.5 text-left align-bottom font-semibold"
              >
                <span className="block text-zinc-7">
                  {column.header || 'without a header'}
                  {column.unit && `, ${column.unit}`}
                </span>
                <select
                  aria-label={`Column ${column.header || index + 1} is`}
                  value={column.use}
                  onChange={(event) => props.onAssign(index, event.target.value as ColumnUse)}
                  className="mt-0.5 h-6.5 rounded-field border border-zinc-3 bg-paper font-normal"
                >
                  {uses.map(({ value, text }) => (
                    <option key={value} value={value}>
                      {text}
                    </option>
                  ))}
                </select>
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {table.rows.map((cells, index) => {
            const row = table.firstRow + index;
            return (
              <tr key={row} className="border-b border-zinc-2">
                <th scope="row" className="px-2 text-right font-normal text-zinc-7">
                  {row}
                </th>
                {table.columns.map((column, at) => (
                  <td
                    // biome-ignore lint/suspicious/noArrayIndexKey: columns in their order
                    key={at}
                    className={classNames(
                      'px-2 py-0.5',
                      column.use === 'leave' && 'text-zinc-7',
                      wrong.has(`${row}/${column.header}`) && 'bg-oxide-2 font-semibold text-oxide',
                    )}
                  >
                    {cells[at]}
                  </td>
                ))}
              </tr>
            );
          })}
        </tbody>
      </table>
    </section>
  );
}

/** What could not be read, by row and column. It is taken over as it stands. */
export function PasteProblems({ problems }: { problems: readonly TableProblem[] }) {
  if (problems.length === 0) return null;
  return (
    <div className="mt-3 border-l-2 border-oxide pl-3" role="status">
      <p className="font-semibold">
        These cells are taken over as they stand and want correcting afterwards:
      </p>
      <ul className="mt-1 max-h-32 overflow-y-auto text-small">
        {problems.map(({ row, column, message }) => (
          <li key={`${row}/${column}`}>
            Row {row}, {column}: {message}
          </li>
        ))}
      </ul>
    </div>
  );
}
