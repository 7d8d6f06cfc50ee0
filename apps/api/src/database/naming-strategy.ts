import { DefaultNamingStrategy, type Table } from 'typeorm';

const snake = (name: string): string => name.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`);
const tableName = (table: Table | string): string =>
  (typeof table === 'string' ? table : table.name).replace(/^.*\./, '');

/** Names as the hand-written migrations give them: snake_case columns, `<table>_pk`, `<table>_<relation>`. */
export class SchemaNamingStrategy extends DefaultNamingStrategy {
  override columnName(property: string, customName: string): string {
    return customName || snake(property);
  }

  override joinColumnName(relation: string, referencedColumn: string): string {
    return `${snake(relation)}_${snake(referencedColumn)}`;
  }

  override primaryKeyName(table: Table | string): string {
    return `${tableName(table)}_pk`;
  }

  override foreignKeyName(table: Table | string, columns: string[]): string {
    return `${tableName(table)}_${columns.join('_').replace(/_id$/, '')}`;
  }
}
