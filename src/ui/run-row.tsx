import Link from 'next/link';
import type { RunItem } from '@/src/runs/schema';
import { percentText } from './run-figures';
import { inputsOf } from './run-inputs-of';
import { Moment } from './run-moment';
import { StatusBadge } from './status-badge';

export function RunRow({ run }: { run: RunItem }) {
  const { catalogue, star } = inputsOf(run);
  return (
    <tr className="border-line hover:bg-panel border-t">
      <th scope="row" className="max-w-72 py-2.5 pr-4 text-left font-medium">
        <Link href={`/runs/${run.id}`} className="block truncate hover:underline">
          {run.name}
        </Link>
      </th>
      <td className="max-w-52 truncate py-2.5 pr-4">{catalogue.name}</td>
      <td className="py-2.5 pr-4">{star.name}</td>
      <td className="py-2.5 pr-4">
        <StatusBadge status={run.status} />
        {run.status === 'running' && (
          <span className="text-muted ml-2 tabular-nums">{Math.round(run.progress * 100)} %</span>
        )}
      </td>
      <td className="py-2.5 pr-8 text-right font-mono tabular-nums">
        {run.summary ? percentText(run.summary.unbound.numberShare) : '—'}
      </td>
      <td className="py-2.5 pr-4">
        <Moment iso={run.createdAt} />
      </td>
      <td className="py-2.5">{run.requestedBy}</td>
    </tr>
  );
}
