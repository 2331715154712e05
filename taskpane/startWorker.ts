/** Starts the thread for long calculations. By itself, since only a bundler knows where its script will lie. */
import type { WorkerLike } from '../functions/longWork';

export const startWorker = (): WorkerLike =>
  new Worker(new URL('../functions/worker.ts', import.meta.url)) as unknown as WorkerLike;
