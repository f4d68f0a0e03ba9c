import type { GroupRole } from '@/entities/membership';
import type { TokenScope } from '@/entities/personal-token';

/** Who is asking, and in which of their groups. Built by src/web for a request, by the worker for a job. */
export type Actor = {
  personId: string;
  name: string;
  email: string;
  groupId: string | null;
  groupName: string | null;
  role: GroupRole | null;
  platformRole: 'member' | 'admin';
  /** A session may do all that the person may; a token only what its scopes say. */
  scopes: readonly TokenScope[];
};
