import { createUnionType, Field, ObjectType } from '@nestjs/graphql';
import { Limit } from '../entities/limit.entity.js';

@ObjectType()
export class LimitNameTaken {
  @Field()
  message: string;

  constructor(name: string) {
    this.message = `This round has a limit named “${name}” already.`;
  }
}

@ObjectType({ description: 'No portfolio could be told apart by it, or none could meet it.' })
export class LimitEmpty {
  @Field()
  message: string;

  constructor(message: string) {
    this.message = message;
  }
}

export const SaveLimitResult = createUnionType({
  name: 'SaveLimitResult',
  types: () => [Limit, LimitNameTaken, LimitEmpty] as const,
  resolveType: (value) =>
    value instanceof LimitNameTaken ? LimitNameTaken : value instanceof LimitEmpty ? LimitEmpty : Limit,
});
