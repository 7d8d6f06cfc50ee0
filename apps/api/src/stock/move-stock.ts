import type { EntityManager } from 'typeorm';

import type { StockMovementKind } from '../listings/stock-movement.entity.js';

export interface StockMove {
  listingId: string;
  kind: StockMovementKind;
  quantity: number;
  reserved: number;
  orderId?: string | null;
  accountId?: string | null;
}

/**
 * Changes a listing's two levels by one conditional statement and writes the ledger row beside it.
 * @returns false when there is not enough; nothing is changed then
 */
export async function moveStock(manager: EntityManager, move: StockMove): Promise<boolean> {
  const [rows] = await manager.query<[{ id: string }[], number]>(
    `UPDATE listings SET quantity = quantity + $2, reserved = reserved + $3, version = version + 1, updated_at = now()
      WHERE id = $1 AND quantity + $2 >= reserved + $3 AND reserved + $3 >= 0 RETURNING id`,
    [move.listingId, move.quantity, move.reserved],
  );
  if (rows.length === 0) return false;
  await manager.query(
    `INSERT INTO stock_movements (listing_id, order_id, account_id, kind, quantity_delta, reserved_delta)
     VALUES ($1, $2, $3, $4, $5, $6)`,
    [move.listingId, move.orderId ?? null, move.accountId ?? null, move.kind, move.quantity, move.reserved],
  );
  return true;
}
