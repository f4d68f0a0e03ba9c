import type { ReactNode } from 'react';

type Props = { title: string; subtitle?: ReactNode; actions?: ReactNode };

export function PageHeader({ title, subtitle, actions }: Props) {
  return (
    <header className="mb-8 flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
      <div className="min-w-0 max-w-3xl">
        <h1 className="text-3xl font-medium tracking-tight sm:text-4xl">{title}</h1>
        {subtitle && <p className="text-muted mt-2">{subtitle}</p>}
      </div>
      {actions && <div className="flex flex-wrap gap-3">{actions}</div>}
    </header>
  );
}
