import { Shell } from '#client/app/shell.tsx';
import { ChangePasswordForm } from '#client/features/account/components/change-password-form.tsx';
import { usePerson } from '#client/features/account/queries.ts';
import { Paper, PaperHead, PartHead } from '#client/ui/paper.tsx';

export function Component() {
  const person = usePerson();
  const firm = person.firm ? `${person.firm.name}, ${person.firm.role}` : 'of no firm here';
  return (
    <Shell title="Account" crumbs={[{ text: 'Account' }]}>
      <Paper className="max-w-[760px] px-10 pt-9 pb-12">
        <PaperHead title={person.name} sub={`${person.email} · ${firm}`} />
        <PartHead title="Password" />
        <ChangePasswordForm />
      </Paper>
    </Shell>
  );
}
