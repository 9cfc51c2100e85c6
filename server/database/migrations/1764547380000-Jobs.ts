import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Jobs, their people, and the packs that were issued for them. */
export class Jobs1764547380000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE job_counter (
        site uuid PRIMARY KEY REFERENCES site,
        last integer NOT NULL CHECK (last > 0)
      );

      CREATE TABLE job (
        id uuid PRIMARY KEY,
        site uuid NOT NULL REFERENCES site,
        number integer NOT NULL CHECK (number > 0),
        panel uuid NOT NULL,
        revision integer NOT NULL,
        panel_tag text NOT NULL,
        panel_name text NOT NULL,
        panel_points integer NOT NULL,
        isolators jsonb NOT NULL,
        scope jsonb NOT NULL CHECK (jsonb_array_length(scope) > 0),
        foreman uuid NOT NULL REFERENCES person,
        due date NOT NULL,
        words text,
        acceptances jsonb NOT NULL,
        request_digest text NOT NULL CHECK (request_digest ~ '^[0-9a-f]{64}$'),
        created_at timestamptz NOT NULL,
        created_by uuid NOT NULL REFERENCES person,
        pack text,
        sent_at timestamptz,
        sent_by uuid REFERENCES person,
        cancelled_at timestamptz,
        cancelled_by uuid REFERENCES person,
        cancel_words text,
        record uuid,
        sealed_at timestamptz,
        last_order integer NOT NULL DEFAULT 0 CHECK (last_order >= 0),
        last_heard timestamptz,
        status text NOT NULL DEFAULT 'planned' CHECK (status IN
          ('planned', 'sent', 'accepted', 'running', 'signed', 'returned', 'countersigned', 'sealed', 'cancelled')),
        waits boolean NOT NULL DEFAULT false,
        progress jsonb,
        progress_order integer NOT NULL DEFAULT -1,
        FOREIGN KEY (panel, revision) REFERENCES panel_revision (panel, number),
        UNIQUE (site, number),
        CHECK ((pack IS NULL) = (sent_at IS NULL)),
        CHECK ((cancelled_at IS NULL) = (cancel_words IS NULL)),
        CHECK ((record IS NULL) = (sealed_at IS NULL)),
        CHECK (record IS NULL OR pack IS NOT NULL)
      );
      CREATE INDEX job_panel ON job (panel, created_at);
      CREATE INDEX job_site_created ON job (site, created_at DESC, id DESC);
      CREATE INDEX job_foreman_waits ON job (foreman) WHERE waits;
      CREATE INDEX job_stale ON job (site) WHERE progress_order < last_order;

      CREATE TABLE job_person (
        job uuid NOT NULL REFERENCES job,
        person uuid NOT NULL REFERENCES person,
        part text NOT NULL CHECK (part IN ('electrician', 'foreman')),
        PRIMARY KEY (job, person)
      );
      CREATE INDEX job_person_person ON job_person (person);

      CREATE TABLE pack (
        digest text PRIMARY KEY CHECK (digest ~ '^[0-9a-f]{64}$'),
        job uuid NOT NULL REFERENCES job,
        content text NOT NULL,
        made_at timestamptz NOT NULL,
        made_by uuid NOT NULL REFERENCES person,
        UNIQUE (job, digest)
      );
      ALTER TABLE job ADD CONSTRAINT job_pack_fkey FOREIGN KEY (id, pack) REFERENCES pack (job, digest);
      CREATE TRIGGER pack_append_only BEFORE UPDATE OR DELETE ON pack
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER pack_no_truncate BEFORE TRUNCATE ON pack
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
      REVOKE UPDATE, DELETE ON pack FROM coldloop_app;
      REVOKE DELETE ON job, job_person, job_counter FROM coldloop_app;
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE job DROP CONSTRAINT job_pack_fkey;
      DROP TABLE pack, job_person, job, job_counter;
    `);
  }
}
