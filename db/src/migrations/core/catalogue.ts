export const catalogueUp = `
CREATE TABLE makers (
  id text CONSTRAINT makers_pk PRIMARY KEY,
  name text NOT NULL,
  makes text NOT NULL CONSTRAINT makers_makes_known CHECK (makes IN ('frames','shocks','parts'))
);
CREATE TABLE frames (
  id text CONSTRAINT frames_pk PRIMARY KEY,
  maker_id text NOT NULL CONSTRAINT frames_maker REFERENCES makers,
  model text NOT NULL,
  year_from integer NOT NULL,
  year_to integer NOT NULL,
  reason text NOT NULL,
  CONSTRAINT frames_years_forward CHECK (year_from <= year_to)
);
CREATE INDEX frames_by_maker ON frames (maker_id);
CREATE TABLE frame_sheets (
  id uuid CONSTRAINT frame_sheets_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  frame_id text NOT NULL CONSTRAINT frame_sheets_frame REFERENCES frames ON DELETE CASCADE,
  version integer NOT NULL,
  facts jsonb NOT NULL,
  published_at timestamptz NOT NULL DEFAULT now(),
  CONSTRAINT frame_sheets_version_once UNIQUE (frame_id, version)
);
CREATE TABLE frame_sheet_entries (
  sheet_id uuid NOT NULL CONSTRAINT frame_sheet_entries_sheet REFERENCES frame_sheets ON DELETE CASCADE,
  entry_id text NOT NULL,
  position integer NOT NULL,
  size_key text NOT NULL,
  travel_mm double precision,
  facts jsonb NOT NULL,
  CONSTRAINT frame_sheet_entries_pk PRIMARY KEY (sheet_id, entry_id)
);
CREATE TABLE catalogue_items (
  id text CONSTRAINT catalogue_items_pk PRIMARY KEY,
  kind text NOT NULL CONSTRAINT catalogue_items_kind_known CHECK (kind IN ('shock','coil','kit','remote','hold-open')),
  maker_id text NOT NULL CONSTRAINT catalogue_items_maker REFERENCES makers,
  name text NOT NULL
);
CREATE INDEX catalogue_items_by_kind ON catalogue_items (kind);
CREATE TABLE shock_models (
  id text CONSTRAINT shock_models_pk PRIMARY KEY,
  maker_id text NOT NULL CONSTRAINT shock_models_maker REFERENCES makers,
  name text NOT NULL,
  spring text NOT NULL CONSTRAINT shock_models_spring_known CHECK (spring IN ('air','coil')),
  summary text NOT NULL
);
CREATE TABLE shock_sizes (
  item_id text CONSTRAINT shock_sizes_pk PRIMARY KEY CONSTRAINT shock_sizes_item REFERENCES catalogue_items ON DELETE CASCADE,
  model_id text NOT NULL CONSTRAINT shock_sizes_model REFERENCES shock_models,
  size_key text NOT NULL,
  facts jsonb NOT NULL
);
CREATE INDEX shock_sizes_by_model ON shock_sizes (model_id);
CREATE TABLE coil_springs (
  item_id text CONSTRAINT coil_springs_pk PRIMARY KEY CONSTRAINT coil_springs_item REFERENCES catalogue_items ON DELETE CASCADE,
  rate_lb_per_in integer NOT NULL CONSTRAINT coil_springs_rate_positive CHECK (rate_lb_per_in > 0),
  travel_mm double precision NOT NULL,
  inside_mm double precision NOT NULL,
  free_length_mm double precision NOT NULL
);
CREATE TABLE hardware_kits (
  item_id text CONSTRAINT hardware_kits_pk PRIMARY KEY CONSTRAINT hardware_kits_item REFERENCES catalogue_items ON DELETE CASCADE,
  bore_mm double precision NOT NULL,
  width_mm double precision NOT NULL,
  bolt_mm double precision NOT NULL
);
CREATE TABLE remotes (
  item_id text CONSTRAINT remotes_pk PRIMARY KEY CONSTRAINT remotes_item REFERENCES catalogue_items ON DELETE CASCADE,
  action text NOT NULL CONSTRAINT remotes_action_known CHECK (action IN ('pull-to-lock','pull-to-open')),
  line text NOT NULL CONSTRAINT remotes_line_known CHECK (line IN ('cable','hydraulic'))
);
CREATE TABLE hold_open_parts (
  item_id text CONSTRAINT hold_open_parts_pk PRIMARY KEY CONSTRAINT hold_open_parts_item REFERENCES catalogue_items ON DELETE CASCADE
);
CREATE TABLE listings (
  id uuid CONSTRAINT listings_pk PRIMARY KEY DEFAULT gen_random_uuid(),
  shop_id text NOT NULL CONSTRAINT listings_shop REFERENCES organisations,
  item_id text NOT NULL CONSTRAINT listings_item REFERENCES catalogue_items,
  price_minor integer NOT NULL CONSTRAINT listings_price_positive CHECK (price_minor > 0),
  quantity integer NOT NULL CONSTRAINT listings_quantity_not_negative CHECK (quantity >= 0),
  reserved integer NOT NULL DEFAULT 0 CONSTRAINT listings_reserved_not_negative CHECK (reserved >= 0),
  lead_days integer NOT NULL DEFAULT 0 CONSTRAINT listings_lead_days_range CHECK (lead_days BETWEEN 0 AND 60),
  version integer NOT NULL DEFAULT 1,
  updated_at timestamptz NOT NULL DEFAULT now(),
  CONSTRAINT listings_item_once_per_shop UNIQUE (shop_id, item_id),
  CONSTRAINT listings_reserved_on_hand CHECK (reserved <= quantity)
);
CREATE INDEX listings_by_item ON listings (item_id);
`;
