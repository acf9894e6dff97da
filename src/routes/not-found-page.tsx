import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { Shell } from '#client/app/shell.tsx';
import { Paper, PaperHead } from '#client/ui/paper.tsx';

/** Nothing at this address, or nothing that this person may know of. */
export function NotFoundPage({ what = 'page' }: { what?: string }) {
  return (
    <Shell title="Not found" crumbs={[{ text: 'Not found' }]}>
      <Paper className="max-w-[760px] px-10 pt-9 pb-12">
        <PaperHead title={`No ${what} at this address`} />
        <p className="mt-5 max-w-[60ch] font-serif text-head">
          It may have been deleted, the address may be mistyped, or you have not been let in. Who
          runs the project can give you a role in it.
        </p>
        <p className="mt-4">
          <Link to={paths.desk} className="link font-medium">
            To your desk
          </Link>
        </p>
      </Paper>
    </Shell>
  );
}
