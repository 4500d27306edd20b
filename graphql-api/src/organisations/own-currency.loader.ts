import { Injectable } from '@nestjs/common';
import { RequestLoader } from '../common/request-loader.js';
import { currentCaller } from '../tenancy/request-context.js';
import { OrganisationsService } from './organisations.service.js';

/** The currency of the caller's organisation, read once a request: tables have it in every row. */
@Injectable()
export class OwnCurrencyLoader extends RequestLoader<string, string> {
  constructor(private readonly organisations: OrganisationsService) {
    super();
  }

  current(): Promise<string> {
    return this.load(currentCaller().organisationId);
  }

  protected async batch(organisationIds: readonly string[]) {
    const { currency } = await this.organisations.current();
    return organisationIds.map(() => currency);
  }
}
