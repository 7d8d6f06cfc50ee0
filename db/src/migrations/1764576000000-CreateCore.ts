import type { MigrationInterface, QueryRunner } from 'typeorm';

import { accountsUp } from './core/accounts.js';
import { catalogueUp } from './core/catalogue.js';
import { deliveryUp } from './core/delivery.js';
import { ordersUp } from './core/orders.js';
import { ridersUp } from './core/riders.js';
import { tradersUp } from './core/traders.js';

/** The whole first schema, one room per file; order matters for the foreign keys. */
export class CreateCore1764576000000 implements MigrationInterface {
  name = 'CreateCore1764576000000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query('CREATE EXTENSION IF NOT EXISTS btree_gist');
    for (const sql of [accountsUp, tradersUp, catalogueUp, ridersUp, ordersUp, deliveryUp]) {
      await runner.query(sql);
    }
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      DROP TABLE IF EXISTS mail_log, outbox, idempotency_keys, fitting_records, bookings, refunds, payments, stripe_events,
        order_lines, parcels, orders, plans, measure_up_links, measure_up_answers, measure_ups, stock_movements, listings,
        hold_open_parts, remotes, hardware_kits, coil_springs, shock_sizes, shock_models, catalogue_items,
        frame_sheet_entries, frame_sheets, frames, makers, workshop_services, workshop_closures, workshop_hours, stands,
        organisation_members, organisations, towns, sign_in_attempts, password_resets, sessions, accounts`);
  }
}
