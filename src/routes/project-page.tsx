import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { Shell } from '#client/app/shell.tsx';
import { CalculationLedger } from '#client/features/calculations/components/calculation-ledger.tsx';
import { NewCalculationDialog } from '#client/features/calculations/components/new-calculation-dialog.tsx';
import { DrawingRegister } from '#client/features/projects/components/drawing-register.tsx';
import { ProjectFacts } from '#client/features/projects/components/project-facts.tsx';
import { projectQuery } from '#client/features/projects/queries.ts';
import { Button } from '#client/ui/button.tsx';
import { Fetched, isAbsent } from '#client/ui/page-state.tsx';
import { Paper, PaperHead, PartHead } from '#client/ui/paper.tsx';
import { Empty } from '#client/ui/state-panels.tsx';
import type { Project } from '#shared/contracts/projects.ts';
import { NotFoundPage } from './not-found-page.tsx';

export function Component() {
  const { projectId = '' } = useParams();
  const query = useQuery(projectQuery(projectId));
  if (isAbsent(query)) return <NotFoundPage what="project" />;
  const title = query.data?.title ?? 'Project';
  return (
    <Shell title={title} crumbs={[{ text: 'Desk', to: paths.desk }, { text: title }]}>
      <Paper className="px-10 pt-9 pb-14">
        <Fetched query={query} what="project">
          {(project) => <ProjectPaper project={project} />}
        </Fetched>
      </Paper>
    </Shell>
  );
}

function ProjectPaper({ project }: { project: Project }) {
  const [beginning, setBeginning] = useState(false);
  const begin = project.can.createCalculation && (
    <Button onClick={() => setBeginning(true)}>New calculation</Button>
  );
  const rows = project.calculationRows;
  return (
    <>
      <PaperHead title={`${project.number} ${project.title}`} />
      <ProjectFacts key={project.version} project={project} />
      <PartHead title="Calculations" actions={rows.length > 0 && begin} />
      {rows.length > 0 ? (
        <CalculationLedger rows={rows} caption="Calculations of the project" />
      ) : (
        <Empty action={begin}>No calculation has been begun in this project.</Empty>
      )}
      <DrawingRegister project={project} />
      {beginning && <NewCalculationDialog project={project} onClose={() => setBeginning(false)} />}
    </>
  );
}
