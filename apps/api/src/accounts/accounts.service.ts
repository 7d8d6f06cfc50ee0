import type { MeView } from '@linkfell/contracts';
import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';

import { Account } from './account.entity.js';

@Injectable()
export class AccountsService {
  constructor(private readonly dataSource: DataSource) {}

  /** @param email in lower case */
  findByEmail(email: string): Promise<Account | null> {
    return this.dataSource.manager.findOneBy(Account, { email });
  }

  /** What the pages may know of whoever is signed in; nobody for null or an account that is gone. */
  async me(accountId: string | null): Promise<MeView> {
    if (accountId === null) return { account: null };
    const account = await this.dataSource.manager.findOne(Account, {
      where: { id: accountId },
      relations: { memberships: { organisation: true } },
      order: { memberships: { organisationId: 'ASC' } },
    });
    if (!account) return { account: null };
    const { id, email, displayName, platformRole, memberships } = account;
    return {
      account: {
        id,
        email,
        displayName,
        platformRole,
        organisations: memberships.map(({ role, organisation }) => ({
          id: organisation.id,
          name: organisation.name,
          isShop: organisation.isShop,
          isWorkshop: organisation.isWorkshop,
          role,
        })),
      },
    };
  }
}
