import packageJson from '../../package.json';
import { Stopped, type HandedCopy } from '../../taskpane/copying';
import type { CopyAnswer, CopyJob } from './job';

/** Makes a copy that needs no add-in, on a thread started for it and ended with it: the page stays alive, and it can be stopped. */
export function copyOnWorker(bytes: Uint8Array, stop: AbortSignal): Promise<HandedCopy> {
  const worker = new Worker(new URL('./worker.ts', import.meta.url));
  return new Promise<HandedCopy>((resolve, reject) => {
    stop.addEventListener('abort', () => reject(new Stopped('stopped')), { once: true });
    worker.onmessage = ({ data }: MessageEvent<CopyAnswer>) =>
      'copy' in data ? resolve(data.copy) : reject(new Error(data.refused));
    worker.onerror = ({ message }) => reject(new Error(message || 'its program could not be loaded'));
    const job: CopyJob = { bytes, origin: { version: packageJson.version, date: today() } };
    worker.postMessage(job);
  }).finally(() => worker.terminate());
}

/** By the person's own calendar: `2026-12-01`. */
function today(): string {
  const now = new Date();
  const two = (part: number): string => String(part).padStart(2, '0');
  return [now.getFullYear(), two(now.getMonth() + 1), two(now.getDate())].join('-');
}
