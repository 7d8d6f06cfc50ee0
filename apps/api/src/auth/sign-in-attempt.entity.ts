import { Column, Entity, Index, PrimaryGeneratedColumn } from 'typeorm';

@Entity('sign_in_attempts')
@Index('sign_in_attempts_by_email', ['email', 'at'])
export class SignInAttempt {
  @PrimaryGeneratedColumn('identity', { type: 'bigint', generatedIdentity: 'ALWAYS' })
  id: string;

  @Column('text')
  email: string;

  @Column('text')
  ip: string;

  @Column('boolean')
  succeeded: boolean;

  @Column('timestamptz', { default: () => 'now()' })
  at: Date;
}
