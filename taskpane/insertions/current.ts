import type { State } from '../store';
import type { Insertion } from './insertion';
import { manyInsertion } from './many';
import { exampleInsertion } from './example';
import { orderInsertion } from './order';
import { readingsInsertion } from './readings';
import { rateInsertion } from './rate';
import { temperatureInsertion } from './temperature';

/** What the open step would write; `null` while it has nothing to write. */
export function currentInsertion(state: State): Insertion | null {
  const { table, run, task, put } = state;
  if (task === 'lookUp') return exampleInsertion(state.lookup.chosen);
  if (!table || !run || task === 'handOver') return null;
  if (task === 'order') return orderInsertion(table, run, state, put.withDetail);
  if (task === 'many') return manyInsertion(table, run, state);
  if (task === 'temperature') return temperatureInsertion(table, run, state);
  if (task === 'reading') return readingsInsertion(table, run, state);
  return rateInsertion(table, run, state, put.withDetail);
}
