import type { ReactNode } from 'react';

type Props = { title: string; action?: ReactNode; children: ReactNode };

/** Nothing is there yet: says what would be, and how to begin. */
export function EmptyState({ title, action, children }: Props) {
  return (
    <div className="border-line grid justify-items-start gap-3 rounded-lg border border-dashed px-6 py-10">
      <h2 className="text-xl">{title}</h2>
      <p className="text-muted max-w-prose">{children}</p>
      {action}
    </div>
  );
}
