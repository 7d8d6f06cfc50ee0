import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** Written by the session store alone; here so that the schema has no table without an entity. */
@Entity('sessions')
export class Session {
  @PrimaryColumn('text')
  sid: string;

  @Column('json')
  sess: Record<string, unknown>;

  @Index('sessions_expire')
  @Column('timestamptz')
  expire: Date;
}
