import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Panels with their draft, and revisions that never change once issued. */
export class Panels1764547260000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE panel (
        id uuid PRIMARY KEY,
        site uuid NOT NULL REFERENCES site,
        tag text NOT NULL CHECK (length(tag) BETWEEN 1 AND 40),
        name text NOT NULL,
        location text NOT NULL,
        points integer NOT NULL CHECK (points >= 0),
        draft jsonb NOT NULL,
        draft_digest text NOT NULL CHECK (draft_digest ~ '^[0-9a-f]{64}$'),
        draft_version integer NOT NULL DEFAULT 1 CHECK (draft_version > 0),
        draft_changed_at timestamptz NOT NULL,
        draft_changed_by uuid NOT NULL REFERENCES person,
        upload_digest text NOT NULL CHECK (upload_digest ~ '^[0-9a-f]{64}$'),
        revision integer CHECK (revision > 0),
        revision_digest text CHECK (revision_digest ~ '^[0-9a-f]{64}$'),
        CHECK ((revision IS NULL) = (revision_digest IS NULL))
      );
      CREATE UNIQUE INDEX panel_site_tag ON panel (site, tag);
      CREATE INDEX panel_tag ON panel (tag, id);

      CREATE TABLE panel_revision (
        panel uuid NOT NULL REFERENCES panel,
        number integer NOT NULL CHECK (number > 0),
        digest text NOT NULL CHECK (digest ~ '^[0-9a-f]{64}$'),
        rule_set text NOT NULL,
        content jsonb NOT NULL,
        findings jsonb NOT NULL,
        standing jsonb NOT NULL,
        draft_version integer NOT NULL,
        issued_at timestamptz NOT NULL,
        issued_by uuid NOT NULL REFERENCES person,
        PRIMARY KEY (panel, number),
        UNIQUE (panel, draft_version)
      );
      CREATE TRIGGER panel_revision_append_only BEFORE UPDATE OR DELETE ON panel_revision
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER panel_revision_no_truncate BEFORE TRUNCATE ON panel_revision
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
      REVOKE UPDATE, DELETE ON panel_revision FROM coldloop_app;
      REVOKE DELETE ON panel FROM coldloop_app;
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE panel_revision, panel;');
  }
}
