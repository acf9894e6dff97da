import { Link, NavLink } from 'react-router-dom';
import { AccountMenu } from '#client/features/account/components/account-menu.tsx';
import { classNames } from '#client/ui/class-names.ts';
import { Mark } from './mark.tsx';
import { paths } from './paths.ts';

export interface Crumb {
  readonly text: string;
  readonly to?: string | undefined;
}

export interface Tab {
  readonly text: string;
  readonly to: string;
  /** The pages under it are not its own. */
  readonly end?: boolean;
  /** Where another page belongs to it. */
  readonly current?: boolean;
}

/** The one bar: where I am, the parts of what is open, what is saved, who I am. */
export function TopBar(props: {
  crumbs: readonly Crumb[];
  tabs?: readonly Tab[] | undefined;
  status?: React.ReactNode;
}) {
  return (
    <header
      data-screen-only
      className="on-ink sticky top-0 z-30 flex h-12 items-stretch gap-x-5 bg-ink px-5 text-paper"
    >
      <Link to={paths.desk} className="flex items-center gap-2.5 text-head font-semibold">
        <Mark />
        Stanchion
      </Link>
      <Crumbs crumbs={props.crumbs} />
      {props.tabs && (
        <nav aria-label="Parts of the calculation" className="mx-auto flex items-stretch gap-1">
          {props.tabs.map((tab) => (
            <NavLink
              key={tab.to}
              to={tab.to}
              end={tab.end ?? false}
              className={({ isActive }) =>
                classNames(
                  'flex items-center border-b-3 px-3 pt-0.75',
                  isActive || tab.current
                    ? 'border-oxide-3 font-semibold text-paper'
                    : 'border-transparent text-zinc-2 hover:text-paper',
                )
              }
            >
              {tab.text}
            </NavLink>
          ))}
        </nav>
      )}
      <div className="ml-auto flex items-center gap-4 font-condensed text-body">
        {props.status}
        <NavLink
          to={paths.library}
          className={({ isActive }) =>
            classNames('hover:text-paper hover:underline', isActive ? 'text-paper' : 'text-zinc-2')
          }
        >
          Library
        </NavLink>
        <AccountMenu />
      </div>
    </header>
  );
}

function Crumbs({ crumbs }: { crumbs: readonly Crumb[] }) {
  return (
    <nav aria-label="Where you are" className="flex min-w-0 items-center font-condensed text-body">
      <ol className="flex min-w-0 items-center">
        {crumbs.map((crumb, index) => {
          const last = index === crumbs.length - 1;
          return (
            <li
              key={`${crumb.to}${crumb.text}`}
              className={classNames('flex min-w-0 items-center', last && 'shrink-0')}
            >
              {index > 0 && <span className="px-1.5 text-zinc-3">/</span>}
              {crumb.to && !last ? (
                <Link
                  to={crumb.to}
                  className="truncate text-zinc-2 hover:text-paper hover:underline"
                >
                  {crumb.text}
                </Link>
              ) : (
                <span
                  className={last ? 'font-semibold' : 'truncate text-zinc-2'}
                  {...(last ? { 'aria-current': 'page' as const } : {})}
                >
                  {crumb.text}
                </span>
              )}
            </li>
          );
        })}
      </ol>
    </nav>
  );
}
