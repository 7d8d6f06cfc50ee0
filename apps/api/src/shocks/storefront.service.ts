import type {
  ShockList,
  ShockListQuery,
  ShockPage,
  ShockRow,
  ShockSizeList,
  ShockSizeRow,
  ShopOffer,
  StorefrontQuery,
} from '@linkfell/contracts';
import { findSizeKey, sizeOf, type ShockFacts } from '@linkfell/fit-engine';
import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';

import { CommonException } from '../common/problems/problem.exception.js';
import { drawnShock } from './drawn-shock.js';
import { notInTheBox, shockEndWords, specGroups } from './spec-figures.js';

interface Row {
  id: string;
  model_id: string;
  model: string;
  maker: string;
  summary: string;
  warranty_months: number | null;
  in_the_box: string[];
  size_key: string;
  facts: Omit<ShockFacts, 'sizeId' | 'modelName' | 'makerName' | 'sizeKey'>;
  from_minor: number | null;
  shops: number;
  total: number;
}

/** Every catalogue shock with its cheapest free unit and the number of shops that have one. */
const shelf = `
  shock_sizes z JOIN shock_models o ON o.id = z.model_id JOIN makers m ON m.id = o.maker_id
  CROSS JOIN LATERAL (
    SELECT min(price_minor) AS from_minor, count(*)::int AS shops FROM listings
     WHERE item_id = z.item_id AND quantity > reserved) l`;

const columns = `z.item_id AS id, z.model_id, o.name AS model, m.name AS maker, o.summary, o.warranty_months,
  o.in_the_box, z.size_key, z.facts, l.from_minor, l.shops`;

/** $1 spring and $2 reservoir; null leaves both as they are. */
const narrowed = `($1::text IS NULL OR o.spring = $1)
  AND ($2::boolean IS NULL OR (jsonb_typeof(z.facts->'reservoir') = 'object') = $2)`;

const narrowing = ({ spring, reservoir }: StorefrontQuery): [string | null, boolean | null] => [
  spring === 'either' ? null : spring,
  reservoir === 'either' ? null : reservoir === 'with',
];

/** The catalogue for people who look around, without anybody's bike in mind. */
@Injectable()
export class StorefrontService {
  constructor(private readonly dataSource: DataSource) {}

  async sizes(query: StorefrontQuery): Promise<ShockSizeList> {
    const rows: { size_key: string; shocks: number; from_minor: number | null }[] =
      await this.dataSource.query(
        `SELECT z.size_key, count(*)::int AS shocks, min(l.from_minor) AS from_minor
           FROM ${shelf} WHERE ${narrowed} GROUP BY z.size_key`,
        narrowing(query),
      );
    const sizes = rows.flatMap(({ size_key, shocks, from_minor }): ShockSizeRow[] => {
      const named = sizeNamed(size_key);
      return named ? [{ ...named, shocks, fromMinor: from_minor }] : [];
    });
    return { sizes: sizes.sort((a, b) => a.eyeToEyeMm - b.eyeToEyeMm || a.strokeMm - b.strokeMm) };
  }

  async list({ size, q, ...query }: ShockListQuery): Promise<ShockList> {
    const named = size === undefined ? null : sizeNamed(size);
    if (size !== undefined && !named) return { size: null, shocks: [], total: 0 };
    const words = (q ?? '').toLowerCase().split(/\s+/).filter(Boolean).slice(0, 8);
    const rows: Row[] = await this.dataSource.query(
      `SELECT ${columns}, count(*) OVER ()::int AS total FROM ${shelf}
        WHERE ${narrowed} AND ($3::text IS NULL OR z.size_key = $3)
          AND NOT EXISTS (SELECT 1 FROM unnest($4::text[]) AS word
                           WHERE strpos(lower(m.name || ' ' || o.name || ' ' || z.size_key), word) = 0)
        ORDER BY l.from_minor NULLS LAST, m.name, o.name, z.item_id LIMIT 60`,
      [...narrowing(query), named?.sizeKey ?? null, words],
    );
    return { size: named, shocks: rows.map(toRow), total: rows[0]?.total ?? 0 };
  }

  /** @throws CommonException "not-found" when no catalogue shock has this id */
  async page(sizeId: string): Promise<ShockPage> {
    const [row]: Row[] = await this.dataSource.query(`SELECT ${columns} FROM ${shelf} WHERE z.item_id = $1`, [
      sizeId,
    ]);
    if (!row) throw new CommonException('not-found');
    const shock = factsOf(row);
    const [offers, others] = await Promise.all([this.offers(sizeId), this.others(row)]);
    return {
      ...toRow(row),
      summary: row.summary,
      groups: specGroups(shock),
      source: shock.source,
      inTheBox: row.in_the_box,
      notInTheBox: notInTheBox(shock),
      warrantyMonths: row.warranty_months,
      notices: shock.notices.map(({ title, effect, source }) => ({ title, effect, source })),
      offers,
      otherSizes: others,
    };
  }

  private offers(sizeId: string): Promise<ShopOffer[]> {
    return this.dataSource.query(
      `SELECT o.id AS "shopId", o.name AS "shopName", t.name AS town, l.price_minor AS "priceMinor",
              o.carriage_minor AS "carriageMinor", l.quantity - l.reserved AS available,
              l.lead_days AS "leadDays", o.carrier_days AS "carrierDays"
         FROM listings l JOIN organisations o ON o.id = l.shop_id JOIN towns t ON t.id = o.town_id
        WHERE l.item_id = $1 AND l.quantity > l.reserved
        ORDER BY l.price_minor + o.carriage_minor, l.lead_days + o.carrier_days, o.name`,
      [sizeId],
    );
  }

  private async others({ id, model_id }: Row): Promise<ShockPage['otherSizes']> {
    const rows: Row[] = await this.dataSource.query(
      `SELECT ${columns} FROM ${shelf} WHERE z.model_id = $1 AND z.item_id <> $2`,
      [model_id, id],
    );
    return rows
      .map((row) => {
        const { eyeToEyeMm, strokeMm } = drawnShock(factsOf(row), null);
        return {
          sizeId: row.id,
          sizeKey: row.size_key,
          eyeToEyeMm,
          strokeMm: strokeMm ?? 0,
          fromMinor: row.from_minor,
        };
      })
      .sort((a, b) => a.eyeToEyeMm - b.eyeToEyeMm || a.strokeMm - b.strokeMm);
  }
}

/** A size by any of its labels; null when there is none of that name. */
function sizeNamed(label: string): NonNullable<ShockList['size']> | null {
  const size = sizeOf(findSizeKey(label) ?? label);
  if (!size) return null;
  const { key, family, eyeToEyeMm, strokeMm, aliases } = size;
  const inches = family === 'inch' ? (aliases.at(-1)?.replace('x', ' x ') ?? null) : null;
  return { sizeKey: key, inches, family, eyeToEyeMm, strokeMm };
}

const factsOf = ({ id, model, maker, size_key, facts }: Row): ShockFacts => ({
  ...facts,
  sizeId: id,
  modelName: model,
  makerName: maker,
  sizeKey: size_key,
});

function toRow(row: Row): ShockRow {
  const shock = factsOf(row);
  return {
    sizeId: row.id,
    makerName: row.maker,
    modelName: row.model,
    sizeKey: row.size_key,
    spring: shock.spring.kind,
    massG: shock.massG,
    diameterMm: shock.diameterMm,
    bodyEnd: shockEndWords(shock.bodyEnd),
    shaftEnd: shockEndWords(shock.shaftEnd),
    reservoir: shock.reservoir !== null,
    remote: shock.remote?.action ?? null,
    drawing: drawnShock(shock, null),
    fromMinor: row.from_minor,
    shops: row.shops,
  };
}
