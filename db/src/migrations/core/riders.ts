export const ridersUp = `
CREATE TABLE measure_ups (
  id uuid CONSTRAINT measure_ups_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  account_id uuid CONSTRAINT measure_ups_account REFERENCES accounts ON DELETE SET NULL,
  revision integer NOT NULL DEFAULT 0,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now()
);
CREATE TABLE measure_up_answers (
  measure_up_id uuid NOT NULL CONSTRAINT measure_up_answers_measure_up REFERENCES measure_ups ON DELETE CASCADE,
  question text NOT NULL,
  value jsonb NOT NULL,
  revision integer NOT NULL,
  updated_at timestamptz NOT NULL DEFAULT now(),
  CONSTRAINT measure_up_answers_pk PRIMARY KEY (measure_up_id, question)
);
CREATE TABLE measure_up_links (
  id uuid CONSTRAINT measure_up_links_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  measure_up_id uuid NOT NULL CONSTRAINT measure_up_links_measure_up REFERENCES measure_ups ON DELETE CASCADE,
  token_hash text NOT NULL CONSTRAINT measure_up_links_token_once UNIQUE,
  created_at timestamptz NOT NULL DEFAULT now(),
  revoked_at timestamptz
);
CREATE INDEX measure_up_links_by_measure_up ON measure_up_links (measure_up_id);
CREATE TABLE plans (
  id uuid CONSTRAINT plans_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  measure_up_id uuid NOT NULL CONSTRAINT plans_measure_up REFERENCES measure_ups ON DELETE CASCADE,
  shock_item_id text NOT NULL CONSTRAINT plans_shock REFERENCES shock_sizes,
  choices jsonb NOT NULL,
  revision integer NOT NULL DEFAULT 1,
  created_at timestamptz NOT NULL DEFAULT now(),
  updated_at timestamptz NOT NULL DEFAULT now()
);
CREATE INDEX plans_by_measure_up ON plans (measure_up_id);
`;
