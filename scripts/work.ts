import { closeDatabase } from '@/lib/db/connection';
import { startWork } from '@/lib/work/run';

/** Takes jobs off the queue until it is told to end; what is under way is finished first. */
const runner = await startWork();

async function end(): Promise<void> {
  await runner.stop();
  await closeDatabase();
}

process.on('SIGTERM', () => void end());
process.on('SIGINT', () => void end());
await runner.promise;
