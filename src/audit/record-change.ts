import type { EntityManager } from '@mikro-orm/postgresql';
import { ChangeRecord } from '@/entities';

/** Who is said to have done it; a command or the product itself acts under a name alone. */
export type Doer = { personId: string | null; name: string };

export type Change = {
  /** Area and verb, such as "member.remove" or "star.publish". */
  action: string;
  target: { kind: string; id: string; name?: string };
  groupId: string | null;
  /** What changed, without secrets: never passwords, tokens or their hashes. */
  before?: object;
  after?: object;
};

/** Writes down a change in the transaction that makes it: one does not exist without the other. */
export function recordChange(tx: EntityManager, doer: Doer, { action, target, groupId, before, after }: Change): void {
  tx.create(ChangeRecord, {
    groupId,
    personId: doer.personId,
    personName: doer.name.slice(0, 200),
    action,
    targetKind: target.kind,
    targetId: target.id,
    targetName: (target.name ?? '').slice(0, 300),
    before: before ?? null,
    after: after ?? null,
  });
  // The caller's flush stores it together with the change.
}
