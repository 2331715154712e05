/** The other thread: takes a job, gives its answer. */
import { answerJob, ready, type Answer, type Job } from './longWork';

interface WorkerScope {
  onmessage: ((event: { readonly data: Job }) => void) | null;
  postMessage(answer: Answer | typeof ready): void;
}

const scope = globalThis as unknown as WorkerScope;

scope.onmessage = ({ data }) => scope.postMessage(answerJob(data));
scope.postMessage(ready);
