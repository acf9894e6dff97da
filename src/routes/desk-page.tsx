import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Shell } from '#client/app/shell.tsx';
import { usePerson } from '#client/features/account/queries.ts';
import { CalculationLedger } from '#client/features/calculations/components/calculation-ledger.tsx';
import { WaitingList } from '#client/features/desk/components/waiting-list.tsx';
import { deskQuery } from '#client/features/desk/queries.ts';
import { NewProjectDialog } from '#client/features/projects/components/new-project-dialog.tsx';
import { ProjectLedger } from '#client/features/projects/components/project-ledger.tsx';
import { Button } from '#client/ui/button.tsx';
import { Fetched } from '#client/ui/page-state.tsx';
import { Paper, PaperHead, PartHead } from '#client/ui/paper.tsx';
import { Empty } from '#client/ui/state-panels.tsx';

export function Component() {
  const person = usePerson();
  const desk = useQuery(deskQuery);
  const [opening, setOpening] = useState(false);
  const openProject = desk.data?.canCreateProject && (
    <Button onClick={() => setOpening(true)}>New project</Button>
  );
  return (
    <Shell title="Desk" crumbs={[{ text: 'Desk' }]}>
      <Paper className="px-10 pt-9 pb-14">
        <PaperHead
          title={`The desk of ${person.name}`}
          sub={person.firm ? `${person.firm.name}, ${person.firm.role}` : person.email}
        />
        <Fetched query={desk} what="desk">
          {({ projects, calculations, waiting }) => (
            <>
              <PartHead title="Waits for you" />
              <WaitingList
                items={waiting}
                designs={calculations.some(({ roles }) => roles.includes('engineer'))}
              />
              <PartHead title="Calculations" />
              {calculations.length > 0 ? (
                <CalculationLedger rows={calculations} showProject caption="Your calculations" />
              ) : (
                <Empty>No calculations yet. They are begun in a project.</Empty>
              )}
              <PartHead title="Projects" actions={projects.length > 0 && openProject} />
              {projects.length > 0 ? (
                <ProjectLedger rows={projects} />
              ) : (
                <Empty action={openProject}>
                  You are in no project yet. Who runs one can let you in
                  {openProject ? ', or you open one yourself.' : '.'}
                </Empty>
              )}
            </>
          )}
        </Fetched>
      </Paper>
      {opening && <NewProjectDialog onClose={() => setOpening(false)} />}
    </Shell>
  );
}
