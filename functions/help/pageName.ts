import type { CellFunction } from '../define';

/** Where a function's page lies, beside the index. */
export const pageName = ({ name }: Pick<CellFunction, 'name'>): string => `${name.toLowerCase()}.html`;
