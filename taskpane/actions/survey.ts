/** A survey of the picked runs for the pane alone: seen before anything is written. */
import { pickedRuns, surveyOne, type Surveyed } from '../calls/many';
import type { Bench } from './bench';
import type { LongWork } from './longWork';

export async function surveyRuns({ store }: Bench, work: LongWork): Promise<void> {
  const { table, run, many, order, pointedAt } = store.state;
  if (!table || !run) return;
  const rows: Surveyed[] = [];
  store.change({ survey: null });
  const isWhole = await work.through('surveying', pickedRuns(table, run, many), (one) => {
    rows.push(surveyOne(table, one, order, { sheet: table.sheet, pointedAt }));
  });
  const isStill = store.state.table === table && store.state.many === many && store.state.order === order;
  if (isStill && rows.length > 0) store.change({ survey: { rows, isWhole } });
}
