import { Field, ID, InputType, Int } from '@nestjs/graphql';
import { IsInt, IsString, IsUUID, MaxLength } from 'class-validator';

@InputType()
export class StartUploadInput {
  @Field(() => ID)
  @IsUUID()
  candidateId: string;

  @Field()
  @IsString()
  @MaxLength(1_000)
  fileName: string;

  @Field({ description: 'As the browser names it.' })
  @IsString()
  @MaxLength(200)
  contentType: string;

  @Field(() => Int)
  @IsInt()
  sizeBytes: number;
}
