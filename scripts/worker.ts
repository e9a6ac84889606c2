import PgBoss from 'pg-boss';
import { closeDatabase } from '@/db/connection';
import { env } from '@/lib/server/env';
import { jobs } from '@/lib/server/jobs/all';
import { log, logUnexpected } from '@/lib/server/log';

/** The one process that does scheduled and queued work. */
const boss = new PgBoss({ connectionString: env().DATABASE_URL, application_name: 'rimewright-worker' });
// Without a listener a lost connection would end the process.
boss.on('error', (error) => logUnexpected(error, 'worker'));

await boss.start();
for (const job of jobs) {
  await boss.createQueue(job.queue);
  await boss.work(job.queue, { pollingIntervalSeconds: 2 }, async () => {
    const startedAt = performance.now();
    await job.run(new Date());
    log('info', `job ${job.queue}`, { ms: Math.round(performance.now() - startedAt) });
  });
  await boss.schedule(job.queue, job.schedule);
  await boss.send(job.queue, {}, { singletonKey: 'at-start', singletonSeconds: 60 });
}
log('info', 'worker ready', { jobs: jobs.map((job) => job.queue) });

const stop = async () => {
  await boss.stop({ graceful: true, timeout: 5000 });
  await closeDatabase();
  process.exit(0);
};
process.on('SIGTERM', () => void stop());
process.on('SIGINT', () => void stop());
