import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { TenantDatabase } from '../tenancy/tenant-database.js';
import { Vendor } from './entities/vendor.entity.js';

@Injectable()
export class VendorsService {
  constructor(private readonly db: TenantDatabase) {}

  all(): Promise<Vendor[]> {
    return this.db.transaction((em) => em.find(Vendor, { order: { name: 'ASC' } }));
  }

  /** The vendor of this name, whatever its capitals. */
  findByName(em: EntityManager, name: string): Promise<Vendor | null> {
    return em
      .createQueryBuilder(Vendor, 'vendor')
      .where('lower(vendor.name) = lower(:name)', { name })
      .orderBy('vendor.name')
      .getOne();
  }

  /** Two people who bring a new vendor at once end up with the same one. */
  async findOrCreate(em: EntityManager, name: string): Promise<Vendor> {
    const known = await this.findByName(em, name);
    if (known) return known;
    await em.createQueryBuilder().insert().into(Vendor).values({ name }).orIgnore().execute();
    return em.findOneByOrFail(Vendor, { name });
  }
}
