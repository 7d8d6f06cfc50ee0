import {
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';

import { Account } from '../accounts/account.entity.js';

@Entity('password_resets')
@Unique('password_resets_token_once', ['tokenHash'])
export class PasswordReset {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Index('password_resets_by_account')
  @Column('uuid')
  accountId: string;

  @ManyToOne(() => Account, { nullable: false, onDelete: 'CASCADE' })
  @JoinColumn()
  account: Relation<Account>;

  @Column('text')
  tokenHash: string;

  @Column('timestamptz')
  expiresAt: Date;

  @Column('timestamptz', { nullable: true })
  usedAt: Date | null;

  @Column('timestamptz', { default: () => 'now()' })
  createdAt: Date;
}
