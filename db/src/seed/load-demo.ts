import { hash } from '@node-rs/argon2';
import pg from 'pg';

import { insertRows } from './insert-rows.js';
import { readScenario, type Scenario } from './scenario.js';

/** argon2id, 19 MiB, two passes, one lane: OWASP's password storage cheat sheet. */
const argon = { memoryCost: 19456, timeCost: 2, parallelism: 1 };

async function loadTraders(client: pg.Client, s: Scenario): Promise<void> {
  await insertRows(client, 'towns', s.towns as unknown as Record<string, unknown>[]);
  await insertRows(
    client,
    'organisations',
    s.organisations.map((o) => ({
      id: o.id,
      name: o.name,
      is_shop: o.isShop,
      is_workshop: o.isWorkshop,
      email: o.email,
      phone: o.phone,
      street: o.street,
      town_id: o.townId,
      postcode: o.postcode,
      latitude: o.latitude,
      longitude: o.longitude,
      time_zone: o.timeZone,
      vat_number: o.vatNumber,
      vat_rate_bp: o.vatRateBp,
      dispatch_cutoff: o.dispatchCutoff,
      dispatch_weekdays: o.dispatchWeekdays,
      carrier_days: o.carrierDays,
      carriage_minor: o.carriageMinor,
      about: o.about,
    })),
  );
  for (const account of s.accounts) {
    const made = await client.query<{ id: string }>(
      'INSERT INTO accounts (email, password_hash, display_name, platform_role) VALUES ($1,$2,$3,$4) RETURNING id',
      [account.email, await hash(account.password, argon), account.displayName, account.role],
    );
    if (account.organisation) {
      await client.query(
        'INSERT INTO organisation_members (organisation_id, account_id, role) VALUES ($1,$2,$3)',
        [account.organisation, made.rows[0]?.id, account.memberRole],
      );
    }
  }
  for (const w of s.workshops) {
    const organisation_id = w.organisationId;
    await insertRows(
      client,
      'stands',
      w.stands.map((name, i) => ({ id: `${organisation_id}-${i + 1}`, organisation_id, name })),
    );
    await insertRows(
      client,
      'workshop_hours',
      w.hours.map((h) => ({ organisation_id, ...h })),
    );
    await insertRows(
      client,
      'workshop_closures',
      w.closures.map((c) => ({
        organisation_id,
        first_day: c.firstDay,
        last_day: c.lastDay,
        reason: c.reason,
      })),
    );
    await insertRows(
      client,
      'workshop_services',
      w.services.map((v) => ({
        organisation_id,
        work_id: v.workId,
        minutes: v.minutes,
        price_minor: v.priceMinor,
      })),
    );
  }
}

async function loadCatalogue(client: pg.Client, s: Scenario): Promise<void> {
  await insertRows(client, 'makers', s.makers as unknown as Record<string, unknown>[]);
  for (const frame of s.frames) {
    await insertRows(client, 'frames', [
      {
        id: frame.id,
        maker_id: frame.makerId,
        model: frame.model,
        year_from: frame.yearFrom,
        year_to: frame.yearTo,
        reason: frame.reason,
      },
    ]);
    const sheet = await client.query<{ id: string }>(
      'INSERT INTO frame_sheets (frame_id, version, facts, published_at) VALUES ($1,$2,$3,$4) RETURNING id',
      [frame.id, frame.sheet.version, JSON.stringify(frame.sheet.facts), frame.sheet.publishedOn],
    );
    await insertRows(
      client,
      'frame_sheet_entries',
      frame.sheet.entries.map((entry, position) => ({
        sheet_id: sheet.rows[0]?.id,
        entry_id: entry.id,
        position,
        size_key: entry.sizeKey,
        travel_mm: entry.travelMm,
        facts: entry,
      })),
    );
  }
  const items = [
    ...s.shockSizes.map((item) => ({ ...item, kind: 'shock' })),
    ...s.coils.map((item) => ({ ...item, kind: 'coil' })),
    ...s.kits.map((item) => ({ ...item, kind: 'kit' })),
    ...s.remotes.map((item) => ({ ...item, kind: 'remote' })),
    ...s.holdOpenParts.map((item) => ({ ...item, kind: 'hold-open' })),
  ];
  await insertRows(
    client,
    'catalogue_items',
    items.map(({ id, kind, makerId, name }) => ({ id, kind, maker_id: makerId, name })),
  );
  await insertRows(
    client,
    'shock_models',
    s.shockModels.map(({ id, makerId, name, spring, summary, warrantyMonths, inTheBox }) => ({
      id,
      maker_id: makerId,
      name,
      spring,
      summary,
      warranty_months: warrantyMonths,
      in_the_box: inTheBox,
    })),
  );
  await insertRows(
    client,
    'shock_sizes',
    s.shockSizes.map(({ id, modelId, sizeKey, facts }) => ({
      item_id: id,
      model_id: modelId,
      size_key: sizeKey,
      facts,
    })),
  );
  await insertRows(
    client,
    'coil_springs',
    s.coils.map((c) => ({
      item_id: c.id,
      rate_lb_per_in: c.rateLbPerIn,
      travel_mm: c.travelMm,
      inside_mm: c.insideMm,
      free_length_mm: c.freeLengthMm,
    })),
  );
  await insertRows(
    client,
    'hardware_kits',
    s.kits.map((k) => ({ item_id: k.id, bore_mm: k.boreMm, width_mm: k.widthMm, bolt_mm: k.boltMm })),
  );
  await insertRows(
    client,
    'remotes',
    s.remotes.map((r) => ({ item_id: r.id, action: r.action, line: r.line })),
  );
  await insertRows(
    client,
    'hold_open_parts',
    s.holdOpenParts.map(({ id }) => ({ item_id: id })),
  );
  await insertRows(
    client,
    'listings',
    s.listings.map((l) => ({
      shop_id: l.shopId,
      item_id: l.itemId,
      price_minor: l.priceMinor,
      quantity: l.quantity,
      lead_days: l.leadDays,
    })),
  );
  await client.query(
    `INSERT INTO stock_movements (listing_id, kind, quantity_delta, reserved_delta) SELECT id, 'open', quantity, 0 FROM listings`,
  );
}

/**
 * Loads the demo scenario in one transaction, unless it is there already.
 * @returns whether anything was loaded
 */
export async function loadDemo(url: string): Promise<boolean> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    const there = await client.query('SELECT 1 FROM makers LIMIT 1');
    if (there.rowCount) return false;
    const scenario = readScenario();
    await client.query('BEGIN');
    await loadTraders(client, scenario);
    await loadCatalogue(client, scenario);
    await client.query('COMMIT');
    return true;
  } catch (error) {
    await client.query('ROLLBACK');
    throw error;
  } finally {
    await client.end();
  }
}
