import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { AuditModule } from '../audit/audit.module.js';
import { OrganisationsModule } from '../organisations/organisations.module.js';
import { RoundsModule } from '../rounds/rounds.module.js';
import { CandidateLinksResolver } from './candidate-links.resolver.js';
import { CandidatesByIdLoader } from './candidates-by-id.loader.js';
import { CandidatesResolver } from './candidates.resolver.js';
import { CandidatesService } from './candidates.service.js';
import { Candidate } from './entities/candidate.entity.js';
import { LinkMember } from './entities/link-member.entity.js';
import { Link } from './entities/link.entity.js';
import { LinksByCandidateLoader, LinksByRoundLoader, MembersByLinkLoader } from './links.loader.js';
import { LinksResolver } from './links.resolver.js';
import { LinksService } from './links.service.js';
import { RoundLinksResolver } from './round-links.resolver.js';

@Module({
  imports: [
    TypeOrmModule.forFeature([Candidate, Link, LinkMember]),
    AuditModule,
    OrganisationsModule,
    RoundsModule,
  ],
  providers: [
    CandidatesService,
    CandidatesResolver,
    CandidatesByIdLoader,
    LinksService,
    LinksResolver,
    CandidateLinksResolver,
    RoundLinksResolver,
    LinksByCandidateLoader,
    LinksByRoundLoader,
    MembersByLinkLoader,
  ],
  exports: [CandidatesService, CandidatesByIdLoader, LinksService],
})
export class CandidatesModule {}
