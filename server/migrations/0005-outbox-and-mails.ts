import type { Migration } from './migration';

export const outboxAndMails: Migration = {
  name: '0005-outbox-and-mails',
  up: `
    -- Payloads hold ids only, never personal data.
    CREATE TABLE outbox (
      id bigserial PRIMARY KEY,
      dedupe_key text NOT NULL UNIQUE,
      kind text NOT NULL,
      payload jsonb NOT NULL CHECK (jsonb_typeof(payload) = 'object'),
      created_at timestamptz NOT NULL DEFAULT now(),
      dispatched_at timestamptz
    );
    CREATE INDEX outbox_waiting ON outbox (id) WHERE dispatched_at IS NULL;
    CREATE TABLE mails (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      dedupe_key text NOT NULL UNIQUE,
      template text NOT NULL,
      intake_id uuid REFERENCES intakes (id),
      lead_id uuid REFERENCES leads (id),
      state text NOT NULL DEFAULT 'queued' CHECK (state IN ('queued', 'sent', 'failed')),
      message_id text,
      attempts integer NOT NULL DEFAULT 0 CHECK (attempts >= 0),
      created_at timestamptz NOT NULL DEFAULT now(),
      sent_at timestamptz,
      CHECK ((state = 'sent') = (sent_at IS NOT NULL)),
      CHECK (state <> 'sent' OR message_id IS NOT NULL)
    );
    CREATE INDEX mails_intake ON mails (intake_id, created_at);
    CREATE INDEX mails_lead ON mails (lead_id, created_at);
    CREATE TABLE idempotency_keys (
      scope text NOT NULL,
      key text NOT NULL CHECK (length(key) BETWEEN 1 AND 200),
      request_hash text NOT NULL,
      status integer CHECK (status BETWEEN 200 AND 599),
      body text,
      created_at timestamptz NOT NULL DEFAULT now(),
      PRIMARY KEY (scope, key)
    );
    CREATE INDEX idempotency_keys_age ON idempotency_keys (created_at);
  `,
  down: 'DROP TABLE idempotency_keys; DROP TABLE mails; DROP TABLE outbox;',
};
