import { ActionButton } from '@/src/ui/action-button';
import { enterGroupAction } from './actions';

type Props = { groups: readonly { id: string; name: string }[]; current: string | null };

export function GroupChoice({ groups, current }: Props) {
  if (groups.length === 0) return <p className="text-muted">You belong to no group.</p>;
  return (
    <ul className="grid gap-2">
      {groups.map(({ id, name }) => (
        <li key={id} className="flex flex-wrap items-center gap-3">
          <span className={id === current ? 'font-medium' : ''}>{name}</span>
          {id === current ? (
            <span className="text-muted text-sm">you are in this one now</span>
          ) : (
            <ActionButton action={enterGroupAction} fields={{ groupId: id }} label={`Go to ${name}`}>
              Go there
            </ActionButton>
          )}
        </li>
      ))}
    </ul>
  );
}
