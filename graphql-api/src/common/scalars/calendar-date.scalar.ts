import { CustomScalar, Scalar } from '@nestjs/graphql';
import { GraphQLError, Kind, type ValueNode } from 'graphql';

/** A day in the organisation's calendar, without a time: "2027-02-15". */
@Scalar('CalendarDate')
export class CalendarDateScalar implements CustomScalar<string, string> {
  description = 'A day as text, such as "2027-02-15".';

  parseValue(value: unknown): string {
    if (typeof value === 'string' && isCalendarDate(value)) return value;
    throw new GraphQLError(
      `Write a day as year-month-day, such as "2027-02-15", not ${JSON.stringify(value)}.`,
      {
        extensions: { code: 'BAD_USER_INPUT' },
      },
    );
  }

  serialize(value: unknown): string {
    return String(value);
  }

  parseLiteral(node: ValueNode): string {
    return this.parseValue(node.kind === Kind.STRING ? node.value : null);
  }
}

/** PostgreSQL knows no year 0. */
function isCalendarDate(text: string): boolean {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(text) || text.startsWith('0000')) return false;
  const date = new Date(`${text}T00:00:00Z`);
  return !Number.isNaN(date.getTime()) && date.toISOString().startsWith(text);
}
