/** Headings and number formats that the sheets of the demo share. */
import { standardRowHeadings } from '../../functions/results';

export const standardHeadings: readonly string[] = [...standardRowHeadings];

export const scientific = '0.000E+00';

export const invented = 'Invented readings, for trying things out. Change any reading: every answer follows.';

/** By column of the table of orders, which starts in column F of every sheet. */
export const orderTableFormats: Readonly<Record<string, string>> = {
  F: '0.00',
  G: scientific,
  H: '0.0E+00',
  I: '0.0',
  J: '0.0000',
  K: '0.0E+00',
  L: '0.0000',
  M: '0.000',
};

/** Times and readings at the left, a gap, then answers that carry five numbers, and the verdict. */
export const columnWidths = [9, 11, 12, 16, 3, 34, 17, 20, 13, 23, 18, 13, 13, 60];
