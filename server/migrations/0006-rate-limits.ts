import type { Migration } from './migration';

export const rateLimits: Migration = {
  name: '0006-rate-limits',
  // Unlogged: a crash may forget the counts, and nothing else is lost.
  up: `
    CREATE UNLOGGED TABLE rate_limits (
      key text PRIMARY KEY,
      tries integer NOT NULL CHECK (tries > 0),
      resets_at timestamptz NOT NULL
    );
    CREATE INDEX rate_limits_over ON rate_limits (resets_at);
  `,
  down: 'DROP TABLE rate_limits;',
};
