import type { Role } from '../generated/graphql';
import { useViewer } from './viewer';

type RolesByOperation = Readonly<Record<string, readonly string[]>>;

const tables = import.meta.glob<RolesByOperation>('../../../schema/roles.json', {
  eager: true,
  import: 'default',
});
const table: RolesByOperation | undefined = Object.values(tables)[0];

/** Whether any of `roles` may run `operation`, by the table the API enforces. */
export function may(roles: readonly Role[], operation: string): boolean {
  if (!table) return true;
  return table[operation]?.some((role) => roles.includes(role as Role)) ?? false;
}

/** Asks for the viewer: `const can = useCan(); can('createCandidate')`. Used to leave out, never to protect. */
export function useCan(): (operation: string) => boolean {
  const { membership } = useViewer();
  return (operation) => may(membership.roles, operation);
}
