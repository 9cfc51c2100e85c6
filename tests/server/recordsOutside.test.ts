import { spawnSync } from 'node:child_process';
import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Client } from 'pg';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { readDevMail, startMailFake } from '../../server/features/mail/devMail';
import { RecordsOffice } from '../support/recordsOffice';

let office: RecordsOffice;
let folder: string;
let fake: Awaited<ReturnType<typeof startMailFake>>;

beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'coldloop-mail-'));
  fake = await startMailFake(folder);
  office = await RecordsOffice.open({ smtpUrl: `smtp://127.0.0.1:${fake.port}`, devMailFolder: folder });
  await office.server.services.start();
});
afterAll(async () => {
  await office.server.close();
  await fake.close();
});

describe('the mail of a sealed record', () => {
  it('reaches the safety officer with number, seal and the PDF', async () => {
    const record = await office.recordOf(await office.anySealed());
    const mail = await vi.waitFor(
      async () => {
        const sent = await readDevMail(folder);
        const found = sent.find(({ to, text }) => to.includes('sam.safety@') && text.includes(record.seal));
        expect(found).toBeDefined();
        return found;
      },
      { timeout: 30_000, interval: 250 },
    );
    expect(mail?.subject).toContain(String(record.number));
    expect(mail?.attachments).toEqual([expect.stringMatching(/^record-\d+-.*\.pdf$/)]);
    expect(mail?.text).toContain(`/records/${record.id}`);
  });
});

const walk = () =>
  spawnSync(process.execPath, ['--import', 'tsx', 'server/commands/verifyRecords.ts'], {
    env: { ...process.env, DATABASE_URL: office.server.ownerUrl },
    encoding: 'utf8',
  });

describe('npm run verify-records', () => {
  it('walks every chain, and names the first break with exit code 1', async () => {
    await office.anySealed();
    const good = walk();
    expect(`${good.stdout}${good.stderr}`).toContain('Halden Quay: holds, 1 records');
    expect(good.status).toBe(0);
    const owner = new Client({ connectionString: office.server.ownerUrl });
    await owner.connect();
    await owner.query('ALTER TABLE record DISABLE TRIGGER ALL');
    await owner.query(`UPDATE record SET content = replace(content, 'Ada Volt', 'Eve Volt')`);
    await owner.end();
    const bad = walk();
    expect(bad.stdout).toContain('Halden Quay: BROKEN at record 1 (content)');
    expect(bad.status).toBe(1);
  });
});
