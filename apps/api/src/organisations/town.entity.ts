import { Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('towns')
export class Town {
  @PrimaryColumn('text')
  id: string;

  @Column('text')
  name: string;

  @Column('double precision')
  latitude: number;

  @Column('double precision')
  longitude: number;
}
