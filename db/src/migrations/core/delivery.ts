export const deliveryUp = `
CREATE TABLE outbox (
  id uuid CONSTRAINT outbox_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  topic text NOT NULL,
  payload jsonb NOT NULL,
  dedupe_key text CONSTRAINT outbox_dedupe_once UNIQUE,
  state text NOT NULL DEFAULT 'pending' CONSTRAINT outbox_state_known CHECK (state IN ('pending','done','dead')),
  attempts integer NOT NULL DEFAULT 0,
  next_try_at timestamptz NOT NULL DEFAULT now(),
  lease_until timestamptz,
  last_error text,
  created_at timestamptz NOT NULL DEFAULT now(),
  done_at timestamptz
);
CREATE INDEX outbox_due ON outbox (next_try_at) WHERE state = 'pending';
CREATE TABLE mail_log (
  id uuid CONSTRAINT mail_log_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  outbox_id uuid CONSTRAINT mail_log_outbox REFERENCES outbox ON DELETE SET NULL,
  template text NOT NULL,
  recipient text NOT NULL,
  subject text NOT NULL,
  message_id text NOT NULL,
  sent_at timestamptz NOT NULL DEFAULT now(),
  CONSTRAINT mail_log_outbox_once UNIQUE (outbox_id)
);
CREATE TABLE idempotency_keys (
  key text NOT NULL,
  operation text NOT NULL,
  actor text NOT NULL,
  request_hash text NOT NULL,
  response jsonb,
  status integer,
  created_at timestamptz NOT NULL DEFAULT now(),
  CONSTRAINT idempotency_keys_pk PRIMARY KEY (actor, operation, key)
);
`;
