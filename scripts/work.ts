import { closeDatabase } from '@/lib/db/connection';
import { startWork } from '@/lib/work/run';

/** Takes jobs off the queue until it is told to end; what is under way is finished first. */
const work = await startWork();

process.on('SIGTERM', () => void work.stop());
process.on('SIGINT', () => void work.stop());
await work.ended;
await closeDatabase();
