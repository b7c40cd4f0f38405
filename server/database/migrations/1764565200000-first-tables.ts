import type { MigrationInterface, QueryRunner } from 'typeorm';

const TEAMS = `
  CREATE TABLE team (
    id uuid CONSTRAINT team_pkey PRIMARY KEY,
    name text NOT NULL,
    created_at timestamptz(3) NOT NULL
  );
  CREATE TABLE person (
    id uuid CONSTRAINT person_pkey PRIMARY KEY,
    team_id uuid NOT NULL CONSTRAINT person_team_fkey REFERENCES team (id) ON DELETE CASCADE,
    name text NOT NULL,
    email text NOT NULL CONSTRAINT person_email_key UNIQUE,
    password_hash text NOT NULL,
    active boolean NOT NULL DEFAULT true,
    created_at timestamptz(3) NOT NULL
  );
  CREATE INDEX person_team_idx ON person (team_id);
  CREATE TABLE role_grant (
    person_id uuid NOT NULL CONSTRAINT role_grant_person_fkey REFERENCES person (id) ON DELETE CASCADE,
    role text NOT NULL CONSTRAINT role_grant_role_check
      CHECK ("role" IN ('designer', 'librarian', 'test-engineer', 'reviewer', 'admin')),
    CONSTRAINT role_grant_pkey PRIMARY KEY (person_id, role)
  );`;

const SESSIONS = `
  CREATE TABLE session (
    id uuid CONSTRAINT session_pkey PRIMARY KEY,
    person_id uuid NOT NULL CONSTRAINT session_person_fkey REFERENCES person (id) ON DELETE CASCADE,
    created_at timestamptz(3) NOT NULL,
    last_seen_at timestamptz(3) NOT NULL,
    expires_at timestamptz(3) NOT NULL,
    ended_at timestamptz(3),
    ended_because text
  );
  CREATE INDEX session_person_idx ON session (person_id);
  CREATE TABLE refresh_token (
    id uuid CONSTRAINT refresh_token_pkey PRIMARY KEY,
    session_id uuid NOT NULL CONSTRAINT refresh_token_session_fkey REFERENCES session (id) ON DELETE CASCADE,
    hash text NOT NULL CONSTRAINT refresh_token_hash_key UNIQUE,
    created_at timestamptz(3) NOT NULL,
    replaced_at timestamptz(3)
  );
  CREATE INDEX refresh_token_session_idx ON refresh_token (session_id);
  CREATE TABLE api_token (
    id uuid CONSTRAINT api_token_pkey PRIMARY KEY,
    person_id uuid NOT NULL CONSTRAINT api_token_person_fkey REFERENCES person (id) ON DELETE CASCADE,
    name text NOT NULL,
    hash text NOT NULL CONSTRAINT api_token_hash_key UNIQUE,
    created_at timestamptz(3) NOT NULL,
    expires_at timestamptz(3) NOT NULL,
    last_used_at timestamptz(3),
    revoked_at timestamptz(3)
  );
  CREATE INDEX api_token_person_idx ON api_token (person_id);`;

/** Laid out as rate-limiter-flexible wants it. */
const SIGN_IN_ATTEMPTS = `
  CREATE TABLE sign_in_attempt (
    key varchar(255) CONSTRAINT sign_in_attempt_pkey PRIMARY KEY,
    points integer NOT NULL DEFAULT 0,
    expire bigint
  );`;

const LIBRARY = `
  CREATE TABLE scenario (
    id uuid CONSTRAINT scenario_pkey PRIMARY KEY,
    team_id uuid NOT NULL CONSTRAINT scenario_team_fkey REFERENCES team (id) ON DELETE CASCADE,
    name text NOT NULL,
    version integer NOT NULL,
    document jsonb NOT NULL,
    created_hash text NOT NULL,
    verdict jsonb,
    closest jsonb,
    engine_version text,
    created_at timestamptz(3) NOT NULL,
    updated_at timestamptz(3) NOT NULL,
    updated_by uuid NOT NULL CONSTRAINT scenario_updated_by_fkey REFERENCES person (id)
  );
  CREATE INDEX scenario_list_idx ON scenario (team_id, updated_at, id);
  CREATE INDEX scenario_updated_by_idx ON scenario (updated_by);
  CREATE TABLE part (
    id uuid CONSTRAINT part_pkey PRIMARY KEY,
    team_id uuid NOT NULL CONSTRAINT part_team_fkey REFERENCES team (id) ON DELETE CASCADE,
    name text NOT NULL,
    kind text NOT NULL,
    revision integer NOT NULL,
    document jsonb NOT NULL,
    provenance jsonb NOT NULL,
    approved_by uuid CONSTRAINT part_approved_by_fkey REFERENCES person (id),
    created_at timestamptz(3) NOT NULL
  );
  CREATE INDEX part_list_idx ON part (team_id, name, id);
  CREATE INDEX part_approved_by_idx ON part (approved_by);`;

export class FirstTables1764565200000 implements MigrationInterface {
  name = 'FirstTables1764565200000';

  async up(runner: QueryRunner): Promise<void> {
    for (const statements of [TEAMS, SESSIONS, SIGN_IN_ATTEMPTS, LIBRARY]) await runner.query(statements);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE part, scenario, sign_in_attempt, api_token, refresh_token, session, role_grant, person, team');
  }
}
