/** The device store: everything the field screens ask of this device, over its two databases and its sender. */
import type { BodyOf, Entry, EntryKind } from '../../shared/job/entry';
import { AppendBases } from './appendBasis';
import { appendEntry } from './appendEntry';
import { Changes } from './changes';
import { PinCheck } from './checkPin';
import { openDatabases } from './databases';
import { deviceId } from './deviceId';
import { enrol } from './enrol';
import type { DeviceEnvironment } from './environment';
import { exportUnsent } from './exportUnsent';
import { JobCache } from './jobCache';
import { localJob, localJobs } from './localJobs';
import { ReadinessChecks } from './readiness';
import { Sender } from './sender';
import { sendingRound, type RoundScope } from './sendingRound';
import { SendReport } from './sendReport';
import type { DevicePerson, DeviceStore, LocalJob, PinResult, Readiness, ReadinessCheck } from './types';
import { WatchedJobs } from './watchedJobs';

const channelName = 'coldloop-device';
const bytesPerMB = 1_000_000;

export class LocalDeviceStore implements DeviceStore {
  private readonly databases;
  private readonly changes: Changes;
  private readonly sender: Sender;
  private readonly report: SendReport;
  private readonly pins: PinCheck;
  private readonly readinessChecks: ReadinessChecks;
  private readonly cache: JobCache;
  private readonly bases: AppendBases;
  private readonly watched = new WatchedJobs();

  constructor(private readonly env: DeviceEnvironment) {
    this.databases = openDatabases(env.indexedDB);
    this.bases = new AppendBases(this.databases);
    this.cache = new JobCache((job) => localJob(this.databases, job));
    this.changes = new Changes(env.openChannel(channelName), () => this.reread());
    this.pins = new PinCheck(env, this.databases.outbox);
    this.sender = new Sender(env, {
      wanted: async () => (await this.people()).length > 0,
      round: (scope) => this.round(scope),
      watched: () => this.watched.list(),
      told: () => {
        this.changes.notify();
      },
    });
    this.report = new SendReport(this.databases, () => this.sender);
    this.readinessChecks = new ReadinessChecks(env, this.databases, () => this.sendNow());
  }

  /** Closes what this tab holds open; the store is not used afterwards. */
  async close(): Promise<void> {
    this.sender.stop();
    this.changes.close();
    await this.databases.outbox.close();
    await this.databases.work.close();
  }

  private reread(): Promise<void> {
    this.cache.forget();
    this.bases.forget();
    return this.report.reread();
  }

  private round(scope: RoundScope) {
    const { env, databases } = this;
    return sendingRound({ env, databases, changed: () => this.changes.announce() }, scope);
  }

  deviceId(): Promise<string> {
    return deviceId(this.env, this.databases.outbox);
  }

  job(id: string): Promise<LocalJob | undefined> {
    return this.cache.job(id);
  }

  jobs(person: string): Promise<LocalJob[]> {
    return localJobs(this.databases, person, (id) => this.cache.job(id));
  }

  async append<K extends EntryKind>(person: string, job: string, kind: K, body: BodyOf<K>): Promise<Entry> {
    const { env, bases } = this;
    const { outbox } = this.databases;
    const entry = await appendEntry({ env, outbox, bases }, person, job, kind, body);
    // It is kept from here on: nothing that follows may make it look as if it were not.
    this.cache.add(entry);
    this.report.add(entry);
    this.changes.tellOthers();
    // After whoever waits for this answer: the screen moves on first.
    this.env.setTimer(0, () => {
      this.changes.notify();
    });
    this.sender.triggerSoon(job);
    return entry;
  }

  subscribe(listener: () => void): () => void {
    return this.changes.subscribe(listener);
  }

  watch(job: string): () => void {
    const letGo = this.watched.watch(job);
    this.sender.reconsider();
    return () => {
      letGo();
      this.sender.reconsider();
    };
  }

  start(): () => void {
    void this.changes.announce();
    return this.sender.start();
  }

  sendState() {
    return this.report.state();
  }

  sendNow(): Promise<void> {
    return this.sender.trigger();
  }

  async people(): Promise<DevicePerson[]> {
    const rows = await this.databases.outbox.run((database) => database.getAll('people'));
    return rows.map(({ person, name, email, enrolledAt }) => ({ person, name, email, enrolledAt }));
  }

  async enrol(person: { id: string; name: string; email: string }, pin: string): Promise<void> {
    await enrol(this.env, this.databases.outbox, person, pin);
    // The first thing on this device that must not be lost; a refusal is shown by the readiness of each job.
    await this.env.storage.persist().catch(() => false);
    await this.changes.announce();
    void this.sender.trigger();
  }

  checkPin(person: string, pin: string): Promise<PinResult> {
    return this.pins.check(person, pin);
  }

  readiness(job: string): Promise<Readiness> {
    return this.readinessChecks.of(job);
  }

  async fix(job: string, check: ReadinessCheck): Promise<void> {
    await this.readinessChecks.fix(job, check);
    await this.changes.announce();
  }

  async storage(): Promise<{ persisted: boolean; usedMB: number; freeMB: number }> {
    const persisted = await this.env.storage.persisted();
    const { usageB, quotaB } = await this.env.storage.estimate();
    return {
      persisted,
      usedMB: usageB / bytesPerMB,
      freeMB: Math.max(0, quotaB - usageB) / bytesPerMB,
    };
  }

  exportUnsent(): Promise<string> {
    return exportUnsent(this.env, this.databases);
  }
}
