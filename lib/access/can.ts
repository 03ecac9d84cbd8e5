import { type Action, permissions, type Role } from '@/lib/access/permissions';

/** Whether this role on the boat allows the action. No role, no access. */
export function can(role: Role | null, action: Action): boolean {
  return role !== null && (permissions[action] as readonly Role[]).includes(role);
}
