import { CustomScalar, Scalar } from '@nestjs/graphql';
import { GraphQLError, Kind, type ValueNode } from 'graphql';

const DECIMAL = /^-?\d{1,18}(\.\d{1,10})?$/;

/** A decimal number as a string: GraphQL floats lose cents, and its integers end at two thousand million. */
@Scalar('Decimal')
export class DecimalScalar implements CustomScalar<string, string> {
  description = 'A decimal number as text, such as "2300556.00".';

  parseValue(value: unknown): string {
    if (typeof value === 'string' && DECIMAL.test(value)) return value;
    throw new GraphQLError(
      `Write a number as text with a decimal point, such as "1250.00", not ${JSON.stringify(value)}.`,
      {
        extensions: { code: 'BAD_USER_INPUT' },
      },
    );
  }

  serialize(value: unknown): string {
    return String(value);
  }

  parseLiteral(node: ValueNode): string {
    return this.parseValue(
      node.kind === Kind.STRING || node.kind === Kind.INT || node.kind === Kind.FLOAT ? node.value : null,
    );
  }
}
