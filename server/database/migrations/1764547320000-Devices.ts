import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Devices, and the public keys people sign with on them; a key is evidence and never changes. */
export class Devices1764547320000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE device (
        id uuid PRIMARY KEY,
        name text NOT NULL CHECK (length(name) BETWEEN 1 AND 120),
        registered_at timestamptz NOT NULL,
        registered_by uuid NOT NULL REFERENCES person,
        revoked_at timestamptz,
        revoked_by uuid REFERENCES person,
        CHECK ((revoked_at IS NULL) = (revoked_by IS NULL))
      );

      CREATE TABLE device_key (
        id uuid PRIMARY KEY,
        device uuid NOT NULL REFERENCES device,
        person uuid NOT NULL REFERENCES person,
        public_key jsonb NOT NULL,
        thumbprint text NOT NULL UNIQUE,
        registered_at timestamptz NOT NULL
      );
      CREATE INDEX device_key_device ON device_key (device);
      CREATE INDEX device_key_person ON device_key (person);
      CREATE TRIGGER device_key_append_only BEFORE UPDATE OR DELETE ON device_key
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER device_key_no_truncate BEFORE TRUNCATE ON device_key
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
      REVOKE UPDATE, DELETE ON device_key FROM coldloop_app;
      REVOKE DELETE ON device FROM coldloop_app;
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE device_key, device;');
  }
}
