/** What the Excel at hand can do, asked once and in one place. */

export interface HostSupport {
  /** As a person would say it. */
  readonly name: string;
  /** A formula fills the cells that its answer takes. */
  readonly spills: boolean;
  readonly charts: boolean;
  /** Gives the workbook's file, and opens another. */
  readonly files: boolean;
  /** Keeps words of ours with the workbook. */
  readonly memory: boolean;
}

/** An Excel of today: what is left out where there is no one to ask. */
export const allSupport: HostSupport = {
  name: 'Excel',
  spills: true,
  charts: true,
  files: true,
  memory: true,
};

/** @param name of the host @see https://learn.microsoft.com/javascript/api/requirement-sets for what came with which set */
export function supportOf(name: string): HostSupport {
  const has = (set: string, version: string): boolean =>
    Office.context.requirements.isSetSupported(set, version);
  return {
    name,
    spills: has('ExcelApi', '1.12'),
    charts: has('ExcelApi', '1.7'),
    files: has('CompressedFile', '1.1') && has('ExcelApi', '1.8'),
    memory: has('Settings', '1.1'),
  };
}

/** What an Excel from before 2020 lacks, and what works there. */
export const withoutSpills =
  'In this Excel a formula fills its own cell alone. What is put in from here becomes a formula a cell. Typed by hand, an answer of several cells is entered as an array formula: select the cells, type it, press Ctrl+Shift+Enter.';
