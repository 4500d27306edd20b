import { registerEnumType } from '@nestjs/graphql';

export enum CandidateKind {
  REPLACEMENT = 'REPLACEMENT',
  UPGRADE = 'UPGRADE',
  EXPANSION = 'EXPANSION',
  NEW_SERVICE = 'NEW_SERVICE',
  REGULATORY = 'REGULATORY',
}

registerEnumType(CandidateKind, { name: 'CandidateKind', description: 'What buying the candidate changes.' });
