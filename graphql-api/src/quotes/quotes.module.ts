import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuditModule } from '../audit/audit.module.js';
import { CandidatesModule } from '../candidates/candidates.module.js';
import { DocumentsModule } from '../documents/documents.module.js';
import { OrganisationsModule } from '../organisations/organisations.module.js';
import { RoundsModule } from '../rounds/rounds.module.js';
import { CandidateQuotesResolver } from './candidate-quotes.resolver.js';
import { Quote } from './entities/quote.entity.js';
import { Vendor } from './entities/vendor.entity.js';
import { KeptQuotesService } from './kept-quotes.service.js';
import { QuoteAmountsResolver } from './quote-amounts.resolver.js';
import { QuoteListService } from './quote-list.service.js';
import { QuotesByCandidateLoader, VendorsByIdLoader } from './quotes.loaders.js';
import { QuotesResolver } from './quotes.resolver.js';
import { QuotesService } from './quotes.service.js';
import { VendorsService } from './vendors.service.js';

@Module({
  imports: [
    TypeOrmModule.forFeature([Quote, Vendor]),
    AuditModule,
    OrganisationsModule,
    RoundsModule,
    CandidatesModule,
    DocumentsModule,
  ],
  providers: [
    QuotesService,
    QuoteListService,
    KeptQuotesService,
    VendorsService,
    QuotesResolver,
    QuoteAmountsResolver,
    CandidateQuotesResolver,
    QuotesByCandidateLoader,
    VendorsByIdLoader,
  ],
  exports: [QuotesService, VendorsService, QuotesByCandidateLoader, VendorsByIdLoader],
})
export class QuotesModule {}
