import { Field, ID, ObjectType } from '@nestjs/graphql';
import { Organisation } from '../../organisations/entities/organisation.entity.js';
import { Membership } from '../entities/membership.entity.js';
import { Role } from '../role.enum.js';

@ObjectType({ description: 'An organisation that the signed-in person may switch to.' })
export class MembershipChoice {
  @Field(() => ID)
  organisationId: string;

  @Field()
  organisationName: string;

  @Field(() => [Role])
  roles: Role[];
}

@ObjectType({ description: 'The signed-in person in the organisation of this session.' })
export class Viewer {
  @Field(() => Membership)
  membership: Membership;

  @Field()
  email: string;

  @Field(() => Organisation)
  organisation: Organisation;

  @Field(() => [MembershipChoice])
  memberships: MembershipChoice[];
}
