/** Does this job work with no signal? Computed from what is on the device, each check on its own. */
import { say } from '../../shared/panel/says';
import type { Databases } from './databases';
import type { DeviceEnvironment } from './environment';
import { localJob } from './localJobs';
import { packIntegrity } from './packIntegrity';
import { selfTest } from './selfTest';
import { fixStorage, storageCheck } from './storageCheck';
import type { LocalJob, Readiness, ReadinessCheck } from './types';

type Check = Readiness['checks'][number];

export class ReadinessChecks {
  /** Packs whose digest was computed and matched since this page was opened. */
  private readonly whole = new Set<string>();
  private readonly lastFault = new Map<string, string>();

  constructor(
    private readonly env: DeviceEnvironment,
    private readonly databases: Databases,
    /** Asks the server for what this device lacks. */
    private readonly pull: () => Promise<void>,
  ) {}

  async of(job: string): Promise<Readiness> {
    const [local, version] = await Promise.all([localJob(this.databases, job), this.env.shell.version()]);
    const checks = [
      verdict('shell', version !== null),
      this.pack(local),
      await this.pin(local),
      await storageCheck(this.env, this.databases.outbox),
      await this.tested(local, version),
    ];
    return { ready: checks.every(({ ok }) => ok), checks };
  }

  async fix(job: string, check: ReadinessCheck): Promise<void> {
    if (check === 'shell') await this.env.shell.mend();
    if (check === 'pack') await this.pull();
    if (check === 'storage') await fixStorage(this.env, this.databases.outbox);
    if (check === 'self-test') await this.test(job);
  }

  private async test(job: string): Promise<void> {
    const fault = await selfTest(this.env, this.databases, job);
    if (fault === null) this.lastFault.delete(job);
    else this.lastFault.set(job, fault);
  }

  private pack(local: LocalJob | undefined): Check {
    const digest = local?.pack.digest ?? '';
    if (local && !this.whole.has(digest) && packIntegrity(local.pack).ok) this.whole.add(digest);
    return verdict('pack', this.whole.has(digest));
  }

  private async pin(local: LocalJob | undefined): Promise<Check> {
    const enrolled = await this.databases.outbox.run((database) => database.getAllKeys('people'));
    return verdict('pin', local?.pack.people.some(({ id }) => enrolled.includes(id)) === true);
  }

  private async tested(local: LocalJob | undefined, shell: string | null): Promise<Check> {
    const job = local?.pack.job.id ?? '';
    const test = await this.databases.work.run((database) => database.get('selfTests', job));
    const isCurrent = test !== undefined && test.shell === shell && test.pack === local?.pack.digest;
    const fault = this.lastFault.get(job);
    const check = verdict('self-test', isCurrent);
    return !isCurrent && fault ? { ...check, says: say(fault) } : check;
  }
}

const verdict = (check: Exclude<ReadinessCheck, 'storage'>, ok: boolean): Check => ({
  check,
  ok,
  says: say(`device.store.ready.${check}.${ok ? 'ok' : 'missing'}`),
  ...(ok ? {} : { button: say(`device.store.ready.${check}.button`) }),
});
