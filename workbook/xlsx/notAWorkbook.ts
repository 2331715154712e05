/** The file cannot be read as a workbook; the message says why, in words for the person who chose it. */
export class NotAWorkbook extends Error {
  override readonly name = 'NotAWorkbook';
}
