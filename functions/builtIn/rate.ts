/** Rates of a run, said in built-in functions. */
import { standardRowTexts } from './estimate';
import type { Given } from './given';
import { holdsOf } from './phrase';
import { Means } from './means';
import { Pairs } from './pairs';
import { SingleScatter } from './singleScatter';
import { SortedRun } from './sortedRun';
import { oneValue, type Said } from './said';
import { where } from './text';

export function sayBetween(given: Given): Said {
  const pairs = Pairs.of(given, 'times', 'values');
  const [from, to, detail] = [given.number('from'), given.number('to'), given.flag('detail')];
  const nu = pairs.stoichiometricNumber(given);
  const perTime = `(${nu.text}*(${to.text}-${from.text}))`;
  const cells = detail.value
    ? averageWithScatter(given, perTime)
    : [`(${interpolated(pairs, to.text)}-${interpolated(pairs, from.text)})/${perTime}`];
  const isInside = `AND(${pairs.within(from.text)},${pairs.within(to.text)})`;
  const say = (column: number): string =>
    where(
      [
        ...pairs.holds,
        `${pairs.different}>1`,
        ...holdsOf(from, to, nu),
        ...detail.holds,
        `${from.text}<>${to.text}`,
      ],
      `IF(${isInside},${cells[column]},NA())`,
    );
  return detail.value ? { cell: (_, column) => say(column) } : oneValue(say(0));
}

/** The five cells of the standard row. */
function averageWithScatter(given: Given, perTime: string): string[] {
  const scatter = new SingleScatter(given, new Means(given, new SortedRun(given)));
  const change = scatter.change(given);
  return standardRowTexts({
    value: `${change.value}/${perTime}`,
    uncertainty: `${scatter.deviation}*SQRT(${change.spread})/ABS(${perTime})`,
    degreesOfFreedom: scatter.degreesOfFreedom,
    studentFactor: scatter.studentFactor,
  });
}

/** y at a time: between the means of the readings just before and just after. */
function interpolated(pairs: Pairs, at: string): string {
  const { x, y } = pairs;
  const before = `MAX(${pairs.some(`IF(${x}<=${at},${x},"")`)})`;
  const after = `MIN(${pairs.some(`IF(${x}>=${at},${x},"")`)})`;
  const mean = (time: string): string =>
    `SUM(${pairs.each(`IF(${x}=${time},${y},0)`)})/SUM(${pairs.each(`IF(${x}=${time},1,0)`)})`;
  const share = `IF(${after}=${before},0,(${at}-${before})/(${after}-${before}))`;
  return `(${mean(before)}+(${mean(after)}-${mean(before)})*${share})`;
}
