import { createUnionType, Field, ObjectType } from '@nestjs/graphql';
import { Document } from '../entities/document.entity.js';

@ObjectType()
export class FormField {
  @Field()
  name: string;

  @Field()
  value: string;
}

@ObjectType({
  description: 'Post the fields, then the file as the last field “file”, to the address within ten minutes.',
})
export class UploadSlot {
  @Field(() => Document)
  document: Document;

  @Field()
  url: string;

  @Field(() => [FormField])
  fields: FormField[];

  constructor(document: Document, url: string, fields: Readonly<Record<string, string>>) {
    this.document = document;
    this.url = url;
    this.fields = Object.entries(fields).map(([name, value]) => ({ name, value }));
  }
}

@ObjectType()
export class UploadRefused {
  @Field()
  message: string;

  constructor(message: string) {
    this.message = message;
  }
}

@ObjectType({ description: 'Good for one minute.' })
export class DownloadLink {
  @Field()
  url: string;
}

export const StartUploadResult = createUnionType({
  name: 'StartUploadResult',
  types: () => [UploadSlot, UploadRefused] as const,
});

export const FinishUploadResult = createUnionType({
  name: 'FinishUploadResult',
  types: () => [Document, UploadRefused] as const,
});
