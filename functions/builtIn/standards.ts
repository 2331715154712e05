/** A calibration line read backwards, said in built-in functions. */
import { eachReading } from './eachReading';
import { standardRowTexts } from './estimate';
import type { Given } from './given';
import { Pairs } from './pairs';
import { NotSaid, type Said } from './said';

export function sayStandards(given: Given): Said {
  if (given.has('uncertainties')) throw new NotSaid('a line weighted by uncertainties has no counterpart');
  const pairs = Pairs.of(given, 'concentrations', 'standards');
  const [origin, detail, replicates] = [
    given.flag('origin'),
    given.flag('detail'),
    given.number('replicates'),
  ];
  const readings = given.readings('readings');
  const line = calibration(pairs, origin.value);
  const holds = [...pairs.holds, ...origin.holds, ...detail.holds, ...replicates.holds];
  const cells = (y: string): string[] => {
    const value = `(${y}-${line.intercept})/${line.slope}`;
    const scatter = `SQRT(1/${replicates.text}+${line.leverage(value)})`;
    return standardRowTexts({
      value,
      uncertainty: `${line.deviation}/ABS(${line.slope})*${scatter}`,
      degreesOfFreedom: line.degreesOfFreedom,
    });
  };
  const say = (n: number): Said =>
    eachReading(readings, holds, (y) => `IF(AND(${line.isClear},${line.covers(y)}),${cells(y)[n]},NA())`);
  if (!detail.value) return say(0);
  const isRow = readings.rows === 1 && readings.columns > 1;
  return { cell: (row, column) => (isRow ? say(row).cell!(0, column) : say(column).cell!(row, 0)) };
}

interface Calibration {
  readonly slope: string;
  readonly intercept: string;
  /** Of a single reading about the line. */
  readonly deviation: string;
  readonly degreesOfFreedom: string;
  /** That the slope can be told from 0. */
  readonly isClear: string;
  /** That a reading lies among the standards, or up to a tenth of their range beyond. */
  covers(reading: string): string;
  /** What the line itself adds, in units of a reading's variance. */
  leverage(concentration: string): string;
}

function calibration(pairs: Pairs, throughOrigin: boolean): Calibration {
  const x = pairs.each(pairs.x);
  const terms = throughOrigin ? [x] : ['1', x];
  const fit = pairs.fit({ y: pairs.each(pairs.y), terms, weight: pairs.both });
  const degreesOfFreedom = `(${pairs.count}-${terms.length})`;
  // LINEST counts pairs with a gap among its degrees of freedom
  const share = `SQRT(${pairs.size - terms.length}/MAX(1,${degreesOfFreedom}))`;
  const slope = `INDEX(${fit},1,1)`;
  const reach = `IF(${degreesOfFreedom}>0,TINV(0.05,MAX(1,${degreesOfFreedom}))*INDEX(${fit},2,1)*${share},0)`;
  const [low, high] = ['MIN', 'MAX'].map((f) => `${f}(${throughOrigin ? '0,' : ''}${pairs.some(pairs.y)})`);
  const centre = throughOrigin ? '0' : `SUM(${x})/${pairs.count}`;
  const spread = `SUM(${pairs.each(`(${pairs.x}-${centre})^2`)})`;
  return {
    slope,
    intercept: throughOrigin ? '0' : `INDEX(${fit},1,2)`,
    deviation: `INDEX(${fit},3,2)*${share}`,
    degreesOfFreedom,
    isClear: `${degreesOfFreedom}>=0,${spread}>0,ABS(${slope})>${reach}`,
    covers: (y) => `${y}>=${low}-0.1*(${high}-${low}),${y}<=${high}+0.1*(${high}-${low})`,
    leverage: (value) => `${throughOrigin ? '' : `1/${pairs.count}+`}(${value}-${centre})^2/${spread}`,
  };
}
