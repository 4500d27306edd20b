import { CustomScalar, Scalar } from '@nestjs/graphql';
import { GraphQLError, Kind, type ValueNode } from 'graphql';

const INSTANT = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}:\d{2}(\.\d{1,6})?Z$/;

/** An instant in UTC. The framework's own scalar takes invalid dates, so this one is strict. */
@Scalar('DateTime', () => Date)
export class DateTimeScalar implements CustomScalar<string, Date> {
  description = 'An instant in UTC, such as "2027-02-15T09:30:00.000Z".';

  parseValue(value: unknown): Date {
    const date = typeof value === 'string' && INSTANT.test(value) ? new Date(value) : undefined;
    if (date && !Number.isNaN(date.getTime())) return date;
    throw new GraphQLError(
      `Write an instant in UTC, such as "2027-02-15T09:30:00Z", not ${JSON.stringify(value)}.`,
      {
        extensions: { code: 'BAD_USER_INPUT' },
      },
    );
  }

  serialize(value: unknown): string {
    return new Date(value as string | Date).toISOString();
  }

  parseLiteral(node: ValueNode): Date {
    return this.parseValue(node.kind === Kind.STRING ? node.value : null);
  }
}
