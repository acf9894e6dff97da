import { Button } from '#client/ui/button.tsx';
import { classNames } from '#client/ui/class-names.ts';
import { Row } from '#client/ui/ledger.tsx';
import type { DraftSource } from '#shared/contracts/draft-quantity.ts';
import {
  type ActionName,
  actionNames,
  actionOf,
  type DraftCombination,
} from '#shared/contracts/members.ts';
import { withAction, withCombination, withoutCombination, withText } from '../edit-draft.ts';
import { actionWords } from '../member-fields.ts';
import { useMemberForm } from './member-form-context.ts';
import { SourceControl } from './source-control.tsx';

const cellClass = (problem: string | undefined, extra?: string) =>
  classNames(
    'h-7 w-full min-w-18 rounded-field border bg-transparent px-1.5',
    problem ? 'border-oxide' : 'border-transparent hover:border-zinc-3 focus:border-zinc-5',
    extra,
  );

/** One combination as a row; its ring stands for all its values together. */
export function ForcesRow(props: {
  row: DraftCombination;
  index: number;
  /** The columns that are shown. */
  actions: readonly ActionName[];
  onShow: (id: string) => void;
}) {
  const { row, index } = props;
  const { draft, edit, editable, problemAt } = useMemberForm();
  const at = `combinations[${index}]`;
  const called = row.name || `row ${index + 1}`;
  const nameProblem = problemAt(`${at}.name`) ?? problemAt(`${at}.design`);
  const problems = [
    ...(nameProblem ? [`Name: ${nameProblem}`] : []),
    ...actionNames.flatMap((action) => {
      const problem = problemAt(`${at}.${action}`);
      return problem ? [`${actionWords[action].label}: ${problem}`] : [];
    }),
  ];
  const described = problems.length > 0 ? { 'aria-describedby': `${row.id}-problems` } : {};
  return (
    <>
      <Row className={problems.length > 0 ? 'border-b-0' : ''}>
        <td className="py-0.5 pr-2">
          <input
            {...described}
            aria-label={`Name of combination ${index + 1}`}
            {...(nameProblem ? { 'aria-invalid': true } : {})}
            value={row.name}
            title={row.name}
            readOnly={!editable}
            maxLength={120}
            onChange={(event) =>
              edit(
                withCombination(draft, row.id, (was) => ({ ...was, name: event.target.value })),
                `${row.id}/name`,
              )
            }
            className={cellClass(nameProblem, 'truncate font-semibold')}
          />
        </td>
        {props.actions.map((action) => {
          const problem = problemAt(`${at}.${action}`);
          return (
            <td key={action} className="py-0.5 pr-1">
              <input
                {...described}
                aria-label={`${actionWords[action].label} of ${called}`}
                {...(problem ? { 'aria-invalid': true } : {})}
                value={actionOf(row, action).text}
                readOnly={!editable}
                maxLength={60}
                onChange={(event) =>
                  edit(
                    withAction(
                      draft,
                      row.id,
                      action,
                      withText(actionOf(row, action), event.target.value),
                    ),
                    `${row.id}/${action}`,
                  )
                }
                className={cellClass(problem, 'figures text-right')}
              />
            </td>
          );
        })}
        <td className="text-center">
          <SourceControl
            what={`the forces of ${called}`}
            stated={rowStated(row)}
            onChange={(stated) => edit(withRowStated(draft, row.id, stated), `${row.id}/source`)}
          />
        </td>
        <td className="whitespace-nowrap">
          <Button
            size="small"
            rank="quiet"
            aria-label={`Sheet of ${called}`}
            onClick={() => props.onShow(row.id)}
          >
            Sheet
          </Button>
          {editable && (
            <Button
              size="small"
              rank="quiet"
              aria-label={`Delete ${called}`}
              onClick={() => edit(withoutCombination(draft, row.id), 'rows/delete')}
            >
              Delete
            </Button>
          )}
        </td>
      </Row>
      {problems.length > 0 && (
        <Row>
          <td
            colSpan={props.actions.length + 3}
            id={`${row.id}-problems`}
            className="pb-1.5 text-small font-medium text-oxide"
          >
            {problems.join(' · ')}
          </td>
        </Row>
      )}
    </>
  );
}

const filled = (row: DraftCombination) =>
  actionNames.map((action) => actionOf(row, action)).filter(({ text }) => text.trim() !== '');

/** The source of the row's first value, confirmed when all of them are. */
const rowStated = (row: DraftCombination) => ({
  source: filled(row)[0]?.source,
  confirmed: filled(row).length > 0 && filled(row).every(({ confirmed }) => confirmed),
});

const withRowStated = (
  draft: Parameters<typeof withCombination>[0],
  id: string,
  stated: { source: DraftSource; confirmed: boolean },
) =>
  withCombination(draft, id, (row) => ({
    ...row,
    ...Object.fromEntries(
      actionNames
        .filter((action) => actionOf(row, action).text.trim() !== '')
        .map((action) => [action, { ...actionOf(row, action), ...stated }]),
    ),
  }));
