import { Injectable } from '@nestjs/common';
import { Not, type EntityManager } from 'typeorm';
import { MoneyError } from '@metewand/money';
import { AuditService } from '../audit/audit.service.js';
import { InvalidInputError } from '../common/domain-error.js';
import { RoundCostsService } from '../costing/round-costs.service.js';
import { Site } from '../organisations/entities/site.entity.js';
import { OrganisationsService } from '../organisations/organisations.service.js';
import { RoundsService } from '../rounds/rounds.service.js';
import { findOrThrow, lockVersion } from '../tenancy/find-or-throw.js';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import type { CreateLimitInput, LimitFieldsInput, UpdateLimitInput } from './dto/save-limit.input.js';
import { LimitEmpty, LimitNameTaken } from './dto/save-limit.result.js';
import { Limit, LimitMeasure } from './entities/limit.entity.js';
import { boundOf, CEILING_LIMIT_NAME, formatUse, measured, useOf } from './limit-measures.js';

/** The search's own format takes 32, the ceiling on capital among them. */
const MOST_LIMITS = 31;

type Refusal = LimitNameTaken | LimitEmpty;

@Injectable()
export class LimitsService {
  constructor(
    private readonly db: TenantDatabase,
    private readonly rounds: RoundsService,
    private readonly organisations: OrganisationsService,
    private readonly costs: RoundCostsService,
    private readonly audit: AuditService,
  ) {}

  /** By name. */
  ofRound(roundId: string): Promise<Limit[]> {
    return this.db.transaction((em) => em.find(Limit, { where: { roundId }, order: { name: 'ASC' } }));
  }

  /** What all candidates with a quote in force would take together, as decimal text by limit id. */
  askedOfRound(roundId: string): Promise<Map<string, string>> {
    return this.db.transaction(async () => {
      const limits = await this.ofRound(roundId);
      const { currency, priced } = await this.costs.ofRound(roundId);
      return new Map(
        limits.map((limit) => {
          const uses = priced.map((each) => useOf(limit, measured(each)));
          const asked = uses.reduce((sum, use) => sum + use, 0);
          return [limit.id, formatUse(limit.measure, asked, currency)];
        }),
      );
    });
  }

  create({ roundId, fields }: CreateLimitInput): Promise<Limit | Refusal> {
    return this.db.transaction(async (em) => {
      await this.rounds.lockChangeable(em, roundId);
      if ((await em.countBy(Limit, { roundId })) >= MOST_LIMITS) {
        throw new InvalidInputError([
          { field: 'fields.name', message: `A round has at most ${MOST_LIMITS} limits.` },
        ]);
      }
      const refusal = await this.refusalOf(em, roundId, fields);
      if (refusal) return refusal;
      const { id } = await em.save(em.create(Limit, { roundId, ...columnsOf(fields) }));
      const limit = await em.findOneByOrFail(Limit, { id });
      await this.audit.record(em, 'limit.created', { roundId, objectId: id, data: wordsOf(limit) });
      return limit;
    });
  }

  update({ id, version, fields }: UpdateLimitInput): Promise<Limit | Refusal> {
    return this.db.transaction(async (em) => {
      const { roundId } = await findOrThrow(em, Limit, 'limit', id);
      await this.rounds.lockChangeable(em, roundId);
      const limit = await lockVersion(em, Limit, 'limit', id, version);
      const refusal = await this.refusalOf(em, roundId, fields, id);
      if (refusal) return refusal;
      await em.save(Object.assign(limit, columnsOf(fields)));
      const saved = await em.findOneByOrFail(Limit, { id });
      await this.audit.record(em, 'limit.changed', { roundId, objectId: id, data: wordsOf(saved) });
      return saved;
    });
  }

  delete(id: string): Promise<boolean> {
    return this.db.transaction(async (em) => {
      const { roundId } = await findOrThrow(em, Limit, 'limit', id);
      await this.rounds.lockChangeable(em, roundId);
      const limit = await findOrThrow(em, Limit, 'limit', id);
      await em.delete(Limit, { id });
      await this.audit.record(em, 'limit.deleted', { roundId, objectId: id, data: wordsOf(limit) });
      return true;
    });
  }

  private async refusalOf(
    em: EntityManager,
    roundId: string,
    fields: LimitFieldsInput,
    id?: string,
  ): Promise<Refusal | undefined> {
    if (fields.siteId) await findOrThrow(em, Site, 'site', fields.siteId);
    const empty = emptinessOf(fields, (await this.organisations.current()).currency);
    if (empty) return new LimitEmpty(empty);
    const { name } = fields;
    const taken =
      name === CEILING_LIMIT_NAME ||
      (await em.existsBy(Limit, { roundId, name, ...(id && { id: Not(id) }) }));
    return taken ? new LimitNameTaken(name) : undefined;
  }
}

/** Why no search could use such a limit, in words; undefined when it can. */
function emptinessOf(fields: LimitFieldsInput, currency: string): string | undefined {
  const least = boundIn(fields, 'least', currency);
  const most = boundIn(fields, 'most', currency);
  if (least === undefined && most === undefined) return 'Say the least or the most that the limit allows.';
  if (least !== undefined && most !== undefined && least > most) {
    return `No portfolio can hold at least ${fields.least} and at most ${fields.most}.`;
  }
  return undefined;
}

function boundIn(fields: LimitFieldsInput, field: 'least' | 'most', currency: string): number | undefined {
  const text = fields[field];
  if (text === undefined || text === null) return undefined;
  if (fields.measure !== LimitMeasure.ADDED_RUNNING_COST && text.startsWith('-')) {
    throw new InvalidInputError([
      { field: `fields.${field}`, message: 'Only a running cost can be below zero.' },
    ]);
  }
  try {
    return boundOf(fields.measure, text, currency);
  } catch (error) {
    if (!(error instanceof MoneyError || error instanceof RangeError)) throw error;
    throw new InvalidInputError([{ field: `fields.${field}`, message: error.message }]);
  }
}

function columnsOf({ name, measure, siteId, least, most }: LimitFieldsInput) {
  return { name, measure, siteId: siteId ?? null, least: least ?? null, most: most ?? null };
}

function wordsOf({ name, least, most }: Limit) {
  const bounds = [least !== null && `at least ${least}`, most !== null && `at most ${most}`];
  return { name, detail: bounds.filter(Boolean).join(', ') };
}
