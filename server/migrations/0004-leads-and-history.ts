import type { Migration } from './migration';

export const leadsAndHistory: Migration = {
  name: '0004-leads-and-history',
  up: `
    CREATE EXTENSION IF NOT EXISTS pg_trgm;
    CREATE SEQUENCE lead_job_numbers AS integer START WITH 1001;
    CREATE TABLE leads (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      job_number integer NOT NULL UNIQUE DEFAULT nextval('lead_job_numbers'),
      intake_id uuid NOT NULL UNIQUE REFERENCES intakes (id),
      quote_id uuid REFERENCES quotes (id),
      option_id text,
      deposit_id uuid REFERENCES deposits (id),
      name text NOT NULL CHECK (length(name) BETWEEN 1 AND 100),
      email text NOT NULL CHECK (length(email) BETWEEN 3 AND 254),
      phone text CHECK (length(phone) <= 30),
      street text NOT NULL CHECK (length(street) BETWEEN 1 AND 200),
      town text NOT NULL,
      work text NOT NULL,
      work_note text NOT NULL,
      contact_ways text[] NOT NULL CHECK (contact_ways <@ ARRAY['email', 'text', 'phone']),
      consent_at timestamptz NOT NULL,
      consent_words text NOT NULL,
      stage text NOT NULL CHECK (stage IN
        ('check-photos', 'waiting-on-photo', 'needs-a-visit', 'firm-price-sent', 'accepted', 'booked', 'closed')),
      version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
      due_at timestamptz,
      assignee_id uuid REFERENCES staff (id),
      low_cents integer CHECK (low_cents >= 0),
      high_cents integer CHECK (high_cents >= 0),
      firm_cents integer CHECK (firm_cents >= 0),
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now(),
      search text GENERATED ALWAYS AS
        (lower(name || ' ' || street || ' ' || town || ' ' || coalesce(phone, '') || ' ' || email || ' ' || job_number::text)) STORED,
      -- Never null, so that a page's last row is always a place to go on from.
      sort_due_at timestamptz GENERATED ALWAYS AS (coalesce(due_at, 'infinity'::timestamptz)) STORED,
      sort_name text GENERATED ALWAYS AS (lower(name)) STORED,
      sort_cents integer GENERATED ALWAYS AS (coalesce(firm_cents, high_cents, -1)) STORED,
      CHECK (low_cents <= high_cents AND (low_cents IS NULL) = (high_cents IS NULL))
    );
    ALTER SEQUENCE lead_job_numbers OWNED BY leads.job_number;
    CREATE INDEX leads_search ON leads USING gin (search gin_trgm_ops);
    CREATE INDEX leads_due ON leads (sort_due_at, id);
    CREATE INDEX leads_created ON leads (created_at, id);
    CREATE INDEX leads_name ON leads (sort_name, id);
    CREATE INDEX leads_price ON leads (sort_cents, id);
    CREATE INDEX leads_stage_due ON leads (stage, sort_due_at, id);
    CREATE INDEX leads_stage_created ON leads (stage, created_at, id);
    CREATE INDEX leads_stage_name ON leads (stage, sort_name, id);
    CREATE INDEX leads_stage_price ON leads (stage, sort_cents, id);
    CREATE TABLE history (
      id bigserial PRIMARY KEY,
      lead_id uuid REFERENCES leads (id),
      intake_id uuid REFERENCES intakes (id),
      at timestamptz NOT NULL DEFAULT now(),
      staff_id uuid REFERENCES staff (id),
      who text NOT NULL,
      what text NOT NULL,
      before text,
      after text,
      CHECK (lead_id IS NOT NULL OR intake_id IS NOT NULL OR staff_id IS NOT NULL)
    );
    CREATE INDEX history_lead ON history (lead_id, id);
    CREATE INDEX history_intake ON history (intake_id, id);
    CREATE FUNCTION refuse_changed_history() RETURNS trigger LANGUAGE plpgsql AS $$
    BEGIN RAISE EXCEPTION 'the history is only added to'; END $$;
    CREATE TRIGGER history_append_only BEFORE UPDATE OR DELETE OR TRUNCATE ON history
      FOR EACH STATEMENT EXECUTE FUNCTION refuse_changed_history();
  `,
  // The extension stays: another may have been using it before us.
  down: 'DROP TABLE history; DROP FUNCTION refuse_changed_history(); DROP TABLE leads;',
};
