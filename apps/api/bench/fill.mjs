// Fills a seeded database up to the size that is measured. Everything is drawn by a seed, so that runs compare.
import { drawCatalogue, seeded } from '../../../packages/fit-engine/bench/catalogue.mjs';

const chunks = (list, size) =>
  Array.from({ length: Math.ceil(list.length / size) }, (_, i) => list.slice(i * size, (i + 1) * size));

/** Rows as one JSON parameter: one statement per thousand rows. */
async function insert(client, text, rows) {
  for (const some of chunks(rows, 1000)) await client.query(text, [JSON.stringify(some)]);
}

/** Copies of the demo frames under other names until there are so many; each with its sheet and entries. */
export async function fillFrames(client, count) {
  const { rows } = await client.query('SELECT count(*)::int AS n FROM frames');
  const copies = Math.ceil(count / rows[0].n) - 1;
  const named = `(SELECT n FROM generate_series(1, ${copies}) AS n)`;
  await client.query(`INSERT INTO frames (id, maker_id, model, year_from, year_to, reason)
    SELECT f.id || '-' || c.n, f.maker_id, f.model || ' No ' || c.n, f.year_from, f.year_to, f.reason
      FROM frames f CROSS JOIN ${named} AS c`);
  await client.query(`INSERT INTO frame_sheets (frame_id, version, facts)
    SELECT f.id, s.version, s.facts FROM frames f
      JOIN frame_sheets s ON f.id ~ ('^' || s.frame_id || '-[0-9]+$')
     WHERE NOT EXISTS (SELECT 1 FROM frame_sheets own WHERE own.frame_id = f.id)`);
  await client.query(`INSERT INTO frame_sheet_entries (sheet_id, entry_id, position, size_key, travel_mm, facts)
    SELECT copy.id, e.entry_id, e.position, e.size_key, e.travel_mm, e.facts
      FROM frame_sheets copy
      JOIN frame_sheets original ON copy.frame_id ~ ('^' || original.frame_id || '-[0-9]+$')
                                AND copy.version = original.version
      JOIN frame_sheet_entries e ON e.sheet_id = original.id
     WHERE NOT EXISTS (SELECT 1 FROM frame_sheet_entries own WHERE own.sheet_id = copy.id)`);
}

/** Shock sizes until there are so many, no two with the same facts. */
export async function fillSizes(client, count) {
  const { rows: there } = await client.query('SELECT count(*)::int AS n FROM shock_sizes');
  const { rows: makers } = await client.query(`SELECT id FROM makers WHERE makes = 'shocks' ORDER BY id`);
  const { rows: clips } = await client.query('SELECT item_id FROM hold_open_parts');
  const drawn = drawCatalogue(count - there[0].n, 20261201);
  const makerOf = (shock) => makers[Number(shock.makerName.split(' ').at(-1)) % makers.length].id;
  const modelId = (shock) => shock.modelName.toLowerCase().replaceAll(' ', '-');
  const models = new Map(drawn.map((shock) => [modelId(shock), shock]));
  await insert(
    client,
    `INSERT INTO shock_models (id, maker_id, name, spring, summary)
     SELECT * FROM jsonb_to_recordset($1::jsonb) AS x(id text, maker_id text, name text, spring text, summary text)`,
    [...models].map(([id, shock]) => ({
      id,
      maker_id: makerOf(shock),
      name: shock.modelName,
      spring: shock.spring.kind,
      summary: 'Drawn for a measurement',
    })),
  );
  await insert(
    client,
    `INSERT INTO catalogue_items (id, kind, maker_id, name)
     SELECT id, 'shock', maker_id, name FROM jsonb_to_recordset($1::jsonb) AS x(id text, maker_id text, name text)`,
    drawn.map((shock) => ({
      id: shock.sizeId,
      maker_id: makerOf(shock),
      name: `${shock.modelName} ${shock.sizeKey}`,
    })),
  );
  await insert(
    client,
    `INSERT INTO shock_sizes (item_id, model_id, size_key, facts)
     SELECT * FROM jsonb_to_recordset($1::jsonb) AS x(item_id text, model_id text, size_key text, facts jsonb)`,
    drawn.map(({ sizeId, modelName, sizeKey, ...facts }) => ({
      item_id: sizeId,
      model_id: modelId({ modelName }),
      size_key: sizeKey,
      facts: facts.remote?.holdOpenPartId
        ? { ...facts, remote: { ...facts.remote, holdOpenPartId: clips[0].item_id } }
        : facts,
    })),
  );
}

/** Listings until there are so many, over enough shops that no shop lists an item twice. */
export async function fillListings(client, count) {
  const { rows: items } = await client.query('SELECT id, kind FROM catalogue_items ORDER BY id');
  const shopsNeeded = Math.ceil((count * 1.1) / items.length);
  await client.query(
    `INSERT INTO organisations (id, name, is_shop, is_workshop, email, phone, street, town_id, postcode, latitude,
                                longitude, vat_number, dispatch_cutoff, dispatch_weekdays, carrier_days, carriage_minor)
     SELECT o.id || '-' || n, o.name || ' ' || n, true, false, o.email, o.phone, o.street, o.town_id, o.postcode,
            o.latitude, o.longitude, o.vat_number, o.dispatch_cutoff, o.dispatch_weekdays, o.carrier_days,
            o.carriage_minor + n
       FROM (SELECT * FROM organisations WHERE is_shop AND id !~ '-[0-9]+$') o
      CROSS JOIN generate_series(1, $1) AS n ON CONFLICT DO NOTHING`,
    [Math.ceil(shopsNeeded / 6)],
  );
  const { rows: shops } = await client.query('SELECT id FROM organisations WHERE is_shop ORDER BY id');
  const { rows: listed } = await client.query('SELECT shop_id, item_id FROM listings');
  const taken = new Set(listed.map(({ shop_id, item_id }) => `${shop_id} ${item_id}`));
  const r = seeded(count);
  const rows = [];
  while (taken.size < count) {
    const [shop, item] = [r.pick(shops), r.pick(items)];
    const key = `${shop.id} ${item.id}`;
    if (taken.has(key)) continue;
    taken.add(key);
    rows.push({
      shop_id: shop.id,
      item_id: item.id,
      price_minor: item.kind === 'shock' ? r.rounded(19900, 89900, 50) : r.rounded(900, 7900, 50),
      quantity: r.chance(0.08) ? 0 : r.rounded(1, 12, 1),
      lead_days: r.chance(0.7) ? 0 : r.rounded(1, 10, 1),
    });
  }
  await insert(
    client,
    `INSERT INTO listings (shop_id, item_id, price_minor, quantity, lead_days)
     SELECT * FROM jsonb_to_recordset($1::jsonb)
            AS x(shop_id text, item_id text, price_minor int, quantity int, lead_days int)`,
    rows,
  );
  await client.query('VACUUM ANALYZE');
}

export const counted = async (client) => {
  const { rows } = await client.query(`SELECT (SELECT count(*)::int FROM frame_sheets) AS sheets,
    (SELECT count(*)::int FROM shock_sizes) AS sizes, (SELECT count(*)::int FROM listings) AS listings`);
  return rows[0];
};
