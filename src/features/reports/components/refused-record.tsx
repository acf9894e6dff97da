import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { isProblem, reasonOf } from '#client/lib/problem.ts';
import { Failure } from '#client/ui/state-panels.tsx';
import type { Calculation } from '#shared/contracts/calculations.ts';

/** Why there is no record, with the members whose inputs hinder it. */
export function RefusedRecord(props: {
  error: Error;
  calculation: Calculation;
  onRetry: () => void;
}) {
  const { error, calculation } = props;
  const places = isProblem(error, 'invalid-input') ? (error.details?.problems ?? []) : [];
  if (places.length === 0) {
    return (
      <div className="m-6">
        <Failure title="The report could not be made" onRetry={props.onRetry}>
          {reasonOf(error)}
        </Failure>
      </div>
    );
  }
  return (
    <div className="m-6">
      <Failure title="The report waits for inputs that want correcting">
        <ul className="mt-1">
          {places.map(({ path, message }) => (
            <li key={`${path}${message}`}>
              <Place path={path} calculation={calculation} /> {message}
            </li>
          ))}
        </ul>
      </Failure>
    </div>
  );
}

/** `members[C-07].Lb` as a link to that member, `analysis.…` as one to the basis. */
function Place({ path, calculation }: { path: string; calculation: Calculation }) {
  const mark = /^members\[([^\]]*)\]/.exec(path)?.[1];
  const row = calculation.memberRows.find((member) => member.mark === mark);
  const to = row ? paths.member(calculation.id, row.id) : paths.basis(calculation.id);
  return (
    <Link to={to} className="link font-mono text-small">
      {path}
    </Link>
  );
}
