import type { Role } from '@/src/access/policy';

export const roleWords: Record<Role, string> = {
  pi: 'Principal investigator',
  researcher: 'Researcher',
  student: 'Student',
  admin: 'Administrator',
  groupless: 'Without a group',
};
