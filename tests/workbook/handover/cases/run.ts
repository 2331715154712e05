/** An invented run: times in A2:A9, readings in B2:B9. */
import { column } from '../../engine/book';

export const run = {
  ...column('A2', [0, 20, 40, 60, 90, 120, 180, 240]),
  ...column('B2', [0, 16, 28, 36.4, 44.8, 50, 55.2, 57.4]),
};
