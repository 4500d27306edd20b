import { ValidationPipe, type ValidationError } from '@nestjs/common';
import { InvalidInputError, type FieldProblem } from './domain-error.js';

/** Refuses unknown and malformed fields, all problems at once, each with its path. */
export function inputValidation() {
  return new ValidationPipe({
    transform: true,
    whitelist: true,
    forbidNonWhitelisted: true,
    exceptionFactory: (errors) => new InvalidInputError(errors.flatMap((error) => problems(error))),
  });
}

function problems(error: ValidationError, parent = ''): FieldProblem[] {
  const field = parent ? `${parent}.${error.property}` : error.property;
  const own = Object.values(error.constraints ?? {}).map((message) => ({ field, message: `${message}.` }));
  return [...own, ...(error.children ?? []).flatMap((child) => problems(child, field))];
}
