import type { MigrationInterface, QueryRunner } from 'typeorm';

/** People, sites, roles, sessions, tokens, audit; and the role the server works as, which owns no table. */
export class Ground1764547200000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      DO $$ BEGIN
        IF NOT EXISTS (SELECT FROM pg_roles WHERE rolname = 'coldloop_app') THEN CREATE ROLE coldloop_app NOLOGIN; END IF;
      EXCEPTION WHEN duplicate_object OR unique_violation THEN NULL;
      END $$;
      GRANT coldloop_app TO CURRENT_USER;
      GRANT USAGE ON SCHEMA public TO coldloop_app;
      ALTER DEFAULT PRIVILEGES IN SCHEMA public GRANT SELECT, INSERT, UPDATE, DELETE ON TABLES TO coldloop_app;
      ALTER DEFAULT PRIVILEGES IN SCHEMA public GRANT USAGE, SELECT ON SEQUENCES TO coldloop_app;

      CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN RAISE EXCEPTION '% is append-only', TG_TABLE_NAME USING ERRCODE = 'integrity_constraint_violation'; END $$;

      CREATE TABLE site (
        id uuid PRIMARY KEY,
        name text NOT NULL CHECK (length(name) BETWEEN 1 AND 120),
        settings jsonb NOT NULL,
        version integer NOT NULL DEFAULT 1 CHECK (version > 0)
      );
      CREATE UNIQUE INDEX site_name ON site (lower(name));

      CREATE TABLE person (
        id uuid PRIMARY KEY,
        name text NOT NULL CHECK (length(name) BETWEEN 1 AND 120),
        email text NOT NULL CHECK (email = lower(email)),
        language text NOT NULL CHECK (language IN ('en', 'es')),
        password_hash text,
        active boolean NOT NULL DEFAULT true,
        epoch integer NOT NULL DEFAULT 1,
        version integer NOT NULL DEFAULT 1 CHECK (version > 0),
        invited_at timestamptz,
        joined_at timestamptz
      );
      CREATE UNIQUE INDEX person_email ON person (email);

      CREATE TABLE person_role (
        person uuid NOT NULL REFERENCES person,
        site uuid NOT NULL REFERENCES site,
        role text NOT NULL CHECK (role IN ('electrician', 'foreman', 'safety-officer', 'panel-engineer', 'administrator')),
        PRIMARY KEY (person, site, role)
      );
      CREATE INDEX person_role_site ON person_role (site, role);

      CREATE TABLE session (
        sid varchar NOT NULL PRIMARY KEY,
        sess json NOT NULL,
        expire timestamp(6) NOT NULL
      );
      CREATE INDEX session_expire ON session (expire);

      CREATE TABLE mail_token (
        hash text PRIMARY KEY,
        kind text NOT NULL CHECK (kind IN ('invitation', 'password-reset')),
        person uuid NOT NULL REFERENCES person,
        expires_at timestamptz NOT NULL,
        used_at timestamptz
      );
      CREATE INDEX mail_token_person ON mail_token (person);

      CREATE TABLE rate_limit (
        key text PRIMARY KEY,
        hits integer NOT NULL,
        resets_at timestamptz NOT NULL
      );

      CREATE TABLE audit (
        id uuid PRIMARY KEY,
        at timestamptz NOT NULL DEFAULT now(),
        actor uuid REFERENCES person,
        site uuid REFERENCES site,
        act text NOT NULL,
        about jsonb NOT NULL
      );
      CREATE INDEX audit_site_at ON audit (site, at DESC);
      CREATE TRIGGER audit_append_only BEFORE UPDATE OR DELETE ON audit FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER audit_no_truncate BEFORE TRUNCATE ON audit FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
      REVOKE UPDATE, DELETE ON audit FROM coldloop_app;
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      DROP TABLE audit, rate_limit, mail_token, session, person_role, person, site;
      DROP FUNCTION refuse_change();
    `);
  }
}
