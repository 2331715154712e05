/** Whether the inputs of a frozen formula are still those of the day, in words: a sum over them then, and the same now. */
import { areaName, cellName } from '../../functions/address';
import { namesReachingOutside, reachesOutside } from '../xlsx/outside';
import type { HandedFormula } from './handed';
import type { SheetCell } from './newSheet';
import { fingerprintOf, fingerprintTolerance, type Fingerprint } from './stale';
import type { World } from './world';

export const unwatched = 'not watched';
export const unchanged = 'inputs as they were';
export const changed = 'inputs have changed';

interface Watched {
  /** Nothing where they cannot be watched. */
  readonly print?: Fingerprint;
  /** Where the sum over them stands. */
  readonly now: string;
}

/** Formulas filled down mostly rest on the same inputs: the first of them sums up, and the others point to its cell. */
export class InputWatch {
  private readonly known = new Map<string, Watched>();

  private readonly outside: ReturnType<typeof namesReachingOutside>;

  constructor(private readonly world: World) {
    this.outside = namesReachingOutside(world.book.names);
  }

  /**
   * What the state is, and the sums then and now, to stand in one row of a sheet.
   *
   * @param row of the sheet, and `column` of the sum then, counted from 0
   */
  cells(formula: HandedFormula, row: number, column: number): SheetCell[] {
    const { world } = this;
    const { sheet, original, ofTheDay } = formula;
    if (reachesOutside(original, this.outside)) return [unwatched, null, null];
    const inputs = ofTheDay?.from ?? world.areasIn(world.spelledOut(original, formula), sheet);
    if (inputs.length === 0) return ['no inputs in cells'];
    const key = inputs.map((area) => areaName({ ...area, sheet: area.sheet ?? sheet })).join();
    const [then, now] = [cellName(row, column), cellName(row, column + 1)];
    const before = this.known.get(key);
    const watched = before ?? { print: fingerprintOf(inputs, sheet, world), now };
    this.known.set(key, watched);
    const { print } = watched;
    if (!print || print.formula.length > longest) return [unwatched];
    const same = `IF(ISERROR(${now}),FALSE,ABS(${now}-${then})<${fingerprintTolerance}*MAX(1,ABS(${then})))`;
    return [
      { formula: `IF(${same},"${unchanged}","${changed}")`, value: unchanged },
      print.value,
      { formula: before ? before.now : print.formula, value: print.value },
    ];
  }
}

/** Characters of a formula, with room for what a cell may hold. */
const longest = 8000;
