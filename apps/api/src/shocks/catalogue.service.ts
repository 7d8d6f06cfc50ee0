import {
  nPerMmPerLbPerIn,
  type CoilOnSale,
  type KitOnSale,
  type PartsOnSale,
  type RemoteOnSale,
  type ShockFacts,
} from '@linkfell/fit-engine';
import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';

export interface CatalogueSnapshot {
  /** Shock sizes of which at least one is free somewhere. */
  shocks: ShockFacts[];
  byId: Map<string, ShockFacts>;
  parts: PartsOnSale;
  /** Names of all items, for lines and lists. */
  names: Map<string, string>;
}

/** What is on sale may be this old when matches are judged; prices and stock are read anew each time. */
const keepForMs = 2000;

interface KeptFacts {
  version: string;
  facts: ShockFacts;
}

/** Which shock sizes and parts are on sale, with the facts that the engine reads. */
@Injectable()
export class CatalogueService {
  private kept: { at: number; snapshot: Promise<CatalogueSnapshot> } | null = null;
  /** Facts by size as last read, each with the versions of the rows it was made of. */
  private facts = new Map<string, KeptFacts>();

  constructor(private readonly dataSource: DataSource) {}

  /** The snapshot in force; many requests at once share one read. */
  async snapshot(): Promise<CatalogueSnapshot> {
    if (!this.kept || performance.now() - this.kept.at > keepForMs) {
      this.kept = { at: performance.now(), snapshot: this.read() };
    }
    const { snapshot } = this.kept;
    try {
      return await snapshot;
    } catch (error) {
      // A failed read must not be served again.
      if (this.kept?.snapshot === snapshot) this.kept = null;
      throw error;
    }
  }

  /** One shock size whether on sale or not, or null. */
  async shock(sizeId: string): Promise<ShockFacts | null> {
    return (await this.shocks('WHERE z.item_id = $1', [sizeId]))[0] ?? null;
  }

  private async read(): Promise<CatalogueSnapshot> {
    const onSale = `EXISTS (SELECT 1 FROM listings l WHERE l.item_id = i.id AND l.quantity > l.reserved)`;
    const [shocks, kits, coils, remotes, others, names] = await Promise.all([
      this.onSale(onSale),
      this.dataSource.query<KitOnSale[]>(
        `SELECT i.id, i.name, k.bore_mm AS "boreMm", k.width_mm AS "widthMm", k.bolt_mm AS "boltMm"
           FROM hardware_kits k JOIN catalogue_items i ON i.id = k.item_id WHERE ${onSale} ORDER BY i.id`,
      ),
      this.dataSource.query<Omit<CoilOnSale, 'rateNPerMm'>[]>(
        `SELECT i.id, i.name, c.rate_lb_per_in AS "rateLbPerIn", c.travel_mm AS "travelMm",
                c.inside_mm AS "insideMm", c.free_length_mm AS "freeLengthMm"
           FROM coil_springs c JOIN catalogue_items i ON i.id = c.item_id WHERE ${onSale} ORDER BY i.id`,
      ),
      this.dataSource.query<RemoteOnSale[]>(
        `SELECT i.id, i.name, r.action, r.line
           FROM remotes r JOIN catalogue_items i ON i.id = r.item_id WHERE ${onSale} ORDER BY i.id`,
      ),
      this.dataSource.query<{ id: string }[]>(
        `SELECT i.id FROM hold_open_parts h JOIN catalogue_items i ON i.id = h.item_id WHERE ${onSale}`,
      ),
      this.dataSource.query<{ id: string; name: string }[]>(
        `SELECT i.id, CASE WHEN i.kind = 'shock' THEN m.name || ' ' || i.name ELSE i.name END AS name
           FROM catalogue_items i JOIN makers m ON m.id = i.maker_id`,
      ),
    ]);
    return {
      shocks,
      byId: new Map(shocks.map((shock) => [shock.sizeId, shock])),
      parts: {
        kits,
        coils: coils.map((coil) => ({ ...coil, rateNPerMm: coil.rateLbPerIn * nPerMmPerLbPerIn })),
        remotes,
        otherPartIds: others.map(({ id }) => id),
      },
      names: new Map(names.map(({ id, name }) => [id, name])),
    };
  }

  /**
   * The sizes on sale. Only rows that are new or have changed are read whole; a size that is as it was stays the same
   * object, so that what the engine has kept about it stays true.
   */
  private async onSale(condition: string): Promise<ShockFacts[]> {
    const rows = await this.dataSource.query<{ id: string; version: string }[]>(
      `SELECT z.item_id AS id, concat_ws(' ', z.xmin, o.xmin, m.xmin) AS version
         FROM shock_sizes z JOIN catalogue_items i ON i.id = z.item_id
         JOIN shock_models o ON o.id = z.model_id JOIN makers m ON m.id = o.maker_id
        WHERE ${condition} ORDER BY z.item_id`,
    );
    const changed = rows.filter(({ id, version }) => this.facts.get(id)?.version !== version);
    const read =
      changed.length === 0
        ? []
        : await this.shocks('WHERE z.item_id = ANY($1)', [changed.map(({ id }) => id)]);
    const fresh = new Map(read.map((facts) => [facts.sizeId, facts]));
    const next = new Map<string, KeptFacts>();
    for (const { id, version } of rows) {
      const facts = fresh.get(id) ?? this.facts.get(id)?.facts;
      if (facts) next.set(id, { version, facts });
    }
    this.facts = next;
    return [...next.values()].map(({ facts }) => facts);
  }

  private async shocks(where: string, parameters: unknown[]): Promise<ShockFacts[]> {
    const rows = await this.dataSource.query<
      { id: string; model: string; maker: string; size_key: string; facts: Partial<ShockFacts> }[]
    >(
      `SELECT z.item_id AS id, o.name AS model, m.name AS maker, z.size_key, z.facts
         FROM shock_sizes z JOIN catalogue_items i ON i.id = z.item_id
         JOIN shock_models o ON o.id = z.model_id JOIN makers m ON m.id = o.maker_id ${where} ORDER BY z.item_id`,
      parameters,
    );
    return rows.map(
      (row) =>
        ({
          ...row.facts,
          sizeId: row.id,
          modelName: row.model,
          makerName: row.maker,
          sizeKey: row.size_key,
        }) as ShockFacts,
    );
  }
}
