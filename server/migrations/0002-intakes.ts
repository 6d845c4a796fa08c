import type { Migration } from './migration';

export const intakes: Migration = {
  name: '0002-intakes',
  up: `
    CREATE TABLE intakes (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      version integer NOT NULL DEFAULT 1 CHECK (version >= 1),
      answers jsonb NOT NULL DEFAULT '{}' CHECK (jsonb_typeof(answers) = 'object'),
      zip text GENERATED ALWAYS AS (answers ->> 'zip') STORED,
      jurisdiction_id text,
      stage text NOT NULL DEFAULT 'open' CHECK (stage IN ('open', 'priced', 'paid', 'visit-asked')),
      email text CHECK (length(email) <= 254),
      current_step text,
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now()
    );
    CREATE INDEX intakes_stage ON intakes (stage, updated_at DESC, id);
    CREATE TABLE links (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      token_hash bytea NOT NULL UNIQUE CHECK (length(token_hash) = 32),
      purpose text NOT NULL CHECK (purpose IN ('intake-cookie', 'resume', 'my-cookie', 'my')),
      intake_id uuid NOT NULL REFERENCES intakes (id),
      expires_at timestamptz NOT NULL,
      revoked_at timestamptz,
      created_at timestamptz NOT NULL DEFAULT now(),
      CHECK (expires_at > created_at)
    );
    CREATE INDEX links_intake ON links (intake_id, purpose);
    CREATE TABLE outside_area_requests (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      zip text NOT NULL CHECK (zip ~ '^[0-9]{5}$'),
      email text NOT NULL CHECK (email = lower(email) AND length(email) <= 254),
      created_at timestamptz NOT NULL DEFAULT now(),
      UNIQUE (zip, email)
    );
    CREATE TABLE photos (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      intake_id uuid NOT NULL REFERENCES intakes (id),
      slot text NOT NULL CHECK (slot IN ('panel', 'label', 'wall', 'way', 'meter')),
      width_px integer NOT NULL CHECK (width_px > 0),
      height_px integer NOT NULL CHECK (height_px > 0),
      bytes integer NOT NULL CHECK (bytes > 0),
      verdict text NOT NULL CHECK (verdict IN ('good', 'dark', 'blurred', 'small')),
      storage_key text NOT NULL UNIQUE,
      thumb_key text NOT NULL UNIQUE,
      created_at timestamptz NOT NULL DEFAULT now(),
      removed_at timestamptz
    );
    CREATE INDEX photos_intake ON photos (intake_id, created_at) WHERE removed_at IS NULL;
  `,
  down: 'DROP TABLE photos; DROP TABLE outside_area_requests; DROP TABLE links; DROP TABLE intakes;',
};
