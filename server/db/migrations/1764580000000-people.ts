import { type MigrationInterface, type QueryRunner } from 'typeorm';

/** People, letters' tokens, sessions, rate limits. */
export class People1764580000000 implements MigrationInterface {
  name = 'People1764580000000';

  async up(q: QueryRunner): Promise<void> {
    await q.query(`
      CREATE TABLE people (
        id uuid PRIMARY KEY,
        email text NOT NULL,
        email_confirmed_at timestamptz,
        display_name text NOT NULL,
        handle text NOT NULL,
        shop_name text,
        password_hash text NOT NULL,
        roles text[] NOT NULL CHECK (roles <@ ARRAY['viewer','creator','moderator','admin']),
        preferences jsonb NOT NULL DEFAULT '{}',
        suspended_until timestamptz,
        suspended_for text,
        created_at timestamptz NOT NULL DEFAULT now()
      )`);
    await q.query(`CREATE UNIQUE INDEX people_email ON people (lower(email))`);
    await q.query(`CREATE UNIQUE INDEX people_handle ON people (handle)`);
    await q.query(`
      CREATE TABLE email_tokens (
        token_hash text PRIMARY KEY,
        person_id uuid NOT NULL REFERENCES people(id) ON DELETE CASCADE,
        purpose text NOT NULL CHECK (purpose IN ('confirm','reset')),
        expires_at timestamptz NOT NULL,
        used_at timestamptz
      )`);
    // The shape connect-pg-simple expects.
    await q.query(`
      CREATE TABLE session (
        sid varchar NOT NULL PRIMARY KEY,
        sess json NOT NULL,
        expire timestamp(6) NOT NULL
      )`);
    await q.query(`CREATE INDEX session_expire ON session (expire)`);
    await q.query(`CREATE INDEX session_person ON session ((sess->'passport'->>'user'))`);
    // The shape rate-limiter-flexible expects.
    await q.query(`
      CREATE TABLE rate_limits (
        key varchar(255) PRIMARY KEY,
        points integer NOT NULL DEFAULT 0,
        expire bigint
      )`);
  }

  async down(q: QueryRunner): Promise<void> {
    for (const table of ['rate_limits', 'session', 'email_tokens', 'people'])
      await q.query(`DROP TABLE ${table}`);
  }
}
