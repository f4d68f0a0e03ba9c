import type { ReactNode } from 'react';
import type { RunDraft } from './run-draft';
import type { FieldProblems } from './run-request-of-draft';

/** What each part of the run form is given. */
export type FormPartProps = {
  draft: RunDraft;
  problems: FieldProblems;
  onChange: (changed: Partial<RunDraft>) => void;
};

export function FormPart({ title, children }: { title: string; children: ReactNode }) {
  return (
    <fieldset className="border-line grid min-w-0 gap-4 border-t pt-4">
      <legend className="pr-3 font-serif text-xl">{title}</legend>
      {children}
    </fieldset>
  );
}
