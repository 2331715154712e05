/** Workbooks as .xlsx files. */
import type { FileFormat } from './documents';

export const fileFormat: FileFormat = {
  read() {
    throw new Error('soon');
  },
  create() {
    throw new Error('soon');
  },
  update() {
    throw new Error('soon');
  },
};
