import type { CellsAndWhy, HandedCopy } from '../../taskpane/copying';
import type { HandedFormula } from '../handover/handed';
import { placeOf, showsError, type HandedOver } from '../handover/handOver';

/** What the pane tells of a copy. */
export function reportOf({ bytes, formulas, names, elsewhere }: HandedOver): HandedCopy {
  const isLive = ({ said }: HandedFormula): boolean => said !== undefined;
  return {
    bytes,
    live: formulas.filter(isLive).length,
    frozen: byReason([
      ...formulas.filter((one) => !isLive(one)).map((one): Reason => [one.why ?? '', placeOf(one)]),
      ...names.map(({ name }): Reason => ['a name stands for one value', name]),
    ]),
    left: byReason(
      elsewhere.map(({ kind, where, loss }): Reason => [
        `${kind}: without the add-in ${loss}`,
        where ?? 'the workbook as a whole',
      ]),
    ),
    failing: formulas.filter(showsError).map(placeOf),
  };
}

type Reason = readonly [why: string, cells: string];

function byReason(reasons: readonly Reason[]): CellsAndWhy[] {
  const grouped = new Map<string, string[]>();
  for (const [why, cells] of reasons) grouped.set(why, [...(grouped.get(why) ?? []), cells]);
  return [...grouped].map(([why, cells]) => ({ why, cells }));
}
