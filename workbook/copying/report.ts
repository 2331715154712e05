import type { HandedCopy } from '../../taskpane/copying';
import type { HandedFormula } from '../handover/handed';
import { placeOf, showsError, type HandedOver } from '../handover/handOver';

/** What the pane tells of a copy. */
export function reportOf({ bytes, formulas, names }: HandedOver): HandedCopy {
  const isLive = ({ said }: HandedFormula): boolean => said !== undefined;
  const byReason = new Map<string, string[]>();
  const freeze = (why: string, cells: string): void => {
    byReason.set(why, [...(byReason.get(why) ?? []), cells]);
  };
  for (const formula of formulas.filter((one) => !isLive(one))) freeze(formula.why ?? '', placeOf(formula));
  for (const { name } of names) freeze('a name stands for one value', name);
  return {
    bytes,
    live: formulas.filter(isLive).length,
    frozen: [...byReason].map(([why, cells]) => ({ why, cells })),
    failing: formulas.filter(showsError).map(placeOf),
  };
}
