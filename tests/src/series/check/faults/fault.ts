/** A column built to have exactly one fault, and what is to be found. */
import type { FindingKind } from '../../../../../src/series/check/finding';
import type { RawCell } from '../../../../../src/series/check/rawRun';
import { fading, wobbling } from '../../../../support/invented';

export interface Fault {
  readonly name: string;
  readonly kind: FindingKind;
  /** Rows counted from 0; left out where the finding names many. */
  readonly places?: readonly number[];
  readonly says: RegExp;
  /** Left out: 0, 10 … 190. */
  readonly times?: readonly RawCell[];
  /** Left out: {@link clean}. */
  readonly values?: readonly RawCell[];
}

/** A run without fault, to put one in. */
export const clean: readonly RawCell[] = wobbling(fading);
export const read = (row: number): number => clean[row] as number;
