import { Check, Column, Entity, OneToMany, PrimaryGeneratedColumn, Unique, type Relation } from 'typeorm';

import { OrganisationMember } from '../organisations/organisation-member.entity.js';

export type PlatformRole = 'rider' | 'curator' | 'administrator';

@Entity('accounts')
@Unique('accounts_email_once', ['email'])
@Check('accounts_email_lower', `email = lower(email)`)
@Check('accounts_role_known', `platform_role IN ('rider','curator','administrator')`)
export class Account {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  /** Always in lower case. */
  @Column('text')
  email: string;

  /** argon2id in its encoded form; null for an account that has never set a password. */
  @Column('text', { nullable: true })
  passwordHash: string | null;

  @Column('text')
  displayName: string;

  @Column('text', { default: 'rider' })
  platformRole: PlatformRole;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;

  @OneToMany(() => OrganisationMember, (member) => member.account)
  memberships: Relation<OrganisationMember>[];
}
