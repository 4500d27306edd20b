import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuditModule } from '../audit/audit.module.js';
import { CandidatesModule } from '../candidates/candidates.module.js';
import { MembershipsModule } from '../memberships/memberships.module.js';
import { StorageModule } from '../storage/storage.module.js';
import { CandidateDocumentsResolver } from './candidate-documents.resolver.js';
import { DocumentsByCandidateLoader, DocumentsByQuoteLoader } from './documents.loaders.js';
import { DocumentsResolver } from './documents.resolver.js';
import { DocumentsService } from './documents.service.js';
import { Document } from './entities/document.entity.js';
import { UploadsService } from './uploads.service.js';

@Module({
  imports: [
    TypeOrmModule.forFeature([Document]),
    AuditModule,
    CandidatesModule,
    MembershipsModule,
    StorageModule,
  ],
  providers: [
    DocumentsService,
    UploadsService,
    DocumentsResolver,
    CandidateDocumentsResolver,
    DocumentsByCandidateLoader,
    DocumentsByQuoteLoader,
  ],
  exports: [DocumentsService, DocumentsByQuoteLoader],
})
export class DocumentsModule {}
