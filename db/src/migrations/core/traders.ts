export const tradersUp = `
CREATE TABLE towns (
  id text CONSTRAINT towns_pk PRIMARY KEY,
  name text NOT NULL,
  latitude double precision NOT NULL,
  longitude double precision NOT NULL
);
CREATE TABLE organisations (
  id text CONSTRAINT organisations_pk PRIMARY KEY,
  name text NOT NULL,
  is_shop boolean NOT NULL,
  is_workshop boolean NOT NULL,
  email text NOT NULL,
  phone text NOT NULL,
  street text NOT NULL,
  town_id text NOT NULL CONSTRAINT organisations_town REFERENCES towns,
  postcode text NOT NULL,
  latitude double precision NOT NULL,
  longitude double precision NOT NULL,
  time_zone text NOT NULL DEFAULT 'Europe/London',
  vat_number text NOT NULL,
  vat_rate_bp integer NOT NULL DEFAULT 2000 CONSTRAINT organisations_vat_range CHECK (vat_rate_bp BETWEEN 0 AND 5000),
  dispatch_cutoff time NOT NULL DEFAULT '14:00',
  dispatch_weekdays integer[] NOT NULL DEFAULT '{1,2,3,4,5}',
  carrier_days integer NOT NULL DEFAULT 1 CONSTRAINT organisations_carrier_days_range CHECK (carrier_days BETWEEN 0 AND 30),
  carriage_minor integer NOT NULL DEFAULT 0 CONSTRAINT organisations_carriage_positive CHECK (carriage_minor >= 0),
  about text NOT NULL DEFAULT '',
  stripe_account_id text,
  CONSTRAINT organisations_some_trade CHECK (is_shop OR is_workshop)
);
CREATE TABLE organisation_members (
  organisation_id text NOT NULL CONSTRAINT organisation_members_organisation REFERENCES organisations ON DELETE CASCADE,
  account_id uuid NOT NULL CONSTRAINT organisation_members_account REFERENCES accounts ON DELETE CASCADE,
  role text NOT NULL CONSTRAINT organisation_members_role_known CHECK (role IN ('owner','staff','mechanic')),
  CONSTRAINT organisation_members_pk PRIMARY KEY (organisation_id, account_id)
);
CREATE INDEX organisation_members_by_account ON organisation_members (account_id);
CREATE TABLE stands (
  id text CONSTRAINT stands_pk PRIMARY KEY,
  organisation_id text NOT NULL CONSTRAINT stands_organisation REFERENCES organisations ON DELETE CASCADE,
  name text NOT NULL
);
CREATE INDEX stands_by_organisation ON stands (organisation_id);
CREATE TABLE workshop_hours (
  organisation_id text NOT NULL CONSTRAINT workshop_hours_organisation REFERENCES organisations ON DELETE CASCADE,
  weekday integer NOT NULL CONSTRAINT workshop_hours_weekday_iso CHECK (weekday BETWEEN 1 AND 7),
  opens time NOT NULL,
  closes time NOT NULL,
  CONSTRAINT workshop_hours_pk PRIMARY KEY (organisation_id, weekday, opens),
  CONSTRAINT workshop_hours_forward CHECK (opens < closes)
);
CREATE TABLE workshop_closures (
  organisation_id text NOT NULL CONSTRAINT workshop_closures_organisation REFERENCES organisations ON DELETE CASCADE,
  first_day date NOT NULL,
  last_day date NOT NULL,
  reason text NOT NULL,
  CONSTRAINT workshop_closures_pk PRIMARY KEY (organisation_id, first_day),
  CONSTRAINT workshop_closures_forward CHECK (first_day <= last_day)
);
CREATE TABLE workshop_services (
  organisation_id text NOT NULL CONSTRAINT workshop_services_organisation REFERENCES organisations ON DELETE CASCADE,
  work_id text NOT NULL,
  minutes integer NOT NULL CONSTRAINT workshop_services_minutes_range CHECK (minutes BETWEEN 5 AND 480),
  price_minor integer NOT NULL CONSTRAINT workshop_services_price_positive CHECK (price_minor >= 0),
  CONSTRAINT workshop_services_pk PRIMARY KEY (organisation_id, work_id)
);
`;
