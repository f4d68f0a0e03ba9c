'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState, type FormEvent } from 'react';
import type { ShareItem } from '@/src/sharing/schema';
import { Button } from './button';
import { Notice } from './notice';
import { apiDelete, apiGet, apiPost, sayProblem } from './run-api';
import { RunSection } from './run-section';
import { RunTextField } from './run-text-field';
import { ShareTable } from './share-table';

type NewShare = { id: string; url: string; expiresAt: string };

/** Links under which the run can be seen from outside the group. */
export function SharePanel({ runId, manages }: { runId: string; manages: boolean }) {
  const client = useQueryClient();
  const path = `/api/v1/runs/${runId}/shares`;
  const [days, setDays] = useState('30');
  const [passphrase, setPassphrase] = useState('');
  const [mayDownload, setMayDownload] = useState(false);
  const again = () => client.invalidateQueries({ queryKey: ['shares', runId] });
  const { data, error } = useQuery({
    queryKey: ['shares', runId],
    queryFn: ({ signal }) => apiGet<{ items: ShareItem[] }>(path, signal),
  });
  const make = useMutation({
    mutationFn: () =>
      apiPost<NewShare>(path, { expiresInDays: Number(days), mayDownload, ...(passphrase ? { passphrase } : {}) }),
    onSuccess: again,
  });
  const revoke = useMutation({ mutationFn: (id: string) => apiDelete(`/api/v1/shares/${id}`), onSuccess: again });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    make.mutate();
  };
  const problem = error ?? make.error ?? revoke.error;
  return (
    <RunSection id="sharing" title="Sharing">
      <div className="grid gap-5" aria-live="polite">
        <p className="max-w-prose">
          Whoever has a link sees this run without an account: the results and inputs, no names, nothing else of the
          group.
        </p>
        {problem && <Notice kind="danger">{sayProblem(problem)}</Notice>}
        {make.data && (
          <Notice kind="ok" title="Copy the link now: it is not shown again">
            <p className="font-mono text-sm break-all select-all">{make.data.url}</p>
          </Notice>
        )}
      </div>
      {manages && (
        <form onSubmit={submit} className="mt-5 grid max-w-3xl gap-4" aria-label="New link">
          <div className="grid gap-4 sm:grid-cols-2">
            <RunTextField label="Works for" unit="days" value={days} onChange={setDays} hint="1 to 365" />
            <RunTextField
              label="Passphrase"
              value={passphrase}
              onChange={setPassphrase}
              isNumber={false}
              hint="May stay empty; at least 8 characters."
            />
          </div>
          <label className="flex items-center gap-3">
            <input
              type="checkbox"
              checked={mayDownload}
              onChange={(event) => setMayDownload(event.target.checked)}
              className="accent-chaff size-4"
            />
            The grains may be downloaded
          </label>
          <div>
            <Button type="submit" disabled={make.isPending}>
              Make a link
            </Button>
          </div>
        </form>
      )}
      {data && data.items.length > 0 && (
        <ShareTable shares={data.items} onRevoke={manages ? (id) => revoke.mutate(id) : undefined} />
      )}
    </RunSection>
  );
}
