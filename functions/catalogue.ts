/** All cell functions, in the order of the work. */
import type { CellFunction } from './define';
import event from './rate/event';

export const catalogue: readonly CellFunction[] = [event];

export const functionNamed = (name: string): CellFunction | undefined =>
  catalogue.find((f) => f.name === name.toUpperCase());
