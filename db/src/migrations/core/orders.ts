export const ordersUp = `
CREATE TABLE orders (
  id uuid CONSTRAINT orders_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  reference text NOT NULL CONSTRAINT orders_reference_once UNIQUE,
  plan_id uuid CONSTRAINT orders_plan REFERENCES plans ON DELETE SET NULL,
  measure_up_id uuid CONSTRAINT orders_measure_up REFERENCES measure_ups ON DELETE SET NULL,
  state text NOT NULL CONSTRAINT orders_state_known CHECK (state IN ('held','paid','completed','released','refunding','refunded')),
  fit text NOT NULL CONSTRAINT orders_fit_known CHECK (fit IN ('self','workshop')),
  email text NOT NULL,
  contact jsonb NOT NULL,
  job jsonb NOT NULL,
  currency text NOT NULL DEFAULT 'gbp',
  total_minor integer NOT NULL CONSTRAINT orders_total_positive CHECK (total_minor > 0),
  release_reason text,
  hold_expires_at timestamptz NOT NULL,
  created_at timestamptz NOT NULL DEFAULT now(),
  paid_at timestamptz,
  ended_at timestamptz,
  version integer NOT NULL DEFAULT 1
);
CREATE INDEX orders_by_plan ON orders (plan_id);
CREATE INDEX orders_by_email ON orders (email);
CREATE TABLE parcels (
  id uuid CONSTRAINT parcels_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  order_id uuid NOT NULL CONSTRAINT parcels_order REFERENCES orders ON DELETE CASCADE,
  shop_id text NOT NULL CONSTRAINT parcels_shop REFERENCES organisations,
  state text NOT NULL CONSTRAINT parcels_state_known CHECK (state IN ('held','waiting','to-send','sent','cancelled')),
  address jsonb NOT NULL,
  dispatch_by date NOT NULL,
  tracking text,
  sent_at timestamptz,
  version integer NOT NULL DEFAULT 1,
  CONSTRAINT parcels_one_per_shop UNIQUE (order_id, shop_id)
);
CREATE INDEX parcels_by_shop ON parcels (shop_id, state);
CREATE TABLE order_lines (
  id uuid CONSTRAINT order_lines_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  order_id uuid NOT NULL CONSTRAINT order_lines_order REFERENCES orders ON DELETE CASCADE,
  parcel_id uuid CONSTRAINT order_lines_parcel REFERENCES parcels,
  seller_id text NOT NULL CONSTRAINT order_lines_seller REFERENCES organisations,
  kind text NOT NULL CONSTRAINT order_lines_kind_known CHECK (kind IN ('item','carriage','work')),
  listing_id uuid CONSTRAINT order_lines_listing REFERENCES listings,
  item_id text CONSTRAINT order_lines_item REFERENCES catalogue_items,
  description text NOT NULL,
  quantity integer NOT NULL CONSTRAINT order_lines_quantity_positive CHECK (quantity > 0),
  unit_minor integer NOT NULL CONSTRAINT order_lines_unit_not_negative CHECK (unit_minor >= 0),
  vat_rate_bp integer NOT NULL,
  position integer NOT NULL
);
CREATE INDEX order_lines_by_order ON order_lines (order_id);
CREATE TABLE payments (
  id uuid CONSTRAINT payments_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  order_id uuid NOT NULL CONSTRAINT payments_order REFERENCES orders ON DELETE CASCADE,
  state text NOT NULL CONSTRAINT payments_state_known CHECK (state IN ('preparing','open','paid','expired')),
  amount_minor integer NOT NULL CONSTRAINT payments_amount_positive CHECK (amount_minor > 0),
  refunded_minor integer NOT NULL DEFAULT 0,
  currency text NOT NULL,
  provider_session_id text CONSTRAINT payments_session_once UNIQUE,
  provider_payment_intent_id text CONSTRAINT payments_intent_once UNIQUE,
  url text,
  created_at timestamptz NOT NULL DEFAULT now(),
  paid_at timestamptz,
  CONSTRAINT payments_one_per_order UNIQUE (order_id),
  CONSTRAINT payments_refund_within CHECK (refunded_minor BETWEEN 0 AND amount_minor)
);
CREATE TABLE refunds (
  id uuid CONSTRAINT refunds_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  payment_id uuid NOT NULL CONSTRAINT refunds_payment REFERENCES payments ON DELETE CASCADE,
  amount_minor integer NOT NULL CONSTRAINT refunds_amount_positive CHECK (amount_minor > 0),
  reason text NOT NULL,
  state text NOT NULL CONSTRAINT refunds_state_known CHECK (state IN ('pending','done')),
  provider_refund_id text CONSTRAINT refunds_provider_once UNIQUE,
  created_at timestamptz NOT NULL DEFAULT now(),
  done_at timestamptz
);
CREATE INDEX refunds_by_payment ON refunds (payment_id);
CREATE TABLE stripe_events (
  id text CONSTRAINT stripe_events_pk PRIMARY KEY,
  type text NOT NULL,
  object_id text,
  received_at timestamptz NOT NULL DEFAULT now(),
  processed_at timestamptz
);
CREATE TABLE bookings (
  id uuid CONSTRAINT bookings_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  order_id uuid NOT NULL CONSTRAINT bookings_order REFERENCES orders ON DELETE CASCADE,
  workshop_id text NOT NULL CONSTRAINT bookings_workshop REFERENCES organisations,
  stand_id text NOT NULL CONSTRAINT bookings_stand REFERENCES stands,
  during tstzrange NOT NULL CONSTRAINT bookings_during_bounded CHECK (NOT isempty(during) AND NOT lower_inf(during) AND NOT upper_inf(during)),
  state text NOT NULL CONSTRAINT bookings_state_known CHECK (state IN ('held','requested','accepted','declined','lapsed','cancelled','released','fitted')),
  answer_by timestamptz,
  decline_reason text,
  calendar_uid text NOT NULL CONSTRAINT bookings_calendar_uid_once UNIQUE,
  calendar_sequence integer NOT NULL DEFAULT 0,
  created_at timestamptz NOT NULL DEFAULT now(),
  decided_at timestamptz,
  decided_by uuid CONSTRAINT bookings_decided_by REFERENCES accounts,
  version integer NOT NULL DEFAULT 1,
  CONSTRAINT bookings_stand_once EXCLUDE USING gist (stand_id WITH =, during WITH &&) WHERE (state IN ('held','requested','accepted','fitted'))
);
CREATE INDEX bookings_by_order ON bookings (order_id);
CREATE INDEX bookings_by_workshop ON bookings (workshop_id, state);
CREATE UNIQUE INDEX bookings_one_live_per_order ON bookings (order_id) WHERE state IN ('held','requested','accepted');
CREATE TABLE fitting_records (
  booking_id uuid CONSTRAINT fitting_records_pk PRIMARY KEY CONSTRAINT fitting_records_booking REFERENCES bookings ON DELETE CASCADE,
  record jsonb NOT NULL,
  mechanic_id uuid NOT NULL CONSTRAINT fitting_records_mechanic REFERENCES accounts,
  saved_at timestamptz NOT NULL DEFAULT now(),
  fitted_at timestamptz,
  version integer NOT NULL DEFAULT 1
);
CREATE TABLE stock_movements (
  id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT stock_movements_pk PRIMARY KEY,
  listing_id uuid NOT NULL CONSTRAINT stock_movements_listing REFERENCES listings,
  order_id uuid CONSTRAINT stock_movements_order REFERENCES orders ON DELETE SET NULL,
  account_id uuid CONSTRAINT stock_movements_account REFERENCES accounts,
  kind text NOT NULL CONSTRAINT stock_movements_kind_known CHECK (kind IN ('open','set','reserve','release','dispatch')),
  quantity_delta integer NOT NULL,
  reserved_delta integer NOT NULL,
  at timestamptz NOT NULL DEFAULT now()
);
CREATE INDEX stock_movements_by_listing ON stock_movements (listing_id, at);
`;
