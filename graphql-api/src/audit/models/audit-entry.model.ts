import { Field, Int, ObjectType } from '@nestjs/graphql';

@ObjectType()
export class AuditEntry {
  @Field(() => Int)
  seq: number;

  @Field(() => Date)
  at: Date;

  @Field({ description: 'What happened, in words.' })
  sentence: string;

  @Field({ description: 'What it happened to, or why.' })
  detail: string;

  @Field()
  action: string;

  membershipId: string | null;
}

@ObjectType()
export class AuditFeed {
  @Field(() => [AuditEntry])
  items: AuditEntry[];

  @Field(() => String, { nullable: true })
  endCursor: string | null;

  @Field()
  hasMore: boolean;
}

@ObjectType()
export class AuditVerification {
  @Field(() => Int)
  entries: number;

  @Field()
  whole: boolean;

  @Field(() => [Int], { description: 'Numbers of the entries at which the chain is broken.' })
  brokenSeqs: number[];
}
