import { applyDecorators } from '@nestjs/common';
import { Transform } from 'class-transformer';
import { IsString, Matches, MaxLength, MinLength } from 'class-validator';

/** Without NUL and halves of characters, which PostgreSQL refuses in text and in JSON. */
const STORABLE = /^[^\0\p{Surrogate}]*$/u;

/** Text that may be empty. Blanks around it are dropped. */
export function IsText(longest: number) {
  return applyDecorators(
    Transform(({ value }: { value: unknown }) => (typeof value === 'string' ? value.trim() : value)),
    IsString(),
    MaxLength(longest, { message: ({ property }) => `${property} has at most ${longest} characters` }),
    Matches(STORABLE, { message: ({ property }) => `${property} holds characters that cannot be kept` }),
  );
}

/** Text that says something. */
export function IsFilledText(longest: number) {
  return applyDecorators(
    IsText(longest),
    MinLength(1, { message: ({ property }) => `${property} must not be empty` }),
  );
}
