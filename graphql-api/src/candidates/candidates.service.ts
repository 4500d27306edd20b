import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { readAmounts } from '../common/read-amounts.js';
import { Department } from '../organisations/entities/department.entity.js';
import { Site } from '../organisations/entities/site.entity.js';
import { OrganisationsService } from '../organisations/organisations.service.js';
import type { Round } from '../rounds/entities/round.entity.js';
import { RoundsService } from '../rounds/rounds.service.js';
import { findOrThrow, lockOrThrow, lockVersion } from '../tenancy/find-or-throw.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import type {
  CandidateFieldsInput,
  CreateCandidateInput,
  UpdateCandidateInput,
} from './dto/save-candidate.input.js';
import { MandatoryNeedsReason } from './dto/save-candidate.result.js';
import { Candidate } from './entities/candidate.entity.js';
import { nextCode } from './next-code.js';

@Injectable()
export class CandidatesService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly rounds: RoundsService,
    private readonly organisations: OrganisationsService,
    private readonly audit: AuditService,
  ) {}

  find(id: string): Promise<Candidate> {
    return this.db.transaction((em) => findOrThrow(em, Candidate, 'candidate', id));
  }

  /** The candidate, locked with its round, if the round's contents may be changed. Its quotes are changed under this lock. */
  async lockChangeable(em: EntityManager, id: string): Promise<{ candidate: Candidate; round: Round }> {
    const { roundId } = await findOrThrow(em, Candidate, 'candidate', id);
    const round = await this.rounds.lockChangeable(em, roundId);
    const candidate = await lockOrThrow(em, Candidate, 'candidate', id);
    return { candidate, round };
  }

  create({ roundId, fields }: CreateCandidateInput): Promise<Candidate | MandatoryNeedsReason> {
    return this.db.transaction(async (em) => {
      await this.rounds.lockChangeable(em, roundId);
      if (lacksReason(fields)) return new MandatoryNeedsReason();
      const columns = await this.columnsOf(em, fields);
      const taken = await em.find(Candidate, { where: { roundId }, select: { code: true } });
      const code = nextCode(taken.map((other) => other.code));
      const candidate = em.create(Candidate, {
        roundId,
        code,
        ...columns,
        siteNeeds: [],
        keptQuoteId: null,
        keptReason: '',
      });
      await em.save(candidate);
      await this.record(em, 'candidate.created', candidate);
      return candidate;
    });
  }

  update({ id, version, fields }: UpdateCandidateInput): Promise<Candidate | MandatoryNeedsReason> {
    return this.db.transaction(async (em) => {
      await this.lockChangeable(em, id);
      const candidate = await lockVersion(em, Candidate, 'candidate', id, version);
      if (lacksReason(fields)) return new MandatoryNeedsReason();
      Object.assign(candidate, await this.columnsOf(em, fields));
      await em.save(candidate);
      await this.record(em, 'candidate.changed', candidate);
      return candidate;
    });
  }

  private async columnsOf(em: EntityManager, fields: CandidateFieldsInput) {
    await findOrThrow(em, Department, 'department', fields.departmentId);
    await findOrThrow(em, Site, 'site', fields.siteId);
    const { currency } = await this.organisations.current();
    const { worksNet, consumablesYearly, energyYearly, currentRunningYearly, ...rest } = fields;
    const amounts = { worksNet, consumablesYearly, energyYearly, currentRunningYearly };
    const minor = readAmounts(currency, 'fields.', amounts);
    return {
      ...rest,
      worksNetMinor: minor.worksNet,
      consumablesYearlyMinor: minor.consumablesYearly,
      energyYearlyMinor: minor.energyYearly,
      currentRunningYearlyMinor: minor.currentRunningYearly,
    };
  }

  private record(
    em: EntityManager,
    action: 'candidate.created' | 'candidate.changed',
    { id, roundId, code, name }: Candidate,
  ) {
    return this.audit.record(em, action, { roundId, objectId: id, data: { detail: `${code} ${name}` } });
  }
}

function lacksReason({ mandatory, mandatoryReason }: CandidateFieldsInput): boolean {
  return mandatory && mandatoryReason === '';
}
