import { Check, Column, Entity, PrimaryColumn } from 'typeorm';

@Entity('makers')
@Check('makers_makes_known', `makes IN ('frames','shocks','parts')`)
export class Maker {
  @PrimaryColumn('text')
  id: string;

  @Column('text')
  name: string;

  @Column('text')
  makes: 'frames' | 'shocks' | 'parts';
}
