import type { CellFunction } from '../define';

/** Where a function's page lies, beside the index. */
export const pageName = ({ name }: Pick<CellFunction, 'name'>): string => `${name.toLowerCase()}.html`;

/** Where the help pages stand, beside the page that leads there: the pane in Excel, the workbook on this machine. */
export const helpFolder = 'help';

export const helpAddress = (f?: Pick<CellFunction, 'name'>): string =>
  `${helpFolder}/${f ? pageName(f) : 'index.html'}`;
