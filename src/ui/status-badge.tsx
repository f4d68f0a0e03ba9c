import { CircleCheck, CircleDashed, CircleSlash, CircleX, LoaderCircle } from 'lucide-react';

const looks = {
  queued: { word: 'Waiting', icon: CircleDashed, look: 'text-muted' },
  running: { word: 'Running', icon: LoaderCircle, look: 'text-chaff' },
  checking: { word: 'Checking', icon: LoaderCircle, look: 'text-chaff' },
  done: { word: 'Done', icon: CircleCheck, look: 'text-ok' },
  ready: { word: 'Ready', icon: CircleCheck, look: 'text-ok' },
  failed: { word: 'Failed', icon: CircleX, look: 'text-danger' },
  cancelled: { word: 'Cancelled', icon: CircleSlash, look: 'text-muted' },
};

export function StatusBadge({ status }: { status: keyof typeof looks }) {
  const { word, icon: Icon, look } = looks[status];
  return (
    <span className={`inline-flex items-center gap-1.5 whitespace-nowrap font-medium ${look}`}>
      <Icon className={`size-4 ${Icon === LoaderCircle ? 'motion-safe:animate-spin' : ''}`} aria-hidden="true" />
      {word}
    </span>
  );
}
