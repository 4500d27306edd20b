/** An error that a person may read. Its code travels in `extensions.code`. */
export abstract class DomainError extends Error {
  abstract readonly code: string;
  /** Further facts for the client, for example which fields are wrong. */
  readonly details: Record<string, unknown> = {};
}

export class NotFoundError extends DomainError {
  readonly code = 'NOT_FOUND';
  constructor(what: string, id: string) {
    super(`No ${what} with id ${id}.`);
  }
}

export class UnauthenticatedError extends DomainError {
  readonly code = 'UNAUTHENTICATED';
  constructor() {
    super('You are signed out. Sign in to go on.');
  }
}

export class ForbiddenError extends DomainError {
  readonly code = 'FORBIDDEN';
  constructor(roles: readonly string[]) {
    const inWords = roles.map((role) => role.toLowerCase().replaceAll('_', ' ')).join(' or ');
    super(`Your roles do not allow this. ${inWords ? `It needs the role ${inWords}` : 'No role does'}.`);
  }
}

export class InvalidInputError extends DomainError {
  readonly code = 'BAD_USER_INPUT';
  override readonly details: { fields: FieldProblem[] };
  constructor(fields: FieldProblem[]) {
    super(fields.map((field) => field.message).join(' '));
    this.details = { fields };
  }
}

export interface FieldProblem {
  field: string;
  message: string;
}

/** Somebody saved the same thing in the meantime. Nothing of the late edit is kept. */
export class ConflictError extends DomainError {
  readonly code = 'CONFLICT';
  override readonly details: { currentVersion: number };
  constructor(what: string, currentVersion: number) {
    super(
      `This ${what} was changed by somebody else in the meantime. Nothing was saved. Load it again and repeat your change.`,
    );
    this.details = { currentVersion };
  }
}

/** The round's stage does not allow the change. */
export class WrongStageError extends DomainError {
  readonly code = 'WRONG_STAGE';
  constructor(message: string) {
    super(message);
  }
}
