import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Entries as they were received, byte for byte, in commit order; and those set aside. Neither ever changes. */
export class Entries1764547440000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE entry (
        id uuid PRIMARY KEY,
        job uuid NOT NULL REFERENCES job,
        "order" integer NOT NULL CHECK ("order" > 0),
        log uuid NOT NULL,
        seq integer NOT NULL CHECK (seq > 0),
        hash text NOT NULL CHECK (hash ~ '^[0-9a-f]{64}$'),
        previous text CHECK (previous ~ '^[0-9a-f]{64}$'),
        kind text NOT NULL,
        pack text NOT NULL,
        key uuid NOT NULL REFERENCES device_key,
        content text NOT NULL CHECK (octet_length(content) <= 65536),
        received_at timestamptz NOT NULL,
        after_access boolean NOT NULL,
        FOREIGN KEY (job, pack) REFERENCES pack (job, digest),
        UNIQUE (job, "order"),
        CHECK ((previous IS NULL) = (seq = 1))
      );
      CREATE UNIQUE INDEX entry_log_hash ON entry (log, hash);
      CREATE INDEX entry_log_seq ON entry (log, seq);
      CREATE INDEX entry_signed ON entry (job) WHERE kind = 'signed';
      CREATE INDEX entry_key_received ON entry (key, received_at);

      CREATE TABLE entry_set_aside (
        id uuid NOT NULL,
        hash text NOT NULL CHECK (hash ~ '^[0-9a-f]{64}$'),
        job uuid NOT NULL REFERENCES job,
        log uuid NOT NULL,
        seq integer NOT NULL CHECK (seq > 0),
        kind text NOT NULL,
        key uuid NOT NULL REFERENCES device_key,
        content text NOT NULL CHECK (octet_length(content) <= 65536),
        received_at timestamptz NOT NULL,
        PRIMARY KEY (id, hash)
      );
      CREATE INDEX entry_set_aside_job ON entry_set_aside (job);
      CREATE INDEX entry_set_aside_log ON entry_set_aside (log, hash);

      CREATE TRIGGER entry_append_only BEFORE UPDATE OR DELETE ON entry
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER entry_no_truncate BEFORE TRUNCATE ON entry
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER entry_set_aside_append_only BEFORE UPDATE OR DELETE ON entry_set_aside
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER entry_set_aside_no_truncate BEFORE TRUNCATE ON entry_set_aside
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
      REVOKE UPDATE, DELETE ON entry, entry_set_aside FROM coldloop_app;
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE entry_set_aside, entry;');
  }
}
