import { useMutation } from '@tanstack/react-query';
import { type ReactNode, useRef, useState } from 'react';
import { download } from '#client/lib/api.ts';
import { isProblem, reasonOf } from '#client/lib/problem.ts';
import { useSeconds } from '#client/lib/use-seconds.ts';
import { Button } from '#client/ui/button.tsx';
import { Dialog } from '#client/ui/dialog.tsx';

type File = 'downloadInput' | 'downloadReport';

/** Fetches a file of a calculation and hands it to the browser; a refusal is shown with its places. */
export function DownloadButton(props: {
  file: File;
  calculationId: string;
  name: string;
  rank?: 'main' | 'plain';
  children: ReactNode;
}) {
  const { file, calculationId, name } = props;
  const [refused, setRefused] = useState<Error | null>(null);
  const leaving = useRef<AbortController | null>(null);
  const fetching = useMutation({
    mutationFn: () => {
      leaving.current = new AbortController();
      return download(file, { params: { calculationId }, signal: leaving.current.signal });
    },
    onSuccess: (blob) => handOver(blob, name),
    onError: (error) => {
      if (!leaving.current?.signal.aborted) setRefused(error);
    },
  });
  const seconds = useSeconds(fetching.isPending);
  return (
    <>
      {fetching.isPending ? (
        <span className="inline-flex items-center gap-2">
          <span role="status" className="figures text-small text-zinc-7">
            Making the file{seconds > 1 ? `, ${seconds} s` : ' …'}
          </span>
          <Button onClick={() => leaving.current?.abort()}>Cancel</Button>
        </span>
      ) : (
        <Button rank={props.rank ?? 'plain'} onClick={() => fetching.mutate()}>
          {props.children}
        </Button>
      )}
      {refused && <Refusal error={refused} name={name} onClose={() => setRefused(null)} />}
    </>
  );
}

function Refusal(props: { error: Error; name: string; onClose: () => void }) {
  const { error, name, onClose } = props;
  const places = isProblem(error) ? (error.details?.problems ?? []) : [];
  return (
    <Dialog
      title={`${name} could not be made`}
      onClose={onClose}
      footer={<Button onClick={onClose}>Close</Button>}
    >
      <p>{reasonOf(error)}</p>
      {places.length > 0 && (
        <ul className="mt-3 border-t border-zinc-2">
          {places.map(({ path, message }) => (
            <li key={`${path}${message}`} className="border-b border-zinc-2 py-1.5">
              <span className="font-mono text-small">{path}</span> {message}
            </li>
          ))}
        </ul>
      )}
    </Dialog>
  );
}

function handOver(blob: Blob, name: string) {
  const url = URL.createObjectURL(blob);
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  window.setTimeout(() => URL.revokeObjectURL(url), 10_000);
}
