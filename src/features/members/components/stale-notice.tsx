import { count } from '#client/lib/count.ts';
import type { ProblemPlace } from '#shared/contracts/problems.ts';
import { controlId } from '../member-fields.ts';
import { placeWords } from '../place-words.ts';

/** Above a sheet that is older than the inputs beside it; each problem leads to its field. */
export function StaleNotice(props: {
  problems: readonly ProblemPlace[];
  hasSheet: boolean;
  onGo: (path: string) => void;
}) {
  const { problems, hasSheet } = props;
  if (problems.length === 0) return null;
  const wants = wantsOf(problems);
  return (
    <div
      data-screen-only
      className="mx-auto mb-3 max-w-[880px] border-l-3 border-oxide bg-oxide-2 px-4 py-2.5"
    >
      <p role="status" className="font-semibold">
        {hasSheet ? `The sheet shows the last valid inputs; ${wants}.` : `No sheet yet: ${wants}.`}
      </p>
      <ul className="mt-1 text-small">
        {problems.map(({ path, message }) => (
          <li key={path}>
            <button type="button" className="link font-medium" onClick={() => props.onGo(path)}>
              {placeWords(path)}
            </button>{' '}
            {message}
          </li>
        ))}
      </ul>
    </div>
  );
}

/** What nobody has given yet is not wrong: it is still needed. */
function wantsOf(problems: readonly ProblemPlace[]): string {
  const one = problems.length === 1;
  const missing = problems.every(({ message }) => /^is (needed|empty)/.test(message));
  const verb = missing ? (one ? 'is still needed' : 'are still needed') : null;
  return `${count(problems.length, 'input')} ${verb ?? (one ? 'wants correcting' : 'want correcting')}`;
}

/** The same after the next drawing, for a control that is only then there. */
export const focusControl = (path: string): void => {
  requestAnimationFrame(() => requestAnimationFrame(() => goToControl(path)));
};

/** Moves to the control of a path, if it is in the margin. */
export function goToControl(path: string): boolean {
  const control = document.getElementById(controlId(path));
  control?.focus();
  control?.scrollIntoView({ block: 'nearest' });
  return control !== null;
}
