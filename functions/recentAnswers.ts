/**
 * Answers to calls made a moment ago. An answer depends on the arguments alone, so it never goes stale: what limits
 * the store is memory, and it is emptied when nobody has asked for a while.
 */
import type { CellResult } from './cell';
import { CallTable, cellsIn, type Call } from './sameCall';

const mostCells = 200_000; // a few MB
const idle = 5_000; // ms; all is let go after two such spans at most without a question

export class RecentAnswers {
  private readonly table = new CallTable<CellResult>();
  private cells = 0;
  private isInUse = false;
  private timer: ReturnType<typeof setTimeout> | undefined;

  find(call: Call): CellResult | undefined {
    this.isInUse = true;
    return this.table.find(call);
  }

  keep(call: Call, answer: CellResult): void {
    const size = cellsIn(call.args) + cellsIn([answer]);
    if (size > mostCells) return;
    if (this.cells + size > mostCells) this.clear();
    this.table.set(call, answer);
    this.cells += size;
    this.isInUse = true;
    this.timer ??= this.lookAgainLater();
  }

  private lookAgainLater(): ReturnType<typeof setTimeout> {
    const timer = setTimeout(() => {
      this.timer = this.isInUse ? this.lookAgainLater() : undefined;
      if (!this.isInUse) this.clear();
      this.isInUse = false;
    }, idle);
    if (typeof timer === 'object') timer.unref(); // a command that is done need not wait for it
    return timer;
  }

  private clear(): void {
    this.table.clear();
    this.cells = 0;
  }
}
