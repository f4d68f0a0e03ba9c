'use client';

import { useActionState, useMemo, useRef, useState, type FormEvent } from 'react';
import type { CatalogueItem } from '@/src/catalogues/schema';
import type { MaterialItem } from '@/src/materials/schema';
import type { StarItem } from '@/src/stars/schema';
import type { FormState } from '@/src/web/form-state';
import { Button } from './button';
import { Notice } from './notice';
import { criticalBetaOfDraft } from './run-critical-beta';
import type { RunDraft } from './run-draft';
import { RunFormAdvanced } from './run-form-advanced';
import { RunFormOptics } from './run-form-optics';
import { RunFormPopulation } from './run-form-population';
import { RunFormPreview } from './run-form-preview';
import { RunFormRelease } from './run-form-release';
import { RunFormStar } from './run-form-star';
import { requestOfDraft } from './run-request-of-draft';
import { useSettled } from './run-settled';

type Props = {
  action: (state: FormState, form: FormData) => Promise<FormState>;
  initial: RunDraft;
  catalogues: readonly CatalogueItem[];
  stars: readonly StarItem[];
  materials: readonly MaterialItem[];
};

const previewAfterMs = 400;

export function RunForm({ action, initial, catalogues, stars, materials }: Props) {
  const [draft, setDraft] = useState(initial);
  const [tried, setTried] = useState(false);
  const [state, send, isSending] = useActionState(action, {});
  const form = useRef<HTMLFormElement>(null);
  const { request, problems } = useMemo(() => requestOfDraft(draft), [draft]);
  const asked = useMemo(() => ({ request, betaCritical: criticalBetaOfDraft(draft) }), [request, draft]);
  const settled = useSettled(asked, previewAfterMs);
  const catalogue = catalogues.find(({ id }) => id === settled.request?.catalogueId);
  const shown = { ...state.problems, ...(tried ? problems : {}) };
  const part = { draft, problems: shown, onChange: (changed: Partial<RunDraft>) => setDraft({ ...draft, ...changed }) };

  const check = (event: FormEvent) => {
    if (request) return;
    event.preventDefault();
    setTried(true);
    requestAnimationFrame(() => form.current?.querySelector<HTMLElement>('[aria-invalid=true]')?.focus());
  };

  return (
    <div className="grid items-start gap-10 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
      <form ref={form} action={send} onSubmit={check} noValidate className="grid min-w-0 gap-8" aria-label="New run">
        <input type="hidden" name="request" value={request ? JSON.stringify(request) : ''} />
        <RunFormPopulation {...part} catalogues={catalogues} />
        <RunFormStar {...part} stars={stars} />
        <RunFormRelease {...part} />
        <RunFormOptics {...part} />
        <RunFormAdvanced {...part} materials={materials} />
        <div className="grid gap-3" aria-live="polite">
          {state.message && <Notice kind="danger">{state.message}</Notice>}
          {tried && problems && (
            <Notice kind="danger">{`${Object.keys(problems).length} thing(s) to set right above before the run can start.`}</Notice>
          )}
        </div>
        <div>
          <Button type="submit" variant="primary" disabled={isSending}>
            {isSending ? 'Starting ...' : 'Start the run'}
          </Button>
        </div>
      </form>
      <aside
        className="border-line bg-panel min-w-0 rounded-lg border p-5 lg:sticky lg:top-6"
        aria-labelledby="preview"
      >
        <h2 id="preview" className="mb-3 font-serif text-xl">
          What to expect
        </h2>
        {settled.request && catalogue && settled.betaCritical !== null ? (
          <RunFormPreview
            request={settled.request}
            betaCritical={settled.betaCritical}
            catalogue={catalogue}
            materials={materials}
          />
        ) : (
          <p className="text-muted">
            Choose a catalogue and a star: the radii that go unbound appear here before you start.
          </p>
        )}
      </aside>
    </div>
  );
}
