// Riders drawn by a seed, each with a frame, a body, a wish and a session of their own.
import { createHmac, randomUUID } from 'node:crypto';

import { seeded } from '../../../packages/fit-engine/bench/catalogue.mjs';

function answersOf(r, frame, towns) {
  const answers = {
    frame: { kind: 'listed', frameId: frame.id, modelYear: frame.year_to, frameSize: null, chip: null },
    'printed-size': { text: frame.size_key, sizeKey: frame.size_key },
    'spring-wish': { wish: r.pick(['air', 'either', 'either', 'coil']) },
    weight: { riderKg: r.rounded(48, 115, 0.5), kitKg: r.rounded(1, 7, 0.5) },
    'bike-mass': { kg: r.rounded(12, 18, 0.1) },
    style: { style: r.pick(['cross-country', 'trail', 'enduro', 'downhill']) },
    'remote-wish': { wants: r.chance(0.2), acceptsExternal: r.pick([true, false, null]) },
    'reservoir-wish': { wish: r.pick(['either', 'either', 'with', 'without']) },
    place: { townId: r.pick(towns).id, heightM: r.rounded(0, 600, 10) },
  };
  if (r.chance(0.4)) answers['eye-to-eye'] = reading(r, Number(frame.size_key.split('x')[0]));
  return answers;
}

const reading = (r, nominal) => ({
  mm: Math.round((nominal + r.between(-0.6, 0.6)) * 10) / 10,
  tool: r.pick(['caliper', 'ruler', 'tape']),
  awkward: r.chance(0.3),
});

/** So many measure-ups in the database, with the signed cookie that opens each. */
export async function drawRiders(client, count, secret) {
  const { rows: frames } = await client.query(
    `SELECT DISTINCT ON (f.id) f.id, f.year_to, e.size_key FROM frames f
       JOIN frame_sheets s ON s.frame_id = f.id JOIN frame_sheet_entries e ON e.sheet_id = s.id
      ORDER BY f.id, s.version DESC, e.position`,
  );
  const { rows: towns } = await client.query('SELECT id FROM towns ORDER BY id');
  const r = seeded(count + 7);
  const riders = [];
  const free = [...frames];
  for (let i = 0; i < count; i += 1) {
    const [frame] = free.splice(Math.floor(r.between(0, free.length)), 1);
    const [id, sid] = [randomUUID(), randomUUID()];
    await client.query('INSERT INTO measure_ups (id, revision) VALUES ($1, 1)', [id]);
    await client.query(
      `INSERT INTO measure_up_answers (measure_up_id, question, value, revision)
       SELECT $1, key, jsonb_build_object('state', 'known', 'value', value), 1 FROM jsonb_each($2::jsonb)`,
      [id, JSON.stringify(answersOf(r, frame, towns))],
    );
    const sess = {
      kept: true,
      cookie: { originalMaxAge: 86_400_000, path: '/', httpOnly: true, sameSite: 'lax' },
      grants: { measureUps: [id], orders: [] },
    };
    await client.query(`INSERT INTO sessions (sid, sess, expire) VALUES ($1, $2, now() + interval '1 day')`, [
      sid,
      JSON.stringify(sess),
    ]);
    const signature = createHmac('sha256', secret).update(sid).digest('base64').replace(/=+$/, '');
    riders.push({ id, cookie: `linkfell=${encodeURIComponent(`s:${sid}.${signature}`)}` });
  }
  return riders;
}
