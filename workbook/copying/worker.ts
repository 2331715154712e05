/** The thread that makes a copy: it has a spreadsheet engine of its own, apart from any sheet that is shown. */
import { handOver } from '../handover/handOver';
import type { CopyAnswer, CopyJob } from './job';
import { reportOf } from './report';

interface WorkerScope {
  onmessage: ((event: { readonly data: CopyJob }) => void) | null;
  postMessage(answer: CopyAnswer): void;
}

const scope = globalThis as unknown as WorkerScope;

scope.onmessage = ({ data: { bytes, origin } }) => {
  handOver(bytes, origin).then(
    (made) => scope.postMessage({ copy: reportOf(made) }),
    (error: unknown) =>
      scope.postMessage({ refused: error instanceof Error ? error.message : String(error) }),
  );
};
