import { Check, Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';

import { Account } from '../accounts/account.entity.js';
import { Organisation } from './organisation.entity.js';

export type MemberRole = 'owner' | 'staff' | 'mechanic';

@Entity('organisation_members')
@Check('organisation_members_role_known', `role IN ('owner','staff','mechanic')`)
export class OrganisationMember {
  @PrimaryColumn('text')
  organisationId: string;

  @ManyToOne(() => Organisation, (organisation) => organisation.members, {
    nullable: false,
    onDelete: 'CASCADE',
  })
  @JoinColumn()
  organisation: Relation<Organisation>;

  @Index('organisation_members_by_account')
  @PrimaryColumn('uuid')
  accountId: string;

  @ManyToOne(() => Account, (account) => account.memberships, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  account: Relation<Account>;

  @Column('text')
  role: MemberRole;
}
