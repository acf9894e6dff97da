import { TextArea, TextField } from '#client/ui/text-field.tsx';
import type { DraftSource } from '#shared/contracts/draft-quantity.ts';

/** The fields of a source of one kind. */
export function SourceDetails(props: {
  source: DraftSource;
  onChange: (source: DraftSource) => void;
}) {
  const { source, onChange } = props;
  switch (source.kind) {
    case 'typed':
      return (
        <TextField
          label="Note"
          optional
          maxLength={200}
          value={source.note ?? ''}
          onChange={({ target }) =>
            onChange(target.value ? { ...source, note: target.value } : { kind: 'typed' })
          }
        />
      );
    case 'file':
      return (
        <div className="grid grid-cols-[1fr_72px] gap-2">
          <TextField
            label="File"
            maxLength={200}
            value={source.file}
            onChange={({ target }) => onChange({ ...source, file: target.value })}
          />
          <TextField
            label="Row"
            inputMode="numeric"
            maxLength={12}
            value={source.row ?? ''}
            onChange={({ target }) => onChange({ ...source, row: target.value })}
          />
        </div>
      );
    case 'drawing':
      return (
        <div className="grid grid-cols-[1fr_72px] gap-2">
          <TextField
            label="Drawing"
            maxLength={60}
            value={source.number}
            onChange={({ target }) => onChange({ ...source, number: target.value })}
          />
          <TextField
            label="Revision"
            maxLength={20}
            value={source.revision}
            onChange={({ target }) => onChange({ ...source, revision: target.value })}
          />
          <TextField
            label="Where on it"
            optional
            maxLength={120}
            fieldClassName="col-span-2"
            value={source.detail ?? ''}
            onChange={({ target }) => onChange({ ...source, detail: target.value })}
          />
        </div>
      );
    case 'assumption':
      return (
        <TextArea
          label="On what grounds"
          rows={3}
          maxLength={400}
          value={source.basis}
          onChange={({ target }) => onChange({ ...source, basis: target.value })}
        />
      );
  }
}
