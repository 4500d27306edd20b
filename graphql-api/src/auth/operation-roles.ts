import { Role } from '../memberships/role.enum.js';

const {
  PURCHASING_COORDINATOR,
  CLINICAL_ASSESSOR,
  FINANCE_DIRECTOR,
  ORGANISATION_ADMIN,
  AUDITOR,
  REQUESTER,
} = Role;

/** Anybody, signed in or not. */
export const PUBLIC = 'PUBLIC';

const members = [
  PURCHASING_COORDINATOR,
  CLINICAL_ASSESSOR,
  FINANCE_DIRECTOR,
  ORGANISATION_ADMIN,
  AUDITOR,
  REQUESTER,
];
const readers = [PURCHASING_COORDINATOR, CLINICAL_ASSESSOR, FINANCE_DIRECTOR, ORGANISATION_ADMIN, AUDITOR];
const coordinator = [PURCHASING_COORDINATOR];

/**
 * The one table of role × operation. The guard refuses what is not in it, the emitter refuses a schema that differs
 * from it, and the web draws from its emitted copy what a member may do.
 */
export const OPERATION_ROLES: Readonly<Record<string, typeof PUBLIC | readonly Role[]>> = {
  signIn: PUBLIC,
  refreshSession: PUBLIC,
  signOut: members,
  switchOrganisation: members,
  viewer: members,

  round: readers,
  roundOverview: readers,
  auditFeed: readers,
  auditVerify: readers,
  setCeiling: [FINANCE_DIRECTOR],
  advanceRound: coordinator,
  stepBackRound: coordinator,

  candidates: readers,
  candidate: readers,
  createCandidate: coordinator,
  updateCandidate: coordinator,

  quotes: readers,
  quote: readers,
  vendors: readers,
  createQuote: coordinator,
  updateQuote: coordinator,
  keepQuote: coordinator,
  startUpload: coordinator,
  finishUpload: coordinator,
  openDocument: readers,

  createLimit: coordinator,
  updateLimit: coordinator,
  deleteLimit: coordinator,

  scoreSheet: readers,
  saveScore: [CLINICAL_ASSESSOR],

  run: readers,
  startSearch: [PURCHASING_COORDINATOR, FINANCE_DIRECTOR],
  stopSearch: [PURCHASING_COORDINATOR, FINANCE_DIRECTOR],

  selection: readers,
  submitSelection: coordinator,
  decideSelection: [FINANCE_DIRECTOR],
};
