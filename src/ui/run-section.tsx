import type { ReactNode } from 'react';

/** A part of the run page under its heading. */
export function RunSection({ id, title, children }: { id: string; title: string; children: ReactNode }) {
  return (
    <section aria-labelledby={id} className="min-w-0">
      <h2 id={id} className="border-line mb-4 border-b pb-1 font-serif text-2xl">
        {title}
      </h2>
      {children}
    </section>
  );
}
