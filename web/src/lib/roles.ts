import type { Role } from '../generated/graphql';

const NAMES: Record<Role, string> = {
  PURCHASING_COORDINATOR: 'Purchasing coordinator',
  CLINICAL_ASSESSOR: 'Clinical assessor',
  FINANCE_DIRECTOR: 'Finance director',
  ORGANISATION_ADMIN: 'Administrator',
  AUDITOR: 'Auditor',
  REQUESTER: 'Requester',
};

/** "Purchasing coordinator" or, with several roles, "Finance director, Auditor". */
export function roleNames(roles: readonly Role[]): string {
  return roles.map((role) => NAMES[role]).join(', ');
}
