import type { EntityManager } from '@mikro-orm/postgresql';
import type { Actor } from '@/src/access/actor';
import { csvLine } from '@/src/csv-line';
import { starImpact } from './star-impact';
import type { ImpactItem } from './impact-schema';

const header = [
  'run',
  'group',
  'used_version',
  'unbound_share_before',
  'unbound_share_after',
  'material',
  'unbound_um_before',
  'unbound_um_after',
];

/** One line per run and material. */
export async function impactCsv(em: EntityManager, actor: Actor, versionId: string): Promise<AsyncIterable<string>> {
  const items = await starImpact(em, actor, versionId);
  return (async function* () {
    yield csvLine(header);
    for (const item of items) yield linesOf(item);
  })();
}

const linesOf = ({ run, group, usedVersion, shareBefore, shareAfter, materials }: ImpactItem): string =>
  materials
    .map(({ material, before, after }) =>
      csvLine([run, group, usedVersion, shareBefore, shareAfter, material, text(before), text(after)]),
    )
    .join('');

const text = (intervals: [number, number | null][]) =>
  intervals.map(([lo, hi]) => `${lo}..${hi ?? ''}`).join(' ') || 'never';
