/** The other thread: takes a job, tells now and then how far it is, gives its answer. */
import { answerJob, ready, type Answer, type HowFar, type Job } from './longWork';

interface WorkerScope {
  onmessage: ((event: { readonly data: Job }) => void) | null;
  postMessage(said: Answer | HowFar | typeof ready): void;
}

const scope = globalThis as unknown as WorkerScope;

/** A share that is told more often nobody could read; what is done next is told in any case. */
const between = 100; // ms

scope.onmessage = ({ data }) => {
  let told = -Infinity;
  const answer = answerJob(data, (howFar) => {
    const now = performance.now();
    if (howFar.progress.share !== undefined && now - told < between) return;
    told = now;
    scope.postMessage(howFar);
  });
  scope.postMessage(answer);
};
scope.postMessage(ready);
