import type { Migration } from './migration';

export const quotesAndDeposits: Migration = {
  name: '0003-quotes-and-deposits',
  up: `
    CREATE TABLE quotes (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      intake_id uuid NOT NULL REFERENCES intakes (id),
      intake_version integer NOT NULL CHECK (intake_version >= 1),
      input_hash text NOT NULL,
      document text NOT NULL CHECK (document::json IS NOT NULL),
      outcome text NOT NULL CHECK (outcome IN ('range', 'firm', 'visit')),
      rulebook_edition integer NOT NULL CHECK (rulebook_edition >= 1),
      low_cents integer CHECK (low_cents >= 0),
      high_cents integer CHECK (high_cents >= 0),
      created_at timestamptz NOT NULL DEFAULT now(),
      withdrawn_at timestamptz,
      CHECK (low_cents <= high_cents),
      CHECK ((outcome = 'visit') = (low_cents IS NULL) AND (low_cents IS NULL) = (high_cents IS NULL)),
      UNIQUE (id, intake_id)
    );
    CREATE UNIQUE INDEX quotes_one_standing ON quotes (intake_id) WHERE withdrawn_at IS NULL;
    CREATE INDEX quotes_intake ON quotes (intake_id, created_at);
    -- A frozen document stays word for word; only its withdrawal is ever written.
    CREATE FUNCTION refuse_changed_quote() RETURNS trigger LANGUAGE plpgsql AS $$
    BEGIN
      IF (NEW.document, NEW.input_hash, NEW.intake_id, NEW.outcome, NEW.rulebook_edition)
        IS DISTINCT FROM (OLD.document, OLD.input_hash, OLD.intake_id, OLD.outcome, OLD.rulebook_edition) THEN
        RAISE EXCEPTION 'a frozen quote does not change';
      END IF;
      RETURN NEW;
    END $$;
    CREATE TRIGGER quotes_frozen BEFORE UPDATE ON quotes FOR EACH ROW EXECUTE FUNCTION refuse_changed_quote();
    CREATE TABLE deposits (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      intake_id uuid NOT NULL REFERENCES intakes (id),
      quote_id uuid NOT NULL,
      option_id text NOT NULL,
      amount_cents integer NOT NULL CHECK (amount_cents > 0),
      currency text NOT NULL DEFAULT 'usd' CHECK (currency = 'usd'),
      state text NOT NULL DEFAULT 'pending' CHECK (state IN ('pending', 'paid', 'expired', 'refunded')),
      checkout_session_id text UNIQUE,
      payment_intent_id text UNIQUE,
      contact jsonb NOT NULL CHECK (jsonb_typeof(contact) = 'object'),
      consent_words text NOT NULL,
      created_at timestamptz NOT NULL DEFAULT now(),
      paid_at timestamptz,
      refunded_at timestamptz,
      FOREIGN KEY (quote_id, intake_id) REFERENCES quotes (id, intake_id),
      CHECK (state NOT IN ('paid', 'refunded') OR paid_at IS NOT NULL),
      CHECK ((state = 'refunded') = (refunded_at IS NOT NULL))
    );
    CREATE UNIQUE INDEX deposits_one_paid ON deposits (intake_id) WHERE state = 'paid';
    CREATE INDEX deposits_intake ON deposits (intake_id, created_at);
    CREATE TABLE payment_events (
      event_id text PRIMARY KEY,
      type text NOT NULL,
      created_at timestamptz NOT NULL,
      handled_at timestamptz NOT NULL DEFAULT now()
    );
  `,
  down: 'DROP TABLE payment_events; DROP TABLE deposits; DROP TABLE quotes; DROP FUNCTION refuse_changed_quote();',
};
