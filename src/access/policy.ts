import type { GroupRole } from '@/entities/membership';
import { Refusal } from '@/src/errors';
import type { Actor } from './actor';

/** `groupless` is a person who is signed in and belongs to no group. */
export type Role = GroupRole | 'admin' | 'groupless';

/** Who may do what: the one table. A role that is not named may not. */
export const permissions = {
  'catalogue.read': { does: 'See the catalogues of the group', roles: ['pi', 'researcher', 'student'], scope: 'read' },
  'catalogue.upload': { does: 'Upload a catalogue', roles: ['pi', 'researcher'], scope: 'write' },
  'run.read': { does: 'See the runs of the group', roles: ['pi', 'researcher', 'student'], scope: 'read' },
  'run.request': { does: 'Request a run', roles: ['pi', 'researcher', 'student'], scope: 'write' },
  'run.impact': {
    does: 'See what a new version of a star would change in finished runs',
    roles: ['pi', 'admin'],
    scope: 'read',
  },
  'run.cancel': { does: 'Cancel a run', roles: ['pi', 'researcher', 'student'], scope: 'write' },
  'star.read': {
    does: 'See star presets',
    roles: ['pi', 'researcher', 'student', 'admin', 'groupless'],
    scope: 'read',
  },
  'star.manageOwn': { does: 'Draft, publish and retire star presets of the group', roles: ['pi'], scope: 'write' },
  'star.manageShared': {
    does: 'Draft, publish and retire star presets for everybody',
    roles: ['admin'],
    scope: 'write',
  },
  'material.read': {
    does: 'See materials',
    roles: ['pi', 'researcher', 'student', 'admin', 'groupless'],
    scope: 'read',
  },
  'curve.compute': {
    does: 'Use the calculator',
    roles: ['pi', 'researcher', 'student', 'admin', 'groupless'],
    scope: 'read',
  },
  'share.read': { does: 'See who shares a run by which links', roles: ['pi', 'researcher', 'student'], scope: 'read' },
  'share.manage': { does: 'Share a run by a link, and revoke links', roles: ['pi', 'researcher'], scope: 'write' },
  'group.create': {
    does: 'Start a further group',
    roles: ['pi', 'researcher', 'student', 'admin', 'groupless'],
    scope: 'write',
  },
  'group.read': { does: 'See who belongs to the group', roles: ['pi', 'researcher', 'student'], scope: 'read' },
  'group.manage': { does: 'Invite and remove people, set roles, rename the group', roles: ['pi'], scope: 'write' },
  'changes.read': { does: 'Read the record of changes', roles: ['pi', 'admin'], scope: 'read' },
  'token.manage': {
    does: 'Make and revoke own access tokens',
    roles: ['pi', 'researcher', 'student', 'admin'],
    scope: 'write',
  },
} as const satisfies Record<string, { does: string; roles: readonly Role[]; scope: 'read' | 'write' }>;

export type Permission = keyof typeof permissions;

export function may(actor: Actor, permission: Permission): boolean {
  const rule = permissions[permission];
  if (!(actor.scopes as readonly string[]).includes(rule.scope)) return false;
  const roles: readonly Role[] = rule.roles;
  if (actor.platformRole === 'admin' && roles.includes('admin')) return true;
  return roles.includes(actor.groupId === null || actor.role === null ? 'groupless' : actor.role);
}

export function demand(actor: Actor, permission: Permission): void {
  if (!may(actor, permission)) {
    throw new Refusal('forbidden', `Your role does not allow this: ${permissions[permission].does.toLowerCase()}.`);
  }
}

/** The filter that every query for a group's things carries. Without a group it matches nothing. */
export function ofOwnGroup(actor: Actor): { group: string } {
  return { group: actor.groupId ?? '00000000-0000-0000-0000-000000000000' };
}

/** Presets are everybody's, or the group's own. */
export function visiblePresets(groupId: string | null): { $or: ({ group: null } | { group: string })[] } {
  return { $or: groupId === null ? [{ group: null }] : [{ group: null }, { group: groupId }] };
}
