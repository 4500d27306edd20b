import { Args, ID, Mutation, Parent, ResolveField, Resolver } from '@nestjs/graphql';
import { Membership } from '../memberships/entities/membership.entity.js';
import { MembershipsByIdLoader } from '../memberships/memberships-by-id.loader.js';
import { DocumentsService } from './documents.service.js';
import { StartUploadInput } from './dto/start-upload.input.js';
import { DownloadLink, FinishUploadResult, StartUploadResult } from './dto/upload.result.js';
import { Document } from './entities/document.entity.js';
import { UploadsService } from './uploads.service.js';

@Resolver(() => Document)
export class DocumentsResolver {
  constructor(
    private readonly uploads: UploadsService,
    private readonly documents: DocumentsService,
    private readonly membershipsById: MembershipsByIdLoader,
  ) {}

  @Mutation(() => StartUploadResult)
  startUpload(@Args('input') input: StartUploadInput) {
    return this.uploads.start(input);
  }

  @Mutation(() => FinishUploadResult)
  finishUpload(@Args('documentId', { type: () => ID }) documentId: string) {
    return this.uploads.finish(documentId);
  }

  @Mutation(() => DownloadLink)
  openDocument(@Args('id', { type: () => ID }) id: string) {
    return this.documents.open(id);
  }

  @ResolveField(() => Membership)
  uploadedBy(@Parent() { uploadedBy }: Document) {
    return this.membershipsById.load(uploadedBy);
  }
}
