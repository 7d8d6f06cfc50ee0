import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What a maker promises and packs with a shock, for its page in the storefront. */
export class AddModelPapers1764603000000 implements MigrationInterface {
  name = 'AddModelPapers1764603000000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE shock_models
        ADD COLUMN warranty_months integer CONSTRAINT shock_models_warranty_positive CHECK (warranty_months > 0),
        ADD COLUMN in_the_box text[] NOT NULL DEFAULT '{}'`);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE shock_models DROP COLUMN warranty_months, DROP COLUMN in_the_box');
  }
}
