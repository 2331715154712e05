/** Rates of a run, said in built-in functions. */
import { standardRowTexts } from './estimate';
import type { Given } from './given';
import { JoinedMeans } from './joinedMeans';
import { Means } from './means';
import { holdsOf } from './phrase';
import { SingleScatter } from './singleScatter';
import { SortedRun } from './sortedRun';
import { oneValue, type Said } from './said';
import { where } from './text';

export function sayBetween(given: Given): Said {
  const run = new SortedRun(given);
  const [from, to, detail] = [given.number('from'), given.number('to'), given.flag('detail')];
  const nu = run.stoichiometricNumber(given);
  const perTime = `(${nu.text}*(${to.text}-${from.text}))`;
  const cells = detail.value
    ? averageWithScatter(given, run, perTime)
    : [`${difference(new JoinedMeans(given, run), from.text, to.text)}/${perTime}`];
  const isInside = `AND(${run.within(from.text)},${run.within(to.text)})`;
  const holds = [...run.holds, `${run.different}>1`, ...holdsOf(from, to, nu), ...detail.holds];
  const say = (column: number): string =>
    where([...holds, `${from.text}<>${to.text}`], `IF(${isInside},${cells[column]},NA())`);
  return detail.value ? { cell: (_, column) => say(column) } : oneValue(say(0));
}

const difference = (joined: JoinedMeans, from: string, to: string): string =>
  `(${joined.at(to)}-${joined.at(from)})`;

/** The five cells of the standard row. */
function averageWithScatter(given: Given, run: SortedRun, perTime: string): string[] {
  const scatter = new SingleScatter(given, new Means(given, run));
  const change = scatter.change(given);
  return standardRowTexts({
    value: `${change.value}/${perTime}`,
    uncertainty: `${scatter.deviation}*SQRT(${change.spread})/ABS(${perTime})`,
    degreesOfFreedom: scatter.degreesOfFreedom,
    studentFactor: scatter.studentFactor,
  });
}
