import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Sealed records in one chain a site, and the PDF of each, made once. None of them ever changes. */
export class Records1764547500000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE record_chain (
        site uuid PRIMARY KEY REFERENCES site,
        last_number integer NOT NULL CHECK (last_number >= 0),
        last_seal text CHECK (last_seal ~ '^[0-9a-f]{64}$'),
        CHECK ((last_seal IS NULL) = (last_number = 0))
      );
      CREATE FUNCTION refuse_backwards() RETURNS trigger LANGUAGE plpgsql AS $$
      BEGIN
        IF NEW.site <> OLD.site OR NEW.last_number <> OLD.last_number + 1 THEN
          RAISE EXCEPTION 'a chain of records only grows, by one' USING ERRCODE = 'integrity_constraint_violation';
        END IF;
        RETURN NEW;
      END $$;
      CREATE TRIGGER record_chain_grows BEFORE UPDATE ON record_chain
        FOR EACH ROW EXECUTE FUNCTION refuse_backwards();
      CREATE TRIGGER record_chain_stays BEFORE DELETE ON record_chain
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER record_chain_no_truncate BEFORE TRUNCATE ON record_chain
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();

      CREATE TABLE record (
        id uuid PRIMARY KEY,
        site uuid NOT NULL REFERENCES site,
        number integer NOT NULL CHECK (number > 0),
        job uuid NOT NULL REFERENCES job,
        amends uuid REFERENCES record,
        content text NOT NULL,
        digest text NOT NULL CHECK (digest ~ '^[0-9a-f]{64}$'),
        previous_seal text CHECK (previous_seal ~ '^[0-9a-f]{64}$'),
        seal text NOT NULL UNIQUE CHECK (seal ~ '^[0-9a-f]{64}$'),
        language text NOT NULL CHECK (language IN ('en', 'es')),
        sealed_at timestamptz NOT NULL,
        last_order integer NOT NULL CHECK (last_order > 0),
        set_aside integer NOT NULL CHECK (set_aside >= 0),
        panel_tag text NOT NULL,
        panel_name text NOT NULL,
        job_number text NOT NULL,
        electricians text[] NOT NULL,
        foreman text NOT NULL,
        people uuid[] NOT NULL,
        points text[] NOT NULL,
        locks text[] NOT NULL,
        exceptions integer NOT NULL CHECK (exceptions >= 0),
        UNIQUE (site, number),
        CHECK ((previous_seal IS NULL) = (number = 1))
      );
      CREATE UNIQUE INDEX record_job ON record (job) WHERE amends IS NULL;
      CREATE INDEX record_job_number ON record (job, number);
      CREATE INDEX record_digest ON record (digest);
      CREATE INDEX record_sealed ON record (sealed_at DESC, id DESC);

      CREATE TABLE record_pdf (
        record uuid PRIMARY KEY REFERENCES record,
        sha256 text NOT NULL CHECK (sha256 ~ '^[0-9a-f]{64}$'),
        content bytea NOT NULL,
        made_at timestamptz NOT NULL
      );
      CREATE INDEX record_pdf_sha256 ON record_pdf (sha256);

      CREATE TRIGGER record_append_only BEFORE UPDATE OR DELETE ON record
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER record_no_truncate BEFORE TRUNCATE ON record
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER record_pdf_append_only BEFORE UPDATE OR DELETE ON record_pdf
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER record_pdf_no_truncate BEFORE TRUNCATE ON record_pdf
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
      REVOKE UPDATE, DELETE ON record, record_pdf FROM coldloop_app;
      REVOKE DELETE ON record_chain FROM coldloop_app;
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE record_pdf, record, record_chain; DROP FUNCTION refuse_backwards();');
  }
}
