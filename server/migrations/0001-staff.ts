import type { Migration } from './migration';

export const staff: Migration = {
  name: '0001-staff',
  up: `
    CREATE TABLE staff (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      email text NOT NULL UNIQUE CHECK (email = lower(email) AND length(email) BETWEEN 3 AND 254),
      name text NOT NULL CHECK (length(name) BETWEEN 1 AND 100),
      role text NOT NULL CHECK (role IN ('owner', 'estimator', 'sales')),
      password_hash text NOT NULL,
      active boolean NOT NULL DEFAULT true,
      created_at timestamptz NOT NULL DEFAULT now()
    );
    CREATE TABLE desk_sessions (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      token_hash bytea NOT NULL UNIQUE CHECK (length(token_hash) = 32),
      staff_id uuid NOT NULL REFERENCES staff (id),
      created_at timestamptz NOT NULL DEFAULT now(),
      last_seen_at timestamptz NOT NULL DEFAULT now(),
      expires_at timestamptz NOT NULL,
      revoked_at timestamptz,
      CHECK (expires_at > created_at)
    );
    CREATE INDEX desk_sessions_staff ON desk_sessions (staff_id);
  `,
  down: 'DROP TABLE desk_sessions; DROP TABLE staff;',
};
