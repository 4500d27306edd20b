import { applyDecorators } from '@nestjs/common';
import { Matches } from 'class-validator';

/** An amount of money that cannot be negative, as decimal text. How many decimals fit depends on the currency. */
export function IsAmount() {
  return applyDecorators(
    Matches(/^\d{1,13}(\.\d{1,3})?$/, {
      message: ({ property }) => `${property} must be zero or more, such as 1250.00; it cannot be negative`,
    }),
  );
}

export function IsPercent() {
  return applyDecorators(
    Matches(/^(100(\.0{1,2})?|\d{1,2}(\.\d{1,2})?)$/, {
      message: ({ property }) => `${property} must lie between 0 and 100, with at most two decimals`,
    }),
  );
}

/** A quantity of days, square metres and the like, as large as its column. */
export function IsQuantity() {
  return applyDecorators(
    Matches(/^\d{1,6}(\.\d{1,2})?$/, {
      message: ({ property }) =>
        `${property} must be zero or more, less than a million, with at most two decimals`,
    }),
  );
}
