import { join } from 'node:path';
import type { Logger } from 'pino';
import type { Passwords } from './accounts/passwords.ts';
import { attemptRules } from './attempts/attempt-rules.ts';
import { readDemoAccounts } from './demo/demo-accounts.ts';
import { readRecordings } from './demo/read-recordings.ts';
import { seedAttempts } from './demo/seed-attempts.ts';
import { seedDemo } from './demo/seed-demo.ts';
import type { OvenLibrary } from './ovens/oven-library.ts';
import type { OnBadFile } from './ovens/read-json-folder.ts';
import { readOvens } from './ovens/read-ovens.ts';
import { publishJobs } from './scenarios/publish-jobs.ts';
import { readJobs } from './scenarios/read-jobs.ts';
import type { Stores } from './stores.ts';

const practiceOrganisation = 'Coldbench practice';

export interface PrepareOptions {
  root: string;
  isSeeded: boolean;
  stores: Stores;
  passwords: Passwords;
  clock: () => Date;
  log: Logger;
}

/** What is done once at start: ovens and practice jobs are read and published, a demonstration database is filled. */
export async function prepare(options: PrepareOptions): Promise<OvenLibrary> {
  const { root, stores, passwords, clock, log } = options;
  const onBadFile: OnBadFile = (file, mistakes) =>
    log.error({ file, mistakes }, 'a file cannot be used and is left out');
  const ovens = await readOvens(join(root, 'scenarios', 'ovens'), onBadFile);
  const jobs = await readJobs(join(root, 'scenarios', 'jobs'), ovens, onBadFile);
  const practice = await stores.organisations.practice(practiceOrganisation, clock());
  await publishJobs(stores.scenarios, practice, jobs, clock());
  if (options.isSeeded) {
    const organisation = await seedDemo(
      { ...stores, passwords, clock },
      await readDemoAccounts(root),
      jobs,
    );
    if (organisation !== null) {
      const recordings = await readRecordings(root, onBadFile);
      const put = await seedAttempts(
        { ...stores, rules: attemptRules, ovens, clock },
        organisation,
        recordings,
      );
      if (put > 0) log.info({ attempts: put }, 'the demonstration organisation was set up');
    }
  }
  log.info({ ovens: ovens.list().length, jobs: jobs.length }, 'ovens and practice jobs are ready');
  return ovens;
}
