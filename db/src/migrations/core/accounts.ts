export const accountsUp = `
CREATE TABLE accounts (
  id uuid CONSTRAINT accounts_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  email text NOT NULL CONSTRAINT accounts_email_lower CHECK (email = lower(email)),
  password_hash text,
  display_name text NOT NULL,
  platform_role text NOT NULL DEFAULT 'rider' CONSTRAINT accounts_role_known CHECK (platform_role IN ('rider','curator','administrator')),
  created_at timestamptz NOT NULL DEFAULT now(),
  CONSTRAINT accounts_email_once UNIQUE (email)
);
CREATE TABLE sessions (
  sid text CONSTRAINT sessions_pk PRIMARY KEY,
  sess json NOT NULL,
  expire timestamptz NOT NULL
);
CREATE INDEX sessions_expire ON sessions (expire);
CREATE TABLE password_resets (
  id uuid CONSTRAINT password_resets_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  account_id uuid NOT NULL CONSTRAINT password_resets_account REFERENCES accounts ON DELETE CASCADE,
  token_hash text NOT NULL CONSTRAINT password_resets_token_once UNIQUE,
  expires_at timestamptz NOT NULL,
  used_at timestamptz,
  created_at timestamptz NOT NULL DEFAULT now()
);
CREATE INDEX password_resets_by_account ON password_resets (account_id);
CREATE TABLE sign_in_attempts (
  id bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT sign_in_attempts_pk PRIMARY KEY,
  email text NOT NULL,
  ip text NOT NULL,
  succeeded boolean NOT NULL,
  at timestamptz NOT NULL DEFAULT now()
);
CREATE INDEX sign_in_attempts_by_email ON sign_in_attempts (email, at);
`;
