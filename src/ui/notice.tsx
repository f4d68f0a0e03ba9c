import { CircleAlert, CircleCheck, Info, TriangleAlert } from 'lucide-react';
import type { ReactNode } from 'react';

const kinds = {
  info: { look: 'bg-info-soft border-bound', icon: Info, word: 'Note' },
  ok: { look: 'bg-ok-soft border-ok', icon: CircleCheck, word: 'Done' },
  caution: { look: 'bg-caution-soft border-caution', icon: TriangleAlert, word: 'Caution' },
  danger: { look: 'bg-danger-soft border-danger', icon: CircleAlert, word: 'Problem' },
};

type Props = { kind: keyof typeof kinds; title?: string; children: ReactNode };

/** Says something in a box; an icon and a word tell the kind apart, not only the colour. */
export function Notice({ kind, title, children }: Props) {
  const { look, icon: Icon, word } = kinds[kind];
  return (
    <div
      className={`flex min-w-0 gap-3 rounded-md border-l-4 px-4 py-3 ${look}`}
      role={kind === 'danger' ? 'alert' : undefined}
    >
      <Icon className="mt-0.5 size-5 shrink-0" aria-hidden="true" />
      <div className="min-w-0">
        {title ? <p className="font-medium">{title}</p> : <span className="sr-only">{word}: </span>}
        {children}
      </div>
    </div>
  );
}
