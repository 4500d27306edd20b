import rolesByOperation from '../../../schema/roles.json';
import type { Role } from '../generated/graphql';
import { useViewer } from './viewer';

const ROLES: Readonly<Record<string, string | readonly string[]>> = rolesByOperation;

/** Whether any of `roles` may run `operation`, by the table the API enforces. What is not in it is nobody's. */
export function may(roles: readonly Role[], operation: string): boolean {
  const allowed = ROLES[operation] ?? [];
  return allowed === 'PUBLIC' || roles.some((role) => allowed.includes(role));
}

/** Asks for the viewer: `const can = useCan(); can('createCandidate')`. Used to leave out, never to protect. */
export function useCan(): (operation: string) => boolean {
  const { membership } = useViewer();
  return (operation) => may(membership.roles, operation);
}
