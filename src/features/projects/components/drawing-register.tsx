import { useState } from 'react';
import { when } from '#client/lib/clock.ts';
import { reasonOf } from '#client/lib/problem.ts';
import { useAnnounce } from '#client/ui/announcements.tsx';
import { Button } from '#client/ui/button.tsx';
import { Cell, HeadCell, Ledger, Row, RowHead } from '#client/ui/ledger.tsx';
import { PartHead } from '#client/ui/paper.tsx';
import { Empty } from '#client/ui/state-panels.tsx';
import type { Drawing, Project } from '#shared/contracts/projects.ts';
import { useDeleteDrawing, useRestoreDrawing } from '../mutations.ts';
import { DeletedDrawings } from './deleted-drawings.tsx';
import { DrawingForm } from './drawing-form.tsx';

/** The project's drawings at their revisions, which sources of inputs refer to. */
export function DrawingRegister({ project }: { project: Project }) {
  const [editing, setEditing] = useState<string | null>(null);
  const editable = project.can.editDrawings;
  const { drawings } = project;
  const close = () => setEditing(null);
  return (
    <section aria-labelledby="drawings">
      <PartHead
        id="drawings"
        title="Drawings"
        actions={
          editable &&
          editing !== 'new' && <Button onClick={() => setEditing('new')}>Add a drawing</Button>
        }
      />
      {editing === 'new' && <DrawingForm projectId={project.id} onDone={close} />}
      {drawings.length === 0 && editing !== 'new' && (
        <Empty>
          No drawings yet. Lengths and restraints taken from a drawing name it here, so that its
          next revision can be noticed.
        </Empty>
      )}
      {drawings.length > 0 && (
        <Ledger
          caption="Drawings"
          head={
            <>
              <HeadCell className="w-[14%]">Number</HeadCell>
              <HeadCell>Title</HeadCell>
              <HeadCell className="w-[9%]">Revision</HeadCell>
              <HeadCell className="w-[16%]">Status</HeadCell>
              <HeadCell className="w-[18%]">Changed</HeadCell>
              {editable && (
                <HeadCell className="w-[1%]">
                  <span className="sr-only">Change</span>
                </HeadCell>
              )}
            </>
          }
        >
          {drawings.map((drawing) =>
            editing === drawing.id ? (
              <Row key={drawing.id}>
                <td colSpan={6}>
                  <DrawingForm projectId={project.id} drawing={drawing} onDone={close} />
                </td>
              </Row>
            ) : (
              <DrawingRow
                key={drawing.id}
                projectId={project.id}
                drawing={drawing}
                {...(editable ? { onEdit: () => setEditing(drawing.id) } : {})}
              />
            ),
          )}
        </Ledger>
      )}
      {editable && <DeletedDrawings project={project} />}
    </section>
  );
}

function DrawingRow(props: { projectId: string; drawing: Drawing; onEdit?: () => void }) {
  const { drawing, onEdit } = props;
  const remove = useDeleteDrawing(props.projectId);
  const restore = useRestoreDrawing(props.projectId);
  const announce = useAnnounce();
  const bringBack = () =>
    restore.mutate(drawing.id, { onError: (error) => announce(reasonOf(error)) });
  const onDelete = () =>
    remove.mutate(drawing.id, {
      onSuccess: () =>
        announce({
          text: `Drawing ${drawing.number} deleted.`,
          action: { label: 'Restore', run: bringBack },
        }),
      onError: (error) => announce(reasonOf(error)),
    });
  return (
    <Row>
      <RowHead>{drawing.number}</RowHead>
      <Cell>{drawing.title}</Cell>
      <Cell className="font-semibold">{drawing.revision}</Cell>
      <Cell>{drawing.status}</Cell>
      <Cell className="text-zinc-7">
        {when(drawing.changedAt)}, {drawing.changedBy}
      </Cell>
      {onEdit && (
        <Cell className="whitespace-nowrap">
          <Button
            size="small"
            rank="quiet"
            onClick={onEdit}
            aria-label={`Change ${drawing.number}`}
          >
            Change
          </Button>
          <Button
            size="small"
            rank="quiet"
            disabled={remove.isPending}
            onClick={onDelete}
            aria-label={`Delete ${drawing.number}`}
          >
            Delete
          </Button>
        </Cell>
      )}
    </Row>
  );
}
