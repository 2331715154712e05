/** Results that every estimate shares: one value, or the standard row. */
import type { Estimate } from '../src/estimate';
import { CellError, type CellResult, type CellValue } from './cell';

/** The headings of the standard row, in its order. */
export const standardRowHeadings = [
  'value',
  'standard uncertainty',
  'lower 95 %',
  'upper 95 %',
  'degrees of freedom',
] as const;

/** The number, or `#N/A` that says why there is none. */
export const orNotAvailable = (value: number | null | undefined, why: string): CellValue =>
  value ?? new CellError('#N/A', why);

export function standardRow(estimate: Estimate): CellValue[] {
  const noScatter = 'no degrees of freedom: as many parameters as readings leave no scatter to judge by';
  const noLimit = estimate.standardUncertainty === null ? noScatter : 'the data set no limit on this side';
  return [
    estimate.value,
    orNotAvailable(estimate.standardUncertainty, noScatter),
    orNotAvailable(estimate.lower, noLimit),
    orNotAvailable(estimate.upper, noLimit),
    estimate.degreesOfFreedom === Infinity ? '∞' : estimate.degreesOfFreedom,
  ];
}

/** The standard row where nothing is known of the uncertainty. */
export const unknownUncertaintyRow = (value: number, why: string): CellValue[] => [
  value,
  ...standardRowHeadings.slice(1).map(() => new CellError('#N/A', why)),
];

/** `[detail]`: the value alone, or the standard row. */
export const estimateResult = (estimate: Estimate, detail: boolean): CellResult =>
  detail ? [standardRow(estimate)] : estimate.value;
