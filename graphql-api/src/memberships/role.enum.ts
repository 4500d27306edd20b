import { registerEnumType } from '@nestjs/graphql';

export enum Role {
  PURCHASING_COORDINATOR = 'PURCHASING_COORDINATOR',
  CLINICAL_ASSESSOR = 'CLINICAL_ASSESSOR',
  FINANCE_DIRECTOR = 'FINANCE_DIRECTOR',
  ORGANISATION_ADMIN = 'ORGANISATION_ADMIN',
  AUDITOR = 'AUDITOR',
  REQUESTER = 'REQUESTER',
}

registerEnumType(Role, {
  name: 'Role',
  description: 'What a member does in an organisation. A member may hold several.',
});
